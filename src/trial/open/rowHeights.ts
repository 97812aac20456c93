import type { CellStyle, SheetLook } from "../../hosts/file/sheetLook";
import type { Sheet } from "../../sheet/workbook";

const USUAL = 22;
const USUAL_SIZE = 10;
/** In points, as the format allows at most. */
const HIGHEST = 409;
const PIXELS_OF_A_POINT = 4 / 3;
const PIXELS_OF_A_CHARACTER = 7;
const USUAL_WIDTH = 88;
/** How wide a letter is at most, on average over a line: rather a line too many than one cut off. */
const PART_OF_SIZE = 0.55;

/**
 * How high the rows are, in pixels, those of the usual height left out. Where the file names none it leaves that to whoever shows it: wrapped texts
 * and large letters are then given the lines that they take, or they would be cut off.
 */
export function rowHeights(
  sheet: Sheet,
  look: SheetLook | undefined,
  styles: readonly CellStyle[],
): ReadonlyMap<number, number> {
  const heights = new Map<number, number>();
  if (!look) return heights;
  sheet.forEachCell((row, column, value) => {
    const style = styles[look.style(row, column)]?.look;
    if (typeof value !== "string" || !style || look.rowHeights.has(row)) return;
    const size = (style.size ?? USUAL_SIZE) * PIXELS_OF_A_POINT;
    const lines = style.wrap ? linesOf(value, widthOf(row, column, look) / (size * PART_OF_SIZE)) : 1;
    const height = Math.min(Math.round(lines * size * 1.3 + 4), HIGHEST * PIXELS_OF_A_POINT);
    if (height > Math.max(USUAL, heights.get(row) ?? 0)) heights.set(row, height);
  });
  for (const [row, points] of look.rowHeights) heights.set(row, Math.round(points * PIXELS_OF_A_POINT));
  return heights;
}

/** The width of a cell in pixels; merged cells are as wide as all of them. */
function widthOf(row: number, column: number, { columnWidths, merged }: SheetLook): number {
  const whole = merged.find(({ top, left }) => top === row && left === column);
  let width = 0;
  for (let one = column; one <= (whole?.right ?? column); one++)
    width += (columnWidths.get(one) ?? USUAL_WIDTH / PIXELS_OF_A_CHARACTER) * PIXELS_OF_A_CHARACTER;
  return width;
}

/** How many lines a text takes where so many characters fit into one. */
function linesOf(text: string, fitting: number): number {
  return text.split("\n").reduce((lines, line) => lines + Math.max(1, Math.ceil(line.length / fitting)), 0);
}
