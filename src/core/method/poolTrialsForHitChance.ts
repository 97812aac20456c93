import { requireFraction } from "../domain";
import { hypergeometricCdf } from "../distribution/hypergeometricCdf";
import { hypergeometricUpperTail } from "../distribution/hypergeometricUpperTail";
import { smallestInteger } from "../numeric/smallestInteger";
import { requireHitsInPool, requirePool } from "./pool";
import { reachesChance } from "./reachesChance";

export interface PoolTrials {
  readonly trials: number;
  /** The chance of the hits within these trials, and within one fewer. */
  readonly chance: number;
  readonly chanceBefore: number;
}

/**
 * The smallest number of entries to draw without return for at least `hits` hits with the chance asked for.
 *
 * Domain     as poolHitChance; chance in (0, 1).
 * Edges      a chance met on paper counts as met (reachesChance); drawing all but good − hits always does.
 * Method     The chance rises with every entry drawn, so the smallest number is found by bisection.
 *
 * @throws {DomainError} @throws {NoAnswerError} where the pool holds fewer good ones than hits.
 */
export function poolTrialsForHitChance(pool: number, good: number, chance: number, hits: number): PoolTrials {
  requirePool(pool, good, hits);
  requireFraction("chance", chance);
  requireHitsInPool(good, hits);
  const met = (trials: number) =>
    reachesChance(
      chance,
      () => hypergeometricUpperTail(hits, pool, good, trials),
      () => hypergeometricCdf(hits - 1, pool, good, trials),
    );
  const trials = smallestInteger(met, hits, pool);
  return {
    trials,
    chance: hypergeometricUpperTail(hits, pool, good, trials),
    chanceBefore: hypergeometricUpperTail(hits, pool, good, trials - 1),
  };
}
