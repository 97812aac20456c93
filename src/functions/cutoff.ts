import { knownCurve, requireOnScale } from "../core/method/markCurve";
import { nextScoreCutoff } from "../core/method/nextScoreCutoff";
import { plainCutoff } from "../core/method/plainCutoff";
import { safeCutoff } from "../core/method/safeCutoff";
import { toleranceFactor } from "../core/method/toleranceFactor";
import { twoSidedFactor } from "../core/method/twoSidedFactor";
import { fitCurve } from "../core/sample/fitCurve";
import { readBetter, readCount, readFraction, readNumber, readPositive } from "../sheet/readArgument";
import { readScores } from "../sheet/readScores";
import { readShape } from "../sheet/readShape";

/**
 * Gives the plain cutoff: the score that the top fraction of entries is estimated to reach, such as the top 5%.
 *
 * Mean plus z times standard deviation of the scores on the scale of the shape, carried back to scores. It is a point estimate: look at
 * CUTOFF_LIMITS for how far to trust it, and take SAFE_CUTOFF where no more than the fraction may pass.
 *
 * @customfunction TOP_FRACTION_CUTOFF
 * @param {any[][]} scores The scores so far; blank cells are skipped. At least 2 numbers that differ.
 * @param {any} fraction The share of all entries that is to pass, between 0 and 1, such as 5%.
 * @param {any} [shape] The scale on which the scores are normal: "normal", "lognormal", "logit(low,high)", "boxcox" or "boxcox(power)". Left out: "normal".
 * @param {any} [better] "high" or "low": which scores are better. Left out: "high".
 * @returns {any} One score. #N/A where it falls off the scale of the shape.
 * @choices better "high" "low"
 * @caution The plain mark lets through more than the fraction in nearly half of all samples: SAFE_CUTOFF is for that.
 * @caution A cutoff over people is no decision: groups can be hit unequally, and local law and licensed practice come first.
 * @question Above which score are the top 5 percent?
 * @question Where do I set the pass mark from the scores I have?
 * @example =WEIR.TOP_FRACTION_CUTOFF({54;52.3;60.4;43.4;50.5},1%) => 66.40328338889401
 */
export function TOP_FRACTION_CUTOFF(scores: any[][], fraction: any, shape?: any, better?: any): any {
  const share = readFraction("fraction", fraction);
  const scale = readShape(shape);
  const side = readBetter(better);
  const { sample } = readScores("scores", scores);
  return requireOnScale("cutoff", plainCutoff(fitCurve("scores", sample, scale), share, side).cutoff);
}

/**
 * Gives the score that the top fraction of a known normal curve reaches.
 *
 * Mean plus z times standard deviation, for a mean and standard deviation that are taken as true: last year's, or a database's. Where they
 * come from a sample, CURVE_CUTOFF_LIMITS tells how far to trust the answer.
 *
 * @customfunction CURVE_CUTOFF
 * @param {any} mean Mean of the curve.
 * @param {any} sd Standard deviation of the curve, above 0.
 * @param {any} fraction The share of all entries that is to pass, between 0 and 1.
 * @param {any} [better] "high" or "low": which scores are better. Left out: "high".
 * @returns {any} One score.
 * @choices better "high" "low"
 * @caution A cutoff over people is no decision: groups can be hit unequally, and local law and licensed practice come first.
 * @question With mean 70 and standard deviation 8, which score do the top 5 percent reach?
 * @example =WEIR.CURVE_CUTOFF(70,8,5%) => 83.15882901561179
 */
export function CURVE_CUTOFF(mean: any, sd: any, fraction: any, better?: any): any {
  const centre = readNumber("mean", mean);
  const spread = readPositive("sd", sd);
  const share = readFraction("fraction", fraction);
  return plainCutoff(knownCurve(2, centre, spread), share, readBetter(better)).cutoff;
}

