import { DomainError } from "../core/domain";
import { tailFraction } from "../core/method/tailFraction";
import { andersonDarling, LEAST_FOR_ANDERSON_DARLING } from "../core/sample/andersonDarling";
import { extremeDeviates, LEAST_FOR_OUTLIERS } from "../core/sample/extremeDeviates";
import { fitCurve } from "../core/sample/fitCurve";
import { NORMAL } from "../core/sample/shape";
import { SHAPIRO_WILK_LEAST, SHAPIRO_WILK_MOST, shapiroWilk } from "../core/sample/shapiroWilk";
import { mapEach } from "../sheet/each";
import { readBetter, readCount, readFraction, readNumber, readPositive, readWord } from "../sheet/readArgument";
import { readScores } from "../sheet/readScores";
import { readShape } from "../sheet/readShape";
import { labelTable, requireItem } from "../sheet/tables";

const CHECK = ["statistic", "p-value", "scores used"] as const;

/**
 * Tests whether a score column can have come from a normal curve.
 *
 * A small p-value says that it hardly can. A large one does not prove a normal curve, least of all with few scores.
 *
 * @customfunction NORMALITY_CHECK
 * @param {any[][]} scores The score column; blank cells are skipped. 3 to 5000 numbers for "shapiro-wilk", at least 8 for "anderson-darling".
 * @param {any} [test] "shapiro-wilk" (left out) or "anderson-darling".
 * @param {any} [item] One label alone: "statistic", "p-value" or "scores used". Left out: the whole table.
 * @returns {any[][]} Two columns, label and value: statistic (W or A²), p-value, scores used. #N/A with too few scores.
 * @choices test "shapiro-wilk" "anderson-darling"
 * @choices item "statistic" "p-value" "scores used"
 * @caution With thousands of scores a harmless departure gives a tiny p-value: look at the picture too.
 * @question Are my scores normally distributed?
 * @example =WEIR.NORMALITY_CHECK({148;154;158;160;161;162;166;170;182;195;236},,"statistic") => 0.788815
 */
export function NORMALITY_CHECK(scores: any[][], test?: any, item?: any): any {
  const wanted = readWord("test", test, ["shapiro-wilk", "anderson-darling"], "shapiro-wilk");
  requireItem(CHECK, item);
  const royston = wanted === "shapiro-wilk";
  const { sample } = readScores("scores", scores, royston ? SHAPIRO_WILK_LEAST : LEAST_FOR_ANDERSON_DARLING);
  const { count } = fitCurve("scores", sample, NORMAL);
  if (royston && count > SHAPIRO_WILK_MOST) {
    const came = `${count} were given: take "anderson-darling"`;
    throw new DomainError("scores", count, `at most ${SHAPIRO_WILK_MOST} numbers for "shapiro-wilk"`, came);
  }
  const { statistic, pValue } = royston ? shapiroWilk(sample) : andersonDarling(sample);
  const values = [statistic, pValue, count];
  return labelTable(
    CHECK.map((label, i) => [label, values[i]] as const),
    item,
  );
}

/**
 * Flags the scores that stand too far out to belong to the rest.
 *
 * The generalised ESD test of Rosner (1983) takes away the furthest score up to most times, so that outliers cannot hide one another.
 * Two-sided, on the scale of the shape: prices are often lognormal. Equal scores share a flag.
 *
 * @customfunction OUTLIER_FLAGS
 * @param {any[][]} scores The score column; blank cells are skipped. At least 10 numbers.
 * @param {any} [most] The largest number of outliers to look for, from 1 to 2 fewer than the scores; left out: a tenth of the scores, at least 1.
 * @param {any} [alpha] Chance of a false alarm where there is no outlier, between 0 and 1; left out: 5%.
 * @param {any} [shape] "normal" (left out), "lognormal", "logit(low,high)", "boxcox" or "boxcox(power)".
 * @returns {any[][]} The shape of scores: TRUE for an outlier, FALSE else, blank for a blank cell. #N/A below 10 scores.
 * @caution Below 25 scores a flag is a hint: Rosner's approximation is good from 25 scores and tolerable from 15.
 * @caution A flag is a reason to look an entry up, not to leave it out.
 * @question Which scores are outliers or typing errors?
 * @example =WEIR.OUTLIER_FLAGS({9;10;10;10;11;11;11;12;12;60}) => [[false],[false],[false],[false],[false],[false],[false],[false],[false],[true]]
 */
export function OUTLIER_FLAGS(scores: any[][], most?: any, alpha?: any, shape?: any): any[][] {
  const chance = readFraction("alpha", alpha, 0.05);
  const wanted = readShape(shape);
  const { sample } = readScores("scores", scores, LEAST_FOR_OUTLIERS);
  const limit = readCount("most", most, 1, undefined, Math.max(1, Math.floor(sample.count / 10)));
  const { scaled, toScale } = fitCurve("scores", sample, wanted);
  const { lowest, highest } = extremeDeviates(scaled, limit, chance);
  return mapEach("scores", scores, (score) => toScale(score) <= lowest || toScale(score) >= highest);
}

/**
 * Gives the fraction of a normal curve at or beyond a cutoff, for each cutoff of a range.
 *
 * With better "low" it is the fraction at or below. Takes mean and standard deviation as the true ones.
 *
 * @customfunction TAIL_FRACTION
 * @param {any[][]} cutoff A cutoff, or a range of them; blank cells stay blank.
 * @param {any} mean Mean of the curve.
 * @param {any} sd Standard deviation of the curve, above 0.
 * @param {any} [better] "high" (left out) where higher scores are better, "low" for prices and the like.
 * @returns {any[][]} A fraction between 0 and 1 for each cutoff, in the shape of cutoff.
 * @choices better "high" "low"
 * @caution With an estimated mean and spread the true fraction may be quite another: CUTOFF_PRECISION tells by how much.
 * @question What share of all entries scores 83 or more?
 * @example =WEIR.TAIL_FRACTION(83,70,8) => 0.05208127941521955
 * @example =WEIR.TAIL_FRACTION(12,30,6,"low") => 0.0013498980316300946
 */
export function TAIL_FRACTION(cutoff: any[][], mean: any, sd: any, better?: any): any[][] {
  const centre = readNumber("mean", mean);
  const spread = readPositive("sd", sd);
  const direction = readBetter(better);
  return mapEach("cutoff", cutoff, (mark) => tailFraction(mark, centre, spread, direction).fraction);
}
