import { passingFractionLimits } from "../core/method/passingFractionLimits";
import { samplesForCutoffPrecision } from "../core/method/samplesForCutoffPrecision";
import { samplesForMeanPrecision } from "../core/method/samplesForMeanPrecision";
import { samplesForSdPrecision, samplesForVariancePrecision } from "../core/method/samplesForSdPrecision";
import { samplesForVarianceStandardError } from "../core/method/samplesForVarianceStandardError";
import { sdPrecision } from "../core/method/sdPrecision";
import { isBlank } from "../sheet/cell";
import { readCount, readFlag, readFraction, readPositive } from "../sheet/readArgument";
import { labelTable, requireItem } from "../sheet/tables";

/**
 * Says how many entries to score first so that their standard deviation is known to within a percentage of the true one.
 *
 * The standard deviation from n scores then lies within plus or minus precision of the true one with this confidence. Takes the scores as
 * normal and independent. Greenwood and Sandomire 1950.
 *
 * @customfunction SAMPLES_FOR_SD_PRECISION
 * @param {any} precision Allowed relative deviation, between 0 and 1: 10% means within a tenth either way.
 * @param {any} [confidence] Between 0 and 1; left out: 95%.
 * @returns {any} The smallest number of scores, at least 2. #N/A where no number of scores is enough.
 * @caution With heavy tails or a mixture of suppliers or groups the same precision takes more scores.
 * @question How many entries must I score before I can trust the spread of the scores?
 * @question What sample size estimates a standard deviation within 10 percent?
 * @example =WEIR.SAMPLES_FOR_SD_PRECISION(10%) => 193
 * @example =WEIR.SAMPLES_FOR_SD_PRECISION(25%,99%) => 54
 */
export function SAMPLES_FOR_SD_PRECISION(precision: any, confidence?: any): any {
  const allowed = readFraction("precision", precision);
  return samplesForSdPrecision(allowed, readFraction("confidence", confidence, 0.95)).count;
}

/**
 * Says how many entries to score first so that their variance is known to within a percentage of the true one.
 *
 * The same as SAMPLES_FOR_SD_PRECISION for the square of the standard deviation, which takes about four times as many scores for the same
 * percentage. Takes the scores as normal and independent.
 *
 * @customfunction SAMPLES_FOR_VARIANCE_PRECISION
 * @param {any} precision Allowed relative deviation of the variance, between 0 and 1.
 * @param {any} [confidence] Between 0 and 1; left out: 95%.
 * @returns {any} The smallest number of scores, at least 2. #N/A where no number of scores is enough.
 * @question How many scores fix the variance within 10 percent?
 * @example =WEIR.SAMPLES_FOR_VARIANCE_PRECISION(10%) => 769
 */
export function SAMPLES_FOR_VARIANCE_PRECISION(precision: any, confidence?: any): any {
  const allowed = readFraction("precision", precision);
  return samplesForVariancePrecision(allowed, readFraction("confidence", confidence, 0.95)).count;
}

/**
 * Says how many entries to score first so that the variance has at most this relative standard error.
 *
 * The standard error of a variance from n normal scores is the variance times the root of 2/(n - 1). A standard error of 20% takes exactly
 * 51 scores; the rounder "about 52" that goes round in the trade is common practice, no source.
 *
 * @customfunction SAMPLES_FOR_VARIANCE_STANDARD_ERROR
 * @param {any} relative_error Standard error of the variance over the variance, between 0 and 1.
 * @returns {any} The smallest number of scores. #N/A where no number of scores is enough.
 * @question How many scores give the variance a standard error of 20 percent?
 * @example =WEIR.SAMPLES_FOR_VARIANCE_STANDARD_ERROR(20%) => 51
 */
export function SAMPLES_FOR_VARIANCE_STANDARD_ERROR(relative_error: any): any {
  return samplesForVarianceStandardError(readFraction("relative_error", relative_error)).count;
}

/**
 * Says how many entries to score first so that their mean is known to within plus or minus half_width.
 *
 * With the standard deviation unknown (the rule) Student's t is used, and sd is a guess at it. Without an assurance the interval that comes
 * out is as narrow as asked only about half the time; with one it is so with at least that chance. Kupper and Hafner 1989.
 *
 * @customfunction SAMPLES_FOR_MEAN_PRECISION
 * @param {any} half_width Half the width of the interval for the mean, in score points, above 0.
 * @param {any} sd Standard deviation of the scores, above 0: a guess, or the known one.
 * @param {any} [confidence] Of the interval, between 0 and 1; left out: 95%.
 * @param {any} [sd_known] TRUE where sd is known beyond doubt; left out: FALSE.
 * @param {any} [assurance] Chance with which the interval must come out narrow enough, between 0 and 1; left out: none asked. Not with sd_known.
 * @returns {any} The smallest number of scores. #N/A where no number of scores is enough.
 * @caution Without an assurance the interval from the scores themselves comes out wider than asked about half the time.
 * @question How many entries must I score to know the average within 2 points?
 * @example =WEIR.SAMPLES_FOR_MEAN_PRECISION(2,8) => 64
 * @example =WEIR.SAMPLES_FOR_MEAN_PRECISION(2,8,95%,TRUE) => 62
 * @example =WEIR.SAMPLES_FOR_MEAN_PRECISION(2,8,95%,FALSE,90%) => 77
 */
