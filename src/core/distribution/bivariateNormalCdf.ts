import { DomainError, requireReal } from "../domain";
import { bivariateNormalLower } from "../special/bivariateNormalLower";
import { normalBetween } from "../special/normalBetween";
import { normalTail } from "../special/normalTail";

/**
 * P(X ≤ h, Y ≤ k) for standard normal X and Y with correlation rho.
 *
 * Domain     h, k any numbers; rho in [−1, 1].
 * Edges      h or k −∞ gives 0, ∞ leaves the other's Φ; rho = 1 gives Φ(min(h, k)), rho = −1 gives P(−k < Z < h).
 * Method     bivariateNormalLower.ts.
 * Accuracy   1e-13 relative, 1e-12 below 1e-100; test/core/distribution/bivariateNormal.test.ts.
 * Reference  Plackett (1954), A reduction formula for normal multivariate integrals, Biometrika 41.
 *
 * @throws {DomainError} if an argument is outside its domain.
 */
export function bivariateNormalCdf(h: number, k: number, rho: number): number {
  requireReal("h", h);
  requireReal("k", k);
  if (!(rho >= -1 && rho <= 1)) throw new DomainError("rho", rho, "a number from -1 to 1");
  // What lies beyond 40 is below the smallest number.
  if (Math.min(h, k) < -40) return 0;
  if (rho === 1 || Math.max(h, k) > 40) return normalTail(-Math.min(h, k));
  return rho === -1 ? normalBetween(-k, h) : bivariateNormalLower(h, k, rho);
}
