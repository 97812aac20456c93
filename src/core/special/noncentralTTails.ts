import { UnsettledError } from "../domain";
import { erfcx, expSquare } from "./erfcx";
import { log1pMinus } from "./log1pMinus";
import { stirlingError } from "./stirlingError";

const CAP = 100_000;

/** One tail of the noncentral t distribution at t, with its derivatives by t. */
export interface NoncentralT {
  isLower: boolean;
  tail: number;
  density: number;
  slope: number;
}

/**
 * The smaller tail (near the middle: one of them) of (Z + ncp)/S at t, S² = χ²/df, and the density there.
 *
 * Domain     t finite, 1 ≤ df ≤ 1e10, ncp finite.
 * Method     tail = E[Φ(±(tS − ncp))]: the trapezoidal rule in ln S from the peak of the integrand outwards until
 *            nothing is added, its terms positive, so that far tails keep their digits. Series in the noncentrality (AS 243)
 *            underflow from ncp 38 on.
 * Accuracy   1e-14 relative; test/core/distribution/noncentralT.test.ts.
 * Reference  Witkovský (2013), A note on computing extreme tail probabilities of the noncentral t distribution, arXiv 1306.5294.
 */
export function noncentralTTails(t: number, df: number, ncp: number): NoncentralT {
  if (t < 0) {
    const mirrored = noncentralTTails(-t, df, -ncp);
    return { ...mirrored, isLower: !mirrored.isLower, slope: -mirrored.slope };
  }
  const isLower = t < ncp;
  const sign = isLower ? 1 : -1;
  // Where v·ln s − v·s²/2 − (ts − ncp)²/2 is largest; the last part only counts on the far side of ts = ncp.
  const peak = (t * ncp + Math.sqrt(t * t * ncp * ncp + 4 * df * (df + t * t))) / (2 * (df + t * t));
  const step = 0.55 / Math.sqrt(2 * df + (Math.abs(ncp) + 2.5) ** 2);
  const stretch = df < 20 ? 1 : 0;
  let tail = 0;
  let density = 0;
  let slope = 0;
  const centre = Math.log(peak);
  for (const direction of [1, -1]) {
    let before = 0;
    for (let j = direction === 1 ? 0 : 1; ; j++) {
      if (j > CAP) throw new UnsettledError("The noncentral t sum");
      const tau = direction * j * step;
      const bend = stretch && Math.exp(-tau);
      const u = centre + (stretch ? (tau - bend + 1) / 2 : tau);
      const near = Math.abs(u) < 0.5;
      // Next to 1, s − 1 carries the digits: df·s² and t·s − ncp are differences of large numbers there.
      const s1 = near ? Math.expm1(u) : Math.exp(u) - 1;
      const s = near ? 1 + s1 : Math.exp(u);
      const x = sign * (near ? t - ncp + t * s1 : t * s - ncp);
      const logWeight = near ? log1pMinus(s1) - (s1 * s1) / 2 : u - (s * s - 1) / 2;
      const weight = Math.exp(df * logWeight) * (stretch ? (1 + bend) / 2 : 1);
      const half = weight * expSquare(x, -0.5);
      const size = x < 0 ? 0.5 * half * erfcx(-x * Math.SQRT1_2) : weight - 0.5 * half * erfcx(x * Math.SQRT1_2);
      const point = half * s;
      tail += size;
      density += point;
      slope -= point * s * sign * x;
      if (size <= 1e-18 * tail && size <= before) break;
      before = size;
    }
  }
  const scale = step * Math.sqrt(df / Math.PI) * Math.exp(-stirlingError(df / 2));
  const dense = scale / Math.sqrt(2 * Math.PI);
  return { isLower, tail: tail * scale, density: density * dense, slope: slope * dense };
}
