import type { TrialSheet } from "../hosts/trial/startSheet";
import { functionNames } from "../hosts/trial/functionNames";
import { frameLanguage, frameTexts } from "./language";
import { hideMessage, showMessage } from "./message";
import { takeDrops } from "./open/dropTarget";

/** Lets the user open files, by the button and by dropping them, and save what is in the sheet. */
export function setUpFiles(sheet: TrialSheet): void {
  const picked = document.getElementById("file") as HTMLInputElement;
  const opened = async (files: readonly File[]): Promise<void> => {
    const texts = frameTexts();
    if (files.length !== 1)
      return showMessage({ kind: "refusal", text: texts.oneFile, actions: [[texts.close, hideMessage]] });
    const given = { texts, language: frameLanguage(), functions: functionNames(sheet) };
    await import("./open/openFile").then(({ openFile }) => openFile(files[0]!, given), notLoaded);
  };
  document.getElementById("open")!.addEventListener("click", () => picked.click());
  picked.addEventListener("change", () => {
    const files = [...(picked.files ?? [])];
    // Else the same file, corrected meanwhile, could not be picked once more.
    picked.value = "";
    if (files.length > 0) void opened(files);
  });
  const save = document.getElementById("save")!;
  save.addEventListener("click", () => {
    void import("./save/saveFile").then(({ saveFile }) => saveFile(sheet, frameTexts()), notLoaded);
  });
  const target = document.getElementById("drop")!;
  takeDrops(
    (files) => void opened(files),
    (over) => (target.hidden = !over),
  );
}

/** The parts that read and write files are fetched when they are first needed: the server may be gone by then. */
function notLoaded(): void {
  const texts = frameTexts();
  showMessage({ kind: "refusal", text: texts.notLoaded, actions: [[texts.close, hideMessage]] });
}