/**
 * Gives the safe cutoff: with this confidence, no more than the fraction of all entries will pass it.
 *
 * The one-sided normal tolerance bound, exact by the noncentral t distribution. It is stricter than the plain cutoff, and the fewer the
 * scores the more so.
 *
 * @customfunction SAFE_CUTOFF
 * @param {any[][]} scores The scores so far; blank cells are skipped. At least 2 numbers that differ.
 * @param {any} fraction The share of all entries that may pass at most, between 0 and 1.
 * @param {any} [confidence] Between 0 and 1; left out: 95%.
 * @param {any} [shape] The scale on which the scores are normal: "normal", "lognormal", "logit(low,high)", "boxcox" or "boxcox(power)". Left out: "normal".
 * @param {any} [better] "high" or "low": which scores are better. Left out: "high".
 * @returns {any} One score. #N/A where it falls off the scale of the shape.
 * @choices better "high" "low"
 * @caution Exact for a shape fixed beforehand. With a fitted power, or a shape picked by looking at the same scores, nominal 95% is about 88 to 93% with 20 to 60 scores.
 * @caution A cutoff over people is no decision: groups can be hit unequally, and local law and licensed practice come first.
 * @question Which mark makes sure that no more than 5 percent get through?
 * @example =WEIR.SAFE_CUTOFF({54;52.3;60.4;43.4;50.5},5%) => 77.92356991757256
 */
export function SAFE_CUTOFF(scores: any[][], fraction: any, confidence?: any, shape?: any, better?: any): any {
  const share = readFraction("fraction", fraction);
  const trust = readFraction("confidence", confidence, 0.95);
  const scale = readShape(shape);
  const side = readBetter(better);
  const { sample } = readScores("scores", scores);
  return requireOnScale("safe cutoff", safeCutoff(fitCurve("scores", sample, scale), share, trust, side).cutoff);
}

/**
 * Gives the mark that the very next score clears with exactly this chance, the errors of mean and spread included.
 *
 * Mean plus Student's t times standard deviation times the root of 1 + 1/n. Use it to promise a rate of hits over many searches.
 *
 * @customfunction NEXT_SCORE_CUTOFF
 * @param {any[][]} scores The scores so far; blank cells are skipped. At least 2 numbers that differ.
 * @param {any} fraction The chance that the next score clears the mark, between 0 and 1.
 * @param {any} [shape] The scale on which the scores are normal: "normal", "lognormal", "logit(low,high)", "boxcox" or "boxcox(power)". Left out: "normal".
 * @param {any} [better] "high" or "low": which scores are better. Left out: "high".
 * @returns {any} One score. #N/A where it falls off the scale of the shape.
 * @choices better "high" "low"
 * @caution The chance holds on average over samples, not for this one: this mark may let through more or less.
 * @caution A cutoff over people is no decision: groups can be hit unequally, and local law and licensed practice come first.
 * @question Which mark does the next entry clear with a chance of exactly 5 percent?
 * @example =WEIR.NEXT_SCORE_CUTOFF({54;52.3;60.4;43.4;50.5},1%) => 77.32122274205265
 */
export function NEXT_SCORE_CUTOFF(scores: any[][], fraction: any, shape?: any, better?: any): any {
  const share = readFraction("fraction", fraction);
  const scale = readShape(shape);
  const side = readBetter(better);
  const { sample } = readScores("scores", scores);
  return requireOnScale("next-score cutoff", nextScoreCutoff(fitCurve("scores", sample, scale), share, side).cutoff);
}

/**
 * Gives the normal tolerance factor k, for those who set mean plus k times standard deviation themselves or check a table.
 *
 * With sides 1, mean + k sd lies above the share coverage of all entries with this confidence; with sides 2, mean - k sd to mean + k sd
 * holds that share. Both exact: noncentral t, and the sense of ISO 16269-6. Older tables of two-sided factors hold approximations.
 *
 * @customfunction TOLERANCE_FACTOR
 * @param {any} count How many scores mean and standard deviation come from, a whole number of at least 2.
 * @param {any} coverage The share of all entries to be covered, between 0 and 1: 95% for a mark that 5% pass.
 * @param {any} [confidence] Between 0 and 1; left out: 95%.
 * @param {any} [sides] 1 or 2; left out: 1.
 * @returns {any} The factor k.
 * @question Which factor k do I need for 95/95 with 10 scores?
 * @example =WEIR.TOLERANCE_FACTOR(10,95%) => 2.9109634130781665
 * @example =WEIR.TOLERANCE_FACTOR(10,95%,95%,2) => 3.3934294787126076
 */
export function TOLERANCE_FACTOR(count: any, coverage: any, confidence?: any, sides?: any): any {
  const scored = readCount("count", count, 2);
  const share = readFraction("coverage", coverage);
  const trust = readFraction("confidence", confidence, 0.95);
  return readCount("sides", sides, 1, 2, 1) === 1
    ? toleranceFactor(scored, share, trust).factor
    : twoSidedFactor(scored, share, trust).factor;
}
