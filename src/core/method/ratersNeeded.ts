import { NoAnswerError, requireFraction } from "../domain";

export interface RatersNeeded {
  /** The number before rounding up. */
  readonly exact: number;
  readonly raters: number;
}

/** A number of raters that is whole on paper must not be one more for rounding's sake. */
const SLACK = 1e-12;

/**
 * How many raters' mean reaches the target reliability when one rater has the single one: t(1 − r)/(r(1 − t)), rounded up.
 *
 * Domain     single and target reliability strictly between 0 and 1.
 * Edges      1 where one rater is enough.
 * Accuracy   exact, whole numbers on paper included (test/core/method/scoreReliability.test.ts).
 * Reference  Spearman (1910) and Brown (1910), British J. Psychology 3.
 *
 * @throws {DomainError} if an argument is outside its domain. @throws {NoAnswerError} where the number is beyond counting.
 */
export function ratersNeeded(singleReliability: number, target: number): RatersNeeded {
  requireFraction("single_reliability", singleReliability);
  requireFraction("target", target);
  const exact = ((target / (1 - target)) * (1 - singleReliability)) / singleReliability;
  const raters = Math.max(1, Math.ceil(exact * (1 - SLACK)));
  if (!(raters <= Number.MAX_SAFE_INTEGER))
    throw new NoAnswerError(
      "target",
      `target ${target} is out of reach at a single_reliability of ${singleReliability}: it takes more than ${Number.MAX_SAFE_INTEGER} raters.`,
    );
  return { exact, raters };
}
