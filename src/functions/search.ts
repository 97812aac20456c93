import { expectedTrials } from "../core/method/expectedTrials";
import { hitChance } from "../core/method/hitChance";
import { curveHitChance } from "../core/method/curveHitChance";
import { searchDuration } from "../core/method/searchDuration";
import { trialsForHitChance } from "../core/method/trialsForHitChance";
import { readBetter, readCount, readFraction, readNumber, readPositive } from "../sheet/readArgument";

/**
 * Gives the number of looks that a search takes on average until it has its hits.
 *
 * Hits divided by fraction: each look is a hit with this chance, whatever came before. A single search often takes much longer: see
 * TRIALS_FOR_HIT_CHANCE.
 *
 * @customfunction EXPECTED_TRIALS_TO_HIT
 * @param {any} fraction The chance that one look is a hit, between 0 and 1.
 * @param {any} [hits] How many hits are wanted, a whole number of at least 1. Left out: 1.
 * @returns {any} The expected number of looks, not rounded.
 * @caution It takes the fraction as known. With an estimated cutoff the search is longer on average: CUTOFF_REPORT tells.
 * @question How many entries must I look at on average before one clears the cutoff?
 * @example =WEIR.EXPECTED_TRIALS_TO_HIT(5%) => 20
 * @example =WEIR.EXPECTED_TRIALS_TO_HIT(2.5%,3) => 120
 */
export function EXPECTED_TRIALS_TO_HIT(fraction: any, hits?: any): any {
  return expectedTrials(readFraction("fraction", fraction), readCount("hits", hits, 1, undefined, 1));
}

/**
 * Gives the smallest number of looks that brings the hits with the chance asked for.
 *
 * From the binomial distribution: each look is a hit with this chance, whatever came before. 5% and 95% give 59 (Wilks 1941).
 *
 * @customfunction TRIALS_FOR_HIT_CHANCE
 * @param {any} fraction The chance that one look is a hit, between 0 and 1.
 * @param {any} chance The chance with which the hits are to come, between 0 and 1.
 * @param {any} [hits] How many hits are wanted, a whole number of at least 1. Left out: 1.
 * @returns {any} A whole number of looks. #N/A where it passes 9,007,199,254,740,991.
 * @caution It takes the fraction as known. With an estimated cutoff it takes more looks: CUTOFF_REPORT tells.
 * @question How many entries must I plan to look at to be 95 percent sure of a hit?
 * @example =WEIR.TRIALS_FOR_HIT_CHANCE(5%,95%) => 59
 * @example =WEIR.TRIALS_FOR_HIT_CHANCE(50%,87.5%) => 3
 */
export function TRIALS_FOR_HIT_CHANCE(fraction: any, chance: any, hits?: any): any {
  const share = readFraction("fraction", fraction);
  return trialsForHitChance(share, readFraction("chance", chance), readCount("hits", hits, 1, undefined, 1)).trials;
}

/**
 * Gives the chance of at least this many hits in a number of looks.
 *
 * From the binomial distribution: each look is a hit with this chance, whatever came before.
 *
 * @customfunction HIT_CHANCE
 * @param {any} fraction The chance that one look is a hit, between 0 and 1.
 * @param {any} trials How many looks, a whole number; 0 is allowed.
 * @param {any} [hits] How many hits at least, a whole number of at least 1. Left out: 1.
 * @returns {any} A chance from 0 to 1; 0 with fewer looks than hits.
 * @caution It takes the fraction as known. With a cutoff learnt from few scores the chance is lower: CURVE_HIT_CHANCE counts that in.
 * @question How likely is at least one hit among the next 59 entries?
 * @example =WEIR.HIT_CHANCE(60%,4,4) => 0.1296
 */
export function HIT_CHANCE(fraction: any, trials: any, hits?: any): any {
  const share = readFraction("fraction", fraction);
  return hitChance(share, readCount("trials", trials, 0), readCount("hits", hits, 1, undefined, 1));
}

/**
 * Gives the chance that at least one of the next looks clears a cutoff when the curve is known only from count, mean and standard deviation.
 *
 * The predictive chance under the usual reference prior (Geisser 1993): it counts in that mean and spread are estimates. For a mark set as
 * mean + k sd it is also the long-run rate over many samples.
 *
 * @customfunction CURVE_HIT_CHANCE
 * @param {any} count How many scores mean and sd come from, a whole number of at least 2.
 * @param {any} mean Their mean.
 * @param {any} sd Their standard deviation (n - 1), above 0.
 * @param {any} cutoff The score to be cleared.
 * @param {any} trials How many looks are still to come, a whole number; 0 is allowed.
 * @param {any} [better] "high" or "low": which scores are better. Left out: "high".
 * @returns {any} A chance from 0 to 1.
 * @choices better "high" "low"
 * @caution For a mark fixed from outside, such as a budget or a rule, it is a reasonable bet but not the long-run rate.
 * @question How likely is it that one of the next 50 entries beats 83, judging from 20 scores?
 * @example =WEIR.CURVE_HIT_CHANCE(20,70,8,83,50) => 0.8738860193134675
 */
export function CURVE_HIT_CHANCE(count: any, mean: any, sd: any, cutoff: any, trials: any, better?: any): any {
  const scored = readCount("count", count, 2);
  const centre = readNumber("mean", mean);
  const spread = readPositive("sd", sd);
  const mark = readNumber("cutoff", cutoff);
  return curveHitChance(scored, centre, spread, mark, readCount("trials", trials, 0), readBetter(better)).chance;
}

/**
 * Gives how many periods the search lasts, with the chance asked for, when entries arrive at random at a known average rate.
 *
 * Arrivals are Poisson, each a hit with chance fraction, so the time to the last of the hits is gamma distributed. The unit is that of the
 * rate: with entries per week the answer is in weeks.
 *
 * @customfunction SEARCH_DURATION
 * @param {any} fraction The chance that one entry is a hit, between 0 and 1.
 * @param {any} arrivals_per_period How many entries arrive in one period on average, above 0.
 * @param {any} chance The chance with which the hits are to have arrived by then, between 0 and 1.
 * @param {any} [hits] How many hits are wanted, a whole number of at least 1. Left out: 1.
 * @returns {any} The number of periods, not rounded.
 * @caution Entries that come in waves, or that dry up, take longer than a steady average rate says.
 * @question With 3 bids a week, how many weeks until one of the top 5 percent has come with 90 percent chance?
 * @example =WEIR.SEARCH_DURATION(5%,3,90%) => 15.350567286626973
 */
export function SEARCH_DURATION(fraction: any, arrivals_per_period: any, chance: any, hits?: any): any {
  const share = readFraction("fraction", fraction);
  const rate = readPositive("arrivals_per_period", arrivals_per_period);
  const asked = readFraction("chance", chance);
  return searchDuration(share, rate, asked, readCount("hits", hits, 1, undefined, 1)).periods;
}
