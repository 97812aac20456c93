import type { Cell } from "../sheet/cell";

/** One line of a derivation. */
export interface Step {
  /** What this number is, in the words of the glossary. */
  readonly meaning: string;
  readonly value: Cell;
  /**
   * How the host's own functions compute it from the caller's cells: a formula to paste, "" where the host has no function for it. Where a
   * result can only be checked, this is a formula that evaluates the defining equation at the answer, and `value` is what it must give.
   */
  readonly formula: string;
  /** Author, year, equation or table; "" for plain arithmetic. */
  readonly source: string;
}

/** What Excel takes as the length of a formula. */
export const LONGEST_FORMULA = 8192;

/** One step; `formula` without the sign of equality in front. */
export function asStep(meaning: string, value: Cell, formula: string, source: string): Step {
  // A column that came without an address is written out in full: no sheet would take the formula.
  const fits = formula !== "" && formula.length < LONGEST_FORMULA;
  // On the way to a good result a square or a sum may pass the largest number, and no sheet follows it there.
  if (typeof value === "number" && !Number.isFinite(value))
    return { meaning, value: "out of the range of numbers", formula: "", source };
  return { meaning, value, formula: fits ? `=${formula}` : "", source };
}

/** Gathers the steps of one derivation in order. */
export class Steps {
  readonly rows: Step[] = [];

  add(meaning: string, value: Cell, formula = "", source = ""): this {
    this.rows.push(asStep(meaning, value, formula, source));
    return this;
  }
}
