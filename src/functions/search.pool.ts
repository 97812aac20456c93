import { expectedPoolTrials } from "../core/method/expectedTrials";
import { poolHitChance } from "../core/method/poolHitChance";
import { poolTrialsForHitChance } from "../core/method/poolTrialsForHitChance";
import { LARGEST_POOL } from "../core/method/pool";
import { readCount, readFraction } from "../sheet/readArgument";

/**
 * Gives the number of looks that a search through a known pool takes on average until it has its hits.
 *
 * Entries are drawn in random order and none comes back: hits times (pool + 1) over (good + 1).
 *
 * @customfunction POOL_EXPECTED_TRIALS
 * @param {any} pool How many entries there are, a whole number from 1 to 1,000,000,000.
 * @param {any} good How many of them would be hits, a whole number from 0 to pool.
 * @param {any} [hits] How many hits are wanted, a whole number of at least 1. Left out: 1.
 * @returns {any} The expected number of looks, not rounded. #N/A where the pool has fewer good ones than hits.
 * @caution The order must be random: a pool sorted by anything that goes with the score needs another count.
 * @question 5 of 100 applicants are good enough: how many interviews until I meet the first, on average?
 * @example =WEIR.POOL_EXPECTED_TRIALS(52,4) => 10.6
 */
export function POOL_EXPECTED_TRIALS(pool: any, good: any, hits?: any): any {
  return expectedPoolTrials(...readPool(pool, good), readCount("hits", hits, 1, undefined, 1));
}

/**
 * Gives the smallest number of looks into a known pool that brings the hits with the chance asked for.
 *
 * Entries are drawn in random order and none comes back (hypergeometric), so it takes fewer looks than TRIALS_FOR_HIT_CHANCE says.
 *
 * @customfunction POOL_TRIALS_FOR_HIT_CHANCE
 * @param {any} pool How many entries there are, a whole number from 1 to 1,000,000,000.
 * @param {any} good How many of them would be hits, a whole number from 0 to pool.
 * @param {any} chance The chance with which the hits are to come, between 0 and 1.
 * @param {any} [hits] How many hits are wanted, a whole number of at least 1. Left out: 1.
 * @returns {any} A whole number of looks. #N/A where the pool has fewer good ones than hits.
 * @caution The order must be random: a pool sorted by anything that goes with the score needs another count.
 * @question 5 of 100 are good: how many must I look at to be 95 percent sure to see one?
 * @example =WEIR.POOL_TRIALS_FOR_HIT_CHANCE(100,5,95%) => 45
 */
export function POOL_TRIALS_FOR_HIT_CHANCE(pool: any, good: any, chance: any, hits?: any): any {
  const [size, fit] = readPool(pool, good);
  const asked = readFraction("chance", chance);
  return poolTrialsForHitChance(size, fit, asked, readCount("hits", hits, 1, undefined, 1)).trials;
}

/**
 * Gives the chance of at least this many hits in a number of looks into a known pool.
 *
 * Entries are drawn in random order and none comes back (hypergeometric).
 *
 * @customfunction POOL_HIT_CHANCE
 * @param {any} pool How many entries there are, a whole number from 1 to 1,000,000,000.
 * @param {any} good How many of them would be hits, a whole number from 0 to pool.
 * @param {any} trials How many looks, a whole number from 0 to pool.
 * @param {any} [hits] How many hits at least, a whole number of at least 1. Left out: 1.
 * @returns {any} A chance from 0 to 1; 0 with more hits than good ones or looks.
 * @caution The order must be random: a pool sorted by anything that goes with the score needs another count.
 * @question 5 of 100 are good: how likely is it to see one among the first 20?
 * @example =WEIR.POOL_HIT_CHANCE(100,5,20) => 0.6806905580101457
 */
export function POOL_HIT_CHANCE(pool: any, good: any, trials: any, hits?: any): any {
  const [size, fit] = readPool(pool, good);
  const looks = readCount("trials", trials, 0, size);
  return poolHitChance(size, fit, looks, readCount("hits", hits, 1, undefined, 1));
}

function readPool(pool: any, good: any): [number, number] {
  const size = readCount("pool", pool, 1, LARGEST_POOL);
  return [size, readCount("good", good, 0, size)];
}
