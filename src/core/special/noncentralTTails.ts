import { UnsettledError } from "../domain";
import { erfcx, expSquare } from "./erfcx";
import { log1pMinus } from "./log1pMinus";
import { stirlingError } from "./stirlingError";

const CAP = 100_000;

/** One tail of the noncentral t distribution, and its two derivatives by t where |t| ≤ 1, by ln |t| beyond. */
export interface NoncentralTail {
  readonly isLower: boolean;
  readonly tail: number;
  readonly first: number;
  readonly second: number;
}

/**
 * The smaller tail (near the middle: one of them) of (Z + ncp)/S at t, S² = χ²/df, with its derivatives.
 *
 * Domain     t finite; df from 1 to 1e15; |ncp| at most 1000·√df.
 * Method     tail = E[Φ(±(tS − ncp))]: the trapezoidal rule in u = ln S from the peak of the integrand outwards until
 *            nothing is added, its terms positive, so that far tails keep their digits. Few degrees of freedom let the integrand
 *            fall off like e^(df·u), over hundreds of steps; u = (τ − e^(−τ) + 1)/2 shortens that side to a dozen. Series in
 *            the noncentrality (AS 243) underflow from ncp 38 on.
 * Accuracy   1e-14 relative down to 1e-15, 1e-13 down to 1e-100; test/core/distribution/noncentralT.test.ts.
 * Reference  Witkovský (2013), A note on computing extreme tail probabilities of the noncentral t distribution, arXiv 1306.5294.
 */
export function noncentralTTails(t: number, df: number, ncp: number): NoncentralTail {
  if (t < 0) {
    const { isLower, tail, first, second } = noncentralTTails(-t, df, -ncp);
    return { isLower: !isLower, tail, first: t < -1 ? first : -first, second };
  }
  const isLower = t < ncp;
  const sign = isLower ? 1 : -1;
  const far = t > 1;
  const centre = Math.log(peak(t, df, ncp));
  const step = 0.55 / Math.sqrt(2 * df + (Math.abs(ncp) + 2.5) ** 2);
  const stretched = df < 20;
  let tail = 0;
  let first = 0;
  let second = 0;
  for (const direction of [step, -step]) {
    let before = 0;
    for (let j = direction > 0 ? 0 : 1; ; j++) {
      if (j > CAP) throw new UnsettledError("The noncentral t sum");
      const tau = direction * j;
      const bend = stretched ? Math.exp(-tau) : 1;
      const u = centre + (stretched ? (tau - bend + 1) / 2 : tau);
      const near = Math.abs(u) < 0.5;
      // Next to 1, s − 1 carries the digits: df·s² and t·s − ncp are differences of large numbers there.
      const over = near ? Math.expm1(u) : 0;
      const s = near ? 1 + over : Math.exp(u);
      const x = sign * (near ? t - ncp + t * over : t * s - ncp);
      const logWeight = near ? log1pMinus(over) - (over * over) / 2 : u - (s * s - 1) / 2;
      const weight = (Math.exp(df * logWeight) * (1 + bend)) / 2;
      const half = (weight * expSquare(x, -0.5)) / 2;
      const size = x < 0 ? half * erfcx(-x * Math.SQRT1_2) : weight - half * erfcx(x * Math.SQRT1_2);
      const speed = far ? t * s : s;
      tail += size;
      first += half * speed;
      second += half * speed * (far ? sign - x * speed : -x * speed);
      if (size <= 1e-18 * tail && size <= before) break;
      before = size;
    }
  }
  const scale = step * Math.sqrt(df / Math.PI) * Math.exp(-stirlingError(df / 2));
  const slopes = scale * Math.sqrt(2 / Math.PI);
  return { isLower, tail: tail * scale, first: sign * first * slopes, second: second * slopes };
}

/**
 * The s at which df·(ln s − s²/2) − (ts − ncp)²/2 is largest: in each tail that is where the integrand is, its normal part
 * counting only on the far side of ts = ncp. Divided by t where t is large, since t² may overflow.
 */
function peak(t: number, df: number, ncp: number): number {
  const unit = Math.max(t, 1);
  const r = t / unit;
  const root = Math.sqrt(ncp * ncp * r * r + 4 * df * (df / unit / unit + r * r));
  return (ncp * r + root) / (2 * (df / unit + t * r));
}
