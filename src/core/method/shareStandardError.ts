import { requireCount, requireProbability } from "../domain";

/**
 * The standard error of a share counted over independent runs: √(share(1 − share)/runs).
 *
 * Domain     share in [0, 1]; runs a whole number from 1.
 * Edges      a share of 0 or 1 gives 0: the runs have shown no other outcome, which is no proof that there is none.
 * Accuracy   a few roundings; test/core/method/shareStandardError.test.ts.
 * Reference  Cramér (1946), Mathematical Methods of Statistics, 16.4: the variance of a binomial share.
 *
 * @throws {DomainError} if an argument is outside its domain.
 */
export function shareStandardError(share: number, runs: number): number {
  requireProbability("share", share);
  requireCount("runs", runs, 1);
  return Math.sqrt((share * (1 - share)) / runs);
}
