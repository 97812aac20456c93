import { noncentralTCdf } from "./noncentralTCdf";

/**
 * P(T > x) for T = (Z + ncp)/√(χ²/df), the noncentral t distribution.
 *
 * Domain     x any number; df from 1 to 1e15, ∞ is the normal with mean ncp; |ncp| at most 1000·√df.
 * Edges      −∞ gives 1, ∞ gives 0.
 * Method     The lower tail of the mirror image, −T with −ncp.
 * Accuracy   1e-13 relative down to 1e-100; test/core/distribution/noncentralT.test.ts.
 * Reference  Witkovský (2013), arXiv 1306.5294.
 *
 * @throws {DomainError} if an argument is outside its domain.
 */
export function noncentralTUpperTail(x: number, df: number, ncp: number): number {
  return noncentralTCdf(-x, df, -ncp);
}
