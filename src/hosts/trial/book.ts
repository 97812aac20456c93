import type { Cell } from "../../sheet/cell";

/** A workbook as plain data, ready to be laid out in the trial sheet: blocks of cells, each at its place. */
export interface Book {
  readonly name: string;
  readonly sheets: readonly BookSheet[];
}

export interface BookSheet {
  readonly name: string;
  /** In CSS pixels, from column A on. */
  readonly columnWidths: readonly number[];
  readonly frozenRows?: number;
  readonly blocks: readonly BookBlock[];
}

export interface BookBlock {
  /** Where its first cell stands, such as "B4". */
  readonly at: string;
  /** Texts that begin with "=" are formulas: English names, comma between arguments. */
  readonly cells: readonly (readonly Cell[])[];
  readonly style?: BookStyle;
  /** A number format, such as "0.0" or "0%". */
  readonly format?: string;
}

export type BookStyle = "title" | "note" | "caution" | "heading" | "centred";
