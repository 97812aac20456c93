import { noncentralTUpperTailQuantile } from "./noncentralTUpperTailQuantile";

/**
 * The t with P(T ≤ t) = p for T = (Z + ncp)/√(χ²/df), the noncentral t distribution.
 *
 * Domain     p in [0, 1]; df from 1 to 1e15, ∞ is the normal with mean ncp; |ncp| at most 1000·√df.
 * Edges      0 gives −∞, 1 gives ∞.
 * Method     The mirror image of the upper-tail quantile, −T with −ncp.
 * Accuracy   1e-13 relative (next to t = 0: of 1); test/core/distribution/noncentralT.test.ts.
 * Reference  as noncentralTUpperTailQuantile.
 *
 * @throws {DomainError} if an argument is outside its domain.
 */
export function noncentralTQuantile(p: number, df: number, ncp: number): number {
  return 0 - noncentralTUpperTailQuantile(p, df, 0 - ncp);
}
