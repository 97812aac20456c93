import { requireInteger, requireShape, requireProbability } from "../domain";
import { betaLambda } from "../special/betaFactor";
import { betaTails } from "../special/betaTails";

/**
 * P(X ≤ k), X the failures before the r-th success, each trial a success with chance p.
 *
 * Domain     k whole; r from 0.001 to 1e15, not only whole; p in [0, 1].
 * Edges      k < 0 gives 0; p = 0 gives 0 (the r-th success never comes), p = 1 gives 1.
 * Method     The incomplete beta function I_p(r, k + 1).
 * Accuracy   1e-13 relative down to 1e-100; test/core/distribution/negativeBinomial.test.ts.
 * Reference  Abramowitz & Stegun (1964), Handbook of Mathematical Functions, 26.5.26; betaTails.ts.
 *
 * @throws {DomainError} if an argument is outside its domain.
 */
export function negativeBinomialCdf(k: number, r: number, p: number): number {
  requireInteger("k", k);
  requireShape("r", r);
  requireProbability("p", p);
  if (k < 0) return 0;
  return betaTails(r, k + 1, p, 1 - p, betaLambda(r, k + 1, p)).lower;
}
