import { requireShape, requireProbability } from "../domain";
import { gammaInverse } from "../special/gammaInverse";

/**
 * The x with P(X ≤ x) = p for a gamma variable of this shape and scale 1.
 *
 * Domain     p in [0, 1]; shape from 0.001 to 1e15.
 * Edges      0 gives 0, 1 gives ∞.
 * Method     gammaInverse.ts.
 * Accuracy   1e-13 relative; test/core/distribution/gamma.test.ts.
 * Reference  Gil, Segura & Temme (2012), SIAM J. Sci. Comput. 34.
 *
 * @throws {DomainError} if an argument is outside its domain.
 */
export function gammaQuantile(p: number, shape: number): number {
  requireProbability("p", p);
  requireShape("shape", shape);
  return gammaInverse(p, 1 - p, shape);
}
