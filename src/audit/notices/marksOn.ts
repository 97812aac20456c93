import { isFixedMarkHeading, readFixedMark, type FixedMark } from "../../sheet/fixedMark";
import type { Sheet } from "../../sheet/workbook";

const COLUMNS = 14;
const ROWS_LOOKED_AT = 50;
const MOST_MARKS = 1_000;

/** The fixed marks on a sheet, with the row of each. */
export function marksOn(sheet: Sheet): { row: number; mark: FixedMark }[] {
  const cells = (row: number) => sheet.range({ top: row, left: 0, bottom: row, right: COLUMNS - 1 })[0]!;
  let heading = 0;
  while (!isFixedMarkHeading(cells(heading))) if (++heading > Math.min(sheet.lastRow, ROWS_LOOKED_AT)) return [];
  const marks: { row: number; mark: FixedMark }[] = [];
  for (let row = heading + 1; row <= Math.min(sheet.lastRow, heading + MOST_MARKS); row++) {
    const mark = readFixedMark(cells(row));
    if (mark) marks.push({ row, mark });
  }
  return marks;
}
