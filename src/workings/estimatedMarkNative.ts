import { normalScore } from "../core/special/normalScore";

/** More nodes than this would make a sheet slow. */
const MOST_NODES = 3000;
const FARTHEST = 6.4;

/**
 * A native formula about a mark estimated from a sample, in units of the true curve: T = kU + V/√n, U² chi-square over its n − 1 degrees of
 * freedom, V standard normal. In `body` w are the weights and b the chances Φ(T) that one score stays below: E[Φ(T)^m] is SUM(w*b^m)/SUM(w).
 * "" where it would take too many nodes.
 *
 * Trapezoidal rule in V and in ln U, drawn together by u − e^(−u) so that the long lower tail of few scores needs no more nodes. The
 * numbers choose the nodes, up to Φ(T)^trials: good to 1e-10. Needs LET, SEQUENCE and MAP (Excel 2021 or 365).
 */
export function estimatedMarkNative(
  [k, count]: readonly [string, string],
  at: { readonly k: number; readonly count: number; readonly trials: number },
  body: string,
): string {
  const degrees = at.count - 1;
  const sharp = Math.max(1, normalScore(1 / Math.max(2, at.trials)));
  const across = Math.ceil(FARTHEST / Math.min(0.7, (0.5 * Math.sqrt(at.count)) / sharp));
  const [low, high] = [end(degrees, -1), end(degrees, 1)];
  const step = Math.min(0.8 / Math.sqrt(2 * degrees), 0.5 / (Math.abs(at.k) * sharp), 0.25);
  const along = Math.ceil((high - low) / step) + 1;
  if (along * (2 * across + 1) > MOST_NODES) return "";
  return (
    `LET(k,${k},n,${count},u,SEQUENCE(${along},1,${low},${(high - low) / (along - 1)}),` +
    `z,SEQUENCE(1,${2 * across + 1},-${FARTHEST},${FARTHEST / across}),y,(u-EXP(0-u)+1)/2,` +
    `w,(1+EXP(0-u))*EXP((n-1)*(y-(EXP(2*y)-1)/2)-z*z/2),` +
    `b,MAP(k*EXP(y)+z/SQRT(n),LAMBDA(a,NORM.S.DIST(a,TRUE))),${body})`
  );
}

/** Where the weight of ln U has fallen to e^-25 of its peak, on one side. */
function end(degrees: number, side: 1 | -1): number {
  let u = (0.1 * side) / Math.sqrt(degrees);
  for (;;) {
    const y = (u - Math.exp(-u) + 1) / 2;
    if (degrees * (y - Math.expm1(2 * y) / 2) < -25) return u;
    u *= 1.1;
  }
}
