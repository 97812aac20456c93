import { readFileSync } from "node:fs";
import { join } from "node:path";

/** Workbooks that other programs made, or that were put together by hand: see the README beside them. */
export const FOREIGN_BOOKS = [
  "openpyxl",
  "openpyxlUncalculated",
  "xlsxWriter",
  "libreOffice",
  "libreOfficeUnknown",
  "byHand",
  "byHandStrict",
] as const;
export type ForeignBook = (typeof FOREIGN_BOOKS)[number];

export function foreignBook(name: ForeignBook): Uint8Array {
  return readFileSync(join(__dirname, "../reference/workbooks", `${name}.xlsx`));
}
