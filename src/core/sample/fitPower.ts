import { UnsettledError } from "../domain";

const LOWEST = -5;
const HIGHEST = 5;
/** 1/(j!(j + 2)): the coefficients of h(u) = (u eᵘ − eᵘ + 1)/u², for small u. */
const SERIES = Float64Array.from({ length: 15 }, (_, j) => 1 / (factorial(j) * (j + 2)));

/**
 * The Box-Cox power λ from −5 to 5 at which (x^λ − 1)/λ is most likely normal, from the logarithms of the scores over a common centre.
 *
 * Domain     at least two different logarithms, finite.
 * Edges      the nearer end where the likelihood still rises there.
 * Method     The root of the score ½ d ln s²(λ)/dλ − mean(ln x). ln s² is convex in λ (it is the logarithm of a sum of
 *            e^{λ(a+b)} (sinh(λ(a−b)/2)/(λ/2))² over the pairs, each of which is log-convex), so there is one root and a guarded Newton
 *            iteration finds it; a line search on the likelihood would stop half the digits short. Long columns, in rising order, start
 *            from the power of a thousand scores spread over them, then of eight thousand and so on, which leaves two passes through all.
 * Accuracy   1e-9 in λ against test/core/sample/fitCurve.test.ts.
 * Reference  Box & Cox (1964), J. R. Statist. Soc. B 26, 211–252.
 *
 * @throws {UnsettledError} if Newton's iteration passes its cap.
 */
export function fitPower(logs: Float64Array): number {
  let start = 0;
  for (let stride = Math.floor(logs.length / 1000); stride >= 4; stride = Math.floor(stride / 8)) {
    const thinned = new Float64Array(Math.floor(logs.length / stride));
    for (let i = 0; i < thinned.length; i++) thinned[i] = logs[i * stride + (stride >> 1)]!;
    if (thinned.some((log) => log !== thinned[0])) start = root(thinned, start);
  }
  return root(logs, start);
}

function root(logs: Float64Array, start: number): number {
  const meanLog = logs.reduce((sum, log) => sum + log, 0) / logs.length;
  const work: Work = [new Float64Array(logs.length), new Float64Array(logs.length), new Float64Array(logs.length)];
  let low = LOWEST;
  let high = HIGHEST;
  let power = start;
  let before = 0;
  for (let pass = 0; pass < 100; pass++) {
    const { score, slope } = scoreAt(power, logs, meanLog, work);
    if (score === 0) return power;
    if (score < 0) {
      if (power === HIGHEST) return HIGHEST;
      low = power;
    } else {
      if (power === LOWEST) return LOWEST;
      high = power;
    }
    let next = power - score / slope;
    // An end is tried before halving: where the likelihood still rises there, it is the answer.
    if (!(next < high)) next = high === HIGHEST && power !== HIGHEST && score < 0 ? HIGHEST : (low + high) / 2;
    else if (!(next > low)) next = low === LOWEST && power !== LOWEST && score > 0 ? LOWEST : (low + high) / 2;
    const step = Math.abs(next - power);
    // Newton's error is squared at each pass: what the next one would still change shows before it is made.
    if (step <= 1e-7 * (1 + Math.abs(power)) || step * (step / before) ** 2 <= 1e-13) return next;
    before = step;
    power = next;
  }
  throw new UnsettledError("fitting a Box-Cox power");
}

type Work = readonly [Float64Array, Float64Array, Float64Array];

/** The score and its slope, from y = (eᵘ − 1)/λ, u = λ ln x, and its derivatives in λ: (ln x)² h(u) and (ln x)³ h′(u). */
function scoreAt(power: number, logs: Float64Array, meanLog: number, [y, first, second]: Work) {
  const count = logs.length;
  let largest = 0;
  for (let i = 0; i < count; i++) largest = Math.max(largest, power * logs[i]!);
  // Only ratios matter, so a common factor keeps eᵘ from overflowing.
  const shift = largest > 300 ? largest : 0;
  const unit = Math.exp(-shift);
  let ySum = 0;
  let firstSum = 0;
  for (let i = 0; i < count; i++) {
    const log = logs[i]!;
    const u = power * log;
    let rise: number;
    let h: number;
    let bend: number;
    if (Math.abs(u) < 0.5) {
      h = 0;
      for (let j = SERIES.length - 1; j >= 0; j--) h = h * u + SERIES[j]!;
      rise = (unit * (1 - u * h)) / (1 - u);
      bend = unit * (Math.abs(u) < 1e-4 ? 1 / 3 + u / 4 : (1 + (u * (1 - u * h)) / (1 - u) - 2 * h) / u);
      h *= unit;
    } else {
      const scaled = Math.exp(u - shift);
      rise = (scaled - unit) / u;
      h = (scaled - rise) / u;
      bend = (scaled - 2 * h) / u;
    }
    ySum += y[i] = log * rise;
    firstSum += first[i] = log * log * h;
    second[i] = log * log * log * bend;
  }
  let squares = 0;
  let cross = 0;
  let curve = 0;
  for (let i = 0; i < count; i++) {
    const dy = y[i]! - ySum / count;
    const dFirst = first[i]! - firstSum / count;
    squares += dy * dy;
    cross += dy * dFirst;
    curve += dFirst * dFirst + dy * second[i]!;
  }
  const ratio = cross / squares;
  return { score: ratio - meanLog, slope: curve / squares - 2 * ratio * ratio };
}

function factorial(n: number): number {
  return n < 2 ? 1 : n * factorial(n - 1);
}
