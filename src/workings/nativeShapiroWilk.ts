import {
  LARGE_LOG_SD,
  LARGE_MEAN,
  LAST_WEIGHT,
  NEXT_WEIGHT,
  SMALL_BOUND,
  SMALL_LOG_SD,
  SMALL_MEAN,
} from "../core/sample/shapiroWilk";
import { literal } from "./native";
import { NORMAL } from "../core/sample/shape";
import { countNative, orderedNative } from "./nativeScale";

/** The native texts of Royston's version of the test, for a column of `count` scores (4 and more). */
export interface ShapiroWilkNative {
  readonly expectedSquares: string;
  readonly lastWeight: string;
  readonly nextWeight: string;
  readonly lack: string;
  readonly transformed: string;
  readonly mean: string;
  readonly sd: string;
}

export function shapiroWilkNative(range: string, count: number): ShapiroWilkNative {
  const expected =
    `n,${countNative(range)},i,SEQUENCE(n),m,MAP(i,LAMBDA(k,NORM.S.INV((k-0.375)/(n+0.25)))),q,SUM(m^2),h,1/SQRT(n),` +
    `a,${polynomialNative(LAST_WEIGHT, "h")}+INDEX(m,n)/SQRT(q)`;
  const second = `b,${polynomialNative(NEXT_WEIGHT, "h")}+INDEX(m,n-1)/SQRT(q)`;
  const twoOuter = count > 5;
  const rest = twoOuter
    ? "SQRT((q-2*INDEX(m,n)^2-2*INDEX(m,n-1)^2)/(1-2*a^2-2*b^2))"
    : "SQRT((q-2*INDEX(m,n)^2)/(1-2*a^2))";
  const inner = twoOuter ? "IF(i=2,-b,IF(i=n-1,b,m/f))" : "m/f";
  const lack =
    `LET(s,${orderedNative(range, NORMAL)},e,(s-AVERAGE(s))/SQRT(DEVSQ(s)),${expected},${twoOuter ? `${second},` : ""}` +
    `f,${rest},w,IF(i=1,-a,IF(i=n,a,${inner})),SUM((e-SUM(w*e)*w)^2))`;
  const ofCount = (coefficients: readonly number[]) =>
    count > 11
      ? `LET(h,LN(${countNative(range)}),${polynomialNative(coefficients, "h")})`
      : `LET(h,${countNative(range)},${polynomialNative(coefficients, "h")})`;
  return {
    expectedSquares: `LET(${expected},q)`,
    lastWeight: `LET(${expected},a)`,
    nextWeight: `LET(${expected},${second},b)`,
    lack,
    transformed: count > 11 ? `LN(${lack})` : `-LN(${ofCount(SMALL_BOUND)}-LN(${lack}))`,
    mean: ofCount(count > 11 ? LARGE_MEAN : SMALL_MEAN),
    sd: `EXP(${ofCount(count > 11 ? LARGE_LOG_SD : SMALL_LOG_SD)})`,
  };
}

/** The lack of W from three scores, whose weights are −√½, 0 and √½. */
export function lackOfThreeNative(range: string): string {
  return `1-(MAX(${range})-MIN(${range}))^2/2/DEVSQ(${range})`;
}

/** c₀ + c₁x + c₂x² …, nested as it is best computed. */
function polynomialNative(coefficients: readonly number[], x: string): string {
  return coefficients.reduceRight((text, c) => (text === "" ? literal(c) : `(${literal(c)}+${x}*${text})`), "");
}
