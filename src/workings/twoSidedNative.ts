import { normalQuantile } from "../core/distribution/normalQuantile";
import { literal } from "./native";

const LARGEST_STEP = 0.15;
const LEAST_NODES = 40;

/**
 * The confidence with which x̄ ± factor·s holds the coverage, as native text: E[P(χ² ≥ (n − 1)r²/k²)] over the error x of the mean, where x ± r
 * just holds the coverage.
 *
 * The ends a = x − r and b = x + r are what is chosen, so that nothing is left to solve: with w from 0 upwards the tail (1 − coverage)/(1 + e^2w) lies
 * below a and (1 − coverage)/(1 + e^−2w) above b. Trapezoidal rule in w, weighted with the density of x and dx/dw; good to 1e-11. Needs LET,
 * SEQUENCE and MAP (Excel 2021 or 365).
 */
export function twoSidedNative(
  factor: number,
  [count, coverage]: readonly [string, string],
  at: { readonly count: number; readonly coverage: number },
): string {
  const end = farthest(at.count, at.coverage);
  const steps = Math.max(LEAST_NODES, Math.ceil(end / LARGEST_STEP));
  return (
    `LET(n,${count},g,${coverage},k,${literal(factor)},w,SEQUENCE(${steps + 1},1,0,${end / steps}),` +
    `p,(1-g)/(1+EXP(2*w)),q,(1-g)/(1+EXP(0-2*w)),` +
    `a,MAP(p,LAMBDA(x,NORM.S.INV(x))),b,MAP(q,LAMBDA(x,-NORM.S.INV(x))),` +
    `v,IF(w=0,0.5,1)*p*q*(EXP(a*a/2)+EXP(b*b/2))*EXP(0-n*(a+b)^2/8),` +
    `SUM(v*MAP((n-1)*((b-a)/2/k)^2,LAMBDA(x,CHISQ.DIST.RT(x,n-1))))/SUM(v))`
  );
}

/** The w at which the density of x has fallen to e^-28 of its peak. */
function farthest(count: number, coverage: number): number {
  const rest = 1 - coverage;
  for (let w = 0.001; ; w *= 1.1) {
    const x = (normalQuantile(rest / (1 + Math.exp(2 * w))) - normalQuantile(rest / (1 + Math.exp(-2 * w)))) / 2;
    if ((count * x * x) / 2 > 28) return w;
  }
}
