import { betaCdf } from "../../core/distribution/betaCdf";
import { betaQuantile } from "../../core/distribution/betaQuantile";
import { chiSquareCdf } from "../../core/distribution/chiSquareCdf";
import { chiSquareQuantile } from "../../core/distribution/chiSquareQuantile";
import { chiSquareUpperTail } from "../../core/distribution/chiSquareUpperTail";
import { chiSquareUpperTailQuantile } from "../../core/distribution/chiSquareUpperTailQuantile";
import { fCdf } from "../../core/distribution/fCdf";
import { fQuantile } from "../../core/distribution/fQuantile";
import { fUpperTail } from "../../core/distribution/fUpperTail";
import { gammaCdf } from "../../core/distribution/gammaCdf";
import { gammaQuantile } from "../../core/distribution/gammaQuantile";
import { normalCdf } from "../../core/distribution/normalCdf";
import { normalPdf } from "../../core/distribution/normalPdf";
import { normalQuantile } from "../../core/distribution/normalQuantile";
import { normalUpperTailQuantile } from "../../core/distribution/normalUpperTailQuantile";
import { studentTCdf } from "../../core/distribution/studentTCdf";
import { studentTPdf } from "../../core/distribution/studentTPdf";
import { studentTQuantile } from "../../core/distribution/studentTQuantile";
import { studentTUpperTail } from "../../core/distribution/studentTUpperTail";
import { studentTUpperTailQuantile } from "../../core/distribution/studentTUpperTailQuantile";
import { logGamma } from "../../core/special/logGamma";
import { numeric, type NativeTable } from "./native";

/** Degrees of freedom lose what stands behind the point, as the host does it. */
const whole = Math.trunc;
const degrees = (df: number) => (whole(df) >= 1 ? whole(df) : NaN);
const positive = (x: number) => (x > 0 ? x : NaN);

const normal = numeric(4, 4, (x, mean, sd, cumulative) => {
  const z = (x - mean) / positive(sd);
  return cumulative ? normalCdf(z) : normalPdf(z) / sd;
});
const normalInverse = numeric(3, 3, (p, mean, sd) => mean + positive(sd) * normalQuantile(p));
const lognormalInverse = numeric(3, 3, (p, mean, sd) => Math.exp(mean + positive(sd) * normalQuantile(p)));
const twoSidedT = numeric(2, 2, (p, df) => (p === 1 ? 0 : studentTUpperTailQuantile(p / 2, degrees(df))));
const chiUpper = numeric(2, 2, (x, df) => (x >= 0 ? chiSquareUpperTail(x, degrees(df)) : NaN));
const chiUpperInverse = numeric(2, 2, (p, df) => chiSquareUpperTailQuantile(p, degrees(df)));
const fUpper = numeric(3, 3, (x, df1, df2) => (x >= 0 ? fUpperTail(x, degrees(df1), degrees(df2)) : NaN));
const fUpperInverse = numeric(3, 3, (p, df1, df2) => 1 / fQuantile(p, degrees(df2), degrees(df1)));
const gamma = numeric(4, 4, (x, shape, scale, cumulative) => {
  if (!(x >= 0)) return NaN;
  return cumulative ? gammaCdf(x / positive(scale), positive(shape)) : gammaDensity(x, shape, positive(scale));
});
const gammaInverse = numeric(3, 3, (p, shape, scale) => positive(scale) * gammaQuantile(p, positive(shape)));
const betaInverse = numeric(3, 5, (p, a, b, low = 0, high = 1) => low + (high - low) * betaQuantile(p, a, b));
const confidenceNormal = numeric(3, 3, (alpha, sd, n) =>
  whole(n) >= 1 ? (normalUpperTailQuantile(alpha / 2) * positive(sd)) / Math.sqrt(whole(n)) : NaN,
);

