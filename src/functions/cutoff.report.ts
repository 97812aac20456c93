import { clearanceConfidence } from "../core/method/clearanceConfidence";
import { cutoffReport } from "../core/method/cutoffReport";
import { cutoffVerdict } from "../core/method/cutoffVerdict";
import { fitCurve } from "../core/sample/fitCurve";
import { NORMAL } from "../core/sample/shape";
import { mapEach } from "../sheet/each";
import { markTable } from "../sheet/markTable";
import { numberCells } from "../sheet/numberCells";
import { readBetter, readFraction } from "../sheet/readArgument";
import { readLimit } from "../sheet/readLimit";
import { readScores } from "../sheet/readScores";
import { readShape } from "../sheet/readShape";
import { requireItem } from "../sheet/tables";

const REPORT = [
  "scores used",
  "blanks skipped",
  "curve mean",
  "curve standard deviation",
  "Anderson-Darling p-value",
  "cutoff",
  "lower limit",
  "upper limit",
  "safe cutoff",
  "passing now",
  "lowest passing fraction",
  "highest passing fraction",
  "looks for a 50% chance",
  "looks for a 90% chance",
] as const;

/**
 * Gives for each score the confidence with which it lies beyond the true mark of the top fraction.
 *
 * It is the confidence at which the safe cutoff would fall on that score: 0.95 means that SAFE_CUTOFF at 95% stands just there. Takes the
 * scores as normal and independent.
 *
 * @customfunction CLEARANCE_CONFIDENCE
 * @param {any[][]} score The score or scores to judge; blank cells stay blank.
 * @param {any[][]} scores The scores that the mark is learnt from; blank cells are skipped. At least 2 numbers that differ.
 * @param {any} fraction The share of all entries that is to pass, between 0 and 1.
 * @param {any} [better] "high" or "low": which scores are better. Left out: "high".
 * @returns {any[][]} A confidence from 0 to 1 for each score, in the shape of score.
 * @choices better "high" "low"
 * @caution It is the confidence that the score lies beyond the mark, not the chance that the entry is truly good: scores have errors of their own.
 * @caution A cutoff over people is no decision: groups can be hit unequally, and local law and licensed practice come first.
 * @question How sure is it that this score is really among the top 5 percent?
 * @example =WEIR.CLEARANCE_CONFIDENCE(60,{54;52.3;60.4;43.4;50.5},20%) => 0.71441797407404
 */
export function CLEARANCE_CONFIDENCE(score: any[][], scores: any[][], fraction: any, better?: any): any {
  const share = readFraction("fraction", fraction);
  const side = readBetter(better);
  numberCells("score", score);
  const { sample } = readScores("scores", scores);
  const { count, mean, sd } = fitCurve("scores", sample, NORMAL);
  return mapEach("score", score, clearanceConfidence(count, mean, sd, share, side).confidence);
}

/**
 * Says for each score whether it clears the cutoff, falls short of it, or is too close to call, given the limits of the cutoff.
 *
 * A score clears at or beyond the far limit (the upper one, with "low" the lower one) and falls short before the near limit. Limits come from
 * CUTOFF_LIMITS, CURVE_CUTOFF_LIMITS, GATED_CUTOFF_LIMITS or RANK_CUTOFF.
 *
 * @customfunction CUTOFF_VERDICT
 * @param {any[][]} score The score or scores to judge; blank cells stay blank.
 * @param {any} lower_limit The lower limit, or "none".
 * @param {any} upper_limit The upper limit, at or above the lower one, or "none".
 * @param {any} [better] "high" or "low": which scores are better. Left out: "high".
 * @returns {any[][]} "clears", "falls short" or "too close to call" for each score, in the shape of score.
 * @choices better "high" "low"
 * @caution Without a far limit nothing clears for certain, without a near limit nothing falls short for certain.
 * @caution A verdict over people is no decision: groups can be hit unequally, and local law and licensed practice come first.
 * @question Which entries clearly pass, and which are too close to call?
 * @example =WEIR.CUTOFF_VERDICT({70;80;90},75,85) => [["falls short"],["too close to call"],["clears"]]
 */
