import type { Workbook } from "../sheet/workbook";
import type { CallCell } from "./callCells";
import { marksOn } from "./notices/marksOn";

/**
 * The revision of the numbers that a file says it was computed by: in a cell that calls RELEASE, else in the newest of its fixed marks;
 * undefined where it says nothing.
 */
export function fileRevision(calls: readonly CallCell[], workbook: Workbook): number | undefined {
  const marks = workbook.sheets.flatMap((sheet) => marksOn(sheet).map(({ mark }) => mark.revision));
  return releaseRevision(calls) ?? (marks.length > 0 ? Math.max(...marks) : undefined);
}

function releaseRevision(calls: readonly CallCell[]): number | undefined {
  for (const { sheet, cell } of calls) {
    if (!isReleaseCell(cell.formula)) continue;
    const value = sheet.cell(cell.row, cell.column);
    if (typeof value === "number") return value;
    if (!cell.array) continue;
    const row = sheet
      .range(cell.array)
      .find(([label]) => typeof label === "string" && label.toLowerCase() === "revision");
    if (typeof row?.[1] === "number") return row[1];
  }
  return undefined;
}

/** A cell that calls RELEASE and nothing else: it tells which release computed the file. */
export function isReleaseCell(formula: string): boolean {
  return /^@?(\[\d+\]!)?(_xldudf_)?weir[._]release\(\s*("[a-z ]*")?\s*\)$/i.test(formula);
}
