import type { Area } from "./address";
import type { Cell, Range } from "./cell";

/** A cell that holds a formula, as the file stores it. */
export interface FormulaCell {
  readonly row: number;
  readonly column: number;
  /** Without the leading "=". */
  readonly formula: string;
  /** A shared formula is written at another cell: its relative references move by this much. */
  readonly shift?: { readonly rows: number; readonly columns: number };
  /** What an array formula fills, spilled or entered over a range. */
  readonly array?: Area;
  /** True for a formula that spills by itself; false where the host would take one cell of a range for it. */
  readonly dynamic: boolean;
  /** False where the file holds no value for it: it was written and never calculated. */
  readonly calculated: boolean;
}

export interface DefinedName {
  readonly name: string;
  /** What it stands for, without the leading "=". */
  readonly formula: string;
  /** The sheet it is known on; undefined where it is known everywhere. */
  readonly sheet?: string;
}

/** A table of a sheet, for references such as `Bids[Score]`. */
export interface Table {
  readonly name: string;
  readonly sheet: string;
  readonly area: Area;
  readonly columns: readonly string[];
  readonly headerRows: number;
  readonly totalsRows: number;
}

/** Everything that a file of cells says, without a host: what the evaluator and the audit read. */
export interface Workbook {
  readonly sheets: readonly Sheet[];
  readonly names: readonly DefinedName[];
  readonly tables: readonly Table[];
  /** Dates are counted from 1904 instead of 1900. */
  readonly date1904: boolean;
}

const COLUMNS = 16_384;
const MOST_COLUMNS_IN_TURN = 256;
const MOST_REMEMBERED_CELLS = 1_000_000;
/** Ranges of no more cells are read anew each time: there may be one a row. */
const SMALL = 8;

/** One sheet: the stored values by row, the formulas beside them, and what of it is hidden. */
export class Sheet {
  readonly formulas = new Map<number, FormulaCell>();
  /** Formula cells without a stored value. Reading one as a blank would be a guess. */
  readonly uncalculated = new Set<number>();
  readonly hiddenRows = new Set<number>();
  /** The range under a filter, where one is set. */
  filter?: Area;
  /** The last row and column that hold anything; -1 on an empty sheet. */
  lastRow = -1;
  lastColumn = -1;
  readonly #rows: (Cell[] | undefined)[] = [];
  readonly #ranges = new Map<string, Range>();
  #remembered = 0;

  constructor(
    readonly name: string,
    readonly visible = true,
  ) {}

  static key(row: number, column: number): number {
    return row * COLUMNS + column;
  }

  set(row: number, column: number, value: Cell): void {
    (this.#rows[row] ??= [])[column] = value;
    this.lastRow = Math.max(this.lastRow, row);
    this.lastColumn = Math.max(this.lastColumn, column);
  }

  addFormula(cell: FormulaCell): void {
    const key = Sheet.key(cell.row, cell.column);
    this.formulas.set(key, cell);
    if (!cell.calculated) this.uncalculated.add(key);
    this.lastRow = Math.max(this.lastRow, cell.row);
    this.lastColumn = Math.max(this.lastColumn, cell.column);
  }

  formulaAt(row: number, column: number): FormulaCell | undefined {
    return this.formulas.get(Sheet.key(row, column));
  }

  cell(row: number, column: number): Cell {
    return this.#rows[row]?.[column] ?? null;
  }

  /** Visits each cell that holds a value; a sheet with one cell in each corner is no more work than any with two cells. */
  forEachCell(visit: (row: number, column: number, value: Cell) => void): void {
    for (const [row, stored] of this.#rows.entries()) {
      if (!stored) continue;
      if (stored.length > MOST_COLUMNS_IN_TURN) {
        for (const column of Object.keys(stored)) visit(row, Number(column), stored[Number(column)]!);
        continue;
      }
      for (let column = 0; column < stored.length; column++) {
        const value = stored[column];
        if (value !== undefined) visit(row, column, value);
      }
    }
  }

  /** The stored values of an area, row by row, null for a blank. The same area gives the same array, but for a small one: it must not be changed. */
  range({ top, left, bottom, right }: Area): Range {
    const size = (bottom - top + 1) * (right - left + 1);
    if (size <= SMALL) return Object.freeze(this.#read(top, left, bottom, right));
    const name = `${top},${left},${bottom},${right}`;
    const known = this.#ranges.get(name);
    if (known) return known;
    const cells = this.#read(top, left, bottom, right);
    if (this.#remembered + size > MOST_REMEMBERED_CELLS) {
      this.#ranges.clear();
      this.#remembered = 0;
    }
    // What reads a frozen range may remember what it read.
    Object.freeze(cells);
    this.#ranges.set(name, cells);
    this.#remembered += size;
    return cells;
  }

  #read(top: number, left: number, bottom: number, right: number): Cell[][] {
    const cells: Cell[][] = [];
    // One and the same blank row throughout: a range may claim millions of them.
    const blank = Array<Cell>(right - left + 1).fill(null);
    for (let row = top; row <= bottom; row++) {
      const stored = this.#rows[row];
      if (stored === undefined) {
        cells.push(blank);
        continue;
      }
      const line: Cell[] = [];
      for (let column = left; column <= right; column++) line.push(stored[column] ?? null);
      cells.push(line);
    }
    return cells;
  }
}

export function sheetNamed(workbook: Workbook, name: string): Sheet | undefined {
  const wanted = name.toLowerCase();
  return workbook.sheets.find((sheet) => sheet.name.toLowerCase() === wanted);
}
