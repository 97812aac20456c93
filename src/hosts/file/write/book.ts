import type { Area } from "../../../sheet/address";
import type { Cell } from "../../../sheet/cell";
import type { CellRole, RoleLook } from "../../../sheet/cellLook";
import type { ChartToWrite } from "./chart";

/** A workbook to be written as a new .xlsx file. */
export interface BookToWrite {
  readonly sheets: readonly SheetToWrite[];
  readonly names?: readonly NameToWrite[];
  readonly title?: string;
  /** Which sheet is in front when the file is opened; the first where left out. */
  readonly active?: number;
  /** Plain JSON that the pane keeps with the workbook. */
  readonly settings?: Readonly<Record<string, unknown>>;
}

/** A defined name, known on every sheet or on one: `formula` is `Plan!$C$5` or any formula, as typed, with or without "=". */
export interface NameToWrite {
  readonly name: string;
  readonly formula: string;
  /** The sheet that alone knows it. */
  readonly sheet?: string;
}

/** A cell with more to it than its value. */
export interface CellToWrite {
  readonly value?: Cell;
  /** As it is typed, with or without "=": `WEIR.SAFE_CUTOFF(Scores!B2:B61,5%)`. `value` is what it came to. */
  readonly formula?: string;
  /** What the formula fills when it spills, this cell its first; the other cells hold their values. */
  readonly spills?: { readonly rows: number; readonly columns: number };
  readonly role?: CellRole;
  /** A look of its own, in the place of a role's. */
  readonly look?: RoleLook;
  /** A number format, such as `0.0%`. */
  readonly format?: string;
}

export interface SheetToWrite {
  readonly name: string;
  /** Row by row from A1; a value alone stands for a plain cell. */
  readonly rows: readonly (readonly (Cell | CellToWrite)[])[];
  /** Widths in characters, from column A on; 0 leaves a column as wide as usual. */
  readonly widths?: readonly number[];
  /** Heights in points, by row from 0. */
  readonly heights?: ReadonlyMap<number, number>;
  readonly hiddenRows?: ReadonlySet<number>;
  readonly hiddenColumns?: ReadonlySet<number>;
  readonly hidden?: boolean;
  /** So many rows on top and columns on the left stay in view. */
  readonly frozenRows?: number;
  readonly frozenColumns?: number;
  readonly merged?: readonly Area[];
  /** Cells that offer a list of words to choose from; other words are refused only where `strict`. */
  readonly choices?: readonly { readonly area: Area; readonly words: readonly string[]; readonly strict?: boolean }[];
  readonly gridLines?: boolean;
  readonly print?: PrintSetup;
  readonly charts?: readonly ChartToWrite[];
  readonly pictures?: readonly PictureToWrite[];
}

/** A picture whose upper left corner stands on a cell, in CSS pixels. */
export interface PictureToWrite {
  /** What it shows, also said to those who can't see it. */
  readonly name: string;
  readonly png: Uint8Array;
  readonly row: number;
  readonly column: number;
  readonly width: number;
  readonly height: number;
}

export interface PrintSetup {
  readonly paper: "A4" | "Letter";
  readonly orientation: "portrait" | "landscape";
  /** As many pages wide as this; the height follows. */
  readonly pagesWide?: number;
  readonly area?: Area;
  /** Rows repeated on every page, from 0, ends included. */
  readonly titleRows?: readonly [first: number, last: number];
  /** Rows that begin a new page, from 0. */
  readonly breaksBefore?: readonly number[];
  /** In the code of the format: `&P` the page, `&N` of how many, `&A` the sheet, `&F` the file; `&&` an ampersand. */
  readonly header?: PrintLine;
  readonly footer?: PrintLine;
}

export interface PrintLine {
  readonly left?: string;
  readonly centre?: string;
  readonly right?: string;
}
