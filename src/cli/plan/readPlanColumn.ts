import { DomainError, NoAnswerError } from "../../core/domain";
import { nearestName } from "../../functions/nearestName";
import type { Area } from "../../sheet/address";
import { isBlank, type Cell } from "../../sheet/cell";
import { readScores } from "../../sheet/readScores";
import type { Sheet } from "../../sheet/workbook";
import { Stop } from "../io";
import { printable } from "../../report/plainText";

/** Headings are looked for down to here. */
const FIRST_ROWS = 50;

export interface PlanColumn {
  readonly heading: string;
  readonly headingRow: number;
  /** From the first cell below the heading to the last that holds anything. */
  readonly area: Area;
  readonly sorted: Float64Array;
}

/** The scores below a heading. A heading that isn't there, or a column without scores, ends the command with what to do. */
export function readPlanColumn(sheet: Sheet, name: string): PlanColumn {
  const { row, column } = findHeading(sheet, name);
  const heading = String(sheet.cell(row, column)).trim();
  let bottom = sheet.lastRow;
  while (bottom > row && isBlank(sheet.cell(bottom, column))) bottom--;
  if (bottom === row) throw new Stop(`There are no scores below “${heading}” on the sheet “${sheet.name}”.`);
  const area = { top: row + 1, left: column, bottom, right: column };
  try {
    const { sample } = readScores(`The column “${heading}”`, sheet.range(area));
    return { heading, headingRow: row, area, sorted: sample.sorted };
  } catch (failure) {
    if (failure instanceof DomainError || failure instanceof NoAnswerError) throw new Stop(failure.message);
    throw failure;
  }
}

function findHeading(sheet: Sheet, name: string): { row: number; column: number } {
  const wanted = name.trim().toLowerCase();
  const seen: string[] = [];
  const found: { row: number; column: number }[] = [];
  for (let row = 0; row <= Math.min(sheet.lastRow, FIRST_ROWS - 1) && found.length === 0; row++) {
    for (let column = 0; column <= sheet.lastColumn; column++) {
      const cell: Cell = sheet.cell(row, column);
      if (typeof cell !== "string" || isBlank(cell)) continue;
      if (cell.trim().toLowerCase() === wanted) found.push({ row, column });
      else if (row === 0) seen.push(cell.trim());
    }
  }
  if (found.length === 1) return found[0]!;
  if (found.length > 1)
    throw new Stop(
      `The heading “${name}” stands above ${found.length} columns: give the one you mean a name of its own.`,
    );
  const nearest = nearestName(name, seen);
  const listed = seen
    .slice(0, 12)
    .map((one) => `“${printable(one)}”`)
    .join(", ");
  const hint = nearest ? ` Did you mean “${printable(nearest)}”?` : "";
  const has = seen.length === 0 ? "Its first row holds no headings." : `Its first row holds ${listed}.`;
  throw new Stop(`No column of the sheet “${sheet.name}” has the heading “${name}”.${hint} ${has}`);
}
