import { requireCount, requireInteger, requireProbability } from "../domain";
import { betaLambda } from "../special/betaFactor";
import { betaTails } from "../special/betaTails";

/**
 * P(X ≤ k) for X ~ Binomial(n, p).
 *
 * Domain     k whole; n whole ≥ 0 (tested to 1e9); p in [0, 1].
 * Edges      k < 0 gives 0, k ≥ n gives 1.
 * Method     The incomplete beta function I_(1−p)(n − k, k + 1); a sum of chances takes too long for large n.
 * Accuracy   1e-13 relative down to 1e-100; test/core/distribution/binomial.test.ts.
 * Reference  Abramowitz & Stegun (1964), Handbook of Mathematical Functions, 26.5.24; betaTails.ts.
 *
 * @throws {DomainError} if an argument is outside its domain.
 */
export function binomialCdf(k: number, n: number, p: number): number {
  requireInteger("k", k);
  requireCount("n", n);
  requireProbability("p", p);
  if (k < 0 || k >= n) return k < 0 ? 0 : 1;
  return betaTails(k + 1, n - k, p, 1 - p, betaLambda(k + 1, n - k, p)).upper;
}
