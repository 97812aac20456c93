import { log1pMinus } from "../special/log1pMinus";
import { stirlingError } from "../special/stirlingError";

/**
 * The density at t of a mark estimated from `count` scores, in units of the true curve: T = kU + V/√count, U² ~ χ²(count − 1)/(count − 1),
 * V ~ N(0, 1).
 *
 * Domain     count ≥ 2 whole; k and t finite.
 * Method     √count·E[φ(√count(t − kU))] by the trapezoidal rule in ln U, from the peak of the integrand outwards until nothing is added;
 *            its terms are positive, so far tails keep their digits. Below 20 degrees of freedom the lower tail of ln U is long, and is
 *            drawn together by τ − e^(−τ). Far from the mean, t − kU is a small difference of large numbers: at the peak it comes from the
 *            quadratic that the peak solves, and beside it from the distance to the peak.
 * Accuracy   1e-13 relative; test/core/method/curveHitChance.test.ts.
 * Reference  Trefethen & Weideman (2014), The exponentially convergent trapezoidal rule, SIAM Review 56.
 */
export function markDensity(count: number, k: number, t: number): number {
  const df = count - 1;
  const root = Math.sqrt(count);
  const peak = likeliestSpread(count, k, t);
  const centre = Math.log(peak);
  const reach = k * peak;
  const offset = k * k * peak > 1 ? (df * (peak - 1) * (peak + 1)) / (count * reach) : t - reach;
  const step = 0.55 / Math.sqrt(2 * df + (root * Math.abs(t) + 2.5) ** 2);
  const stretch = df < 20;
  let sum = 0;
  for (const direction of [1, -1]) {
    let before = 0;
    for (let j = direction === 1 ? 0 : 1; j < 100_000; j++) {
      const tau = direction * j * step;
      const bend = stretch ? Math.exp(-tau) : 0;
      const shift = stretch ? (tau - bend + 1) / 2 : tau;
      const s = Math.expm1(centre + shift);
      const x = root * (offset - reach * Math.expm1(shift));
      const size = s < -0.5 ? centre + shift - s : log1pMinus(s);
      const term = Math.exp(df * (size - (s * s) / 2) - 0.5 * x * x) * (stretch ? (1 + bend) / 2 : 1);
      sum += term;
      if (term <= 1e-18 * sum && term <= before) break;
      before = term;
    }
  }
  return sum * step * Math.sqrt((df * count) / 2) * (Math.exp(-stirlingError(df / 2)) / Math.PI);
}

/** The U at which the integrand is largest: the positive root of (ν + nk²)u² − nkt·u − ν, without cancellation. */
export function likeliestSpread(count: number, k: number, t: number): number {
  const df = count - 1;
  const square = df + count * k * k;
  const half = (count * k * t) / 2;
  const root = Math.sqrt(half * half + df * square);
  return half > 0 ? (half + root) / square : df / (root - half);
}
