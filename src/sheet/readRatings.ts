import { DomainError, NoAnswerError } from "../core/domain";
import { ordinalCell, type Range } from "./cell";
import { readGrid } from "./readGrid";

/** A full table of ratings, row by row: at least two entries (rows) and two raters (columns), no blank. */
export function readRatings(argument: string, range: Range): { values: Float64Array; raters: number } {
  const { rows, columns, values } = readGrid(argument, range);
  if (columns < 2)
    throw new DomainError(
      argument,
      range,
      "a table with one column a rater, at least 2",
      `${columns} column was given`,
    );
  const blank = values.findIndex(Number.isNaN);
  if (blank >= 0) throw new DomainError(argument, null, "without blanks", `${ordinalCell(blank + 1)} is blank`);
  if (rows < 2)
    throw new NoAnswerError(
      argument,
      `${argument} needs at least 2 rows, one an entry, and there is only 1 so far: rate more entries or take more rows.`,
    );
  return { values, raters: columns };
}
