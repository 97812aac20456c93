import { requireShape, requireReal } from "../domain";
import { betaTails } from "../special/betaTails";

/**
 * P(F ≤ x) for the F distribution with df1 and df2 degrees of freedom.
 *
 * Domain     x any number; df1, df2 from 0.001 to 1e15, not only whole.
 * Edges      x ≤ 0 gives 0, ∞ gives 1.
 * Method     The incomplete beta function of x/(x + df2/df1), its distance from the mean taken from x − 1.
 * Accuracy   1e-13 relative down to 1e-100; test/core/distribution/f.test.ts.
 * Reference  Abramowitz & Stegun (1964), Handbook of Mathematical Functions, 26.6.2; betaTails.ts.
 *
 * @throws {DomainError} if an argument is outside its domain.
 */
export function fCdf(x: number, df1: number, df2: number): number {
  requireReal("x", x);
  requireShape("df1", df1);
  requireShape("df2", df2);
  if (x <= 0 || x === Infinity) return x <= 0 ? 0 : 1;
  const c = df2 / df1;
  const sum = x + c;
  return betaTails(df1 / 2, df2 / 2, x / sum, c / sum, 0.5 * df2 * ((1 - x) / sum)).lower;
}
