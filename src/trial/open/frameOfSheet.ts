import type { IWorksheetData } from "@univerjs/core";
import type { CellStyle, SheetLook } from "../../hosts/file/sheetLook";
import type { Sheet } from "../../sheet/workbook";
import { rowHeights } from "./rowHeights";

const SPARE_ROWS = 40;
const LEAST_ROWS = 200;
const LEAST_COLUMNS = 26;
const MOST_ROWS = 1_048_576;
const MOST_COLUMNS = 16_384;
const ROWS_TO_MEASURE = 100;
/** In characters. */
const NARROW = 9;
const WIDE = 42;

/** Everything of a sheet but its cells: its size, widths, what is hidden, merged and stays in view. */
export function frameOfSheet(
  sheet: Sheet,
  look: SheetLook | undefined,
  styles: readonly CellStyle[],
): Partial<IWorksheetData> {
  const columnCount = Math.min(MOST_COLUMNS, Math.max(LEAST_COLUMNS, sheet.lastColumn + 5));
  const columnData: Record<number, { w?: number; hd?: 1 }> = {};
  (look?.columnWidths ?? measured(sheet)).forEach((wide, column) => {
    if (column < columnCount) columnData[column] = { w: pixels(wide) };
  });
  look?.hiddenColumns.forEach((column) => {
    if (column < columnCount) columnData[column] = { ...columnData[column], hd: 1 };
  });
  const rowData: Record<number, { h?: number; hd?: 1 }> = {};
  for (const [row, h] of rowHeights(sheet, look, styles)) rowData[row] = { h };
  for (const row of sheet.hiddenRows) rowData[row] = { ...rowData[row], hd: 1 };
  const [rows, columns] = [look?.frozenRows ?? 0, look?.frozenColumns ?? 0];
  const mergeData = (look?.merged ?? [])
    .filter(({ bottom, right }) => bottom <= sheet.lastRow + SPARE_ROWS && right < columnCount)
    .map(({ top, left, bottom, right }) => ({ startRow: top, startColumn: left, endRow: bottom, endColumn: right }));
  return {
    hidden: sheet.visible ? 0 : 1,
    rowCount: Math.min(MOST_ROWS, Math.max(LEAST_ROWS, sheet.lastRow + 1 + SPARE_ROWS)),
    columnCount,
    columnData,
    rowData,
    mergeData,
    defaultRowHeight: 22,
    freeze: { startRow: rows || -1, startColumn: columns || -1, ySplit: rows, xSplit: columns },
  };
}

/** A character is 7 pixels wide, and 5 are left around the text. */
function pixels(characters: number): number {
  return Math.round(characters * 7 + 5);
}

/** A list without widths gets those of its first rows. */
function measured(sheet: Sheet): Map<number, number> {
  const widths = new Map<number, number>();
  sheet.forEachCell((row, column, value) => {
    if (row >= ROWS_TO_MEASURE) return;
    const length = typeof value === "string" ? value.length : String(value).length;
    widths.set(column, Math.min(WIDE, Math.max(NARROW, length + 1, widths.get(column) ?? 0)));
  });
  return widths;
}
