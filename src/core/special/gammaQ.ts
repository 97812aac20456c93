import { gammaTails } from "./gammaTails";

/**
 * The upper regularised incomplete gamma function Q(shape, x) = Γ(shape, x)/Γ(shape), to its last digits where it is small.
 *
 * Domain     x ≥ 0, shape > 0.
 * Edges      x = 0 gives 1, ∞ gives 0; anything else outside gives NaN.
 * Method, accuracy, reference: gammaTails.ts.
 */
export function gammaQ(x: number, shape: number): number {
  return gammaTails(x, shape).upper;
}
