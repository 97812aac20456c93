import { UnsettledError } from "../domain";

const LOWEST = -5;
const HIGHEST = 5;
/** Coefficients 1/(j!(j + 2)) of (u eᵘ − eᵘ + 1)/u², and of its derivative, for small u. */
const SLOPE_SERIES = Array.from({ length: 16 }, (_, j) => 1 / (factorial(j) * (j + 2)));
const BEND_SERIES = SLOPE_SERIES.slice(1).map((coefficient, j) => coefficient * (j + 1));

/**
 * The Box-Cox power λ from −5 to 5 at which (x^λ − 1)/λ is most likely normal, from the logarithms of the scores over a common centre.
 *
 * Domain     at least two different logarithms, finite.
 * Edges      the nearer end where the likelihood still rises there.
 * Method     The root of the score ½ d ln s²(λ)/dλ − mean(ln x). ln s² is convex in λ (it is the logarithm of a sum of
 *            e^{λ(a+b)} (sinh(λ(a−b)/2)/(λ/2))² over the pairs, each of which is log-convex), so there is one root and a guarded Newton
 *            iteration finds it; a line search on the likelihood would stop half the digits short.
 * Accuracy   1e-9 in λ against test/core/sample/fitCurve.test.ts.
 * Reference  Box & Cox (1964), J. R. Statist. Soc. B 26, 211–252.
 *
 * @throws {UnsettledError} if Newton's iteration passes its cap.
 */
export function fitPower(logs: Float64Array): number {
  const meanLog = logs.reduce((sum, log) => sum + log, 0) / logs.length;
  const work = [new Float64Array(logs.length), new Float64Array(logs.length), new Float64Array(logs.length)] as const;
  let low = LOWEST;
  let high = HIGHEST;
  let power = 0;
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
    // An end is tried before bisecting: where the likelihood still rises there, it is the answer.
    if (!(next < high)) next = high === HIGHEST && power !== HIGHEST && score < 0 ? HIGHEST : (low + high) / 2;
    else if (!(next > low)) next = low === LOWEST && power !== LOWEST && score > 0 ? LOWEST : (low + high) / 2;
    if (Math.abs(next - power) <= 1e-9 * (1 + Math.abs(power))) return next;
    power = next;
  }
  throw new UnsettledError("fitting a Box-Cox power");
}

type Work = readonly [Float64Array, Float64Array, Float64Array];

function scoreAt(power: number, logs: Float64Array, meanLog: number, [z, first, second]: Work) {
  const count = logs.length;
  let largest = 0;
  for (let i = 0; i < count; i++) largest = Math.max(largest, power * logs[i]!);
  // Only ratios matter, so a common factor keeps eᵘ from overflowing.
  const shift = largest > 300 ? largest : 0;
  const unit = Math.exp(-shift);
  let zMean = 0;
  let firstMean = 0;
  for (let i = 0; i < count; i++) {
    const log = logs[i]!;
    const u = power * log;
    if (Math.abs(u) < 0.5) {
      z[i] = unit * (u === 0 ? log : (log * Math.expm1(u)) / u);
      first[i] = unit * log * log * series(SLOPE_SERIES, u);
      second[i] = unit * log * log * log * series(BEND_SERIES, u);
    } else {
      const power1 = Math.exp(u - shift);
      const rise = power1 - unit;
      z[i] = rise / power;
      first[i] = (u * power1 - rise) / (power * power);
      second[i] = ((u * u - 2 * u) * power1 + 2 * rise) / (power * power * power);
    }
    zMean += z[i]! / count;
    firstMean += first[i]! / count;
  }
  let squares = 0;
  let cross = 0;
  let bend = 0;
  for (let i = 0; i < count; i++) {
    const dz = z[i]! - zMean;
    const dFirst = first[i]! - firstMean;
    squares += dz * dz;
    cross += dz * dFirst;
    bend += dFirst * dFirst + dz * second[i]!;
  }
  const ratio = cross / squares;
  return { score: ratio - meanLog, slope: bend / squares - 2 * ratio * ratio };
}

function series(coefficients: readonly number[], u: number): number {
  let sum = 0;
  for (let j = coefficients.length - 1; j >= 0; j--) sum = sum * u + coefficients[j]!;
  return sum;
}

function factorial(n: number): number {
  return n < 2 ? 1 : n * factorial(n - 1);
}
