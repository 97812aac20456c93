import { UnsettledError } from "../domain";
import { deviance } from "./deviance";
import { logGammaOnePlus } from "./logGamma";
import { MOST_TERMS, saddleSeries } from "./saddleSeries";
import { saddleTails, saddleTerms, type Tails } from "./saddleTails";
import { stirlingError } from "./stirlingError";

const EPSILON = 2 ** -54;
const CAP = 2000;
const SERIES = saddleSeries(1, 0, MOST_TERMS, new Float64Array(MOST_TERMS));

/** x^a·e^(−x)/Γ(a + 1): the Poisson chance of a at mean x for any real a ≥ 0, and the scale of both gamma tails. */
export function gammaFactor(x: number, a: number): number {
  return Math.exp(-deviance(a, x, x - a) - stirlingError(a)) / Math.sqrt(2 * Math.PI * a);
}

/**
 * The lower and upper regularised incomplete gamma functions P(a, x) and Q(a, x).
 *
 * Domain     x ≥ 0, shape a > 0.
 * Edges      x = 0 gives 0 and 1, x = ∞ gives 1 and 0; anything outside the domain gives NaN.
 * Method     Near the mean and from shape 20 on Temme's expansion; else the series below the mean and Legendre's
 *            continued fraction above it, which then settle in a few dozen steps; for shapes below 1 and small x both
 *            tails from one series, since 1 − P keeps no digits there.
 * Accuracy   1e-13 relative for results down to 1e-100; test/core/special/gammaTails.test.ts.
 * Reference  Gautschi (1979), A computational procedure for incomplete gamma functions, ACM TOMS 5; Gil, Segura & Temme (2012).
 */
export function gammaTails(x: number, a: number): Tails {
  if (!(x >= 0 && a > 0 && a < Infinity)) return { lower: NaN, upper: NaN };
  if (x === 0) return { lower: 0, upper: 1 };
  // So far out the upper tail is below the smallest number.
  if (x > 10 * a + 2000) return { lower: 1, upper: 0 };
  if (x < 1e-300) return atNothing(x, a);
  if (a >= 20 && x > 0.4 * a && x < 2 * a) {
    const D = deviance(a, x, x - a);
    return saddleTails(SERIES, saddleTerms(a, D), a, D, x > a);
  }
  if (a < 1 && x < 1.5) return smallShape(x, a);
  return x < a + 1 ? below(x, a) : above(x, a);
}

function below(x: number, a: number): Tails {
  let term = 1;
  let sum = 1;
  for (let n = 1; term > EPSILON * sum; n++) {
    if (n > CAP) throw new UnsettledError("The incomplete gamma series");
    term *= x / (a + n);
    sum += term;
  }
  const lower = sum * gammaFactor(x, a);
  return { lower, upper: Math.max(0, 1 - lower) };
}

function above(x: number, a: number): Tails {
  // Lentz's algorithm on x + 1 − a − 1(1 − a)/(x + 3 − a − …).
  let b = x + 1 - a;
  let value = b;
  let c = b;
  let d = 0;
  for (let n = 1; ; n++) {
    if (n > CAP) throw new UnsettledError("The incomplete gamma fraction");
    const step = n * (a - n);
    b += 2;
    d = 1 / (b + step * d);
    c = b + step / c;
    value *= c * d;
    if (Math.abs(c * d - 1) < 2 * EPSILON * 2) break;
  }
  const upper = (a * gammaFactor(x, a)) / value;
  return { lower: Math.max(0, 1 - upper), upper };
}

function smallShape(x: number, a: number): Tails {
  let term = 1;
  let sum = 0;
  for (let n = 1; Math.abs(term) > EPSILON * x; n++) {
    term *= -x / n;
    sum += term / (a + n);
  }
  const exponent = a * Math.log(x) - logGammaOnePlus(a);
  const power = Math.exp(exponent);
  return { lower: power * (1 + a * sum), upper: -Math.expm1(exponent) - power * a * sum };
}

/** Where the terms themselves leave the range of numbers, the lower tail is its leading power of x. */
function atNothing(x: number, a: number): Tails {
  const lower = gammaTails(1e-300, a).lower * (x / 1e-300) ** a;
  return { lower, upper: 1 - lower };
}
