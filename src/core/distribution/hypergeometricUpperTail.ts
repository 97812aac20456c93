import { hypergeometricLower } from "../special/hypergeometricLower";
import { requireHypergeometric } from "./hypergeometricChecks";

/**
 * P(X ≥ k), X the good ones among `drawn` taken without return from a pool that holds `good` of them; k itself included.
 *
 * Domain     k whole; pool whole, 0 … 2e12 (1e-13 to 1e9); good and drawn whole, 0 … pool.
 * Edges      a k at or below the least that can occur gives 1, above the most gives 0.
 * Method     P(drawn − X ≤ drawn − k), the bad ones drawn: hypergeometricLower.ts.
 * Accuracy   1e-13 relative down to 1e-100; test/core/distribution/hypergeometric.test.ts.
 * Reference  Wu (1993), ACM TOMS 19.
 *
 * @throws {DomainError} if an argument is outside its domain.
 */
export function hypergeometricUpperTail(k: number, pool: number, good: number, drawn: number): number {
  requireHypergeometric(k, pool, good, drawn);
  return hypergeometricLower(drawn - k, pool, pool - good, drawn);
}
