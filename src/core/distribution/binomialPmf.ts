import { requireCount, requireInteger, requireProbability } from "../domain";
import { betaFactor, betaLambda } from "../special/betaFactor";

/**
 * P(X = k) for X ~ Binomial(n, p).
 *
 * Domain     k whole; n whole ≥ 0 (tested to 1e9); p in [0, 1].
 * Edges      k outside 0 … n gives 0; p = 0 and p = 1 put everything on k = 0 and k = n.
 * Method     Loader's saddle-point form; a product of log-gammas loses log₁₀ n digits.
 * Accuracy   1e-13 relative down to 1e-100; test/core/distribution/binomial.test.ts.
 * Reference  Loader (2000), Fast and accurate computation of binomial probabilities.
 *
 * @throws {DomainError} if an argument is outside its domain.
 */
export function binomialPmf(k: number, n: number, p: number): number {
  requireInteger("k", k);
  requireCount("n", n);
  requireProbability("p", p);
  if (k < 0 || k > n) return 0;
  if (p === 0 || p === 1) return k === (p === 0 ? 0 : n) ? 1 : 0;
  if (k === 0) return Math.exp(n * Math.log1p(-p));
  if (k === n) return Math.exp(n * Math.log(p));
  return betaFactor(k, n - k, p, 1 - p, betaLambda(k, n - k, p)) * (n / k / (n - k));
}
