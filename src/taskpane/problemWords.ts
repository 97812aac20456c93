import type { Numbers } from "./numbers";
import type { Texts } from "./texts/en";
import type { Typed } from "./typed";

/** What is said beside a line whose text can't be taken; "" where it can. */
export function problemWords(typed: Typed, text: string, texts: Texts, numbers: Numbers): string {
  if ("value" in typed) return "";
  switch (typed.problem) {
    case "empty":
      return texts.problemEmpty;
    case "no-number":
      return texts.problemNoNumber(text.trim());
    case "percent-sign-missing":
      return texts.problemPercent(text.trim(), `${text.trim()}${numbers.percentGap}%`);
    case "not-between":
      return texts.problemNotBetween;
    case "not-whole":
      return texts.problemNotWhole;
    case "too-small":
      return texts.problemTooSmall(numbers.full(typed.least));
    case "not-positive":
      return texts.problemNotPositive;
  }
}
