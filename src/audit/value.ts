import type { Area } from "../sheet/address";
import { isCellError, type Cell, type CellError, type Range } from "../sheet/cell";
import type { Sheet } from "../sheet/workbook";

/** Cells of one sheet. */
export interface Place {
  readonly sheet: Sheet;
  readonly area: Area;
}

/** What a reference leads to: one area, or several for a union or a run of sheets. */
export class Reference {
  constructor(readonly places: readonly Place[]) {}
}

/** What a formula, or a part of it, comes to: one cell's value, an array row by row, or cells by reference. */
export type Value = Cell | Range | Reference;

export function isArray(value: Value): value is Range {
  return Array.isArray(value);
}

export function errorCell(code: string, message?: string): CellError {
  return message === undefined ? { code } : { code, message };
}

/** The first error among `cells`, in their order. */
export function firstError(cells: readonly Cell[]): CellError | undefined {
  return cells.find(isCellError) as CellError | undefined;
}

/**
 * Thrown where the value can't be known here: a function of the host that this evaluator doesn't have, another workbook, a cell without
 * a stored value. It passes through IFERROR and the like, since a guess in its place would look like an answer.
 */
export class NotKnown extends Error {
  override readonly name = "NotKnown";
}

/** Thrown where the text of a formula is no formula. */
export class UnreadableFormula extends Error {
  override readonly name = "UnreadableFormula";
}
