import { UnsettledError } from "../domain";
import { normalUpperTailQuantile } from "../distribution/normalUpperTailQuantile";
import { findRoot } from "../numeric/findRoot";

export interface RatioLimits {
  readonly lower: number;
  readonly upper: number;
}

/**
 * Score limits for the ratio θ of two rates x1/n1 over x2/n2: the θ at which Koopman's chi-square, the two rates fitted under rate 1 =
 * θ·rate 2, comes to z².
 *
 * Domain     whole numbers, 0 ≤ x ≤ n, n ≥ 1; x2 > 0.
 * Edges      x1 = 0 has the lower limit 0; rates of 1 need no correction.
 * Method     Roots in ln θ left and right of the ratio seen. For θ ≤ 1 the fitted 1 − rate 2 comes from a quadratic without subtraction and
 *            1 − rate 1 = (1 − θ) + θ(1 − rate 2); for θ > 1 the sides are exchanged: no digits are lost next to rates of 0 or 1.
 * Accuracy   relative error ≤ 1e-13 (test/core/method/ratioLimits.test.ts).
 * Reference  Koopman (1984), Biometrics 40.
 */
export function ratioLimits(x1: number, n1: number, x2: number, n2: number, confidence: number): RatioLimits {
  const z = normalUpperTailQuantile((1 - confidence) / 2);
  // A confidence that is 0 to the last digit has no width.
  if (z === 0) return { lower: x1 / n1 / (x2 / n2), upper: x1 / n1 / (x2 / n2) };
  const beyond = (logRatio: number) => koopman(x1, n1, x2, n2, logRatio) - z * z;
  // Half a success stands in for none: only to have somewhere to begin.
  const seen = Math.log(Math.max(x1, 0.5) / n1) - Math.log(x2 / n2);
  const stride = z * Math.sqrt(1 / Math.max(x1, 0.5) + 1 / x2) + 1e-9;
  const inside = x1 > 0 ? seen : walk(seen, -stride, (at) => beyond(at) < 0);
  const limit = (direction: number) => {
    const outside = walk(inside + direction * stride, direction * stride, (at) => beyond(at) > 0);
    // At a confidence next to 0 the interval is narrower than the rounding of the chi-square: it is the ratio itself.
    return Math.exp(beyond(inside) < 0 ? findRoot(beyond, inside, outside) : inside);
  };
  return { lower: x1 > 0 ? limit(-1) : 0, upper: limit(1) };
}

function walk(start: number, stride: number, arrived: (at: number) => boolean): number {
  for (let at = start, i = 0; i < 60; i++, at += stride * 2 ** i) if (arrived(at)) return at;
  throw new UnsettledError("The limits of the ratio");
}

/** Koopman's chi-square of the two rates against the ratio e^logRatio. */
function koopman(x1: number, n1: number, x2: number, n2: number, logRatio: number): number {
  if (logRatio > 0) return koopman(x2, n2, x1, n1, -logRatio);
  const ratio = Math.exp(logRatio);
  const short = -Math.expm1(logRatio);
  const all = n1 + n2;
  // The fitted rate 2 solves all·ratio·p² − sum·p + (x1 + x2) = 0; 1 − p solves the same with `lead` for −sum.
  const sum = ratio * (n1 + x2) + x1 + n2;
  const lead = ratio * (n1 + n2 + (n2 - x2)) - x1 - n2;
  const root = Math.sqrt(lead * lead + 4 * all * ratio * (n2 - x2) * short);
  const pass2 = (2 * (x1 + x2)) / (sum + root);
  const fail2 =
    lead > 0 ? (lead + root) / (2 * all * ratio) : root > lead ? (2 * (n2 - x2) * short) / (root - lead) : 0;
  return part(x1, n1, ratio * pass2, short + ratio * fail2) + part(x2, n2, pass2, fail2);
}

/** (x − n·p)²/(n·p·q), the difference taken on the side of the smaller rate. */
function part(x: number, n: number, p: number, q: number): number {
  const difference = p < q ? x - n * p : n * q - (n - x);
  return difference === 0 ? 0 : (difference * difference) / (n * p * q);
}
