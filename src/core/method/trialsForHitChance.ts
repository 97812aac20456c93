import { NoAnswerError, requireCount, requireFraction } from "../domain";
import { binomialCdf } from "../distribution/binomialCdf";
import { binomialUpperTail } from "../distribution/binomialUpperTail";
import { gammaQuantile } from "../distribution/gammaQuantile";
import { smallestNear } from "../numeric/smallestNear";
import { reachesChance } from "./reachesChance";

export interface HitTrials {
  readonly trials: number;
  /** The chance of the hits within these trials, and within one fewer. */
  readonly chance: number;
  readonly chanceBefore: number;
}

/**
 * The smallest number of trials m with P(Bin(m, fraction) ≥ hits) ≥ chance.
 *
 * Domain     fraction and chance in (0, 1); hits ≥ 1 whole.
 * Edges      a chance met on paper counts as met (reachesChance). More than 2⁵³ − 1 trials are no answer.
 * Method     The chance rises with m. Bisection around hits + the quantile of a gamma variable with mean and variance of the misses,
 *            so that a million hits at 1e-9 take some twenty chances; the closed form exists for one hit only.
 * Reference  Wilks (1941), Ann. Math. Statist. 12 (59 for 5 % and 95 %).
 *
 * @throws {DomainError} @throws {NoAnswerError}
 */
export function trialsForHitChance(fraction: number, chance: number, hits: number): HitTrials {
  requireFraction("fraction", fraction);
  requireFraction("chance", chance);
  requireCount("hits", hits, 1);
  const met = (trials: number) =>
    reachesChance(
      chance,
      () => binomialUpperTail(hits, trials, fraction),
      () => binomialCdf(hits - 1, trials, fraction),
    );
  const misses = Math.min(Math.max(hits * (1 - fraction), 1e-3), 1e15);
  const guess = hits + gammaQuantile(chance, misses) / fraction;
  const trials = smallestNear(met, guess, hits);
  if (trials === Infinity) {
    const most = Number.MAX_SAFE_INTEGER;
    throw new NoAnswerError(
      "fraction",
      `fraction is ${fraction}: that takes more than ${most} trials, past all counting.`,
    );
  }
  return {
    trials,
    chance: binomialUpperTail(hits, trials, fraction),
    chanceBefore: binomialUpperTail(hits, trials - 1, fraction),
  };
}
