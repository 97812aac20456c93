import { DomainError, UnsettledError, requireFinite, requireNotNegative, requirePositive } from "../domain";
import { normalCdf } from "../distribution/normalCdf";
import { directionOf, type Better } from "./better";
import { representable } from "./representable";
import { unitNormalLoss } from "./unitNormalLoss";

export interface ReserveScore {
  /** The reserve in standard units, counted in the direction of better. */
  readonly standardReserve: number;
  /** ψ at the reserve: what one more look brings beyond it, in standard deviations. */
  readonly standardGain: number;
  readonly score: number;
}

const MOST_STEPS = 2000;

/**
 * The score z = discount·(z + sd·ψ((z − mean)/sd) − lookCost) at which stopping and one more look come to the same, scores coming
 * one after another from a known normal curve, without end.
 *
 * Domain     mean finite; sd > 0; lookCost ≥ 0; 0 < discount ≤ 1; lookCost > 0 where discount is 1.
 * Edges      "low" is the mirror image about 0: scores count as costs.
 * Method     In u = (z − mean)/sd: discount·ψ(u) − (1 − discount)·u = (discount·lookCost + (1 − discount)·mean)/sd. The left side falls
 *            and is convex, so Newton's steps from a point left of the root only ever go right and cannot overshoot; −κ is such a point.
 * Accuracy   relative error ≤ 1e-13 of (z − mean)/sd (test/core/method/reserveScore.test.ts).
 * Reference  DeGroot (1970), Optimal Statistical Decisions, ch. 13.
 *
 * @throws {DomainError} if an argument is outside its domain.
 */
export function reserveScore(
  mean: number,
  sd: number,
  lookCost: number,
  discount = 1,
  better: Better = "high",
): ReserveScore {
  requireFinite("mean", mean);
  requirePositive("sd", sd);
  requireNotNegative("look_cost", lookCost);
  if (!(discount > 0 && discount <= 1)) throw new DomainError("discount", discount, "a number above 0 and at most 1");
  if (discount === 1) requireCostThatStops(lookCost);
  const sign = directionOf(better);
  const wait = 1 - discount;
  const level = discount * (lookCost / sd) + wait * ((sign * mean) / sd);
  if (!(Math.abs(level) < 1e300 && (discount < 1 || level > 1e-300)))
    throw new DomainError("sd", sd, "nearer in size to mean and look_cost");

  let u = -level;
  for (let step = 0; ; step++) {
    if (step > MOST_STEPS) throw new UnsettledError("The reserve score");
    const excess = discount * unitNormalLoss(u) - wait * u - level;
    // The slope is −(discount·Q(u) + 1 − discount), written as 1 − discount·Φ(u) where u is low.
    const next = u + excess / slopeAt(u, discount, wait);
    if (!(next > u + 1e-16 * Math.abs(u))) break;
    u = next;
  }
  return { standardReserve: u, standardGain: unitNormalLoss(u), score: representable("sd", sd, mean + sign * sd * u) };
}

function slopeAt(u: number, discount: number, wait: number): number {
  return discount * normalCdf(-u) + wait;
}

function requireCostThatStops(lookCost: number): void {
  // Without a cost and without a discount there is always reason to look on: no reserve exists.
  if (!(lookCost > 0))
    throw new DomainError("look_cost", lookCost, "above 0 where discount is 1 (without either, looking on never ends)");
}
