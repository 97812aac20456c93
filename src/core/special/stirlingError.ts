// x·δ(x) = N(t)/D(t) with t = 1/x² on (0, 1], least squares fit in 60 digits (mpmath 1.3), error below 7e-17, highest power first.
const N = [
  0.0067538003454658777249, 0.41979968909013444989, 3.8783913759609343521, 11.195148548868689173, 12.75803286777856215,
  6.2078181512190717124, 1.2518958925204363082, 0.083333333333333270468,
];
const D = [
  0.14130417392714617094, 6.0074616401777638866, 50.09688961613646323, 138.90706121946506931, 155.45968476177214115,
  74.986163473407931508, 15.056084043577645958, 1,
];

/**
 * What Stirling's formula leaves out: δ(x) = ln Γ(x + 1) − [(x + ½) ln x − x + ½ ln 2π], about 1/(12x).
 *
 * Domain     x ≥ 0.
 * Edges      0 and Infinity give Infinity and 0; a negative x or NaN gives NaN.
 * Method     A rational function of 1/x² for x ≥ 1 (the asymptotic series has 5 digits there); below 1 by
 *            δ(x) = δ(x + 1) + (x + ½) ln(1 + 1/x) − 1.
 * Accuracy   3e-16 absolute, which is what an exponent needs; test/core/special/stirlingError.test.ts.
 * Reference  Loader (2000), Fast and accurate computation of binomial probabilities.
 */
export function stirlingError(x: number): number {
  if (x < 1) return x > 0 ? stirlingError(x + 1) + ((x + 0.5) * Math.log1p(1 / x) - 1) : x === 0 ? Infinity : NaN;
  const t = 1 / (x * x);
  let a = N[0];
  let b = D[0];
  for (let i = 1; i < N.length; i++) {
    a = a * t + N[i];
    b = b * t + D[i];
  }
  return a / (b * x);
}
