import { requireWithinReach } from "./smoothedScores";

export interface CumulativeSums {
  /** Both sides in standard deviations, never below 0. */
  readonly high: Float64Array;
  readonly low: Float64Array;
  /** Above the limit on either side. */
  readonly flags: boolean[];
}

/** What is allowed for at each score, and the sum that is flagged, in standard deviations. */
export const SUM_ALLOWANCE = 0.5;
export const SUM_LIMIT = 5;
/** A sum on the limit by its digits must not be flagged by rounding. */
const SLACK = 1e-12;

/**
 * Two-sided cumulative sums of scores as they come, in standard deviations: high = max(0, high + z − k), low = max(0, low − z − k),
 * z = (score − mean)/sd, both from 0 on and without reset.
 *
 * Domain     recent finite; mean finite; sd > 0; allowance k ≥ 0; limit h > 0. mean and sd are taken as known.
 * Accuracy   a few roundings a step; test/core/method/cumulativeSums.test.ts (NIST/SEMATECH e-Handbook 6.3.2.3).
 * Reference  Page (1954), Continuous inspection schemes, Biometrika 41.
 * @throws {DomainError} if an argument is outside its domain.
 */
export function cumulativeSums(
  recent: Float64Array,
  mean: number,
  sd: number,
  allowance = SUM_ALLOWANCE,
  limit = SUM_LIMIT,
): CumulativeSums {
  requireWithinReach(recent, mean, sd);
  const high = new Float64Array(recent.length);
  const low = new Float64Array(recent.length);
  const flags: boolean[] = [];
  let above = 0;
  let below = 0;
  for (let t = 0; t < recent.length; t++) {
    const z = (recent[t] - mean) / sd;
    high[t] = above = Math.max(0, above + z - allowance);
    low[t] = below = Math.max(0, below - z - allowance);
    flags.push(Math.max(above, below) > limit * (1 + SLACK));
  }
  return { high, low, flags };
}
