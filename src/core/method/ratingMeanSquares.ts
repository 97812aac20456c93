import { DomainError, NoAnswerError, requireCount, requireFinite } from "../domain";
import { compensatedSum } from "../numeric/compensatedSum";

export interface RatingMeanSquares {
  readonly entries: number;
  readonly raters: number;
  readonly betweenEntries: number;
  readonly withinEntries: number;
  readonly betweenRaters: number;
  readonly residual: number;
}

/** A residual below this share of the largest rating is what rounding leaves of none. */
const ROUNDING = 1e-14;

/**
 * Mean squares of a two-way table of ratings without repeats: between entries (rows), within entries, between raters (columns), residual.
 *
 * Domain     ratings row by row, at least 2 rows and 2 columns of finite numbers.
 * Edges      no answer where every rating is entry + rater exactly: no residual is left to judge by.
 * Method     Sums of squared deviations, never differences of sums of squares; the first rating is taken off all before.
 * Accuracy   relative error ≤ 1e-13 (test/core/method/scoreReliability.test.ts).
 * Reference  Shrout & Fleiss (1979), Psychological Bulletin 86, table 2.
 *
 * @throws {DomainError} if an argument is outside its domain. @throws {NoAnswerError} without a residual.
 */
export function ratingMeanSquares(ratings: Float64Array, raters: number): RatingMeanSquares {
  requireCount("raters", raters, 2);
  const entries = ratings.length / raters;
  requireCount("entries", entries, 2);
  let largest = 0;
  const table = ratings.map((rating) => {
    requireFinite("ratings", rating);
    largest = Math.max(largest, Math.abs(rating));
    return rating - ratings[0];
  });
  const rowMeans = new Float64Array(entries).map((_, i) => mean(table.subarray(i * raters, (i + 1) * raters)));
  const grand = mean(rowMeans);
  const column = new Float64Array(entries);
  const raterEffects = new Float64Array(raters).map(
    (_, j) => mean(column.map((_, i) => table[i * raters + j])) - grand,
  );
  const within = table.map((x, cell) => x - rowMeans[Math.floor(cell / raters)]);
  const residuals = within.map((d, cell) => d - raterEffects[cell % raters]);
  if (!residuals.some((r) => Math.abs(r) > ROUNDING * largest)) {
    const message =
      "ratings leave no residual (every rating is the entry's level plus the rater's), so there is nothing to judge their reliability by.";
    throw new NoAnswerError("ratings", message);
  }
  const squares = {
    entries,
    raters,
    betweenEntries: (raters * sumOfSquares(rowMeans.map((m) => m - grand))) / (entries - 1),
    withinEntries: sumOfSquares(within) / (entries * (raters - 1)),
    betweenRaters: (entries * sumOfSquares(raterEffects)) / (raters - 1),
    residual: sumOfSquares(residuals) / ((entries - 1) * (raters - 1)),
  };
  // Ratings of 1e200 or 1e-200: their squares are no numbers any more, or 0.
  const sound =
    squares.residual > 0 && squares.betweenEntries + squares.withinEntries + squares.betweenRaters < Infinity;
  if (!sound) throw new DomainError("ratings", largest, "of a size whose squares are still numbers");
  return squares;
}

function mean(values: Float64Array): number {
  return compensatedSum(values) / values.length;
}

function sumOfSquares(deviations: Float64Array): number {
  return compensatedSum(deviations.map((d) => d * d));
}
