import { type Better, directionOf } from "./better";
import type { MarkCurve } from "./markCurve";
import { safeFactor, type ToleranceFactor } from "./toleranceFactor";

export interface SafeCutoff extends ToleranceFactor {
  readonly count: number;
  readonly mean: number;
  readonly sd: number;
  readonly point: number;
  readonly cutoff: number;
}

/**
 * The mark that, with this confidence, lets through no more than the fraction: the one-sided normal tolerance bound mean + k·sd.
 *
 * Domain     count ≥ 2 whole; sd > 0; fraction and confidence in (0, 1). With better "low" the mirror image.
 * Edges      a mark that falls off the scale is NaN (see plainCutoff).
 * Accuracy   as toleranceFactor.
 *
 * @throws {DomainError}
 */
export function safeCutoff(curve: MarkCurve, fraction: number, confidence: number, better: Better): SafeCutoff {
  const { count, mean, sd, fromScale } = curve;
  const factor = safeFactor(count, fraction, confidence);
  const point = mean + directionOf(better) * factor.factor * sd;
  return { ...factor, count, mean, sd, point, cutoff: fromScale(point) };
}
