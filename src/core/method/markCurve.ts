import { NoAnswerError, requireFinite, requirePositive } from "../domain";
import type { Curve } from "../sample/curve";
import { representable } from "./representable";
import { requireScored } from "./requireScored";

/** What a mark is computed from: a curve fitted to scores, or one known by its three numbers. */
export type MarkCurve = Pick<Curve, "count" | "mean" | "sd" | "fromScale">;

/**
 * A curve known only by count, mean and sd, computed elsewhere; its scale is that of the scores.
 *
 * @throws {DomainError} unless count is whole and at least 2, mean finite, sd above 0; naming sd where a mark passes the largest number.
 */
export function knownCurve(count: number, mean: number, sd: number): MarkCurve {
  requireScored(count);
  requireFinite("mean", mean);
  requirePositive("sd", sd);
  return { count, mean, sd, fromScale: (point) => representable("sd", sd, point) };
}

/**
 * `mark` itself, unless it belongs to no score: a Box-Cox power carries points of the scale off the scores, and a logarithm or a factor
 * of the sizes of a far limit can pass the largest number.
 *
 * @throws {NoAnswerError} whose message says which mark it is.
 */
export function requireOnScale(what: string, mark: number): number {
  if (Number.isFinite(mark)) return mark;
  throw new NoAnswerError(
    "shape",
    `The ${what} falls off the scale of these scores: no score is that far out under this shape. Take another shape, a less extreme fraction or confidence, or score more entries.`,
  );
}
