import { UnsettledError } from "../domain";

/** A function and its first two derivatives at a point. */
export interface Taylor {
  value: number;
  slope: number;
  curvature: number;
}

/**
 * The x > 0 at which a monotone function of ln x is 0, its derivatives by ln x known.
 *
 * Domain     start > 0; `at(x)` gives value, slope and curvature by ln x; infinite values only tell the side.
 * Method     Halley's steps in ln x inside the bracket found so far; where a step leaves it, the geometric mean or a
 *            factor. Multiplying x instead of adding to ln x keeps its last digits.
 * Accuracy   the last step is below 1e-7 and Halley's error is its cube: a rounding of `at` and no more.
 * Reference  Halley's method: Traub (1964), Iterative Methods for the Solution of Equations.
 *
 * @throws {UnsettledError} after 200 rounds.
 */
export function findPositiveRoot(start: number, rising: boolean, at: (x: number) => Taylor): number {
  let low = 0;
  let high = Infinity;
  let x = Math.min(Math.max(start, 1e-300), 1e300);
  let stride = 2;
  for (let round = 0; round < 200; round++) {
    const { value, slope, curvature } = at(x);
    if (value === 0) return x;
    if (value < 0 === rising) low = x;
    else high = x;
    const newton = -value / slope;
    const bend = 1 + (0.5 * newton * curvature) / slope;
    const step = newton / (bend > 0.5 && bend < 2 ? bend : bend >= 2 ? 2 : 0.5);
    let next = x * Math.exp(step);
    if (Math.abs(step) < 1e-7) return next;
    if (!(next > low && next < high)) {
      if (low > 0 && high < Infinity) next = Math.sqrt(low) * Math.sqrt(high);
      else next = low > 0 ? low * stride : high / stride;
      stride *= stride;
    }
    if (next === x || !(next > 0 && next < Infinity)) return x;
    x = next;
  }
  throw new UnsettledError("The search for a quantile");
}
