import { cutoffLimits, type CutoffLimits } from "../core/method/cutoffLimits";
import { gatedCutoffLimits } from "../core/method/gatedCutoffLimits";
import { knownCurve } from "../core/method/markCurve";
import { rankCutoff } from "../core/method/rankCutoff";
import { fitCurve } from "../core/sample/fitCurve";
import type { Cell } from "../sheet/cell";
import { markTable } from "../sheet/markTable";
import { readBetter, readCount, readFraction, readNumber, readPositive } from "../sheet/readArgument";
import { readScores } from "../sheet/readScores";
import { readShape } from "../sheet/readShape";
import { labelTable, requireItem } from "../sheet/tables";

const LIMITS = ["lower limit", "cutoff", "upper limit"] as const;
const RANKS = [...LIMITS, "actual confidence"] as const;

function limitsTable(limits: Pick<CutoffLimits, "lowerLimit" | "cutoff" | "upperLimit">, item: Cell): Cell | Cell[][] {
  const values = [limits.lowerLimit, limits.cutoff, limits.upperLimit];
  return markTable(
    LIMITS.map((label, i) => [label, values[i]] as const),
    item,
  );
}

/**
 * Gives the plain cutoff with confidence limits for where the true mark of the top fraction lies.
 *
 * Exact equal-tailed limits from the noncentral t distribution. A score beyond the far limit clears the true mark with confidence; one
 * between the limits is too close to call (CUTOFF_VERDICT). Takes the scores as normal on the scale of the shape, and independent.
 *
 * @customfunction CUTOFF_LIMITS
 * @param {any[][]} scores The scores so far; blank cells are skipped. At least 2 numbers that differ.
 * @param {any} fraction The share of all entries that is to pass, between 0 and 1.
 * @param {any} [confidence] Between 0 and 1; left out: 95%.
 * @param {any} [shape] The scale on which the scores are normal: "normal", "lognormal", "logit(low,high)", "boxcox" or "boxcox(power)". Left out: "normal".
 * @param {any} [better] "high" or "low": which scores are better. Left out: "high".
 * @param {any} [item] One label alone: "lower limit", "cutoff" or "upper limit". Left out: the whole table.
 * @returns {any[][]} Two columns, label and value; the lower limit is the smaller score also with "low". #N/A where a mark falls off the scale.
 * @choices better "high" "low"
 * @choices item "lower limit" "cutoff" "upper limit"
 * @caution Exact for a shape fixed beforehand. With a fitted power, or a shape picked by looking at the same scores, nominal 95% covers about 88 to 93% with 20 to 60 scores.
 * @caution A cutoff over people is no decision: groups can be hit unequally, and local law and licensed practice come first.
 * @question How far can I trust the pass mark from these scores?
 * @example =WEIR.CUTOFF_LIMITS({54;52.3;60.4;43.4;50.5},20%) => [["lower limit",51.88970103176316],["cutoff",57.28737617764446],["upper limit",70.89804989675164]]
 */
export function CUTOFF_LIMITS(
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
  requireItem(LIMITS, item);
  const { sample } = readScores("scores", scores);
  return limitsTable(cutoffLimits(fitCurve("scores", sample, scale), share, trust, side), item);
}

/**
 * Gives the plain cutoff with confidence limits from count, mean and standard deviation alone, computed elsewhere.
 *
 * The same as CUTOFF_LIMITS where the scores themselves are not at hand: a database worked them out, or last year's file holds the three.
 *
 * @customfunction CURVE_CUTOFF_LIMITS
 * @param {any} count How many scores mean and sd come from, a whole number of at least 2.
 * @param {any} mean Their mean.
 * @param {any} sd Their standard deviation (n - 1), above 0.
 * @param {any} fraction The share of all entries that is to pass, between 0 and 1.
 * @param {any} [confidence] Between 0 and 1; left out: 95%.
 * @param {any} [better] "high" or "low": which scores are better. Left out: "high".
 * @param {any} [item] One label alone: "lower limit", "cutoff" or "upper limit". Left out: the whole table.
 * @returns {any[][]} Two columns, label and value; the lower limit is the smaller score also with "low".
 * @choices better "high" "low"
 * @choices item "lower limit" "cutoff" "upper limit"
 * @caution A cutoff over people is no decision: groups can be hit unequally, and local law and licensed practice come first.
 * @question How sure is a cutoff worked out from last year's mean and standard deviation?
 * @example =WEIR.CURVE_CUTOFF_LIMITS(60,70,8,5%,,,"upper limit") => 86.8254358632768
 */
