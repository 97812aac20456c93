import { requireProbability, UnsettledError } from "../domain";
import { noncentralTTails } from "../special/noncentralTTails";
import { normalScore } from "../special/normalScore";
import { requireNoncentral } from "./noncentralTChecks";
import { studentTUpperTailQuantile } from "./studentTUpperTailQuantile";

/**
 * The t with P(T > t) = p for T = (Z + ncp)/√(χ²/df), the noncentral t distribution.
 *
 * Domain     p in [0, 1]; df from 1 to 1e15, ∞ is the normal with mean ncp; |ncp| at most 1000·√df.
 * Edges      0 gives ∞, 1 gives −∞.
 * Method     Johnson and Welch's start, then Halley on the logarithm of the smaller tail, the tail and both derivatives from one sum.
 * Accuracy   1e-13 relative (next to t = 0: of 1); test/core/distribution/noncentralT.test.ts.
 * Reference  Johnson & Welch (1940), Applications of the non-central t-distribution, Biometrika 31.
 *
 * @throws {DomainError} if an argument is outside its domain.
 */
export function noncentralTUpperTailQuantile(p: number, df: number, ncp: number): number {
  requireProbability("p", p);
  requireNoncentral(df, ncp);
  if (p === 0 || p === 1) return p === 0 ? Infinity : -Infinity;
  // The middle is 0 then, and next to it the answer has digits of its own.
  if (ncp === 0) return studentTUpperTailQuantile(p, df);
  const z = normalScore(p);
  if (df === Infinity) return ncp + z;
  const wantLower = p > 0.5;
  const target = wantLower ? 1 - p : p;
  let t = start(z, df, ncp);
  let low = -Infinity;
  let high = Infinity;
  for (let round = 0; round < 200; round++) {
    const at = noncentralTTails(t, df, ncp);
    const other = at.isLower === wantLower ? 1 : -1;
    const tail = other > 0 ? at.tail : 1 - at.tail;
    const value = Math.log(tail / target);
    if (value === 0) return t;
    if (value < 0 === wantLower) low = t;
    else high = t;
    if (high - low <= 4e-16 * Math.abs(t)) return t;
    // Where a tail falls like a power of t, its logarithm is straight in ln t, not in t.
    const far = Math.abs(t) > 1;
    const slope = (other * at.first) / tail;
    const curvature = (other * at.second) / tail - slope * slope;
    const newton = -value / slope;
    const step = newton / Math.min(Math.max(1 + (0.5 * newton * curvature) / slope, 0.5), 2);
    const next = far ? t * Math.exp(step) : t + step;
    if (Math.abs(step) < 1e-6 || Math.abs(next) === Infinity) return next;
    t = next > low && next < high ? next : between(low, high, t);
  }
  throw new UnsettledError("The noncentral t quantile");
}

/** Johnson and Welch's approximation, and something beyond it where that has no value. */
function start(z: number, df: number, ncp: number): number {
  const c = 1 - 1 / (4 * df);
  const under = c * c - (z * z) / (2 * df);
  if (under > 0.05) return (ncp * c + z * Math.sqrt(under + (ncp * ncp) / (2 * df))) / under;
  return ncp + z * Math.sqrt(1 + (ncp * ncp) / df);
}

function between(low: number, high: number, t: number): number {
  if (low === -Infinity) return Math.min(2 * t, t / 2) - 1;
  if (high === Infinity) return Math.max(2 * t, t / 2) + 1;
  return (low + high) / 2;
}
