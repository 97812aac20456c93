import { andersonDarling } from "../core/sample/andersonDarling";
import { curveLikelihood } from "../core/sample/curveLikelihood";
import { DomainError } from "../core/domain";
import { fitCurve } from "../core/sample/fitCurve";
import { scoreSummary } from "../core/sample/scoreSummary";
import { shapeText } from "../core/sample/shape";
import { LEAST_FOR_RANKING, shapeRanking } from "../core/sample/shapeRanking";
import { isBlank } from "../sheet/cell";
import { readNumber } from "../sheet/readArgument";
import { readScores } from "../sheet/readScores";
import { readShape } from "../sheet/readShape";
import { headedTable, labelTable, requireItem } from "../sheet/tables";

const SUMMARY = [
  "scores used",
  "blanks skipped",
  "mean",
  "standard deviation",
  "standard error of the mean",
  "minimum",
  "lower quartile",
  "median",
  "upper quartile",
  "maximum",
  "skewness",
  "excess kurtosis",
] as const;

/**
 * Sums up a score column: how many, mean, spread, quartiles, skewness and kurtosis.
 *
 * Quartiles by linear interpolation, as the host's own QUARTILE.INC gives them. Skewness and kurtosis are adjusted for small samples and are
 * both 0 for a normal curve.
 *
 * @customfunction SCORE_SUMMARY
 * @param {any[][]} scores The score column; blank cells are skipped. At least 2 numbers that differ.
 * @param {any} [item] One label alone, such as "median". Left out: the whole table.
 * @returns {any[][]} Two columns, label and value, 12 rows. Skewness is blank below 3 scores, excess kurtosis below 4.
 * @choices item "scores used" "blanks skipped" "mean" "standard deviation" "standard error of the mean" "minimum" "lower quartile" "median" "upper quartile" "maximum" "skewness" "excess kurtosis"
 * @question What do my scores look like?
 * @example =WEIR.SCORE_SUMMARY({1;2;3;4},"upper quartile") => 3.25
 * @example =WEIR.SCORE_SUMMARY({2;4},"standard deviation") => 1.4142135623730951
 */
export function SCORE_SUMMARY(scores: any[][], item?: any): any {
  requireItem(SUMMARY, item);
  const { sample, blanks } = readScores("scores", scores);
  const { count, mean, sd, meanError, minimum, maximum, ...of } = scoreSummary("scores", sample);
  const quartiles = [of.lowerQuartile, of.median, of.upperQuartile];
  const shape = [of.skewness, of.excessKurtosis];
  const values = [count, blanks, mean, sd, meanError, minimum, ...quartiles, maximum, ...shape];
  return labelTable(
    SUMMARY.map((label, i) => [label, values[i] ?? ""] as const),
    item,
  );
}

const CURVE = [
  "shape",
  "scores used",
  "curve mean",
  "curve standard deviation",
  "power",
  "log-likelihood",
  "AICc",
  "Anderson-Darling statistic",
  "Anderson-Darling p-value",
] as const;

/**
 * Fits a curve to a score column and says how well it fits.
 *
 * Mean and standard deviation are on the scale of the shape, ln x for instance. The log-likelihood is that of the scores themselves, so that
 * shapes can be compared; a smaller AICc is better. A small Anderson-Darling p-value says that the curve does not fit.
 *
 * @customfunction SCORE_CURVE
 * @param {any[][]} scores The score column; blank cells are skipped. At least 2 numbers that differ.
 * @param {any} [shape] "normal" (left out), "lognormal", "logit(low,high)", "boxcox" or "boxcox(power)".
 * @param {any} [item] One label alone, such as "AICc". Left out: the whole table.
 * @returns {any[][]} Two columns, label and value, 9 rows. Blank where a value has no meaning: the p-value below 8 scores or with a fitted power, AICc with too few scores.
 * @choices item "shape" "scores used" "curve mean" "curve standard deviation" "power" "log-likelihood" "AICc" "Anderson-Darling statistic" "Anderson-Darling p-value"
 * @caution A power fitted to the scores, or a shape picked by looking at them, makes later limits too narrow: nominal 95% covers about 88 to 93% with 20 to 60 scores.
 * @question Which normal, lognormal or Box-Cox curve goes through my scores?
 * @example =WEIR.SCORE_CURVE({1;3},,"curve mean") => 2
 * @example =WEIR.SCORE_CURVE({1;3},"boxcox(1)","power") => 1
 */
export function SCORE_CURVE(scores: any[][], shape?: any, item?: any): any {
  requireItem(CURVE, item);
  const wanted = readShape(shape);
  const { sample } = readScores("scores", scores);
  const curve = fitCurve("scores", sample, wanted);
  const { logLikelihood, aicc } = curveLikelihood(sample, curve);
  const { statistic, pValue } = andersonDarling(curve.scaled);
  const shown = [shapeText(wanted), curve.count, curve.shownMean, curve.shownSd, curve.power];
  const values = [...shown, logLikelihood, aicc, statistic, curve.powerFitted ? "" : pValue];
  return labelTable(
    CURVE.map((label, i) => [label, values[i] ?? ""] as const),
    item,
  );
}

/**
 * Ranks the shapes that can hold these scores, the best first.
 *
 * Candidates are normal; lognormal and boxcox where all scores are above 0; logit where both bounds are given and all scores lie strictly
 * between them. Ranked by AICc, which rewards fit and charges for parameters; a difference below 2 decides nothing.
 *
 * @customfunction SHAPE_RANKING
 * @param {any[][]} scores The score column; blank cells are skipped. At least 5 numbers that differ.
 * @param {any} [low] Lowest score there can be, for a scale with two ends, such as 0.
 * @param {any} [high] Highest score there can be, above low, such as 100.
 * @returns {any[][]} A heading row and one row a shape: shape, AICc, AICc difference, Anderson-Darling p-value.
 * @caution Limits from a shape picked by looking at the same scores are too narrow: nominal 95% covers about 88 to 93% with 20 to 60 scores.
 * @question Which shape should I take for prices that are never below zero?
 * @question Are my scores normal or lognormal?
 * @example =WEIR.SHAPE_RANKING({0;25.4;18.8;21.4;13.8;26.1;27;18.8;24;16.4},-1,50) => [["shape","AICc","AICc difference","Anderson-Darling p-value"],["normal",74.7099097981925,0,0.11279119542859614],["logit(-1,50)",81.74359155045254,7.033681752260046,0.0004686463323121642]]
 */
export function SHAPE_RANKING(scores: any[][], low?: any, high?: any): any[][] {
  const lowest = isBlank(low) ? undefined : readNumber("low", low);
  const highest = isBlank(high) ? undefined : readNumber("high", high);
  const bounded = lowest !== undefined && highest !== undefined;
  if (bounded && !(lowest < highest)) throw new DomainError("low", lowest, `below high, ${highest}`);
  const { sample } = readScores("scores", scores, LEAST_FOR_RANKING);
  const ranked = shapeRanking("scores", sample, bounded ? { low: lowest, high: highest } : undefined);
  return headedTable(
    ["shape", "AICc", "AICc difference", "Anderson-Darling p-value"],
    ranked.map(({ shape, aicc, difference, pValue }) => [shapeText(shape), aicc, difference, pValue ?? ""]),
  );
}
