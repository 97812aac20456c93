import { requireShape, requireProbability } from "../domain";
import { gammaInverse } from "../special/gammaInverse";

/**
 * The x with P(X ≤ x) = p for a chi-square variable with `df` degrees of freedom.
 *
 * Domain     p in [0, 1]; df from 0.001 to 1e15, not only whole.
 * Edges      0 gives 0, 1 gives ∞.
 * Method     Twice the gamma quantile of shape df/2 (gammaInverse.ts).
 * Accuracy   1e-13 relative; test/core/distribution/chiSquare.test.ts.
 * Reference  Gil, Segura & Temme (2012), SIAM J. Sci. Comput. 34.
 *
 * @throws {DomainError} if an argument is outside its domain.
 */
export function chiSquareQuantile(p: number, df: number): number {
  requireProbability("p", p);
  requireShape("df", df);
  return 2 * gammaInverse(p, 1 - p, df / 2);
}
