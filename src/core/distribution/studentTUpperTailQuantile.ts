import { requireProbability, requireShape } from "../domain";
import { betaInverse } from "../special/betaInverse";
import { normalScore } from "../special/normalScore";
import { studentTUpperTail } from "./studentTUpperTail";

/**
 * The t with P(T > t) = p for Student's t with `df` degrees of freedom.
 *
 * Domain     p in [0, 1]; df from 0.001 to 1e15, not only whole; df = ∞ is the standard normal.
 * Edges      0 gives ∞, 1 gives −∞, ½ gives 0.
 * Method     √(df·odds), the odds those of the beta variable t²/(df + t²), solved on the smaller of its two tails.
 * Accuracy   1e-13 relative; test/core/distribution/studentT.test.ts.
 * Reference  Abramowitz & Stegun (1964), Handbook of Mathematical Functions, 26.7.1; betaInverse.ts.
 *
 * @throws {DomainError} if an argument is outside its domain.
 */
export function studentTUpperTailQuantile(p: number, df: number): number {
  requireProbability("p", p);
  if (df === Infinity) return normalScore(p);
  requireShape("df", df);
  if (p === 0 || p === 0.5) return p === 0 ? Infinity : 0;
  if (p > 0.5) return -studentTUpperTailQuantile(1 - p, df);
  // So far out the tail is its leading power of t to the last digit, and t² may overflow.
  const far = 1e15 * Math.sqrt(df);
  const beyond = studentTUpperTail(far, df);
  if (p <= beyond) return far * (beyond / p) ** (1 / df);
  const z = normalScore(p);
  const start = df > 2 ? (z * (1 + (z * z + 1) / (4 * df))) ** 2 / df : undefined;
  return Math.sqrt(df) * Math.sqrt(betaInverse(2 * (0.5 - p), 2 * p, 0.5, df / 2, start));
}
