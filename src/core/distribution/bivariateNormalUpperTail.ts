import { bivariateNormalCdf } from "./bivariateNormalCdf";
import { requireReal } from "../domain";

/**
 * P(X > h, Y > k) for standard normal X and Y with correlation rho.
 *
 * Domain     h, k any numbers; rho in [−1, 1].
 * Edges      h or k ∞ gives 0, −∞ leaves the other's upper tail.
 * Method     The mirror image, P(X ≤ −h, Y ≤ −k).
 * Accuracy   1e-13 relative, 1e-12 below 1e-100; test/core/distribution/bivariateNormal.test.ts.
 * Reference  as bivariateNormalCdf.
 *
 * @throws {DomainError} if an argument is outside its domain.
 */
export function bivariateNormalUpperTail(h: number, k: number, rho: number): number {
  requireReal("h", h);
  requireReal("k", k);
  return bivariateNormalCdf(-h, -k, rho);
}
