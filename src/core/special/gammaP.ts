import { gammaTails } from "./gammaTails";

/**
 * The lower regularised incomplete gamma function P(shape, x) = γ(shape, x)/Γ(shape).
 *
 * Domain     x ≥ 0, shape > 0.
 * Edges      x = 0 gives 0, ∞ gives 1; anything else outside gives NaN.
 * Method, accuracy, reference: gammaTails.ts.
 */
export function gammaP(x: number, shape: number): number {
  return gammaTails(x, shape).lower;
}
