import { compareStored } from "../../audit/compareStored";
import { formatAddress, type Area } from "../../sheet/address";
import { isCellError, type Cell } from "../../sheet/cell";
import type { WorkedStep } from "./workingsOf";

/** The formulas of the workings are proven to this: of the value, and of 1 where it is smaller (a check that comes to 0 never does quite). */
const LARGEST_ERROR = 1e-9;

/** What the formulas of written workings have come to, each held against the value of its step. */
export interface LiveAnswers {
  readonly formulas: number;
  /** Cells where something else came out. */
  readonly off: readonly string[];
  /** Cells whose formula this sheet can't work out. */
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
    if (same(answer, value)) return;
    const row = area.top + index;
    const cell = formatAddress({ top: row, left: area.left, bottom: row, right: area.left });
    (isCellError(answer) ? lacking : off).push(cell);
  });
  return { formulas, off, lacking };
}

function same(answer: Cell, value: Cell): boolean {
  if (typeof answer === "number" && typeof value === "number")
    return Math.abs(answer - value) <= LARGEST_ERROR * Math.max(1, Math.abs(value));
  return compareStored([[answer]], [[value]], LARGEST_ERROR).same;
}
