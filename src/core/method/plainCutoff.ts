import { requireFinite, requireFraction, requirePositive } from "../domain";
import { normalUpperTailQuantile } from "../distribution/normalUpperTailQuantile";
import { type Better, directionOf } from "./better";
import type { MarkCurve } from "./markCurve";

export interface PlainCutoff {
  readonly mean: number;
  readonly sd: number;
  /** z(1 − fraction). */
  readonly z: number;
  /** The mark on the scale of the shape, and as a score (NaN where the point belongs to no score). */
  readonly point: number;
  readonly cutoff: number;
}

/**
 * The plain mark mean + z(1 − fraction)·sd, carried back to the scores: the point estimate of the score that the top fraction reaches.
 *
 * Domain     fraction in (0, 1); with better "low" the mirror image, mean − z·sd.
 * Edges      a mark that falls off the scale is NaN: the caller says so where it shows it (requireOnScale).
 *
 * @throws {DomainError}
 */
export function plainCutoff(curve: Omit<MarkCurve, "count">, fraction: number, better: Better): PlainCutoff {
  const { mean, sd, fromScale } = curve;
  requireFraction("fraction", fraction);
  requireFinite("mean", mean);
  requirePositive("sd", sd);
  const z = normalUpperTailQuantile(fraction);
  const point = mean + directionOf(better) * z * sd;
  return { mean, sd, z, point, cutoff: fromScale(point) };
}
