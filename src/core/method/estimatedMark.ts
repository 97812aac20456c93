import { normalScore } from "../special/normalScore";
import { normalTail } from "../special/normalTail";
import { likeliestSpread, markDensity } from "./markDensity";

/**
 * Where a mark estimated from `count` scores falls on the true curve (markDensity.ts), as a quadrature: each point carries ln Φ(T), the
 * logarithm of the chance that one score stays below it.
 */
export interface EstimatedMark {
  readonly logBelow: Float64Array;
  readonly weights: Float64Array;
  /** The points lie where Φ(T)^trials counts, not 1 − Φ(T)^trials. */
  readonly forMisses: boolean;
}

/** No number of trials up to 2⁵³ finds anything beyond this. */
const BEYOND_TRIALS = 12;

/**
 * The quadrature for 1 − E[Φ(T)^trials]; with `trials` left out one for the body of T, which serves any number of trials.
 *
 * Domain     count ≥ 2 whole; |k| up to 1e9; trials from 1 to 2⁵³ − 1.
 * Method     Trapezoidal rule in T, from the peak of the integrand outwards until nothing is added, so that a far tail keeps its digits.
 *            The step follows the sharper of the density, and of what is averaged, which falls from 1 to 0 within about 1/z of
 *            the score z that one in `trials` passes. For k < 0 the misses are averaged: hits are near certain, and T is wide.
 * Accuracy   1e-13 relative; test/core/method/curveHitChance.test.ts.
 * Reference  Trefethen & Weideman (2014), The exponentially convergent trapezoidal rule, SIAM Review 56.
 */
export function estimatedMark(count: number, k: number, trials?: number): EstimatedMark {
  const forMisses = trials !== undefined && k < 0;
  const spread = Math.sqrt(1 / count + (k * k) / (2 * (count - 1)));
  const sharp = trials === undefined ? Math.min(Math.abs(k) + 1.6 * spread, BEYOND_TRIALS) : normalScore(1 / trials);
  // With few scores the density has a bend at 0, which only the error of the mean makes smooth.
  const step = Math.min(count < 100 ? 0.5 / Math.sqrt(count) : 0.5 * spread, 0.27 / Math.max(sharp, 1));
  const start = trials === undefined ? Math.min(k, BEYOND_TRIALS) : peak(count, k, trials);
  const logBelow: number[] = [];
  const weights: number[] = [];
  let total = 0;
  for (const direction of [1, -1]) {
    let before = 0;
    for (let j = direction === 1 ? 0 : 1; j < 100_000; j++) {
      const t = start + direction * j * step;
      if (trials === undefined && t > BEYOND_TRIALS) break;
      const log = logBelowAt(t);
      const weight = step * markDensity(count, k, t);
      logBelow.push(log);
      weights.push(weight);
      const share =
        trials === undefined ? weight : weight * (forMisses ? Math.exp(trials * log) : -Math.expm1(trials * log));
      total += share;
      if (share <= 1e-18 * total && share <= before) break;
      before = share;
    }
  }
  return { logBelow: Float64Array.from(logBelow), weights: Float64Array.from(weights), forMisses };
}

/**
 * About where the integrand is largest, by thirds: the density by its own largest term, in logarithms that don't underflow. Beyond 40
 * neither hits nor misses are as frequent as the smallest number.
 */
function peak(count: number, k: number, trials: number): number {
  const df = count - 1;
  const size = (t: number) => {
    const u = likeliestSpread(count, k, t);
    const density = df * (Math.log(u) - (u * u) / 2) - (count * (t - k * u) ** 2) / 2;
    if (k < 0) return density + trials * logBelowAt(t);
    return (
      density + (t < 5 ? Math.log(-Math.expm1(trials * logBelowAt(t))) : Math.min(0, Math.log(trials) + logTail(t)))
    );
  };
  let low = -40;
  let high = 40;
  for (let round = 0; round < 120; round++) {
    const third = (high - low) / 3;
    if (size(low + third) < size(high - third)) low += third;
    else high -= third;
  }
  return (low + high) / 2;
}

/** ln Φ(t). */
function logBelowAt(t: number): number {
  return t > 0 ? Math.log1p(-normalTail(t)) : logTail(-t);
}

/** ln P(Z > x), also where the tail itself underflows. */
function logTail(x: number): number {
  return x < 30 ? Math.log(normalTail(x)) : -(x * x) / 2 - Math.log(x * Math.sqrt(2 * Math.PI));
}

/** 1 − E[Φ(T)^trials]. */
export function chanceBeyond({ logBelow, weights, forMisses }: EstimatedMark, trials: number): number {
  let sum = 0;
  for (let i = 0; i < weights.length; i++) {
    const log = trials * logBelow[i];
    sum += weights[i] * (forMisses ? Math.exp(log) : -Math.expm1(log));
  }
  return forMisses ? 1 - sum : sum;
}
