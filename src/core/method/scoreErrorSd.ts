import { requirePositive, requireProbability } from "../domain";

/**
 * The standard error of a score: sd·√(1 − reliability), sd that of the scores.
 *
 * Domain     sd > 0; reliability 0 … 1.
 * Edges      reliability 1 gives 0, 0 gives sd.
 * Reference  Lord & Novick (1968), Statistical Theories of Mental Test Scores, ch. 3.
 *
 * @throws {DomainError} if an argument is outside its domain.
 */
export function scoreErrorSd(sd: number, reliability: number): number {
  requirePositive("sd", sd);
  requireProbability("reliability", reliability);
  return sd * Math.sqrt(1 - reliability);
}
