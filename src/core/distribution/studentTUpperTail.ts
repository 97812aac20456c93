import { requireReal, requireShape } from "../domain";
import { betaTails } from "../special/betaTails";
import { normalUpperTail } from "./normalUpperTail";
import { studentTPdf } from "./studentTPdf";

/**
 * P(T > x) for Student's t with `df` degrees of freedom.
 *
 * Domain     x any number; df from 0.001 to 1e15, not only whole; df = ∞ is the standard normal.
 * Edges      −∞ gives 1, ∞ gives 0.
 * Method     Half the incomplete beta function of df/(df + x²), its distance from the mean taken from x itself.
 * Accuracy   1e-13 relative down to 1e-100; test/core/distribution/studentT.test.ts.
 * Reference  Abramowitz & Stegun (1964), Handbook of Mathematical Functions, 26.7.1; betaTails.ts.
 *
 * @throws {DomainError} if an argument is outside its domain.
 */
export function studentTUpperTail(x: number, df: number): number {
  requireReal("x", x);
  if (df === Infinity) return normalUpperTail(x);
  requireShape("df", df);
  if (x < 0) return 1 - studentTUpperTail(-x, df);
  if (x === 0 || x === Infinity) return x === 0 ? 0.5 : 0;
  // So far out x² may overflow, and the tail is its leading power to the last digit.
  if (x / Math.sqrt(df) > 1e15) return (studentTPdf(x, df) * x) / df;
  const sum = df + x * x;
  const lambda = (df * (x - 1) * (x + 1)) / (2 * sum);
  return 0.5 * betaTails(0.5, df / 2, (x * x) / sum, df / sum, -lambda).upper;
}
