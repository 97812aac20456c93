import { requireReal } from "../domain";
import { normalTail } from "../special/normalTail";

/**
 * P(Z ≤ x) for a standard normal Z.
 *
 * Domain     x any number.
 * Edges      −∞ gives 0, ∞ gives 1.
 * Method     The upper tail of −x, so that a small result keeps its digits (normalTail.ts).
 * Accuracy   1e-15 relative down to 1e-307; test/core/distribution/normal.test.ts.
 * Reference  Cody (1969), Math. Comp. 23.
 *
 * @throws {DomainError} if an argument is outside its domain.
 */
export function normalCdf(x: number): number {
  requireReal("x", x);
  return normalTail(-x);
}
