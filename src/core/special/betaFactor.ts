import { productDifference } from "../numeric/productDifference";
import { deviance } from "./deviance";
import { stirlingError } from "./stirlingError";

/**
 * x^a·y^b/B(a, b), y = 1 − x: what both tails of the beta distribution and the binomial chances have in common.
 *
 * Domain     as betaTails.ts.
 * Method     Saddle-point form: the exponent is the sum of two deviances, the constant one of Stirling errors. Logarithms of
 *            B and of the powers are of size (a + b)·ln(a + b) and cancel.
 * Accuracy   4e-16 relative times the exponent, at least 1e-15; test/core/distribution/binomial.test.ts.
 * Reference  Loader (2000), Fast and accurate computation of binomial probabilities.
 */
export function betaFactor(a: number, b: number, x: number, y: number, lambda: number): number {
  const n = a + b;
  const D = deviance(a, n * x, -lambda) + deviance(b, n * y, lambda);
  return (
    Math.exp(stirlingError(n) - stirlingError(a) - stirlingError(b) - D) * Math.sqrt((a * (b / n)) / (2 * Math.PI))
  );
}

/** λ = a·y − b·x for y = 1 − x, x the exact number: how far x is below its mean a/(a + b), times a + b. */
export function betaLambda(a: number, b: number, x: number): number {
  const y = 1 - x;
  return productDifference(a, y, b, x) - a * (y - 1 + x);
}
