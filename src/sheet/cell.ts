import { ordinal } from "../core/ordinal";

/**
 * What a cell can hold, without any host.
 *
 * Blank is null, undefined, or a text of nothing but white space: hosts differ in which of them they hand over.
 * An error cell is an object with its code, because that is how Excel hands it over.
 */
export interface CellError {
  readonly code: string;
  readonly message?: string;
}
export type Cell = number | string | boolean | null | undefined | CellError;
export type Range = readonly (readonly Cell[])[];

export function isBlank(cell: Cell): cell is null | undefined | "" {
  return cell === null || cell === undefined || (typeof cell === "string" && cell.trim() === "");
}

export function isCellError(cell: unknown): cell is CellError {
  return typeof cell === "object" && cell !== null && "code" in cell;
}

/** The place of a cell in a range read row by row, in words: 1 → "the 1st cell". */
export function ordinalCell(position: number): string {
  return `the ${ordinal(position)} cell`;
}
