import { frameTexts } from "./language";
import { hideMessage, showMessage } from "./message";

const KEY = "weirmark-trial-said";

/** Has a sentence shown once the page is loaded anew. */
export function sayAfterReload(sentence: string): void {
  sessionStorage.setItem(KEY, sentence);
}

export function saySaid(): void {
  const sentence = sessionStorage.getItem(KEY);
  if (sentence === null) return;
  sessionStorage.removeItem(KEY);
  showMessage({ kind: "refusal", text: sentence, actions: [[frameTexts().close, hideMessage]] });
}
