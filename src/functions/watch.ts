import { DomainError } from "../core/domain";
import { cumulativeSums } from "../core/method/cumulativeSums";
import { driftComparison } from "../core/method/driftComparison";
import { smoothedScores } from "../core/method/smoothedScores";
import { MOST_ROWS } from "../sheet/invoke";
import { readNumber, readPositive, readWord } from "../sheet/readArgument";
import { readScores } from "../sheet/readScores";
import { headedTable, labelTable, requireItem } from "../sheet/tables";

/**
 * Watches scores as they come: flags where they have drifted away from the curve on which the mark was set.
 *
 * "ewma" smooths the scores (each new one counts 20 %) and flags where that leaves limits of three standard errors. "cusum" adds up what lies
 * more than half a standard deviation from the mean, on either side, and flags above five; it is not reset after a flag.
 *
 * @customfunction DRIFT_FLAGS
 * @param {any[][]} recent The new scores in the order in which they came; blanks are skipped. One is enough.
 * @param {any} mean The mean of the curve on which the mark was set.
 * @param {any} sd Its standard deviation, above 0.
 * @param {any} [method] "ewma" (default) or "cusum".
 * @returns {any[][]} A table with headings, a row a score. ewma: score number, smoothed, lower limit, upper limit, flag. cusum: score number, high side, low side (both in standard deviations), flag. flag is TRUE strictly outside the limits, or above 5.
 * @choices method "ewma" "cusum"
 * @caution Mean and sd are taken as known: learnt from 60 scores, false alarms are about 1.6 times as frequent, from 30 twice.
 * @question Have the scores drifted since I set the mark?
 * @example =WEIR.DRIFT_FLAGS({84;60},60,8) => [["score number","smoothed","lower limit","upper limit","flag"],[1,64.8,55.2,64.8,false],[2,63.84,53.853000732064466,66.14699926793554,false]]
 * @example =WEIR.DRIFT_FLAGS({68;52},60,8,"cusum") => [["score number","high side","low side","flag"],[1,0.5,0,false],[2,0,0.5,false]]
 */
export function DRIFT_FLAGS(recent: any[][], mean: any, sd: any, method?: any): any {
  const centre = readNumber("mean", mean);
  const spread = readPositive("sd", sd);
  const way = readWord("method", method, ["ewma", "cusum"], "ewma");
  const { values, count } = readScores("recent", recent, 1, "any").sample;
  if (count >= MOST_ROWS)
    throw new DomainError(
      "recent",
      recent,
      `at most ${MOST_ROWS - 1} scores, one row each below the heading`,
      `${count} were given`,
    );
  if (way === "cusum") {
    const { high, low, flags } = cumulativeSums(values, centre, spread);
    return headedTable(
      ["score number", "high side", "low side", "flag"],
      flags.map((flag, i) => [i + 1, high[i], low[i], flag]),
    );
  }
  const { smoothed, lower, upper, flags } = smoothedScores(values, centre, spread);
  return headedTable(
    ["score number", "smoothed", "lower limit", "upper limit", "flag"],
    flags.map((flag, i) => [i + 1, smoothed[i], lower[i], upper[i], flag]),
  );
}

const COMPARISON_LABELS = [
  "mean shift",
  "Welch t",
  "Welch p-value",
  "ratio of variances",
  "Brown-Forsythe p-value",
  "Kolmogorov-Smirnov distance",
  "Kolmogorov-Smirnov p-value",
] as const;

/**
 * Compares new scores with those on which the mark was set: in place, in spread and in shape.
 *
 * A small p-value says that a difference as large as this seldom comes by chance; a large one does not prove that nothing has changed. Three
 * tests are made, so one p-value below 5 % among them is no rare event. Each batch needs 2 scores and a spread.
 *
 * @customfunction DRIFT_COMPARISON
 * @param {any[][]} baseline The scores on which the mark was set; blanks are skipped.
 * @param {any[][]} recent The new scores; blanks are skipped.
 * @param {any} [item] One label alone, such as "Welch p-value". Left out: the whole table.
 * @returns {any[][]} Two columns, label and value: mean shift (recent − baseline), Welch t and its two-sided p-value, ratio of variances (recent/baseline), Brown-Forsythe p-value (empty where the distances from the medians don't vary, as with two scores each), Kolmogorov-Smirnov distance and p-value (exact up to 10,000 pairs of scores, else by the limiting law, which errs on the large side).
 * @choices item "mean shift" "Welch t" "Welch p-value" "ratio of variances" "Brown-Forsythe p-value" "Kolmogorov-Smirnov distance" "Kolmogorov-Smirnov p-value"
 * @question Are this year's scores like last year's?
 * @question Does the mark still fit the new entries?
 * @example =WEIR.DRIFT_COMPARISON({1;2;3},{4;5;6;7},"Kolmogorov-Smirnov p-value") => 0.05714285714285714
 * @example =WEIR.DRIFT_COMPARISON({1;2;3},{4;5;6;7},"mean shift") => 3.5
 */
export function DRIFT_COMPARISON(baseline: any[][], recent: any[][], item?: any): any {
  requireItem(COMPARISON_LABELS, item);
  const before = readScores("baseline", baseline).sample;
  const after = readScores("recent", recent).sample;
  const { welch, varianceRatio, brownForsythe, smirnov } = driftComparison(before, after);
  const values = [
    welch.shift,
    welch.t,
    welch.pValue,
    varianceRatio,
    brownForsythe.pValue ?? "",
    smirnov.distance,
    smirnov.pValue,
  ];
  return labelTable(
    COMPARISON_LABELS.map((label, i) => [label, values[i]]),
    item,
  );
}
