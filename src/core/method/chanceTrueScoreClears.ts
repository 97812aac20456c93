import { DomainError, requireFinite, requirePositive } from "../domain";
import { normalUpperTail } from "../distribution/normalUpperTail";
import { directionOf, type Better } from "./better";

export interface TrueScoreChance {
  /** Share of a score's distance from the mean that is kept: trueSd²/(trueSd² + errorSd²). */
  readonly reliability: number;
  readonly expectedTrue: number;
  /** What remains unknown of the true score once the score is seen. */
  readonly remainingSd: number;
  readonly standardGap: number;
  readonly chance: number;
}

/**
 * P(true ≥ limit | score), true scores normal with this mean and trueSd, score = true + normal error: the upper tail of the normal with
 * mean + reliability·(score − mean) and sd trueSd·errorSd/√(trueSd² + errorSd²). With "low" P(true ≤ limit | score).
 *
 * Domain     score, limit, mean finite; errorSd, trueSd > 0.
 * Method     Closed form; the expected true score is reckoned from whichever of score and mean it is nearer to.
 * Accuracy   relative error ≤ 1e-13 for a gap below 5 (test/core/method/guardedCutoff.test.ts).
 * Reference  JCGM 106:2012, Evaluation of measurement data – The role of measurement uncertainty in conformity assessment, 7.
 *
 * @throws {DomainError} if an argument is outside its domain.
 */
export function chanceTrueScoreClears(
  score: number,
  limit: number,
  errorSd: number,
  mean: number,
  trueSd: number,
  better: Better = "high",
): TrueScoreChance {
  requireFinite("score", score);
  requireFinite("limit", limit);
  requirePositive("error_sd", errorSd);
  requireFinite("mean", mean);
  requirePositive("true_sd", trueSd);
  const scoreSd = Math.hypot(errorSd, trueSd);
  const reliability = (trueSd / scoreSd) ** 2;
  const expectedTrue =
    errorSd < trueSd ? score - (errorSd / scoreSd) ** 2 * (score - mean) : mean + reliability * (score - mean);
  const remainingSd = trueSd * (errorSd / scoreSd);
  const standardGap = (directionOf(better) * (limit - expectedTrue)) / remainingSd;
  // Next to the ends of the range of numbers the gap is 0/0 or ∞/∞.
  if (Number.isNaN(standardGap)) throw new DomainError("error_sd", errorSd, "nearer in size to true_sd and the scores");
  return { reliability, expectedTrue, remainingSd, standardGap, chance: normalUpperTail(standardGap) };
}
