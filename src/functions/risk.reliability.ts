import { ratersNeeded } from "../core/method/ratersNeeded";
import { scoreReliability } from "../core/method/scoreReliability";
import { scoreValidity } from "../core/method/scoreValidity";
import { isBlank } from "../sheet/cell";
import { readFraction, readPositive } from "../sheet/readArgument";
import { readPairs } from "../sheet/readColumn";
import { readRatings } from "../sheet/readRatings";
import { headedTable, labelTable, requireItem } from "../sheet/tables";

/**
 * Says how far raters' scores can be relied on: the six intraclass correlations of a table of ratings, with confidence limits.
 *
 * Rows are entries, columns are raters, every entry rated by every rater. ICC(1,.) takes the raters of each entry as others each time,
 * ICC(2,.) as drawn at random and the same throughout, ICC(3,.) as the only ones of interest; (.,1) is one rating, (.,k) the mean of all k.
 * Limits from F; those of ICC(2,1) and ICC(2,k) are approximate. Shrout and Fleiss 1979, McGraw and Wong 1996.
 *
 * @customfunction SCORE_RELIABILITY
 * @param {any[][]} ratings Ratings without blanks: rows entries, columns raters, at least 2 of each.
 * @param {any} [confidence] Confidence of the limits, between 0 and 1; left out: 95%.
 * @returns {any[][]} A row a form: form, reliability, lower limit, upper limit; "none" where a form does not exist for these ratings. #N/A where the ratings leave no residual.
 * @caution Few entries make wide limits: read them before the reliability itself.
 * @caution Raters who agree can be wrong together: reliability is not validity.
 * @question How far do my raters agree?
 * @question Which reliability belongs to the mean of several raters?
 * @example =WEIR.SCORE_RELIABILITY({9,2,5,8;6,1,3,2;8,4,6,8;7,1,2,6;10,5,6,9;6,2,4,7}) => [["form","reliability","lower limit","upper limit"],["ICC(1,1)",0.1657417684054754,-0.13293232487475096,0.722560062328121],["ICC(2,1)",0.28976377952755905,0.018786513374712013,0.7610843696489528],["ICC(3,1)",0.7148407148407149,0.3424647650339252,0.9458582599553595],["ICC(1,k)",0.4427971336792686,-0.8844421552381198,0.9124154203407755],["ICC(2,k)",0.620050547598989,0.07113681530250336,0.9272320401677219],["ICC(3,k)",0.9093155423770695,0.6756747138163046,0.9858916781690623]]
 */
export function SCORE_RELIABILITY(ratings: any[][], confidence?: any): any[][] {
  const level = readFraction("confidence", confidence, 0.95);
  const { values, raters } = readRatings("ratings", ratings);
  return headedTable(
    ["form", "reliability", "lower limit", "upper limit"],
    scoreReliability(values, raters, level).forms.map(({ form, reliability, lower, upper }) => [
      form,
      reliability ?? "none",
      lower ?? "none",
      upper ?? "none",
    ]),
  );
}

const VALIDITY = ["pairs used", "correlation", "lower limit", "upper limit", "correlation before selection"];

/**
 * Says how far a score foretells the outcome: their correlation, with limits, and what it would be among all entries, not only those taken.
 *
 * Limits by Fisher's z, for pairs that are near bivariate normal. Outcomes are known only of those taken, whose scores spread less than
 * those of all entries, so the correlation is too low; with unselected_sd it is corrected by Thorndike's case 2. It is the validity that
 * TRUE_TOP_AMONG_PASSED and WORTH_AMONG_PASSED ask for.
 *
 * @customfunction SCORE_VALIDITY
 * @param {any[][]} scores One column of scores. Rows where either is blank are skipped; at least 4 pairs.
 * @param {any[][]} outcomes One column of outcomes, as long as scores.
 * @param {any} [confidence] Confidence of the limits, between 0 and 1; left out: 95%.
 * @param {any} [unselected_sd] Standard deviation of the scores of all entries, those not taken included, above 0; left out: no correction.
 * @param {any} [item] One label alone, such as "correlation". Left out: the whole table.
 * @returns {any[][]} Two columns, label and value: pairs used, correlation, lower limit, upper limit, correlation before selection (empty without unselected_sd).
 * @choices item "pairs used" "correlation" "lower limit" "upper limit" "correlation before selection"
 * @caution The correction holds where selection was on this score alone and the line stays straight beyond those taken.
 * @caution A correlation over people says nothing of fairness: it can differ between groups, and local law and licensed practice come first.
 * @question Did high scores really do better afterwards?
 * @example =WEIR.SCORE_VALIDITY({1;2;3;4;5},{1;2;3;5;4},,,"correlation") => 0.9
 */
export function SCORE_VALIDITY(
  scores: any[][],
  outcomes: any[][],
  confidence?: any,
  unselected_sd?: any,
  item?: any,
): any {
  const level = readFraction("confidence", confidence, 0.95);
  const before = isBlank(unselected_sd) ? undefined : readPositive("unselected_sd", unselected_sd);
  requireItem(VALIDITY, item);
  const [x, y] = readPairs("scores", scores, "outcomes", outcomes);
  const { pairs, correlation, lower, upper, beforeSelection } = scoreValidity(x, y, level, before);
  const values = [pairs, correlation, lower, upper, beforeSelection ?? ""];
  return labelTable(
    VALIDITY.map((label, index) => [label, values[index]]),
    item,
  );
}

/**
 * Says how many raters must score each entry so that their mean reaches the reliability you want.
 *
 * By Spearman and Brown, for raters as good as those that the single reliability was found with: target(1 - single)/(single(1 - target)),
 * rounded up.
 *
 * @customfunction RATERS_NEEDED
 * @param {any} single_reliability Reliability of one rater's score, between 0 and 1: ICC(.,1) of SCORE_RELIABILITY.
 * @param {any} target Reliability wanted of the mean, between 0 and 1.
 * @returns {any} The number of raters, at least 1.
 * @caution The single reliability is an estimate: try its limits too.
 * @question How many raters do I need?
 * @example =WEIR.RATERS_NEEDED(0.5,0.9) => 9
 */
export function RATERS_NEEDED(single_reliability: any, target: any): any {
  return ratersNeeded(readFraction("single_reliability", single_reliability), readFraction("target", target)).raters;
}
