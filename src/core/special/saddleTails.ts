import { erfcx } from "./erfcx";
import { MOST_TERMS } from "./saddleSeries";

/** Both tails of a distribution function. */
export interface Tails {
  lower: number;
  upper: number;
}

const beta = new Float64Array(MOST_TERMS + 2);

/**
 * Both tails of a distribution that is nearly normal: e^(−D) · [½ erfcx(√D) ± S(η)/√(2πN)], η = ±√(2D/N).
 *
 * Domain     f the first `terms` of `saddleSeries`; N ≥ 20; D = Nη²/2 the deviance, |η| ≤ 0.8; `above` says on which side of the mean.
 * Method     Temme's expansion in the form of Gil, Segura & Temme: the terms by one backward recurrence, the scale
 *            factor e^(−D) common to both parts so that far tails keep their digits. A continued fraction needs √N steps here.
 * Accuracy   2e-15 relative plus that of D; test/core/special/gammaTails.test.ts, betaTails.test.ts.
 * Reference  Gil, Segura & Temme (2012), Efficient and accurate algorithms for the computation and inversion of the
 *            incomplete gamma function ratios, SIAM J. Sci. Comput. 34.
 */
export function saddleTails(f: Float64Array, terms: number, N: number, D: number, above: boolean): Tails {
  const eta = Math.sqrt((2 * D) / N) * (above ? 1 : -1);
  const last = terms - 2;
  beta[last + 1] = beta[last + 2] = 0;
  for (let m = last; m >= 0; m--) beta[m] = f[m + 1] + ((m + 2) * beta[m + 2]) / N;
  let series = 0;
  for (let m = last; m >= 0; m--) series = series * eta + beta[m];
  const correction = series / ((1 + beta[1] / N) * Math.sqrt(2 * Math.PI * N));
  const far = Math.exp(-D) * (0.5 * erfcx(Math.sqrt(D)) + (above ? correction : -correction));
  return above ? { lower: 1 - far, upper: far } : { lower: far, upper: 1 - far };
}

/** How many terms of the series reach 1e-17: the powers of η fall by 3.5/|η| a term, the recurrence by about √(12.5·N/m). */
export function saddleTerms(N: number, D: number): number {
  const byEta = 39 / Math.log(3.5 / (Math.sqrt((2 * D) / N) + 1e-3));
  const byN = N < 60 ? 26 : N < 300 ? 18 : 12;
  return Math.min(MOST_TERMS, Math.max(byN, Math.ceil(byEta) + 2));
}
