import { requireReal, requireShape } from "../domain";
import { deviance } from "../special/deviance";
import { stirlingError } from "../special/stirlingError";
import { normalPdf } from "./normalPdf";

/**
 * The density of Student's t with `df` degrees of freedom.
 *
 * Domain     x any number; df from 0.001 to 1e15, not only whole; df = ∞ is the standard normal.
 * Edges      ±∞ gives 0.
 * Method     exp(−(df + 1)/2·ln(1 + x²/df)) with the constant from Stirling errors, not from a difference of log-gammas.
 * Accuracy   1e-13 relative down to 1e-100; test/core/distribution/studentT.test.ts.
 * Reference  Loader (2000), Fast and accurate computation of binomial probabilities.
 *
 * @throws {DomainError} if an argument is outside its domain.
 */
export function studentTPdf(x: number, df: number): number {
  requireReal("x", x);
  if (df === Infinity) return normalPdf(x);
  requireShape("df", df);
  const ratio = (x / df) * x;
  const logOnePlus = ratio < 1e30 ? Math.log1p(ratio) : 2 * Math.log(Math.abs(x)) - Math.log(df);
  // Γ((df + 1)/2)/(√(df/2)·Γ(df/2)) by Stirling's formula with its error.
  const half = df / 2;
  const constant = stirlingError(half + 0.5) - stirlingError(half) - deviance(half, half + 0.5, 0.5);
  return Math.exp(constant - ((df + 1) / 2) * logOnePlus) / Math.sqrt(2 * Math.PI);
}
