import { requireReal } from "../domain";
import { requireNoncentral } from "./noncentralTChecks";
import { normalCdf } from "./normalCdf";
import { noncentralTTails } from "../special/noncentralTTails";

/**
 * P(T ≤ x) for T = (Z + ncp)/√(χ²/df), the noncentral t distribution.
 *
 * Domain     x any number; df from 1 to 1e15, ∞ is the normal with mean ncp; |ncp| at most 1000·√df.
 * Edges      −∞ gives 0, ∞ gives 1.
 * Method     noncentralTTails.ts.
 * Accuracy   1e-13 relative down to 1e-100; test/core/distribution/noncentralT.test.ts.
 * Reference  Witkovský (2013), arXiv 1306.5294.
 *
 * @throws {DomainError} if an argument is outside its domain.
 */
export function noncentralTCdf(x: number, df: number, ncp: number): number {
  requireReal("x", x);
  requireNoncentral(df, ncp);
  if (df === Infinity) return normalCdf(x - ncp);
  if (!Number.isFinite(x)) return x > 0 ? 1 : 0;
  const { isLower, tail } = noncentralTTails(x, df, ncp);
  return isLower ? tail : 1 - tail;
}
