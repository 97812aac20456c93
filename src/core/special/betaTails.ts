import { betaFactor } from "./betaFactor";
import { betaFraction } from "./betaFraction";
import { deviance } from "./deviance";
import { logGammaOnePlus } from "./logGamma";
import { logGammaStep } from "./logGammaStep";
import { MOST_TERMS, saddleSeries } from "./saddleSeries";
import { saddleTails, saddleTerms, type Tails } from "./saddleTails";

const TINY = 1e-290;
const series = new Float64Array(MOST_TERMS);

/**
 * The two regularised incomplete beta functions I_x(a, b) and I_y(b, a), y = 1 − x.
 *
 * Domain     a, b > 0 and finite; x, y ≥ 0 with x + y = 1; lambda = a·y − b·x, which the caller knows to more digits than x gives.
 * Method     Where both shapes are 60 or more and x is near the mean, Temme's expansion with its coefficients made for
 *            this mean, which takes the same time for any shapes; else a continued fraction on the side of the mean where
 *            it settles quickly; for a shape below 1 and x next to its end both tails from one series.
 * Accuracy   1e-13 relative for results down to 1e-100; test/core/special/betaTails.test.ts.
 * Reference  DiDonato & Morris (1992), Algorithm 708: Significant digit computation of the incomplete beta function
 *            ratios, ACM TOMS 18; Temme (1992), Asymptotic inversion of the incomplete beta function, J. Comput. Appl. Math. 41.
 */
export function betaTails(a: number, b: number, x: number, y: number, lambda: number): Tails {
  if (!(x > 0)) return x === 0 ? { lower: 0, upper: 1 } : { lower: NaN, upper: NaN };
  if (!(y > 0)) return { lower: 1, upper: 0 };
  if (x < TINY || y < TINY) return atEnd(a, b, x, y);
  if (a < 1 && x < 0.7 && x * b < 1.5) return smallShape(a, b, x);
  if (b < 1 && y < 0.7 && y * a < 1.5) {
    const { lower, upper } = smallShape(b, a, y);
    return { lower: upper, upper: lower };
  }
  const small = Math.min(a, b);
  if (small >= 60) {
    const n = a + b;
    const D = deviance(a, n * x, -lambda) + deviance(b, n * y, lambda);
    if (D < 0.32 * small) {
      const p = small / n;
      const q = Math.max(a, b) / n;
      const terms = saddleTerms(small, D);
      saddleSeries((q - p) / Math.sqrt(q), p, terms, series);
      const tails = saddleTails(series, terms, small, D, a <= b ? lambda < 0 : lambda > 0);
      return a <= b ? tails : { lower: tails.upper, upper: tails.lower };
    }
  }
  if (lambda >= 0) {
    const lower = betaFactor(a, b, x, y, lambda) * betaFraction(a, b, x, y, lambda);
    return { lower, upper: Math.max(0, 1 - lower) };
  }
  const upper = betaFactor(a, b, x, y, lambda) * betaFraction(b, a, y, x, -lambda);
  return { lower: Math.max(0, 1 - upper), upper };
}

/** Both tails from one series in x for a shape below 1: 1 − lower keeps no digits there, and the fraction creeps. */
function smallShape(a: number, b: number, x: number): Tails {
  let term = 1;
  let sum = 0;
  for (let n = 1; Math.abs(term) > 2 ** -55 * x; n++) {
    term *= ((n - b) / n) * x;
    sum += term / (a + n);
  }
  const exponent = a * Math.log(x) - logGammaOnePlus(a) + logGammaStep(b, a);
  const power = Math.exp(exponent);
  return { lower: power * (1 + a * sum), upper: -Math.expm1(exponent) - power * a * sum };
}

/** Where the terms themselves leave the range of numbers, a tail is its leading power. */
function atEnd(a: number, b: number, x: number, y: number): Tails {
  if (x < y) {
    const lower = betaTails(a, b, TINY, 1, a).lower * (x / TINY) ** a;
    return { lower, upper: 1 - lower };
  }
  const upper = betaTails(a, b, 1, TINY, -b).upper * (y / TINY) ** b;
  return { lower: 1 - upper, upper };
}
