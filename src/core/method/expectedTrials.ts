import { requireCount, requireFraction } from "../domain";
import { requireHitsInPool, requirePool } from "./pool";
import { representable } from "./representable";

/**
 * The expected number of trials until the last of the hits: hits / fraction, the mean of the negative binomial.
 *
 * @throws {DomainError} unless fraction lies in (0, 1) and hits is whole and at least 1.
 */
export function expectedTrials(fraction: number, hits: number): number {
  requireFraction("fraction", fraction);
  requireCount("hits", hits, 1);
  return representable("fraction", fraction, hits / fraction);
}

/**
 * The same when drawing without return from a pool: hits·(pool + 1)/(good + 1), as the good ones part the others into good + 1 runs
 * of the same expected length.
 *
 * Reference  Mosteller (1965), Fifty Challenging Problems in Probability, no. 40 (the first ace: 10.6).
 *
 * @throws {DomainError} as requirePool. @throws {NoAnswerError} where the pool holds fewer good ones than hits.
 */
export function expectedPoolTrials(pool: number, good: number, hits: number): number {
  requirePool(pool, good, hits);
  requireHitsInPool(good, hits);
  return (hits * (pool + 1)) / (good + 1);
}
