import { requireReal } from "../domain";
import { normalTail } from "../special/normalTail";

/**
 * P(Z > x) for a standard normal Z.
 *
 * Domain     x any number.
 * Edges      −∞ gives 1, ∞ gives 0.
 * Method     normalTail.ts.
 * Accuracy   1e-15 relative down to 1e-307; test/core/distribution/normal.test.ts.
 * Reference  Cody (1969), Math. Comp. 23.
 *
 * @throws {DomainError} if an argument is outside its domain.
 */
export function normalUpperTail(x: number): number {
  requireReal("x", x);
  return normalTail(x);
}
