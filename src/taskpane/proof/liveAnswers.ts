import { compareStored } from "../../audit/compareStored";
import { formatAddress, type Area } from "../../sheet/address";
import { isCellError, type Cell } from "../../sheet/cell";
import { TOLERANCE } from "./checkBook";
import type { WorkedStep } from "./workingsOf";

/** What the formulas of written workings have come to, each held against the value of its step. */
export interface LiveAnswers {
  readonly formulas: number;
  /** Cells where something else came out. */
  readonly off: readonly string[];
  /** Cells whose formula this sheet doesn't know. */
  readonly lacking: readonly string[];
}

/** `answers` are the cells of the column `area`, a row a step. */
export function liveAnswers(steps: readonly WorkedStep[], answers: readonly Cell[], area: Area): LiveAnswers {
  const off: string[] = [];
  const lacking: string[] = [];
  let formulas = 0;
  steps.forEach(({ value, formula }, index) => {
    if (formula === "") return;
    formulas++;
    const answer = answers[index];
    if (compareStored([[answer]], [[value]], TOLERANCE).same) return;
    const row = area.top + index;
    const cell = formatAddress({ top: row, left: area.left, bottom: row, right: area.left });
    (isCellError(answer) && answer.code === "#NAME?" ? lacking : off).push(cell);
  });
  return { formulas, off, lacking };
}
