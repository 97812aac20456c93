import { remembered } from "../numeric/remembered";
import { noncentralTTails } from "../special/noncentralTTails";

const TERMS = 16;
/** Chebyshev's points, and the cosines that turn values there into coefficients. */
const POINTS = Array.from({ length: TERMS }, (_, i) => Math.cos((Math.PI * (i + 0.5)) / TERMS));
const COSINES = POINTS.map((_, j) => POINTS.map((__, i) => (2 / TERMS) * Math.cos((Math.PI * j * (i + 0.5)) / TERMS)));
/** A panel whose largest tail is below this is flat: its logarithm is soon out of reach. */
const LEAST = 1e-280;
/** Beyond this the lower tail is a power of t, the upper one below the last digit of 1. */
const FAR = 1e100;

/** The coefficients of ln of a tail on one panel, or the one value that the cdf has all over it. */
type Panel = number | { readonly isLower: boolean; readonly coefficients: Float64Array };

/**
 * The noncentral t cdf with fixed df and noncentrality as a function of t, for a whole column of them.
 *
 * Domain     1 ≤ df ≤ 1e10; ncp finite; t any number, ±∞ too.
 * Edges      below 1e-280 the result is 0.
 * Method     ln of the smaller tail, interpolated by Chebyshev sums in y = asinh(t/√(2 df)), in which the distribution is about equally wide
 *            everywhere and its power tails are straight lines, on panels of one standard deviation, each made when a t first falls
 *            into it. At 12 µs a value the tail itself would take 12 s for a full column. Panels are kept for the next cell with the same
 *            arguments, and a score gets the same bits alone and in a column.
 * Accuracy   1e-12 relative, both tails; test/core/method/clearanceConfidence.test.ts.
 * Reference  Trefethen (2013), Approximation Theory and Approximation Practice, ch. 8.
 */
export const noncentralTCurve = remembered((df: number, ncp: number): ((t: number) => number) => {
  const unit = Math.sqrt(2 * df);
  // The steepest that the distribution gets in y, in standard deviations.
  const width = 2 / (unit * (1 + Math.hypot(1, ncp / unit)));
  const panels = new Map<number, Panel>();
  const cdf = (t: number): number => {
    if (!(Math.abs(t) <= FAR)) return t > 0 ? 1 : cdf(-FAR) * (FAR / -t) ** df;
    const place = Math.asinh(t / unit) / width;
    const index = Math.floor(place);
    let panel = panels.get(index);
    if (panel === undefined) panels.set(index, (panel = makePanel(index)));
    if (typeof panel === "number") return panel;
    const logTail = chebyshevSum(panel.coefficients, 2 * (place - index) - 1);
    return panel.isLower ? Math.exp(logTail) : -Math.expm1(logTail);
  };
  const makePanel = (index: number): Panel => {
    const at = (point: number) => unit * Math.sinh((index + (point + 1) / 2) * width);
    const isLower = at(0) < ncp;
    const tails = POINTS.map((point) => {
      const one = noncentralTTails(at(point), df, ncp);
      return one.isLower === isLower ? one.tail : 1 - one.tail;
    });
    if (Math.max(...tails) < LEAST) return isLower ? 0 : 1;
    const logs = tails.map(Math.log);
    const coefficients = Float64Array.from(COSINES, (row) => row.reduce((sum, cosine, i) => sum + cosine * logs[i], 0));
    return { isLower, coefficients };
  };
  return cdf;
}, 8);

/** c₀/2 + Σ cⱼTⱼ(x), by Clenshaw. */
function chebyshevSum(coefficients: Float64Array, x: number): number {
  let ahead = 0;
  let behind = 0;
  for (let j = TERMS - 1; j > 0; j--) {
    const next = 2 * x * ahead - behind + coefficients[j];
    behind = ahead;
    ahead = next;
  }
  return x * ahead - behind + coefficients[0] / 2;
}
