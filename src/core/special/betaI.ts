import { betaLambda } from "./betaFactor";
import { betaTails } from "./betaTails";

/**
 * The regularised incomplete beta function I_x(a, b).
 *
 * Domain     x in [0, 1]; a, b > 0. `oneMinusX` may hand in 1 − x where x is so near to 1 that it no longer shows it.
 * Edges      x = 0 gives 0, 1 gives 1; anything outside gives NaN.
 * Method, accuracy, reference: betaTails.ts.
 */
export function betaI(x: number, a: number, b: number, oneMinusX = 1 - x): number {
  if (!(x >= 0 && x <= 1 && a > 0 && b > 0 && a < Infinity && b < Infinity)) return NaN;
  // The smaller of the two carries the digits.
  if (x <= oneMinusX) return betaTails(a, b, x, 1 - x, betaLambda(a, b, x)).lower;
  return betaTails(b, a, oneMinusX, 1 - oneMinusX, betaLambda(b, a, oneMinusX)).upper;
}
