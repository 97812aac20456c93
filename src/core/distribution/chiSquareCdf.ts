import { requireShape, requireReal } from "../domain";
import { gammaP } from "../special/gammaP";

/**
 * P(X ≤ x) for a chi-square variable with `df` degrees of freedom.
 *
 * Domain     x any number; df from 0.001 to 1e15, not only whole.
 * Edges      x ≤ 0 gives 0, ∞ gives 1.
 * Method     The regularised incomplete gamma function P(df/2, x/2) (gammaTails.ts).
 * Accuracy   1e-13 relative down to 1e-100; test/core/distribution/chiSquare.test.ts.
 * Reference  Gil, Segura & Temme (2012), SIAM J. Sci. Comput. 34.
 *
 * @throws {DomainError} if an argument is outside its domain.
 */
export function chiSquareCdf(x: number, df: number): number {
  requireReal("x", x);
  requireShape("df", df);
  return gammaP(Math.max(x, 0) / 2, df / 2);
}
