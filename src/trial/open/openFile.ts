import { hasKeptBook } from "../../hosts/trial/keptBook";
import { keepSettings, readSettings } from "../../hosts/trial/keptSettings";
import { hideMessage, showMessage } from "../message";
import type { TrialTexts } from "../texts/en";
import { readInBackground, RefusedFile, type WaitingFile } from "./fileReader";
import { summaryWords } from "./summaryWords";

/** How the page speaks, and what the sheet can compute, at the moment a file is opened. */
export interface OpenWith {
  readonly texts: TrialTexts;
  readonly language: string;
  readonly functions: readonly string[];
}

let running: AbortController | undefined;

/**
 * Reads a file in the background, says what of it the sheet can't show, and asks before it replaces a workbook that the user worked on. The page is then
 * loaded anew with it: nothing of the workbook before is left over in engine or pane.
 */
export async function openFile(file: File, given: OpenWith): Promise<void> {
  const { texts } = given;
  running?.abort();
  const mine = (running = new AbortController());
  const stop = () => {
    mine.abort();
    hideMessage();
  };
  showMessage({ kind: "busy", text: texts.reading(file.name), actions: [[texts.cancel, stop]] });
  try {
    const read = await readInBackground(file, given.functions, mine.signal);
    const losses = summaryWords(read.summary, texts, given.language);
    const replaces = await hasKeptBook();
    if (mine.signal.aborted) return;
    if (losses.length === 0 && !replaces) await take(read, given);
    else ask(read, [...(replaces ? [texts.replaces] : []), ...losses], given, stop);
  } catch (failure) {
    if (mine.signal.aborted) return;
    refuse(texts.refused(file.name), failure instanceof RefusedFile ? failure.message : String(failure), texts);
  }
}

function ask(read: WaitingFile, more: readonly string[], given: OpenWith, stop: () => void): void {
  const { texts, language } = given;
  const { name, cells, sheets } = read.summary;
  showMessage({
    kind: "question",
    text: texts.found(name, cells.toLocaleString(language), sheets),
    more,
    actions: [
      [texts.openIt, () => void take(read, given)],
      [texts.keepThis, stop],
    ],
  });
}

async function take(read: WaitingFile, { texts }: OpenWith): Promise<void> {
  showMessage({ kind: "busy", text: texts.reading(read.summary.name), actions: [] });
  const settings = await read.take();
  if (settings === undefined) return refuse(texts.noStore, undefined, texts);
  // The language is the user's, not the workbook's.
  const { language } = readSettings();
  keepSettings({ ...settings, ...(language !== undefined && { language }) });
  location.reload();
}

function refuse(text: string, reason: string | undefined, texts: TrialTexts): void {
  showMessage({ kind: "refusal", text, reason, actions: [[texts.close, hideMessage]] });
}
