import { requireCount, requireFinite, requirePositive } from "../domain";
import { type Better, directionOf } from "./better";
import { chanceBeyond, estimatedMark } from "./estimatedMark";
import { representable } from "./representable";

export interface CurveHitChance {
  /** How far the cutoff lies beyond the mean, in standard deviations of the sample. */
  readonly k: number;
  readonly chance: number;
}

const FARTHEST = 1e9;

/**
 * The chance that at least one of the next trials clears a cutoff, the curve known only from count, mean and sd of a sample:
 * 1 − E[Φ(kU + V/√count)^trials], k = (cutoff − mean)/sd.
 *
 * Domain     count ≥ 2 and trials ≥ 0 whole; mean and cutoff finite; sd > 0.
 * Edges      no trials give 0.
 * Method     estimatedMark.ts, up to 1e9 deviations. Beyond, U must be so small that its density is a power of it: what is rare, hits above or
 *            misses below, falls with |k|^(1 − count). Taking the sample's mean and sd for the true ones would promise too few hits beyond far cutoffs.
 * Accuracy   1e-13 relative; test/core/method/curveHitChance.test.ts (one trial is a Student t tail).
 * Reference  Geisser (1993), Predictive Inference: the predictive chance under the reference prior 1/σ.
 *
 * @throws {DomainError}
 */
export function curveHitChance(
  count: number,
  mean: number,
  sd: number,
  cutoff: number,
  trials: number,
  better: Better,
): CurveHitChance {
  requireCount("count", count, 2);
  requireFinite("mean", mean);
  requirePositive("sd", sd);
  requireFinite("cutoff", cutoff);
  requireCount("trials", trials);
  const k = (directionOf(better) * (cutoff - mean)) / sd;
  representable("cutoff", cutoff, k);
  if (trials === 0) return { k, chance: 0 };
  const within = Math.sign(k) * Math.min(Math.abs(k), FARTHEST);
  const chance = chanceBeyond(estimatedMark(count, within, trials), trials);
  const thinned = (within / k) ** (count - 1);
  return {
    k,
    chance: Math.abs(k) <= FARTHEST ? Math.min(1, chance) : k > 0 ? chance * thinned : 1 - (1 - chance) * thinned,
  };
}
