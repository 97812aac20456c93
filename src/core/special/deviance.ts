import { productError } from "../numeric/productDifference";
import { log1pMinus } from "./log1pMinus";

/**
 * How unlikely a count is against its expectation: n ln(n/e) + e − n, the exponent of every saddle-point density here.
 *
 * Domain     n ≥ 0, expected e > 0; `difference` is e − n, handed in because the caller often knows it to more digits.
 * Edges      n = 0 gives e.
 * Method     −n·(ln(1 + w) − w), w = (e − n)/n, with the rounding of w put back: the plain formula subtracts numbers of size n.
 * Accuracy   4e-16 relative; test/core/special/deviance.test.ts.
 * Reference  Loader (2000), Fast and accurate computation of binomial probabilities (there D₀).
 */
export function deviance(n: number, expected: number, difference: number): number {
  if (n === 0) return expected;
  const w = difference / n;
  if (!(w > -0.5 && w < 1e100)) return n * Math.log(n / expected) + difference;
  const product = w * n;
  const rest = difference - product - productError(w, n, product);
  return (w / (1 + w)) * rest - n * log1pMinus(w);
}
