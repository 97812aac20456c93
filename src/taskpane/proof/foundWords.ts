import type { Texts } from "../texts/en";
import type { Finding } from "./findings";

/** A verdict or a notice in the words of the language. */
export function foundWords(found: Finding["found"], texts: Texts): string {
  const words: Readonly<Record<Finding["found"], string>> = {
    agrees: texts.foundAgrees,
    differs: texts.foundDiffers,
    "not checkable": texts.foundNotCheckable,
    "typed over": texts.foundTypedOver,
    "leaves data out": texts.foundLeavesOut,
    "skips rows": texts.foundSkipsRows,
    "ranges out of line": texts.foundOutOfLine,
    "takes in a total": texts.foundTotal,
    "hidden rows": texts.foundHidden,
    "asked in two ways": texts.foundTwoWays,
    "fixed mark moved": texts.foundMarkMoved,
    "second opinion differs": texts.foundSecondOpinion,
  };
  return words[found];
}
