import type { IWorksheetData } from "@univerjs/core";
import type { SheetToWrite } from "../../hosts/file/write/book";

const POINTS_OF_A_PIXEL = 0.75;

/** Everything of a sheet but its cells: widths, what is hidden, merged and stays in view. */
export function frameToWrite(sheet: Partial<IWorksheetData>): Omit<SheetToWrite, "name" | "rows"> {
  const columns = Object.entries(sheet.columnData ?? {});
  const widths: number[] = [];
  const heights = new Map<number, number>();
  for (const [row, data] of Object.entries(sheet.rowData ?? {}))
    if (data?.h !== undefined) heights.set(Number(row), data.h * POINTS_OF_A_PIXEL);
  for (const [column, data] of columns) if (data?.w !== undefined) widths[Number(column)] = characters(data.w);
  return {
    widths: Array.from(widths, (width) => width ?? 0),
    heights,
    hiddenRows: hiddenIn(sheet.rowData),
    hiddenColumns: hiddenIn(sheet.columnData),
    hidden: sheet.hidden === 1,
    frozenRows: sheet.freeze?.ySplit ?? 0,
    frozenColumns: sheet.freeze?.xSplit ?? 0,
    merged: (sheet.mergeData ?? []).map(({ startRow, startColumn, endRow, endColumn }) => ({
      top: startRow,
      left: startColumn,
      bottom: endRow,
      right: endColumn,
    })),
  };
}

/** A character is 7 pixels wide, and 5 are left around the text; in hundredths, as hosts keep it. */
function characters(pixels: number): number {
  return Math.max(0, Math.round(((pixels - 5) / 7) * 100) / 100);
}

function hiddenIn(data: Readonly<Record<number, { hd?: number } | null | undefined>> | undefined): Set<number> {
  return new Set(
    Object.entries(data ?? {})
      .filter(([, one]) => one?.hd === 1)
      .map(([place]) => Number(place)),
  );
}
