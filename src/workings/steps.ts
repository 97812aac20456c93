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

/** Gathers the steps of one derivation in order. */
export class Steps {
  readonly rows: Step[] = [];

  add(meaning: string, value: Cell, formula = "", source = ""): this {
    this.rows.push({ meaning, value, formula: formula === "" ? "" : `=${formula}`, source });
    return this;
  }
}