export function CURVE_CUTOFF_LIMITS(
  count: any,
  mean: any,
  sd: any,
  fraction: any,
  confidence?: any,
  better?: any,
  item?: any,
): any {
  const scored = readCount("count", count, 2);
  const curve = knownCurve(scored, readNumber("mean", mean), readPositive("sd", sd));
  const share = readFraction("fraction", fraction);
  const trust = readFraction("confidence", confidence, 0.95);
  const side = readBetter(better);
  requireItem(LIMITS, item);
  return limitsTable(cutoffLimits(curve, share, trust, side), item);
}

/**
 * Gives the cutoff of the top fraction of all entries with its limits where those below a gate were only counted.
 *
 * Maximum likelihood for a normal curve cut off at the gate, limits by profile likelihood. The fraction is of all entries, those below the
 * gate included. Higher scores are better.
 *
 * @customfunction GATED_CUTOFF_LIMITS
 * @param {any[][]} scores The scores of those that passed the gate; blank cells are skipped. At least 2 numbers that differ, none below the gate.
 * @param {any} gate The score below which entries were only counted.
 * @param {any} below_count How many were below the gate, a whole number; 0 is allowed.
 * @param {any} fraction The share of all entries that is to pass, between 0 and 1.
 * @param {any} [confidence] Between 0 and 1; left out: 95%.
 * @param {any} [item] One label alone: "lower limit", "cutoff" or "upper limit". Left out: the whole table.
 * @returns {any[][]} Two columns, label and value.
 * @choices item "lower limit" "cutoff" "upper limit"
 * @caution Valid where the gate stands on this same score, not on an earlier quick look at the entries.
 * @caution The limits are large-sample ones: below some 20 scores they cover less than their confidence.
 * @caution A cutoff over people is no decision: groups can be hit unequally, and local law and licensed practice come first.
 * @question I scored only those above 60 and counted the rest: where are the top 5 percent of all?
 * @example =WEIR.GATED_CUTOFF_LIMITS({1;3},0,0,50%,,"upper limit") => 4.413697487657867
 */
export function GATED_CUTOFF_LIMITS(
  scores: any[][],
  gate: any,
  below_count: any,
  fraction: any,
  confidence?: any,
  item?: any,
): any {
  const mark = readNumber("gate", gate);
  const below = readCount("below_count", below_count, 0);
  const share = readFraction("fraction", fraction);
  const trust = readFraction("confidence", confidence, 0.95);
  requireItem(LIMITS, item);
  const { sample } = readScores("scores", scores);
  return limitsTable(gatedCutoffLimits(sample, mark, below, share, trust), item);
}

/**
 * Gives the cutoff of the top fraction with limits that assume no curve at all, only that the scores are a random sample.
 *
 * The cutoff is the sample quantile; the limits are scores of the sample, each missed with at most half of what the confidence leaves.
 * They need more scores than CUTOFF_LIMITS, and say "none" where there are too few.
 *
 * @customfunction RANK_CUTOFF
 * @param {any[][]} scores The scores so far; blank cells are skipped. At least 2 numbers that differ.
 * @param {any} fraction The share of all entries that is to pass, between 0 and 1.
 * @param {any} [confidence] Between 0 and 1; left out: 95%.
 * @param {any} [better] "high" or "low": which scores are better. Left out: "high".
 * @param {any} [item] One label alone: "lower limit", "cutoff", "upper limit" or "actual confidence". Left out: the whole table.
 * @returns {any[][]} Two columns, label and value. A limit is "none" where the sample is too small for one.
 * @choices better "high" "low"
 * @choices item "lower limit" "cutoff" "upper limit" "actual confidence"
 * @caution With "none" on one side the actual confidence counts that side as never missed.
 * @caution A cutoff over people is no decision: groups can be hit unequally, and local law and licensed practice come first.
 * @question Where is the cutoff if I don't trust a normal curve?
 * @example =WEIR.RANK_CUTOFF({1;2;3;4;5},25%) => [["lower limit",2],["cutoff",4],["upper limit","none"],["actual confidence",0.984375]]
 */
export function RANK_CUTOFF(scores: any[][], fraction: any, confidence?: any, better?: any, item?: any): any {
  const share = readFraction("fraction", fraction);
  const trust = readFraction("confidence", confidence, 0.95);
  const side = readBetter(better);
  requireItem(RANKS, item);
  const { sample } = readScores("scores", scores);
  const { lowerLimit = "none", cutoff, upperLimit = "none", actualConfidence } = rankCutoff(sample, share, trust, side);
  const values = [lowerLimit, cutoff, upperLimit, actualConfidence];
  return labelTable(
    RANKS.map((label, i) => [label, values[i]] as const),
    item,
  );
}
