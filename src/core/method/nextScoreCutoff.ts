import { requireFraction } from "../domain";
import { studentTUpperTailQuantile } from "../distribution/studentTUpperTailQuantile";
import { type Better, directionOf } from "./better";
import type { MarkCurve } from "./markCurve";
import { requireScored } from "./requireScored";

export interface NextScoreCutoff {
  readonly count: number;
  readonly mean: number;
  readonly sd: number;
  /** t(count − 1; 1 − fraction). */
  readonly t: number;
  /** t·√(1 + 1/count). */
  readonly factor: number;
  readonly point: number;
  readonly cutoff: number;
}

/**
 * The mark that the next score clears with exactly this chance, the errors of mean and sd included: mean + t·sd·√(1 + 1/count).
 *
 * Domain     count ≥ 2 whole; fraction in (0, 1). With better "low" the mirror image.
 * Edges      a mark that falls off the scale is NaN (see plainCutoff).
 * Accuracy   as studentTUpperTailQuantile.
 * Reference  Whitmore (1986), Prediction limits for a univariate normal observation, Amer. Statist. 40; Geisser (1993).
 *
 * @throws {DomainError}
 */
export function nextScoreCutoff(curve: MarkCurve, fraction: number, better: Better): NextScoreCutoff {
  const { count, mean, sd, fromScale } = curve;
  requireScored(count);
  requireFraction("fraction", fraction);
  const t = studentTUpperTailQuantile(fraction, count - 1);
  const factor = t * Math.sqrt(1 + 1 / count);
  const point = mean + directionOf(better) * factor * sd;
  return { count, mean, sd, t, factor, point, cutoff: fromScale(point) };
}
