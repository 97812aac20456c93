import { isBlank, type Cell } from "../../../sheet/cell";
import type { CellToWrite, SheetToWrite } from "./book";

/** A list of plain values as a sheet: headings in its first row, which stays in view. */
export interface ListToWrite {
  readonly name: string;
  readonly rows: readonly (readonly Cell[])[];
  /** Widths in characters. */
  readonly widths: readonly number[];
}

const LONG = 60;

/** The list with its looks: bold headings, wrapped sentences, and texts that are never taken for formulas. */
export function listSheet({ name, rows, widths }: ListToWrite): SheetToWrite {
  const styled = rows.map((row, top) =>
    row.map((cell): Cell | CellToWrite => (isBlank(cell) ? null : styledCell(cell, top))),
  );
  return { name, rows: styled, widths, frozenRows: 1 };
}

function styledCell(value: Cell, top: number): Cell | CellToWrite {
  if (top === 0) return { value, role: "heading" };
  if (typeof value !== "string") return value;
  if (/^[=+\-@\t\r]/.test(value)) return { value, role: "text" };
  return value.length > LONG ? { value, role: "wrapped" } : value;
}
