import { hypergeometricMass } from "../special/hypergeometricMass";
import { requireHypergeometric } from "./hypergeometricChecks";

/**
 * P(X = k), X the good ones among `drawn` taken without return from a pool that holds `good` of them.
 *
 * Domain     k whole; pool whole, 0 … 2e12 (1e-13 to 1e9); good and drawn whole, 0 … pool.
 * Edges      a k that cannot occur gives 0.
 * Method     hypergeometricMass.ts.
 * Accuracy   1e-13 relative down to 1e-100; test/core/distribution/hypergeometric.test.ts.
 * Reference  Loader (2000), Fast and accurate computation of binomial probabilities.
 *
 * @throws {DomainError} if an argument is outside its domain.
 */
export function hypergeometricPmf(k: number, pool: number, good: number, drawn: number): number {
  requireHypergeometric(k, pool, good, drawn);
  if (k < Math.max(0, good + drawn - pool) || k > Math.min(good, drawn)) return 0;
  // A sure thing may come out one rounding above 1.
  return Math.min(1, hypergeometricMass(k, pool, good, drawn));
}
