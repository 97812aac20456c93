import { ERF_EDGE, erfcx, erfNearZero, expSquare } from "./erfcx";

const ROOT_HALF = Math.SQRT1_2;

/**
 * P(Z > x) for a standard normal Z, unchecked, for the inner loops.
 *
 * Edges      −∞ gives 1, ∞ gives 0, NaN gives NaN; below 1e-307 the result loses digits, below 5e-324 it is 0 (x > 38.5).
 * Method     ½ e^(−x²/2) erfcx(x/√2). ½ erfc(x/√2) would carry the rounding of x/√2 into the exponent.
 * Accuracy   1e-15 relative; test/core/special/erfc.test.ts.
 * Reference  Cody (1969), Rational Chebyshev approximations for the error function, Math. Comp. 23.
 */
export function normalTail(x: number): number {
  const z = x * ROOT_HALF;
  if (Math.abs(z) < ERF_EDGE) return 0.5 - 0.5 * erfNearZero(z);
  if (z > 0) return z > 28 ? 0 : 0.5 * expSquare(x, -0.5) * erfcx(z);
  return z < -6 ? 1 : z < 0 ? 1 - 0.5 * expSquare(x, -0.5) * erfcx(-z) : NaN;
}
