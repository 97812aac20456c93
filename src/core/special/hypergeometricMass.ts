import { productDifference } from "../numeric/productDifference";
import { deviance } from "./deviance";
import { stirlingError } from "./stirlingError";

/**
 * The hypergeometric chance C(good, k)·C(pool − good, drawn − k)/C(pool, drawn), unchecked.
 *
 * Domain     whole numbers, all four cells k, good − k, drawn − k and the rest ≥ 0.
 * Method     Saddle-point form over the four cells of the table: every cell differs from its expectation by the same d,
 *            which is computed exactly. Log-gammas of the pool would lose all digits beyond 1e-9 of it.
 * Accuracy   1e-14 relative; test/core/distribution/hypergeometric.test.ts.
 * Reference  Loader (2000), Fast and accurate computation of binomial probabilities.
 */
export function hypergeometricMass(k: number, pool: number, good: number, drawn: number): number {
  if (pool === 0) return 1;
  const bad = pool - good;
  const left = pool - drawn;
  const d = productDifference(good, drawn, k, pool) / pool;
  let exponent = margin(good) + margin(bad) + margin(drawn) + margin(left) - margin(pool);
  exponent -= cell(k, (good / pool) * drawn, d) + cell(good - k, (good / pool) * left, -d);
  exponent -= cell(drawn - k, (bad / pool) * drawn, -d) + cell(left - good + k, (bad / pool) * left, d);
  const roots = (root(good) * root(bad)) / root(k) / root(good - k);
  return (
    Math.exp(exponent) * roots * (root(drawn) / root(drawn - k)) * (root(left) / root(pool) / root(left - good + k))
  );
}

function margin(n: number): number {
  return n > 0 ? stirlingError(n) : 0;
}

function cell(n: number, expected: number, difference: number): number {
  return n > 0 ? stirlingError(n) + deviance(n, expected, difference) : expected;
}

function root(n: number): number {
  return n > 0 ? Math.sqrt(2 * Math.PI * n) : 1;
}
