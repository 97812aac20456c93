import { remembered } from "../numeric/remembered";
import { noncentralTTails } from "../special/noncentralTTails";

const TERMS = 20;
/** Chebyshev's points, and the cosines that turn values there into coefficients. */
const POINTS = Array.from({ length: TERMS }, (_, i) => Math.cos((Math.PI * (i + 0.5)) / TERMS));
const COSINES = POINTS.map((_, j) => POINTS.map((__, i) => (2 / TERMS) * Math.cos((Math.PI * j * (i + 0.5)) / TERMS)));
/** A panel whose largest tail is below this is flat: its logarithm is soon out of reach. */
const LEAST = 1e-280;
/** Tails below this have lost digits: a panel that reaches so far down is halved. */
const EXACT = 1e-300;
/** Panels are one standard deviation wide around the centre, 0 and what lies between; outside they grow by a sixteenth up to this width in y. */
const GROWTH = 16;
const WIDEST = 0.2;

/** The coefficients of ln of a tail on one panel, the one value that the cdf has all over it, or its two halves. */
type Panel =
  | number
  | { readonly isLower: boolean; readonly from: number; readonly to: number; readonly coefficients: Float64Array }
  | { readonly middle: number; readonly below: Panel; readonly above: Panel };

/**
 * The noncentral t cdf with fixed df and noncentrality as a function of t, for a whole column of them.
 *
 * Domain     1 ≤ df ≤ 1e10; ncp finite; t any number, ±∞ too.
 * Edges      below 1e-280 the result is 0.
 * Method     ln of the smaller tail, interpolated by Chebyshev sums in y = asinh(t/√(2 df)), in which the distribution is about equally wide
 *            everywhere and its power tails are straight lines, on panels of one standard deviation and, farther out, wider ones, each
 *            made when a t first falls into it; where the power law is exact, by that. At 12 µs a value the tail itself would take 12 s
 *            for a full column. Panels are kept for the next cell with the same arguments, and a score gets the same bits alone and in a
 *            column.
 * Accuracy   1e-12 relative in both tails for fractions from 1e-9, down to 1e-30; 1e-11 for any, down to 1e-250; test/core/method/noncentralTCurve.test.ts.
 * Reference  Trefethen (2013), Approximation Theory and Approximation Practice, ch. 8.
 */
export const noncentralTCurve = remembered((df: number, ncp: number): ((t: number) => number) => {
  const unit = Math.sqrt(2 * df);
  // The steepest that the distribution gets in y, in standard deviations.
  const width = 2 / (unit * (1 + Math.hypot(1, ncp / unit)));
  const centre = Math.asinh(ncp / unit);
  const scale = panelScale(
    Math.floor(Math.min(0, centre) / width - Math.max(GROWTH, 0.5 / width)),
    Math.ceil(Math.max(0, centre) / width + GROWTH),
    Math.max(1, WIDEST / width),
  );
  // Beyond this the lower tail is a power of t, the upper one below the last digit of 1.
  const far = 1e16 * unit * (1 + Math.abs(ncp));
  const panels = new Map<number, Panel>();
  // Outside a flat panel all are.
  const flat = { below: -Infinity, above: Infinity };
  const cdf = (t: number): number => {
    if (!(Math.abs(t) <= far)) return t > 0 ? 1 : cdf(-far) * (far / -t) ** df;
    const place = scale.place(Math.asinh(t / unit) / width);
    const index = Math.floor(place);
    if (index <= flat.below) return 0;
    if (index >= flat.above) return 1;
    let panel = panels.get(index);
    if (panel === undefined) {
      panels.set(index, (panel = makePanel(index, index + 1)));
      if (panel === 0) flat.below = index;
      if (panel === 1) flat.above = index;
    }
    while (typeof panel === "object" && "middle" in panel) panel = place < panel.middle ? panel.below : panel.above;
    if (typeof panel === "number") return panel;
    const { isLower, from, to, coefficients } = panel;
    const logTail = chebyshevSum(coefficients, (2 * (place - from)) / (to - from) - 1);
    return isLower ? Math.exp(logTail) : -Math.expm1(logTail);
  };
  const makePanel = (from: number, to: number): Panel => {
    const middle = (from + to) / 2;
    const isLower = width * scale.distance(middle) < centre;
    const tails = POINTS.map((point) => {
      const y = width * scale.distance(middle + (point * (to - from)) / 2);
      const one = noncentralTTails(unit * Math.sinh(y), df, ncp);
      return one.isLower === isLower ? one.tail : 1 - one.tail;
    });
    if (Math.max(...tails) < LEAST) return isLower ? 0 : 1;
    if (Math.min(...tails) < EXACT) return { middle, below: makePanel(from, middle), above: makePanel(middle, to) };
    const logs = tails.map(Math.log);
    const coefficients = Float64Array.from(COSINES, (row) => row.reduce((sum, cosine, i) => sum + cosine * logs[i], 0));
    return { isLower, from, to, coefficients };
  };
  return cdf;
}, 8);

/**
 * The way from y, in standard deviations, to the panels and back: even from `low` to `high`, both whole numbers; outside, panels grow until
 * `widest` of the even ones make one.
 */
function panelScale(low: number, high: number, widest: number) {
  const grown = Math.round(GROWTH * Math.log(widest));
  const most = Math.exp(grown / GROWTH);
  const last = GROWTH * (most - 1);
  const panelsOf = (beyond: number) =>
    beyond < last ? GROWTH * Math.log1p(beyond / GROWTH) : grown + (beyond - last) / most;
  const beyondOf = (panels: number) =>
    panels < grown ? GROWTH * Math.expm1(panels / GROWTH) : last + (panels - grown) * most;
  const outside = (x: number, carried: (beyond: number) => number) =>
    x < low ? low - carried(low - x) : x > high ? high + carried(x - high) : x;
  return { place: (x: number) => outside(x, panelsOf), distance: (place: number) => outside(place, beyondOf) };
}

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
