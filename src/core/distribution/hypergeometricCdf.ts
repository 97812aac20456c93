import { hypergeometricLower } from "../special/hypergeometricLower";
import { requireHypergeometric } from "./hypergeometricChecks";

/**
 * P(X ≤ k), X the good ones among `drawn` taken without return from a pool that holds `good` of them.
 *
 * Domain     k whole; pool whole, 0 … 2e12 (1e-13 to 1e9); good and drawn whole, 0 … pool.
 * Edges      a k below what can occur gives 0, at or above the most gives 1.
 * Method     hypergeometricLower.ts: sums the smaller tail, about 8 standard deviations of steps.
 * Accuracy   1e-13 relative down to 1e-100; test/core/distribution/hypergeometric.test.ts.
 * Reference  Wu (1993), ACM TOMS 19.
 *
 * @throws {DomainError} if an argument is outside its domain.
 */
export function hypergeometricCdf(k: number, pool: number, good: number, drawn: number): number {
  requireHypergeometric(k, pool, good, drawn);
  return hypergeometricLower(k, pool, good, drawn);
}
