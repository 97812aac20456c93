import { cutoffErrorRates } from "../core/method/cutoffErrorRates";
import { MARK_METHODS } from "../core/method/markFactor";
import { trueTopAmongPassed } from "../core/method/trueTopAmongPassed";
import { worthAmongPassed } from "../core/method/worthAmongPassed";
import { readBetween, readCount, readFraction, readWord } from "../sheet/readArgument";
import { labelTable, requireItem } from "../sheet/tables";

const ERROR_RATES = ["average passing fraction", "passed but not truly top", "truly top but missed"];

/**
 * Says how often a mark set from so many scores passes the wrong entries and misses the right ones, before a single one is scored.
 *
 * The mark is meant to pass the top fraction of a normal curve and is only an estimate, so it stands somewhat too low or too high. The
 * rates are averages over all samples of this count: the fraction that really passes; the share of all that pass who are not in the true
 * top fraction; the share of the true top fraction that is missed. Errors of the score itself are not counted: see TRUE_TOP_AMONG_PASSED.
 *
 * @customfunction CUTOFF_ERROR_RATES
 * @param {any} count Scores that the mark is set from, a whole number of at least 2.
 * @param {any} fraction Fraction meant to pass, between 0 and 1 (from 1e-100 on).
 * @param {any} [method] How the mark is set: "plain" (default, TOP_FRACTION_CUTOFF), "safe" (SAFE_CUTOFF) or "next" (NEXT_SCORE_CUTOFF).
 * @param {any} [confidence] Confidence of the safe mark, between 0 and 1; left out: 95%. The other methods don't use it.
 * @param {any} [item] One label alone, such as "truly top but missed". Left out: the whole table.
 * @returns {any[][]} Two columns, label and value: average passing fraction, passed but not truly top, truly top but missed.
 * @choices method "plain" "safe" "next"
 * @choices item "average passing fraction" "passed but not truly top" "truly top but missed"
 * @caution Averages over samples: the mark that you have set may do better or worse.
 * @caution The plain mark lets through more than the fraction in nearly half of all samples.
 * @caution Where entries are people, a cutoff is no decision: groups can be hit unequally, and local law and licensed practice come first.
 * @question How many wrong entries will pass because the mark is only an estimate?
 * @question How many good ones do I lose with the safe mark?
 * @example =WEIR.CUTOFF_ERROR_RATES(30,5%) => [["average passing fraction",0.05823320769435],["passed but not truly top",0.28262989535718114],["truly top but missed",0.16450475405234324]]
 */
export function CUTOFF_ERROR_RATES(count: any, fraction: any, method?: any, confidence?: any, item?: any): any {
  const scores = readCount("count", count, 2);
  const top = readFraction("fraction", fraction);
  const how = readWord("method", method, MARK_METHODS, "plain");
  const level = readFraction("confidence", confidence, 0.95);
  requireItem(ERROR_RATES, item);
  const { passingFraction, passedNotTop, topMissed } = cutoffErrorRates(scores, top, how, level);
  const values = [passingFraction, passedNotTop, topMissed];
  return labelTable(
    ERROR_RATES.map((label, index) => [label, values[index]]),
    item,
  );
}

/**
 * Says what share of those passed on a score truly belong to the top, when the score is only correlated with true worth.
 *
 * Takes score and worth as bivariate normal. Validity is their correlation among all entries: SCORE_VALIDITY estimates it. Taylor and
 * Russell 1939.
 *
 * @customfunction TRUE_TOP_AMONG_PASSED
 * @param {any} true_fraction Fraction of all entries that is truly good enough, between 0 and 1.
 * @param {any} pass_fraction Fraction of all entries that is passed on the score, between 0 and 1.
 * @param {any} validity Correlation of the score with true worth among all entries, from -1 to 1.
 * @returns {any} The share, 0 to 1.
 * @caution A correlation found among those already selected is too low for all entries: correct it first (SCORE_VALIDITY, unselected_sd).
 * @caution Where entries are people, the share is no judgement of any one of them: groups can be hit unequally, and local law and licensed practice come first.
 * @question How many of those I pass will really turn out good?
 * @example =WEIR.TRUE_TOP_AMONG_PASSED(0.5,0.2,0.5) => 0.7821235833385749
 * @example =WEIR.TRUE_TOP_AMONG_PASSED(0.3,0.6,1) => 0.5
 */
export function TRUE_TOP_AMONG_PASSED(true_fraction: any, pass_fraction: any, validity: any): any {
  return trueTopAmongPassed(
    readFraction("true_fraction", true_fraction),
    readFraction("pass_fraction", pass_fraction),
    readBetween("validity", validity, -1, 1),
  ).share;
}

/**
 * Gives the mean true worth of those passed on a score, in standard deviations of worth above the mean of all.
 *
 * Takes the score as normal and worth as linear in it. Times the standard deviation of worth in money it is what selecting brings an entry.
 * Naylor and Shine 1965.
 *
 * @customfunction WORTH_AMONG_PASSED
 * @param {any} pass_fraction Fraction of all entries that is passed on the score, between 0 and 1.
 * @param {any} validity Correlation of the score with true worth among all entries, from -1 to 1.
 * @returns {any} Mean worth in standard units; 0 is that of all entries.
 * @caution A correlation found among those already selected is too low for all entries: correct it first (SCORE_VALIDITY, unselected_sd).
 * @caution Where entries are people, a mean says nothing of any one of them: local law and licensed practice come first.
 * @question How much better are those passed than all that came?
 * @example =WEIR.WORTH_AMONG_PASSED(20%,0.5) => 0.6999048010195208
 */
export function WORTH_AMONG_PASSED(pass_fraction: any, validity: any): any {
  return worthAmongPassed(readFraction("pass_fraction", pass_fraction), readBetween("validity", validity, -1, 1))
    .meanWorth;
}