/** Continuous distributions, by our own kernel. */
export const distribution: NativeTable = {
  "NORM.S.DIST": numeric(2, 2, (z, cumulative) => (cumulative ? normalCdf(z) : normalPdf(z))),
  NORMSDIST: numeric(1, 1, normalCdf),
  PHI: numeric(1, 1, normalPdf),
  GAUSS: numeric(1, 1, (z) => normalCdf(z) - 0.5),
  "NORM.S.INV": numeric(1, 1, normalQuantile),
  NORMSINV: numeric(1, 1, normalQuantile),
  "NORM.DIST": normal,
  NORMDIST: normal,
  "NORM.INV": normalInverse,
  NORMINV: normalInverse,
  "LOGNORM.DIST": numeric(4, 4, (x, mean, sd, cumulative) => {
    const z = (Math.log(positive(x)) - mean) / positive(sd);
    return cumulative ? normalCdf(z) : normalPdf(z) / (sd * x);
  }),
  "LOGNORM.INV": lognormalInverse,
  LOGINV: lognormalInverse,
  "T.DIST": numeric(3, 3, (x, df, cumulative) =>
    cumulative ? studentTCdf(x, degrees(df)) : studentTPdf(x, degrees(df)),
  ),
  "T.DIST.RT": numeric(2, 2, (x, df) => studentTUpperTail(x, degrees(df))),
  "T.DIST.2T": numeric(2, 2, (x, df) => (x >= 0 ? 2 * studentTUpperTail(x, degrees(df)) : NaN)),
  TDIST: numeric(3, 3, (x, df, sides) =>
    x >= 0 && (sides === 1 || sides === 2) ? sides * studentTUpperTail(x, degrees(df)) : NaN,
  ),
  "T.INV": numeric(2, 2, (p, df) => studentTQuantile(p, degrees(df))),
  "T.INV.2T": twoSidedT,
  TINV: twoSidedT,
  "CHISQ.DIST": numeric(3, 3, (x, df, cumulative) => {
    if (!(x >= 0)) return NaN;
    return cumulative ? chiSquareCdf(x, degrees(df)) : gammaDensity(x, degrees(df) / 2, 2);
  }),
  "CHISQ.DIST.RT": chiUpper,
  CHIDIST: chiUpper,
  "CHISQ.INV": numeric(2, 2, (p, df) => chiSquareQuantile(p, degrees(df))),
  "CHISQ.INV.RT": chiUpperInverse,
  CHIINV: chiUpperInverse,
  "F.DIST": numeric(4, 4, (x, df1, df2, cumulative) => {
    if (!(x >= 0)) return NaN;
    return cumulative ? fCdf(x, degrees(df1), degrees(df2)) : fDensity(x, degrees(df1), degrees(df2));
  }),
  "F.DIST.RT": fUpper,
  FDIST: fUpper,
  "F.INV": numeric(3, 3, (p, df1, df2) => fQuantile(p, degrees(df1), degrees(df2))),
  "F.INV.RT": fUpperInverse,
  FINV: fUpperInverse,
  "GAMMA.DIST": gamma,
  GAMMADIST: gamma,
  "GAMMA.INV": gammaInverse,
  GAMMAINV: gammaInverse,
  GAMMALN: numeric(1, 1, (x) => logGamma(positive(x))),
  "GAMMALN.PRECISE": numeric(1, 1, (x) => logGamma(positive(x))),
  "BETA.DIST": numeric(4, 6, (x, a, b, cumulative, low = 0, high = 1) => {
    const part = (x - low) / positive(high - low);
    return cumulative ? betaCdf(part, a, b) : betaDensity(part, a, b) / (high - low);
  }),
  BETADIST: numeric(3, 5, (x, a, b, low = 0, high = 1) => betaCdf((x - low) / positive(high - low), a, b)),
  "BETA.INV": betaInverse,
  BETAINV: betaInverse,
  "EXPON.DIST": numeric(3, 3, (x, rate, cumulative) => {
    if (!(x >= 0 && rate > 0)) return NaN;
    return cumulative ? -Math.expm1(-rate * x) : rate * Math.exp(-rate * x);
  }),
  "WEIBULL.DIST": numeric(4, 4, (x, shape, scale, cumulative) => {
    if (!(x >= 0 && shape > 0 && scale > 0)) return NaN;
    const power = (x / scale) ** shape;
    return cumulative ? -Math.expm1(-power) : (shape / scale) * (x / scale) ** (shape - 1) * Math.exp(-power);
  }),
  "CONFIDENCE.NORM": confidenceNormal,
  CONFIDENCE: confidenceNormal,
  "CONFIDENCE.T": numeric(
    3,
    3,
    (alpha, sd, n) => (studentTUpperTailQuantile(alpha / 2, degrees(n - 1)) * positive(sd)) / Math.sqrt(whole(n)),
  ),
};

function gammaDensity(x: number, shape: number, scale: number): number {
  if (x === 0) return shape > 1 ? 0 : shape === 1 ? 1 / scale : Infinity;
  return Math.exp((shape - 1) * Math.log(x / scale) - x / scale - logGamma(shape)) / scale;
}

function betaDensity(x: number, a: number, b: number): number {
  if (!(x > 0 && x < 1 && a > 0 && b > 0)) return NaN;
  return Math.exp((a - 1) * Math.log(x) + (b - 1) * Math.log1p(-x) + logGamma(a + b) - logGamma(a) - logGamma(b));
}

function fDensity(x: number, df1: number, df2: number): number {
  if (x === 0) return df1 > 2 ? 0 : df1 === 2 ? 1 : Infinity;
  const ratio = (df1 * x) / (df1 * x + df2);
  return (betaDensity(ratio, df1 / 2, df2 / 2) * ratio * (1 - ratio)) / x;
}