export function CUTOFF_VERDICT(score: any[][], lower_limit: any, upper_limit: any, better?: any): any {
  const lower = readLimit("lower_limit", lower_limit, -Infinity);
  const upper = readLimit("upper_limit", upper_limit, Infinity);
  return mapEach("score", score, cutoffVerdict(lower, upper, readBetter(better)));
}

/**
 * Gives the whole cutoff in one table: curve, mark, limits, safe mark, who passes now, and how long the next hit may take.
 *
 * The looks are what one must expect knowing that the mark is only an estimate: more than 1/fraction promises. The passing fractions are those
 * that CUTOFF_PRECISION gives at this confidence. Takes the scores as normal on the scale of the shape, and independent.
 *
 * @customfunction CUTOFF_REPORT
 * @param {any[][]} scores The scores so far; blank cells are skipped. At least 2 numbers that differ.
 * @param {any} fraction The share of all entries that is to pass, between 0 and 1.
 * @param {any} [confidence] Between 0 and 1; left out: 95%.
 * @param {any} [shape] The scale on which the scores are normal: "normal", "lognormal", "logit(low,high)", "boxcox" or "boxcox(power)". Left out: "normal".
 * @param {any} [better] "high" or "low": which scores are better. Left out: "high".
 * @param {any} [item] One label alone, such as "safe cutoff". Left out: the whole table.
 * @returns {any[][]} Two columns, label and value. The Anderson-Darling p-value is blank below 8 scores and with a fitted power; #N/A where a mark falls off the scale.
 * @choices better "high" "low"
 * @choices item "scores used" "blanks skipped" "curve mean" "curve standard deviation" "Anderson-Darling p-value" "cutoff" "lower limit" "upper limit" "safe cutoff" "passing now" "lowest passing fraction" "highest passing fraction" "looks for a 50% chance" "looks for a 90% chance"
 * @caution The plain mark lets through more than the fraction in nearly half of all samples: the safe cutoff is for that.
 * @caution Limits are exact for a shape fixed beforehand. With a fitted power, or a shape picked by looking at the same scores, nominal 95% covers about 88 to 93% with 20 to 60 scores.
 * @caution A cutoff over people is no decision: groups can be hit unequally, and local law and licensed practice come first.
 * @question What is the pass mark, how far can I trust it, and how long will the search be?
 * @example =WEIR.CUTOFF_REPORT({54;52.3;60.4;43.4;50.5},20%,,,,"looks for a 90% chance") => 16
 */
export function CUTOFF_REPORT(
  scores: any[][],
  fraction: any,
  confidence?: any,
  shape?: any,
  better?: any,
  item?: any,
): any {
  const share = readFraction("fraction", fraction);
  const trust = readFraction("confidence", confidence, 0.95);
  const scale = readShape(shape);
  const side = readBetter(better);
  requireItem(REPORT, item);
  const { sample, blanks } = readScores("scores", scores);
  const curve = fitCurve("scores", sample, scale);
  const report = cutoffReport(sample, curve, share, trust, side);
  const values = [
    sample.count,
    blanks,
    curve.shownMean,
    curve.shownSd,
    report.normalityP ?? "",
    report.limits.cutoff,
    report.limits.lowerLimit,
    report.limits.upperLimit,
    report.safe.cutoff,
    report.passing,
    report.passingFractions.lowest,
    report.passingFractions.highest,
    looksText(report.looksForHalf),
    looksText(report.looksForMost),
  ];
  return markTable(
    REPORT.map((label, i) => [label, values[i]] as const),
    item,
  );
}

function looksText(looks: number): number | string {
  return looks === Infinity ? "more than 9E+15" : looks;
}
