import { requireCount, requireFinite, requireNotNegative, requirePositive } from "../domain";
import { normalUpperTail } from "../distribution/normalUpperTail";
import { directionOf, type Better } from "./better";
import { MOST_LOOKS } from "./mostLooks";
import { representable } from "./representable";
import { unitNormalLoss } from "./unitNormalLoss";

export interface ReserveStep {
  readonly looksLeft: number;
  /** The score from which this look is accepted; undefined where it must be taken, whatever it is. */
  readonly mark: number | undefined;
  readonly expectedResult: number;
  readonly acceptChance: number;
}

/**
 * Marks for a known number of looks at scores from a known normal curve: with j looks left accept at W(j−1) or better, where
 * W(j) = E[max(X, W(j−1))] − lookCost, and W(0) = fallback, below which no W falls; without a fallback the last look must be taken.
 *
 * Domain     mean, fallback finite; sd > 0; looks 1 … 10,000; lookCost ≥ 0.
 * Edges      "low" is the mirror image: scores count as costs.
 * Method     In standard units w: E[max(Z, w)] = w + ψ(w) for w ≥ 0, and ψ(−w) for w < 0, which is the same without the cancellation.
 * Accuracy   relative error ≤ 1e-13 of (W − mean)/sd (test/core/method/reserveSchedule.test.ts).
 * Reference  Moser (1956), Scripta Math. 22; Guttman (1960), Canad. Math. Bull. 3.
 *
 * @returns steps with the most looks left first.
 * @throws {DomainError} if an argument is outside its domain.
 */
export function reserveSchedule(
  mean: number,
  sd: number,
  looks: number,
  lookCost = 0,
  fallback?: number,
  better: Better = "high",
): readonly ReserveStep[] {
  requireFinite("mean", mean);
  requirePositive("sd", sd);
  requireCount("looks", looks, 1, MOST_LOOKS);
  requireNotNegative("look_cost", lookCost);
  if (fallback !== undefined) requireFinite("fallback", fallback);
  const sign = directionOf(better);
  const cost = representable("look_cost", lookCost, lookCost / sd);
  const floor =
    fallback === undefined ? undefined : representable("fallback", fallback, (sign * (fallback - mean)) / sd);
  const asScore = (w: number) => (w === floor ? fallback! : representable("look_cost", lookCost, mean + sign * sd * w));

  const steps = new Array<ReserveStep>(looks);
  let w = floor;
  for (let left = 1; left <= looks; left++) {
    const held = w;
    const taken = held === undefined ? 0 : held < 0 ? unitNormalLoss(-held) : held + unitNormalLoss(held);
    w = Math.max(taken - cost, floor ?? -Infinity);
    steps[looks - left] = {
      looksLeft: left,
      mark: held === undefined ? undefined : asScore(held),
      expectedResult: asScore(w),
      acceptChance: held === undefined ? 1 : normalUpperTail(held),
    };
  }
  return steps;
}
