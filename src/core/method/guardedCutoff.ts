import { NoAnswerError, requireFinite, requireFraction, requirePositive } from "../domain";
import { normalCdf } from "../distribution/normalCdf";
import { normalUpperTailQuantile } from "../distribution/normalUpperTailQuantile";
import { findRoot } from "../numeric/findRoot";
import { directionOf, type Better } from "./better";
import { representable } from "./representable";
import { wrongPassRisk } from "./wrongPassRisk";

export interface GuardedCutoff {
  readonly scoreSd: number;
  /** Share of all entries that are truly short of the limit: the risk without any mark. */
  readonly riskWithoutMark: number;
  /** The mark in standard deviations of the scores from their mean, counted in the direction of better. */
  readonly standardMark: number;
  readonly cutoff: number;
}

/**
 * The smallest mark A with P(true < limit | score ≥ A) ≤ maxWrong, true scores normal with this mean and trueSd, score = true + normal
 * error of errorSd; with "low" the largest A with P(true > limit | score ≤ A) ≤ maxWrong.
 *
 * Domain     limit, mean finite; errorSd, trueSd > 0; 0 < maxWrong < 1.
 * Edges      no answer where the risk is met without any mark.
 * Method     The risk falls as the mark rises (monotone likelihood ratio), so there is one root. It lies above −40, where the mark
 *            lets everyone pass, and below the score at which the chance of being short is maxWrong itself, since those above it are safer.
 * Accuracy   relative error of the mark's distance from the mean ≤ 1e-12 (test/core/method/guardedCutoff.test.ts).
 * Reference  JCGM 106:2012, 9 (there the joint risks; this is the conditional one).
 *
 * @throws {DomainError} if an argument is outside its domain. @throws {NoAnswerError} where no mark is needed.
 */
export function guardedCutoff(
  limit: number,
  errorSd: number,
  mean: number,
  trueSd: number,
  maxWrong = 0.05,
  better: Better = "high",
): GuardedCutoff {
  requireFinite("limit", limit);
  requirePositive("error_sd", errorSd);
  requireFinite("mean", mean);
  requirePositive("true_sd", trueSd);
  requireFraction("max_wrong", maxWrong);
  const sign = directionOf(better);
  const scoreSd = Math.hypot(errorSd, trueSd);
  const standardLimit = representable("true_sd", trueSd, (sign * (limit - mean)) / trueSd);
  const riskWithoutMark = normalCdf(standardLimit);
  if (riskWithoutMark <= maxWrong * (1 + 1e-12)) {
    const message = `max_wrong of ${maxWrong} is met without any mark: only ${riskWithoutMark.toPrecision(3)} of all entries are truly short of the limit.`;
    throw new NoAnswerError("max_wrong", message);
  }
  // An error below 1e-15 of the true spread is none to the last digit of the mark.
  const slope = Math.min(trueSd / errorSd, 1e15);
  const need = representable("limit", limit, standardLimit * Math.hypot(1, slope));
  const safe = (need + normalUpperTailQuantile(maxWrong)) / slope;
  const above = representable("error_sd", errorSd, safe + 1 + 1e-6 * Math.abs(safe));
  const standardMark = findRoot((a) => Math.log(wrongPassRisk(a, slope, need) / maxWrong), -40, above);
  return {
    scoreSd,
    riskWithoutMark,
    standardMark,
    cutoff: representable("error_sd", errorSd, mean + sign * scoreSd * standardMark),
  };
}
