import { studentTUpperTailQuantile } from "./studentTUpperTailQuantile";

/**
 * The t with P(T ≤ t) = p for Student's t with `df` degrees of freedom.
 *
 * Domain     p in [0, 1]; df from 0.001 to 1e15, not only whole; df = ∞ is the standard normal.
 * Edges      0 gives −∞, 1 gives ∞, ½ gives 0.
 * Method     The mirror image of the upper-tail quantile.
 * Accuracy   1e-13 relative; test/core/distribution/studentT.test.ts.
 * Reference  as studentTUpperTailQuantile.
 *
 * @throws {DomainError} if an argument is outside its domain.
 */
export function studentTQuantile(p: number, df: number): number {
  return 0 - studentTUpperTailQuantile(p, df);
}
