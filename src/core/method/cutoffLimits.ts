import { type Better, directionOf } from "./better";
import type { MarkCurve } from "./markCurve";
import { plainCutoff, type PlainCutoff } from "./plainCutoff";
import { limitFactors } from "./toleranceFactor";

export interface CutoffLimits extends PlainCutoff {
  readonly count: number;
  /** The chance of missing on either side, (1 − confidence)/2. */
  readonly alpha: number;
  readonly noncentrality: number;
  /** The k of mean ± k·sd towards better, at α and at 1 − α. */
  readonly nearFactor: number;
  readonly farFactor: number;
  /** On the scale of the shape, and as scores; the lower limit is the smaller score also with better "low". */
  readonly lowerPoint: number;
  readonly upperPoint: number;
  readonly lowerLimit: number;
  readonly upperLimit: number;
}

/**
 * Exact equal-tailed confidence limits for the true mark: mean + k·sd, k = t'(p; count − 1, z√count)/√count at p = α and 1 − α.
 *
 * Domain     count ≥ 2 whole; sd > 0; fraction and confidence in (0, 1). With better "low" the mirror image.
 * Edges      a limit that falls off the scale is NaN (see plainCutoff).
 * Method     Noncentral t quantiles, each on its own tail. The large-sample limits mean + z·sd ± 1.96·se are symmetric where the truth is not.
 * Accuracy   k to 1e-13 relative; test/core/method/cutoffLimits.test.ts.
 * Reference  Owen (1968), A survey of properties and applications of the noncentral t-distribution, Technometrics 10.
 *
 * @throws {DomainError}
 */
export function cutoffLimits(curve: MarkCurve, fraction: number, confidence: number, better: Better): CutoffLimits {
  const { count, mean, sd, fromScale } = curve;
  const plain = plainCutoff(curve, fraction, better);
  const { alpha, lower, upper } = limitFactors(count, fraction, confidence);
  const near = mean + directionOf(better) * lower.factor * sd;
  const far = mean + directionOf(better) * upper.factor * sd;
  const [lowerPoint, upperPoint] = better === "low" ? [far, near] : [near, far];
  return {
    ...plain,
    count,
    alpha,
    noncentrality: lower.noncentrality,
    nearFactor: lower.factor,
    farFactor: upper.factor,
    lowerPoint,
    upperPoint,
    lowerLimit: fromScale(lowerPoint),
    upperLimit: fromScale(upperPoint),
  };
}
