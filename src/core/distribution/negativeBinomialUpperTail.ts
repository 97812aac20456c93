import { requireInteger, requireShape, requireProbability } from "../domain";
import { betaLambda } from "../special/betaFactor";
import { betaTails } from "../special/betaTails";

/**
 * P(X ≥ k), X the failures before the r-th success, each trial a success with chance p; k itself included.
 *
 * Domain     k whole; r from 0.001 to 1e15, not only whole; p in [0, 1].
 * Edges      k ≤ 0 gives 1; p = 0 gives 1, p = 1 gives 0.
 * Method     The incomplete beta function I_(1−p)(k, r).
 * Accuracy   1e-13 relative down to 1e-100; test/core/distribution/negativeBinomial.test.ts.
 * Reference  Abramowitz & Stegun (1964), Handbook of Mathematical Functions, 26.5.26; betaTails.ts.
 *
 * @throws {DomainError} if an argument is outside its domain.
 */
export function negativeBinomialUpperTail(k: number, r: number, p: number): number {
  requireInteger("k", k);
  requireShape("r", r);
  requireProbability("p", p);
  if (k <= 0) return 1;
  return betaTails(r, k, p, 1 - p, betaLambda(r, k, p)).upper;
}
