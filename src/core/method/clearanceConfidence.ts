import { requireFinite, requireFraction, requirePositive } from "../domain";
import { normalUpperTailQuantile } from "../distribution/normalUpperTailQuantile";
import { type Better, directionOf } from "./better";
import { noncentralTCurve } from "./noncentralTCurve";
import { requireScored } from "./requireScored";

export interface ClearanceConfidence {
  readonly z: number;
  readonly noncentrality: number;
  /** The k of a score: how far it lies beyond the mean towards better, in standard deviations. */
  readonly standing: (score: number) => number;
  readonly confidence: (score: number) => number;
}

/**
 * The confidence with which a score lies beyond the true mark: F(k√count; count − 1, z√count), k = (score − mean)/sd, F the noncentral t cdf.
 *
 * Domain     count ≥ 2 whole; sd > 0; fraction in (0, 1); scores finite. With better "low" the mirror image.
 * Method     It is the confidence at which the safe mark would fall on this score. One curve serves the whole column (noncentralTCurve.ts).
 * Accuracy   For fractions from 1e-9 1e-12 relative, both tails, down to 1e-30; 1e-11 down to 1e-280; test/core/method/clearanceConfidence.test.ts.
 * Reference  Owen (1968), A survey of properties and applications of the noncentral t-distribution, Technometrics 10.
 *
 * @throws {DomainError}
 */
export function clearanceConfidence(
  count: number,
  mean: number,
  sd: number,
  fraction: number,
  better: Better,
): ClearanceConfidence {
  requireScored(count);
  requireFinite("mean", mean);
  requirePositive("sd", sd);
  requireFraction("fraction", fraction);
  const z = normalUpperTailQuantile(fraction);
  const root = Math.sqrt(count);
  const direction = directionOf(better);
  const cdf = noncentralTCurve(count - 1, z * root);
  const standing = (score: number) => (direction * (score - mean)) / sd;
  return { z, noncentrality: z * root, standing, confidence: (score) => cdf(standing(score) * root) };
}
