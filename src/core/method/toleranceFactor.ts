import { DomainError, requireFraction } from "../domain";
import { noncentralTQuantile } from "../distribution/noncentralTQuantile";
import { noncentralTUpperTailQuantile } from "../distribution/noncentralTUpperTailQuantile";
import { normalQuantile } from "../distribution/normalQuantile";
import { normalUpperTailQuantile } from "../distribution/normalUpperTailQuantile";
import { remembered } from "../numeric/remembered";
import { requireScored } from "./requireScored";

export interface ToleranceFactor {
  readonly z: number;
  readonly noncentrality: number;
  /** The noncentral t quantile at the confidence. */
  readonly quantile: number;
  readonly factor: number;
}

/**
 * The one-sided normal tolerance factor k: with this confidence, x̄ + k·s lies above the share `coverage` of the population.
 * k = t'(confidence; count − 1, z√count)/√count.
 *
 * Domain     count ≥ 2 whole; coverage and confidence in (0, 1).
 * Method     Exact, by the quantile of the noncentral t distribution. The closed approximation of the handbooks has no value for some counts
 *            below 6 and is off by 5 % at 20.
 * Accuracy   1e-13 relative; test/core/method/toleranceFactor.test.ts.
 * Reference  Owen (1968), A survey of properties and applications of the noncentral t-distribution, Technometrics 10.
 *
 * @throws {DomainError}
 */
export function toleranceFactor(count: number, coverage: number, confidence: number): ToleranceFactor {
  requireScored(count);
  requireFraction("coverage", coverage);
  requireConfidence(confidence);
  return factorFor(count, normalQuantile(coverage), confidence, 0);
}

/** The same for the mark that a top `fraction` passes: coverage 1 − fraction, without the digits that the difference would lose. */
export function safeFactor(count: number, fraction: number, confidence: number): ToleranceFactor {
  requireScored(count);
  requireFraction("fraction", fraction);
  requireConfidence(confidence);
  return factorFor(count, normalUpperTailQuantile(fraction), confidence, 0);
}

/** The factors of the two limits that a true mark keeps between with the confidence, each missed with chance α = (1 − confidence)/2. */
export function limitFactors(
  count: number,
  fraction: number,
  confidence: number,
): { alpha: number; lower: ToleranceFactor; upper: ToleranceFactor } {
  requireScored(count);
  requireFraction("fraction", fraction);
  requireFraction("confidence", confidence);
  const z = normalUpperTailQuantile(fraction);
  const alpha = (1 - confidence) / 2;
  return { alpha, lower: factorFor(count, z, alpha, 0), upper: factorFor(count, z, alpha, 1) };
}

/** Below 1e-100 the quantiles of the noncentral t have no accuracy to speak of. */
export function requireConfidence(confidence: number): void {
  requireFraction("confidence", confidence);
  if (!(confidence >= 1e-100)) throw new DomainError("confidence", confidence, "a number between 1e-100 and 1");
}

/** `tail` 0: the quantile with chance p below it; 1: with chance p above it. */
const factorFor = remembered((count: number, z: number, p: number, tail: number): ToleranceFactor => {
  const root = Math.sqrt(count);
  const noncentrality = z * root;
  const quantile = (tail === 0 ? noncentralTQuantile : noncentralTUpperTailQuantile)(p, count - 1, noncentrality);
  return { z, noncentrality, quantile, factor: quantile / root };
});
