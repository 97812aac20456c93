import { UnsettledError } from "../domain";

const CAP = 300;

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
 * @throws {UnsettledError} after 300 rounds.
 */
export function findPositiveRoot(start: number, rising: boolean, at: (x: number) => Taylor): number {
  let low = 0;
  let high = Infinity;
  let x = start;
  let stride = 2;
  for (let round = 0; round < CAP; round++) {
    const { value, slope, curvature } = at(x);
    if (value === 0) return x;
    if (value < 0 === rising) low = x;
    else high = x;
    // A tail among the denormal numbers moves in steps, and no step of Newton's is ever small.
    if (low > 0 && high <= low * (1 + 4e-16)) return x;
    const newton = -value / slope;
    const bend = 1 + (0.5 * newton * curvature) / slope;
    const step = newton / Math.min(Math.max(bend, 0.5), 2);
    if (Math.abs(step) < 1e-7) return x * Math.exp(step);
    // Where a tail is flat the step may lead out of the range of numbers.
    x *= Math.exp(Math.min(Math.max(step, -30), 30));
    if (x > low && x < high) continue;
    if (low > 0 && high < Infinity) x = Math.sqrt(low) * Math.sqrt(high);
    else x = low > 0 ? low * stride : high / stride;
    stride *= 2;
  }
  throw new UnsettledError("The search for a quantile");
}
