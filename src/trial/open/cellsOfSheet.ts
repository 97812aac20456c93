import type { IWorksheetData } from "@univerjs/core";
import type { CellStyle, SheetLook } from "../../hosts/file/sheetLook";
import { CELL_KIND } from "../../hosts/trial/cellKinds";
import { UnusableFile } from "../../hosts/file/unusableFile";
import { formatAddress } from "../../sheet/address";
import { isCellError, type Cell } from "../../sheet/cell";
import { Sheet, type FormulaCell, type Workbook } from "../../sheet/workbook";
import { shownFormula } from "./shownFormula";

/** What is different in the trial sheet from what the file holds. */
export interface Differences {
  /** Formulas that are shown as the value that the file holds, with the place of the first. */
  frozen: number;
  firstFrozen?: string;
  /** Formulas whose spilled ranges or parts of tables are written as plain ranges. */
  pinned: number;
}

export interface SheetToLayOut {
  readonly sheet: Sheet;
  readonly workbook: Workbook;
  readonly look?: SheetLook;
  readonly styles: readonly CellStyle[];
  knows(name: string): boolean;
}

type Cells = NonNullable<IWorksheetData["cellData"]>;
type CellData = Cells[number][number];

const DAYS_FROM_1900_TO_1904 = 1462;
const DATE = /[ymdh]/i;
const MOST_SPILLED = 5_000_000;

/** The cells of a sheet as the engine keeps them, each at its row and column. */
export function cellsOfSheet(given: SheetToLayOut, differences: Differences): Cells {
  const { sheet, workbook, look, styles } = given;
  const cells: Record<number, Record<number, CellData>> = {};
  const styled = (row: number, column: number): CellData => {
    const style = look?.style(row, column) ?? 0;
    return style > 0 ? { s: `file-${style}` } : {};
  };
  const formulas = shownFormulas(given, differences);
  const filled = spilledCells(sheet, formulas);
  sheet.forEachCell((row, column, value) => {
    if (filled.has(Sheet.key(row, column))) return;
    const dated =
      workbook.date1904 && typeof value === "number" && DATE.test(styles[look?.style(row, column) ?? 0]?.format ?? "");
    const data = dataOf(dated ? value + DAYS_FROM_1900_TO_1904 : value);
    if (data) (cells[row] ??= {})[column] = { ...data, ...styled(row, column) };
  });
  for (const { formula, row, column } of formulas)
    (cells[row] ??= {})[column] = { ...cells[row]?.[column], f: formula, ...styled(row, column) };
  return cells;
}

type Shown = Pick<FormulaCell, "row" | "column" | "array"> & { readonly formula: string };

function shownFormulas({ sheet, workbook, knows }: SheetToLayOut, differences: Differences): Shown[] {
  const all: Shown[] = [];
  for (const cell of sheet.formulas.values()) {
    const { row, column, array } = cell;
    const shown = shownFormula(cell, sheet, workbook, knows);
    if (shown) all.push({ row, column, array, formula: shown.formula });
    else {
      differences.frozen++;
      differences.firstFrozen ??= formatAddress({
        sheet: sheet.name,
        top: row,
        left: column,
        bottom: row,
        right: column,
      });
    }
    if (shown?.pinned) differences.pinned++;
  }
  return all;
}

/** Cells that a formula fills by itself: laid down as values they would be in its way. */
function spilledCells(sheet: Sheet, formulas: readonly Shown[]): ReadonlySet<number> {
  const filled = new Set<number>();
  let steps = 0;
  for (const { array, row, column } of formulas) {
    if (!array) continue;
    const bottom = Math.min(array.bottom, sheet.lastRow);
    const right = Math.min(array.right, sheet.lastColumn);
    for (let down = array.top; down <= bottom; down++)
      for (let across = array.left; across <= right; across++) {
        // Areas that lie over one another by the thousand are a file's way to keep a reader busy.
        if (++steps > MOST_SPILLED)
          throw new UnusableFile("The file is refused: its formulas fill more cells than it has.");
        if (down !== row || across !== column) filled.add(Sheet.key(down, across));
      }
  }
  return filled;
}

function dataOf(value: Cell): CellData | undefined {
  if (value === null || value === undefined || value === "") return undefined;
  if (typeof value === "number") return { v: value, t: CELL_KIND.number };
  if (typeof value === "boolean") return { v: value ? 1 : 0, t: CELL_KIND.flag };
  return { v: isCellError(value) ? value.code : value, t: CELL_KIND.text };
}
