import { readSettings } from "../../hosts/trial/keptSettings";
import type { PlacedPicture } from "../../hosts/trial/pictureLayer";
import { pngOfSvg } from "../../hosts/pngOfSvg";
import { savedBook, type SavedBook } from "../../hosts/trial/savedBook";
import type { TrialSheet } from "../../hosts/trial/startSheet";
import { hideMessage, showMessage } from "../message";
import type { TrialTexts } from "../texts/en";
import type { DrawnPicture, SaveAnswer, SaveRequest } from "./saveProtocol";

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
    showMessage({ kind: "done", text: texts.saved(name), actions: [[texts.close, hideMessage]] });
  };
  try {
    const pictures = await Promise.all(picturesOn(book).map(drawn));
    worker.postMessage({ book, settings: readSettings(), pictures } satisfies SaveRequest);
  } catch (failure) {
    failed((failure as Error).message);
  }
}

function picturesOn({ snapshot }: SavedBook): readonly PlacedPicture[] {
  return (snapshot.custom?.["pictures"] as PlacedPicture[] | undefined) ?? [];
}

async function drawn({ sheetId, row, column, picture }: PlacedPicture): Promise<DrawnPicture> {
  const address = await pngOfSvg(picture);
  const png = Uint8Array.from(atob(address.slice(address.indexOf(",") + 1)), (sign) => sign.charCodeAt(0));
  const { name, width, height } = picture;
  return { sheetId, row, column, name, width, height, png };
}

function download(name: string, bytes: Uint8Array<ArrayBuffer>): void {
  const address = URL.createObjectURL(new Blob([bytes], { type: TYPE }));
  const link = document.createElement("a");
  link.href = address;
  link.download = name;
  link.click();
  setTimeout(() => URL.revokeObjectURL(address), KEPT_FOR_MS);
}
