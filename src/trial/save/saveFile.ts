import { readSettings } from "../../hosts/trial/keptSettings";
import { savedBook } from "../../hosts/trial/savedBook";
import type { TrialSheet } from "../../hosts/trial/startSheet";
import { hideMessage, showMessage } from "../message";
import type { TrialTexts } from "../texts/en";
import type { SaveAnswer, SaveRequest } from "./saveProtocol";

const TYPE = "application/vnd.openxmlformats-officedocument.spreadsheetml.sheet";
/** Long enough for the browser to have begun the download. */
const KEPT_FOR_MS = 60_000;

/** Writes the workbook in the background and hands it to the browser as a download. */
export async function saveFile(sheet: TrialSheet, texts: TrialTexts): Promise<void> {
  // What was changed a moment ago may still be in calculation: its old result must not go into the file.
  await sheet.api.getFormula().onCalculationResultApplied();
  const book = savedBook(sheet);
  const file = book.snapshot.custom?.["file"];
  const name = `${typeof file === "string" ? file.replace(/\.[^.]*$/, "") : "weirmark-trial"}.xlsx`;
  const worker = new Worker(new URL("./saveWorker.ts", import.meta.url));
  const end = (): void => worker.terminate();
  const failed = (reason: string): void => {
    end();
    showMessage({ kind: "refusal", text: texts.notSaved, reason, actions: [[texts.close, hideMessage]] });
  };
  const cancel = (): void => {
    end();
    hideMessage();
  };
  showMessage({ kind: "busy", text: texts.saving(name), actions: [[texts.cancel, cancel]] });
  worker.onerror = (event) => failed(event.message || "The writer could not be loaded.");
  worker.onmessage = ({ data }: MessageEvent<SaveAnswer>) => {
    if (data.kind === "failed") return failed(data.message);
    end();
    download(name, data.bytes);
    const pictures = (book.snapshot.custom?.["pictures"] as unknown[] | undefined) ?? [];
    const more = pictures.length > 0 ? [texts.picturesLeftOut(pictures.length)] : [];
    showMessage({ kind: "done", text: texts.saved(name), more, actions: [[texts.close, hideMessage]] });
  };
  worker.postMessage({ book, settings: readSettings() } satisfies SaveRequest);
}

function download(name: string, bytes: Uint8Array<ArrayBuffer>): void {
  const address = URL.createObjectURL(new Blob([bytes], { type: TYPE }));
  const link = document.createElement("a");
  link.href = address;
  link.download = name;
  link.click();
  setTimeout(() => URL.revokeObjectURL(address), KEPT_FOR_MS);
}
