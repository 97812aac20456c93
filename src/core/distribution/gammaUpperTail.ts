import { requireShape, requireReal } from "../domain";
import { gammaQ } from "../special/gammaQ";

/**
 * P(X > x) for a gamma variable of this shape and scale 1.
 *
 * Domain     x any number; shape from 0.001 to 1e15.
 * Edges      x ≤ 0 gives 1, ∞ gives 0.
 * Method     The regularised incomplete gamma function Q (gammaTails.ts).
 * Accuracy   1e-13 relative down to 1e-100; test/core/distribution/gamma.test.ts.
 * Reference  Gil, Segura & Temme (2012), SIAM J. Sci. Comput. 34.
 *
 * @throws {DomainError} if an argument is outside its domain.
 */
export function gammaUpperTail(x: number, shape: number): number {
  requireReal("x", x);
  requireShape("shape", shape);
  return gammaQ(Math.max(x, 0), shape);
}