export function SAMPLES_FOR_MEAN_PRECISION(
  half_width: any,
  sd: any,
  confidence?: any,
  sd_known?: any,
  assurance?: any,
): any {
  return samplesForMeanPrecision(
    readPositive("half_width", half_width),
    readPositive("sd", sd),
    readFraction("confidence", confidence, 0.95),
    readFlag("sd_known", sd_known, false),
    isBlank(assurance) ? undefined : readFraction("assurance", assurance),
  ).count;
}

/**
 * Says how many entries to score first so that the plain cutoff lets through a fraction between two bounds.
 *
 * The plain cutoff is the mean plus z standard deviations of the entries scored; how many of all entries it really lets through depends on
 * chance. Exact for normal, independent scores, by the noncentral t distribution.
 *
 * @customfunction SAMPLES_FOR_CUTOFF_PRECISION
 * @param {any} fraction The fraction that the cutoff is meant to let through, between 0 and 1.
 * @param {any} low_fraction The smallest fraction that is still good enough, below fraction.
 * @param {any} high_fraction The largest fraction that is still good enough, above fraction.
 * @param {any} [confidence] Between 0 and 1; left out: 90%.
 * @returns {any} The smallest number of scores, at least 2. #N/A where no number of scores is enough.
 * @caution With two very uneven bounds a larger number of scores can miss the confidence that a smaller one meets.
 * @question How many entries must I score before a top-5% mark is any good?
 * @example =WEIR.SAMPLES_FOR_CUTOFF_PRECISION(5%,2%,10%) => 44
 */
export function SAMPLES_FOR_CUTOFF_PRECISION(
  fraction: any,
  low_fraction: any,
  high_fraction: any,
  confidence?: any,
): any {
  return samplesForCutoffPrecision(
    readFraction("fraction", fraction),
    readFraction("low_fraction", low_fraction),
    readFraction("high_fraction", high_fraction),
    readFraction("confidence", confidence, 0.9),
  ).count;
}

/**
 * Says how precisely a standard deviation is known from a number of scores.
 *
 * The relative deviation from the true one that is not exceeded, either way, with this confidence. Takes the scores as normal and
 * independent.
 *
 * @customfunction SD_PRECISION
 * @param {any} count How many were scored, a whole number of at least 2.
 * @param {any} [confidence] Between 0 and 1; left out: 95%.
 * @returns {any} The precision as a fraction; above 1 where the scores are very few.
 * @question I have scored 30 entries: how well do I know the spread?
 * @example =WEIR.SD_PRECISION(30,90%) => 0.2153298573143413
 */
export function SD_PRECISION(count: any, confidence?: any): any {
  return sdPrecision(readCount("count", count, 2), readFraction("confidence", confidence, 0.95)).precision;
}

/**
 * Says which fraction the plain cutoff may really let through when it was set from a number of scores.
 *
 * The central interval, with this confidence, of the fraction of all entries that clear the mean plus z standard deviations of the scores.
 * Exact for normal, independent scores, by the noncentral t distribution.
 *
 * @customfunction CUTOFF_PRECISION
 * @param {any} count How many were scored, a whole number of at least 2.
 * @param {any} fraction The fraction that the cutoff is meant to let through, between 0 and 1.
 * @param {any} [confidence] Between 0 and 1; left out: 90%.
 * @param {any} [item] One label alone: "lowest passing fraction" or "highest passing fraction". Left out: the whole table.
 * @returns {any[][]} Two columns, label and value: lowest passing fraction, highest passing fraction.
 * @choices item "lowest passing fraction" "highest passing fraction"
 * @caution The plain mark lets through more than the fraction in nearly half of all samples: the safe cutoff is for that.
 * @question My cutoff comes from 60 scores: how many will it really let through?
 * @example =WEIR.CUTOFF_PRECISION(60,5%) => [["lowest passing fraction",0.02458571595274805],["highest passing fraction",0.09453688482369609]]
 * @example =WEIR.CUTOFF_PRECISION(60,5%,,"highest passing fraction") => 0.09453688482369609
 */
export function CUTOFF_PRECISION(count: any, fraction: any, confidence?: any, item?: any): any {
  const scored = readCount("count", count, 2);
  const wanted = readFraction("fraction", fraction);
  const sure = readFraction("confidence", confidence, 0.9);
  requireItem(["lowest passing fraction", "highest passing fraction"], item);
  const { lowest, highest } = passingFractionLimits(scored, wanted, sure);
  return labelTable(
    [
      ["lowest passing fraction", lowest],
      ["highest passing fraction", highest],
    ],
    item,
  );
}
