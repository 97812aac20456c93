import type { TrialTexts } from "../texts/en";
import type { FileSummary } from "./openProtocol";

/** What a file loses in the trial sheet, a sentence each; none where it loses nothing. */
export function summaryWords({ extras, differences }: FileSummary, texts: TrialTexts, language: string): string[] {
  const words: string[] = [];
  const list = new Intl.ListFormat(language, { type: "conjunction" });
  if (extras.length > 0) words.push(texts.extras(list.format(extras.map(([kind, count]) => texts.extra[kind](count)))));
  if (differences.frozen > 0) words.push(texts.frozen(differences.frozen, differences.firstFrozen ?? ""));
  if (differences.pinned > 0) words.push(texts.pinned(differences.pinned));
  return words;
}
