import { requireFraction } from "../domain";
import { noncentralTCdf } from "../distribution/noncentralTCdf";
import { noncentralTUpperTail } from "../distribution/noncentralTUpperTail";
import { normalUpperTail } from "../distribution/normalUpperTail";
import { normalUpperTailQuantile } from "../distribution/normalUpperTailQuantile";
import { findRoot } from "../numeric/findRoot";
import { requireScored } from "./requireScored";

export interface PassingFractionLimits {
  readonly z: number;
  readonly alpha: number;
  /** Where the mark comes to stand, in deviations of the true curve from its mean, with the chances α and 1 − α. */
  readonly lowestMark: number;
  readonly highestMark: number;
  /** The fractions of the population beyond those marks: `lowest` belongs to the highest mark. */
  readonly lowest: number;
  readonly highest: number;
}

/**
 * The central interval of the fraction that the plain mark x̄ + z(1−fraction)s from `count` scores really lets through.
 *
 * Domain     count a whole number of at least 2; fraction and confidence in (0, 1).
 * Method     The mark stands at T = (x̄ + zs − μ)/σ, and P(T ≤ t) = 1 − F(z√n), F the noncentral t cdf with n − 1 degrees of freedom and
 *            noncentrality t√n; the equation is solved for t on the logarithm of the tail, so that it holds at extreme confidences too.
 * Accuracy   1e-11 relative; test/core/method/passingFractionLimits.test.ts.
 * Reference  Owen (1968), A survey of properties and applications of the noncentral t-distribution, Technometrics 10, 445–478.
 *
 * @throws {DomainError} naming count, fraction or confidence.
 */
export function passingFractionLimits(count: number, fraction: number, confidence: number): PassingFractionLimits {
  requireScored(count);
  requireFraction("fraction", fraction);
  requireFraction("confidence", confidence);
  const z = normalUpperTailQuantile(fraction);
  const alpha = (1 - confidence) / 2;
  const lowestMark = solve((mark) => Math.log(markBelow(count, z, mark) / alpha), count, z);
  const highestMark = solve((mark) => Math.log(alpha / markAbove(count, z, mark)), count, z);
  const [lowest, highest] = [normalUpperTail(highestMark), normalUpperTail(lowestMark)];
  return { z, alpha, lowestMark, highestMark, lowest, highest };
}

/** P(T ≤ mark): the chance that the plain mark comes to stand no higher than `mark` deviations above the true mean. */
export function markBelow(count: number, z: number, mark: number): number {
  return noncentralTUpperTail(z * Math.sqrt(count), count - 1, mark * Math.sqrt(count));
}

/** P(T > mark). */
export function markAbove(count: number, z: number, mark: number): number {
  return noncentralTCdf(z * Math.sqrt(count), count - 1, mark * Math.sqrt(count));
}

/** The root of a rising function of the mark, bracketed outwards from z in steps of the mark's own standard deviation. */
function solve(rising: (mark: number) => number, count: number, z: number): number {
  const step = Math.sqrt(1 / count + (z * z) / (2 * (count - 1)));
  let reach = 2 * step;
  while (rising(z - reach) > 0) reach *= 2;
  const low = z - reach;
  reach = 2 * step;
  while (rising(z + reach) < 0) reach *= 2;
  return findRoot(rising, low, z + reach);
}
