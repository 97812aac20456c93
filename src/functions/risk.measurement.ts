import { chanceTrueScoreClears } from "../core/method/chanceTrueScoreClears";
import { guardedCutoff } from "../core/method/guardedCutoff";
import { scoreErrorSd } from "../core/method/scoreErrorSd";
import { mapEach } from "../sheet/each";
import { readBetter, readBetween, readFraction, readNumber, readPositive } from "../sheet/readArgument";

/**
 * Gives for each score the chance that the true score behind it reaches the limit.
 *
 * A score is the true score plus a normal error. True scores are normal with this mean and true_sd, so a high score is partly luck and is
 * drawn towards the mean. true_sd is not the standard deviation of the scores: true_sd squared = sd of the scores squared minus error_sd
 * squared. SCORE_ERROR_SD gives error_sd. JCGM 106:2012.
 *
 * @customfunction CHANCE_TRUE_SCORE_CLEARS
 * @param {any[][]} score One score or a range of scores. Blanks stay blank.
 * @param {any} limit The true score that is needed.
 * @param {any} error_sd Standard deviation of the error of a score, above 0.
 * @param {any} mean Mean of all entries' true scores.
 * @param {any} true_sd Standard deviation of all entries' true scores, above 0: the root of (sd of the scores squared minus error_sd squared).
 * @param {any} [better] "high" (default): the chance of reaching the limit or more; "low": of the limit or less.
 * @returns {any[][]} The chance, 0 to 1, in the shape of score.
 * @choices better "high" "low"
 * @caution true_sd is that of the true scores: with the sd of the scores themselves the chances come out wrong.
 * @caution Where entries are people, the chance is no decision: groups can be hit unequally, and local law and licensed practice come first.
 * @question How sure can I be that this entry really reaches the limit, given that scores have errors?
 * @example =WEIR.CHANCE_TRUE_SCORE_CLEARS(64,60,3,55,8) => 0.8482570499574357
 * @example =WEIR.CHANCE_TRUE_SCORE_CLEARS({75.8;"";60.1},60,3,61,8) => [[0.9999996741390055],[""],[0.5299329841407623]]
 */
export function CHANCE_TRUE_SCORE_CLEARS(
  score: any[][],
  limit: any,
  error_sd: any,
  mean: any,
  true_sd: any,
  better?: any,
): any {
  const needed = readNumber("limit", limit);
  const error = readPositive("error_sd", error_sd);
  const centre = readNumber("mean", mean);
  const spread = readPositive("true_sd", true_sd);
  const direction = readBetter(better);
  return mapEach("score", score, (one) => chanceTrueScoreClears(one, needed, error, centre, spread, direction).chance);
}

/**
 * Gives the lowest mark on the score that keeps the share of wrongly passed entries down to what you allow.
 *
 * A score is the true score plus a normal error, true scores are normal with this mean and true_sd (see CHANCE_TRUE_SCORE_CLEARS). Of all
 * entries scoring at the mark or better, at most max_wrong are truly short of the limit. This is the risk among those passed, not the
 * joint risk among all entries that JCGM 106 calls global.
 *
 * @customfunction GUARDED_CUTOFF
 * @param {any} limit The true score that is needed.
 * @param {any} error_sd Standard deviation of the error of a score, above 0.
 * @param {any} mean Mean of all entries' true scores.
 * @param {any} true_sd Standard deviation of all entries' true scores, above 0: the root of (sd of the scores squared minus error_sd squared).
 * @param {any} [max_wrong] Largest share of those passed that may be truly short of the limit, between 0 and 1; left out: 5%.
 * @param {any} [better] "high" (default), or "low" where low scores are better: the highest mark, to be met at or below.
 * @returns {any} The mark, in score points. #N/A where the share is met without any mark.
 * @choices better "high" "low"
 * @caution It guards against passing the wrong ones alone: how many right ones it turns away is not limited.
 * @caution Where entries are people, the mark is no decision: groups can be hit unequally, and local law and licensed practice come first.
 * @question How far above the limit must I set the mark so that few of those passed are really below it?
 * @example =WEIR.GUARDED_CUTOFF(60,3,55,8) => 63.50009186096573
 * @example =WEIR.GUARDED_CUTOFF(20,2,22,4,0.03,"low") => 16.594631383514873
 */
export function GUARDED_CUTOFF(limit: any, error_sd: any, mean: any, true_sd: any, max_wrong?: any, better?: any): any {
  return guardedCutoff(
    readNumber("limit", limit),
    readPositive("error_sd", error_sd),
    readNumber("mean", mean),
    readPositive("true_sd", true_sd),
    readFraction("max_wrong", max_wrong, 0.05),
    readBetter(better),
  ).cutoff;
}

/**
 * Gives the standard error of a score: how far it strays from the true score.
 *
 * The standard deviation of the scores times the root of 1 - reliability. It is the error_sd that CHANCE_TRUE_SCORE_CLEARS and
 * GUARDED_CUTOFF ask for; SCORE_RELIABILITY gives the reliability.
 *
 * @customfunction SCORE_ERROR_SD
 * @param {any} sd Standard deviation of the scores, above 0.
 * @param {any} reliability Reliability of the scores, from 0 to 1: that of the mean of k raters where such means are the scores.
 * @returns {any} The standard error, in score points.
 * @caution sd and reliability must be of the same scores: a reliability found among more varied entries makes the error look too small or too large.
 * @question How far off can a score be?
 * @example =WEIR.SCORE_ERROR_SD(8,0.81) => 3.487119154832538
 */
export function SCORE_ERROR_SD(sd: any, reliability: any): any {
  return scoreErrorSd(readPositive("sd", sd), readBetween("reliability", reliability, 0, 1));
}
