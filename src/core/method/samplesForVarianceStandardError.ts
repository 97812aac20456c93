import { requireFraction } from "../domain";
import { requireReachable } from "./requireReachable";

/**
 * The smallest number of normal scores whose variance has at most this relative standard error: √(2/(n − 1)) ≤ relative_error.
 *
 * Domain     relative_error in (0, 1).
 * Edges      an error met on paper counts as met: 20 % gives exactly 51, though 2/0.2² comes out just above or below 50.
 * Method     n = 1 + ⌈2/relative_error²⌉ with a guard of two roundings.
 * Accuracy   exact up to 1e15 scores; test/core/method/samplesForSdPrecision.test.ts.
 * Reference  the variance of s² is 2σ⁴/(n − 1): Cramér (1946), Mathematical Methods of Statistics, 27.4.
 *
 * @throws {DomainError} naming relative_error; {NoAnswerError} if no number of scores that a number can hold is enough.
 */
export function samplesForVarianceStandardError(relativeError: number): { count: number; degrees: number } {
  requireFraction("relative_error", relativeError);
  const degrees = Math.ceil((2 / (relativeError * relativeError)) * (1 - 2 ** -51));
  return { count: requireReachable("relative_error", relativeError, degrees + 1), degrees };
}
