import { normalQuantile } from "../distribution/normalQuantile";
import { normalUpperTail } from "../distribution/normalUpperTail";
import { compensatedSum } from "../numeric/compensatedSum";
import type { Sample } from "./sample";

export interface ShapiroWilk {
  /** Sum of the squared normal scores expected of so many. */
  readonly expectedSquares: number;
  /** What the highest and the second highest score weigh; the second undefined up to 5 scores, where it follows no polynomial of its own. */
  readonly lastWeight: number;
  readonly nextWeight: number | undefined;
  /** 1 − W. */
  readonly lack: number;
  readonly statistic: number;
  /** Undefined for 3 scores, whose law is exact, and where W lies below the range of the approximation. */
  readonly normalised: NormalisedLack | undefined;
  readonly pValue: number;
}

/** A function of 1 − W that is about normal, with its mean and deviation where the scores are normal. */
export interface NormalisedLack {
  readonly transformed: number;
  readonly mean: number;
  readonly sd: number;
  readonly z: number;
}

export const SHAPIRO_WILK_LEAST = 3;
export const SHAPIRO_WILK_MOST = 5000;

/** Royston's polynomials, lowest power first. */
export const LAST_WEIGHT = [0, 0.221157, -0.147981, -2.07119, 4.434685, -2.706056];
export const NEXT_WEIGHT = [0, 0.042981, -0.293762, -1.752461, 5.682633, -3.582633];
export const SMALL_BOUND = [-2.273, 0.459];
export const SMALL_MEAN = [0.544, -0.39978, 0.025054, -0.0006714];
export const SMALL_LOG_SD = [1.3822, -0.77857, 0.062767, -0.0020322];
export const LARGE_MEAN = [-1.5861, -0.31082, -0.083751, 0.0038915];
export const LARGE_LOG_SD = [-0.4803, -0.082676, 0.0030302];

/**
 * The Shapiro-Wilk statistic W, the squared correlation of the ordered scores with what normal order statistics would weigh them, and
 * its p-value.
 *
 * Domain     3 to 5000 scores with a spread.
 * Edges      n = 3 has the exact distribution; a W below the range of the approximation (n ≤ 11) gives 1e-99.
 * Method     Royston's normalising polynomials (AS R94). W near 1 is taken from 1 − W as a sum of squared differences, since the p-value
 *            hangs on ln(1 − W).
 * Accuracy   1e-8 in W and 1e-6 relative in p against R (test/core/sample/shapiroWilk.test.ts); the approximation itself is good to
 *            two digits of p.
 * Reference  Royston (1995), Remark AS R94, Applied Statistics 44, 547–551; Shapiro & Wilk (1965), Biometrika 52, 591–611.
 */
export function shapiroWilk({ sorted, count, mean, sumOfSquares }: Sample): ShapiroWilk {
  const { weights, expectedSquares } = weightsOf(count);
  const cross = compensatedSum(sorted.map((x, i) => weights[i]! * (x - mean)));
  const root = Math.sqrt(sumOfSquares);
  // The weights have length 1, so |x/root − (weights·x/root) weights|² is 1 − W without cancellation.
  const lack = compensatedSum(sorted.map((x, i) => ((x - mean) / root - (cross / root) * weights[i]!) ** 2));
  const [lastWeight, nextWeight] = [weights[count - 1]!, count > 5 ? weights[count - 2]! : undefined];
  return { expectedSquares, lastWeight, nextWeight, lack, statistic: 1 - lack, ...pValueOf(lack, count) };
}

/** The weights of the ordered scores, antisymmetric and of length 1. */
export function shapiroWilkWeights(count: number): Float64Array {
  return weightsOf(count).weights;
}

function weightsOf(count: number): { weights: Float64Array; expectedSquares: number } {
  const weights = new Float64Array(count);
  const half = Math.floor(count / 2);
  const scores = Array.from({ length: half }, (_, i) => -normalQuantile((i + 1 - 0.375) / (count + 0.25)));
  const squares = 2 * scores.reduce((sum, m) => sum + m * m, 0);
  const outer = [polynomial(LAST_WEIGHT, 1 / Math.sqrt(count)) + scores[0]! / Math.sqrt(squares)];
  if (count === 3) outer[0] = Math.SQRT1_2;
  if (count > 5) outer.push(polynomial(NEXT_WEIGHT, 1 / Math.sqrt(count)) + scores[1]! / Math.sqrt(squares));
  let rest = squares;
  let left = 1;
  outer.forEach((weight, i) => {
    rest -= 2 * scores[i]! ** 2;
    left -= 2 * weight * weight;
  });
  const factor = Math.sqrt(rest / left);
  for (let i = 0; i < half; i++) {
    const weight = outer[i] ?? scores[i]! / factor;
    weights[i] = -weight;
    weights[count - 1 - i] = weight;
  }
  return { weights, expectedSquares: squares };
}

function pValueOf(lack: number, count: number): Pick<ShapiroWilk, "normalised" | "pValue"> {
  // Exact: W ≥ 3/4 always, P(W ≤ w) = 6/π (asin √w − asin √¾), and asin √w = π/2 − asin √(1 − w).
  if (count === 3) {
    const pValue = Math.min(Math.max(1 - (6 / Math.PI) * Math.asin(Math.sqrt(lack)), 0), 1);
    return { normalised: undefined, pValue };
  }
  const y = Math.log(lack);
  if (count > 11) {
    const logCount = Math.log(count);
    return tailOf(y, polynomial(LARGE_MEAN, logCount), Math.exp(polynomial(LARGE_LOG_SD, logCount)));
  }
  const bound = polynomial(SMALL_BOUND, count);
  if (y >= bound) return { normalised: undefined, pValue: 1e-99 };
  return tailOf(-Math.log(bound - y), polynomial(SMALL_MEAN, count), Math.exp(polynomial(SMALL_LOG_SD, count)));
}

function tailOf(transformed: number, mean: number, sd: number): Pick<ShapiroWilk, "normalised" | "pValue"> {
  const z = (transformed - mean) / sd;
  return { normalised: { transformed, mean, sd, z }, pValue: normalUpperTail(z) };
}

function polynomial(coefficients: readonly number[], x: number): number {
  return coefficients.reduceRight((sum, coefficient) => sum * x + coefficient, 0);
}
