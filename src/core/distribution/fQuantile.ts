import { requireShape, requireProbability } from "../domain";
import { betaInverse } from "../special/betaInverse";

/**
 * The x with P(F ≤ x) = p for the F distribution with df1 and df2 degrees of freedom.
 *
 * Domain     p in [0, 1]; df1, df2 from 0.001 to 1e15, not only whole.
 * Edges      0 gives 0, 1 gives ∞.
 * Method     The odds of the beta variable times df2/df1 (betaInverse.ts).
 * Accuracy   1e-13 relative; test/core/distribution/f.test.ts.
 * Reference  Abramowitz & Stegun (1964), Handbook of Mathematical Functions, 26.6.2.
 *
 * @throws {DomainError} if an argument is outside its domain.
 */
export function fQuantile(p: number, df1: number, df2: number): number {
  requireProbability("p", p);
  requireShape("df1", df1);
  requireShape("df2", df2);
  return (betaInverse(p, 1 - p, df1 / 2, df2 / 2) * df2) / df1;
}
