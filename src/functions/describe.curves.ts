import { combinedCurve } from "../core/sample/combinedCurve";
import { gatedCurve } from "../core/sample/gatedCurve";
import { readCount, readNotNegative, readNumber } from "../sheet/readArgument";
import { readScores } from "../sheet/readScores";
import { labelTable, requireItem } from "../sheet/tables";

const GATED = [
  "scored",
  "below the gate",
  "mean",
  "standard deviation",
  "standard error of the mean",
  "standard error of the standard deviation",
] as const;

/**
 * Estimates the curve of all entries when those below a gate were only counted, never scored.
 *
 * Maximum likelihood for a normal curve cut off at the gate (Cohen 1959); the standard deviation is the maximum-likelihood one, so with
 * below_count 0 its divisor is n. Use it where a minimum score kept weak entries from being scored in full.
 *
 * @customfunction GATED_CURVE
 * @param {any[][]} scores The scores of those that passed the gate; blank cells are skipped. At least 2 numbers that differ, none below the gate.
 * @param {any} gate The score below which entries were only counted.
 * @param {any} below_count How many were below the gate, a whole number; 0 is allowed.
 * @param {any} [item] One label alone, such as "mean". Left out: the whole table.
 * @returns {any[][]} Two columns, label and value: scored, below the gate, mean, standard deviation and their standard errors.
 * @choices item "scored" "below the gate" "mean" "standard deviation" "standard error of the mean" "standard error of the standard deviation"
 * @caution Valid where the gate stands on this same score, not on an earlier quick look at the entries.
 * @caution The more entries lie below the gate, the more the answer rests on the normal curve itself.
 * @question I scored only those above 60 and counted the rest: what are mean and spread of all?
 * @example =WEIR.GATED_CURVE({1;3},0,0,"standard deviation") => 1
 */
export function GATED_CURVE(scores: any[][], gate: any, below_count: any, item?: any): any {
  const mark = readNumber("gate", gate);
  const below = readCount("below_count", below_count, 0);
  requireItem(GATED, item);
  const { sample } = readScores("scores", scores);
  const { mean, sd, meanError, sdError } = gatedCurve(sample, mark, below);
  const values = [sample.count, below, mean, sd, meanError, sdError];
  return labelTable(
    GATED.map((label, i) => [label, values[i]] as const),
    item,
  );
}

/**
 * Puts two batches of scores together when only count, mean and standard deviation of each are at hand.
 *
 * Exact: the result is that of the two score columns taken as one.
 *
 * @customfunction COMBINED_CURVE
 * @param {any} count_1 How many scores in the first batch, at least 2.
 * @param {any} mean_1 Their mean.
 * @param {any} sd_1 Their standard deviation, 0 or above.
 * @param {any} count_2 How many scores in the second batch, at least 2.
 * @param {any} mean_2 Their mean.
 * @param {any} sd_2 Their standard deviation, 0 or above.
 * @param {any} [item] One label alone: "count", "mean" or "standard deviation". Left out: the whole table.
 * @returns {any[][]} Two columns, label and value: count, mean, standard deviation (n - 1).
 * @choices item "count" "mean" "standard deviation"
 * @caution Two batches with different means are no longer one normal curve: compare them first.
 * @question How do I add this year's scores to last year's mean and standard deviation?
 * @example =WEIR.COMBINED_CURVE(2,10,1,2,20,1,"standard deviation") => 5.830951894845301
 */
export function COMBINED_CURVE(
  count_1: any,
  mean_1: any,
  sd_1: any,
  count_2: any,
  mean_2: any,
  sd_2: any,
  item?: any,
): any {
  requireItem(["count", "mean", "standard deviation"], item);
  const { count, mean, sd } = combinedCurve(
    { count: readCount("count_1", count_1, 2), mean: readNumber("mean_1", mean_1), sd: readNotNegative("sd_1", sd_1) },
    { count: readCount("count_2", count_2, 2), mean: readNumber("mean_2", mean_2), sd: readNotNegative("sd_2", sd_2) },
  );
  return labelTable(
    [
      ["count", count],
      ["mean", mean],
      ["standard deviation", sd],
    ],
    item,
  );
}
