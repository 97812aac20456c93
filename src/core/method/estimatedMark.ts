import { log1pMinus } from "../special/log1pMinus";
import { normalScore } from "../special/normalScore";
import { normalTail } from "../special/normalTail";
import { stirlingError } from "../special/stirlingError";

/**
 * Where a mark estimated from `count` scores falls on the true curve, as a quadrature: T = kU + V/√count, U² ~ χ²(count − 1)/(count − 1),
 * V ~ N(0, 1). Each point carries ln Φ(T), the logarithm of the chance that one score stays below it.
 */
export interface EstimatedMark {
  readonly logBelow: Float64Array;
  readonly weights: Float64Array;
}

const FAR = 9.5;

/**
 * The quadrature for E[g(T)], g(T) = 1 − Φ(T)^trials; with `trials` left out one for the body of T, good for any g no sharper than where
 * about `reach` standard deviations of T lie.
 *
 * Domain     count ≥ 2 whole, k finite, trials ≥ 1.
 * Method     Trapezoidal rules, in ln U from the peak of the integrand outwards until nothing is added, and in V around its own
 *            peak, so that a far tail keeps its digits. The steps follow the sharper of the two: the density of T, or g, which
 *            falls from 1 to 0 within 1/z of the score z that one in `trials` passes. Below 20 degrees of freedom the lower tail of ln U
 *            is long, and is drawn together by τ − e^(−τ).
 * Accuracy   1e-13 relative; test/core/method/curveHitChance.test.ts.
 * Reference  Trefethen & Weideman (2014), The exponentially convergent trapezoidal rule, SIAM Review 56.
 */
export function estimatedMark(count: number, k: number, trials?: number): EstimatedMark {
  const df = count - 1;
  const root = Math.sqrt(count);
  const edge = trials === undefined ? Infinity : normalScore(1 / trials);
  const sharp = Math.max(1, trials === undefined ? k + 1.6 * Math.sqrt(1 / count + (k * k) / (2 * df)) : edge);
  const across = Math.min(0.5, (0.27 * root) / sharp);
  const points = Math.ceil(FAR / across);
  const along = 0.55 / Math.sqrt(2 * df + (root * sharp + 2.5) ** 2);
  const stretch = df < 20 && k > 0;
  const scale = ((along * across) / (Math.PI * Math.SQRT2)) * Math.sqrt(df) * Math.exp(-stirlingError(df / 2));
  const logBelow: number[] = [];
  const weights: number[] = [];

  /** Adds the points at one U; their share of E[g]. */
  const addRow = (centre: number, tau: number) => {
    const bend = stretch ? Math.exp(-tau) : 0;
    const s = Math.expm1(centre + (stretch ? (tau - bend + 1) / 2 : tau));
    const weight = scale * Math.exp(df * (log1pMinus(s) - (s * s) / 2)) * (stretch ? (1 + bend) / 2 : 1);
    const at = k * (1 + s);
    const middle = at > Math.max(edge, 0) ? (Math.max(edge, (at * count) / (count + 1)) - at) * root : 0;
    let share = 0;
    for (let j = -points; j <= points; j++) {
      const v = middle + j * across;
      const t = at + v / root;
      const log = t > 0 ? Math.log1p(-normalTail(t)) : Math.log(normalTail(-t));
      const w = weight * Math.exp(-0.5 * v * v);
      logBelow.push(log);
      weights.push(w);
      share += trials === undefined ? w : -w * Math.expm1(trials * log);
    }
    return share;
  };

  const centre = trials === undefined ? 0 : peak(count, k, trials);
  let total = 0;
  for (const direction of [1, -1]) {
    let before = 0;
    for (let j = direction === 1 ? 0 : 1; j < 100_000; j++) {
      const share = addRow(centre, direction * j * along);
      total += share;
      if (share < 1e-18 * total && share <= before) break;
      before = share;
    }
  }
  return { logBelow: Float64Array.from(logBelow), weights: Float64Array.from(weights) };
}

/** About where in ln U the integrand is largest: the maximum of a concave bound of its logarithm, by thirds. */
function peak(count: number, k: number, trials: number): number {
  const df = count - 1;
  const size = (x: number) => {
    const hit = Math.log(trials) + logTail((k * Math.exp(x)) / Math.sqrt(1 + 1 / count));
    return df * (x - Math.exp(2 * x) / 2) + Math.min(0, hit);
  };
  let low = -40;
  let high = 2;
  for (let round = 0; round < 60; round++) {
    const third = (high - low) / 3;
    if (size(low + third) < size(high - third)) low += third;
    else high -= third;
  }
  return (low + high) / 2;
}

/** ln P(Z > x), also where the tail itself underflows. */
function logTail(x: number): number {
  return x < 30 ? Math.log(normalTail(x)) : -(x * x) / 2 - Math.log(x);
}

/** 1 − E[Φ(T)^trials]. */
export function chanceBeyond({ logBelow, weights }: EstimatedMark, trials: number): number {
  // Summed plainly, a hundred thousand small terms of one sign lose four digits.
  let sum = 0;
  let lost = 0;
  for (let i = 0; i < weights.length; i++) {
    const term = -weights[i] * Math.expm1(trials * logBelow[i]) - lost;
    const next = sum + term;
    lost = next - sum - term;
    sum = next;
  }
  return sum;
}
