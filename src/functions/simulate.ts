import { MARK_METHODS } from "../core/method/markFactor";
import { requireCellWork } from "../core/method/searchPlan";
import { playSearches } from "../core/method/simulateSearch";
import { readCount, readFraction, readNumber, readPositive, readWord } from "../sheet/readArgument";
import { labelTable, requireItem } from "../sheet/tables";

const LABELS = [
  "average looks",
  "median looks",
  "90th percentile looks",
  "first hit not truly top",
  "found nothing",
  "lowest passing fraction",
  "highest passing fraction",
] as const;

/**
 * Plays a whole search out many times: learn on some scores, set the mark, look until the first entry passes, and count.
 *
 * Each run draws its own learning scores from the curve, so the table shows what an estimated mark does, good luck and bad. Looks are
 * searching looks; a run that finds nothing counts most_looks. The 5th and 95th percentiles of the fraction that the mark really lets
 * through close the table. Mean and sd name the curve; none of these numbers depends on them. Longer simulations run in the pane.
 *
 * @customfunction SIMULATED_SEARCH
 * @param {any} mean The mean of the curve from which scores come.
 * @param {any} sd Its standard deviation, above 0.
 * @param {any} fraction The share of entries that is truly top and that the mark aims at, between 0 and 1.
 * @param {any} learn_count How many scores are learnt on before the mark is set: a whole number from 2.
 * @param {any} [method] How the mark is set: "plain" (default), "safe" (with confidence 0.95 no more than the fraction passes) or "next" (the next score passes with just this chance).
 * @param {any} [runs] How many times to play: a whole number. runs × (learn_count + the smaller of most_looks and 3/fraction) at most 20 million. Default 10000.
 * @param {any} [seed] A whole number from 0: the same seed plays the same runs. Default 1.
 * @param {any} [most_looks] Looks after which a run gives up: a whole number from 1. Default 10000.
 * @param {any} [item] One label alone, such as "median looks". Left out: the whole table.
 * @returns {any[][]} Two columns, label and value: average, median and 90th percentile of the looks; the share of finds that were not truly top (empty where no run found one); the share of runs that found nothing; the passing fractions below and above which 5 % of the marks fell.
 * @choices method "plain" "safe" "next"
 * @choices item "average looks" "median looks" "90th percentile looks" "first hit not truly top" "found nothing" "lowest passing fraction" "highest passing fraction"
 * @caution The average hinges on most_looks when learn_count is small, because some marks come out so high that almost nothing passes: read the median.
 * @caution "first hit not truly top" counts one pass a run; CUTOFF_ERROR_RATES counts all passes.
 * @caution It is a simulation: the last digits shown are chance, and another seed gives others.
 * @question How would this search go if I tried it out many times?
 * @example =WEIR.SIMULATED_SEARCH(60,8,99.99%,1000,,1,1,1,"average looks") => 1
 */
export function SIMULATED_SEARCH(
  mean: any,
  sd: any,
  fraction: any,
  learn_count: any,
  method?: any,
  runs?: any,
  seed?: any,
  most_looks?: any,
  item?: any,
): any {
  readNumber("mean", mean);
  readPositive("sd", sd);
  const plan = {
    fraction: readFraction("fraction", fraction),
    learnCount: readCount("learn_count", learn_count, 2),
    method: readWord("method", method, MARK_METHODS, "plain"),
    runs: readCount("runs", runs, 1, undefined, 10_000),
    seed: readCount("seed", seed, 0, undefined, 1),
    mostLooks: readCount("most_looks", most_looks, 1, undefined, 10_000),
  };
  requireItem(LABELS, item);
  requireCellWork(plan);
  const played = playSearches(plan);
  const values = [
    played.averageLooks,
    played.medianLooks,
    played.ninetiethLooks,
    played.firstHitNotTop ?? "",
    played.foundNothing,
    played.lowestPassing,
    played.highestPassing,
  ];
  return labelTable(
    LABELS.map((label, i) => [label, values[i]]),
    item,
  );
}
