import { ERF_EDGE, erfcx, erfNearZero, expSquare } from "./erfcx";

/**
 * The complementary error function 1 − erf(x) = 2/√π · ∫ₓ^∞ e^(−t²) dt.
 *
 * Edges      −∞ gives 2, ∞ gives 0 (and so does x > 27.3, where the result is below the smallest number); NaN gives NaN.
 * Method     e^(−x²) times the scaled function, the square split in two so that its rounding doesn't reach the exponent.
 * Accuracy   1e-15 relative; test/core/special/erfc.test.ts.
 * Reference  Cody (1969), Rational Chebyshev approximations for the error function, Math. Comp. 23.
 */
export function erfc(x: number): number {
  if (x > 28) return 0;
  if (x > ERF_EDGE) return expSquare(x, -1) * erfcx(x);
  if (x >= -ERF_EDGE) return 1 - erfNearZero(x);
  return x < -6 ? 2 : x < 0 ? 2 - expSquare(x, -1) * erfcx(-x) : NaN;
}
