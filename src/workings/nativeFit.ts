import type { Curve } from "../core/sample/curve";
import type { Sample } from "../core/sample/sample";
import { literal } from "./native";
import { countNative, orderedNative, shiftedNative } from "./nativeScale";
import { asStep, type Step } from "./steps";

/** Where λ times the spread of the logarithms is smaller, e^{λl} − 1 and its derivative in λ would lose their digits: series take over. */
const NEAR = 0.3;
/** (e^w − 1)/w and (w e^w − e^w + 1)/w²: the divisors of 1, w, w² … */
const RISE = [1, 2, 6, 24, 120, 720, 5040, 40320, 362880];
const BEND = [2, 3, 8, 30, 144, 840, 5760, 45360, 403200];

/** A² − the distance of the ordered scores from their own normal curve − as one native expression. */
export function andersonDarlingNative(range: string, { shape, power }: Pick<Curve, "shape" | "power">): string {
  return (
    `LET(s,${orderedNative(range, shape, power)},n,${countNative(range)},z,(s-AVERAGE(s))/STDEV.S(s),i,SEQUENCE(n),` +
    `p,LN(MAP(z,LAMBDA(x,NORM.S.DIST(x,TRUE)))),q,LN(MAP(z,LAMBDA(x,NORM.S.DIST(-x,TRUE)))),` +
    `-n-SUM((2*i-1)*p+(2*n+1-2*i)*q)/n)`
  );
}

/** A² adjusted for the number of scores. */
export function adjustedNative(range: string, statistic: string): string {
  return `${statistic}*(1+0.75/${countNative(range)}+2.25/${countNative(range)}^2)`;
}

/** The p-value of D'Agostino & Stephens, by the branch to which the adjusted statistic belongs. */
export function andersonDarlingTailNative(adjusted: string, value: number): string {
  if (value < 0.2) return `LET(a,${adjusted},1-EXP(-13.436+101.14*a-223.73*a^2))`;
  if (value < 0.34) return `LET(a,${adjusted},1-EXP(-8.318+42.796*a-59.938*a^2))`;
  if (value < 0.6) return `LET(a,${adjusted},EXP(0.9177-4.279*a-1.38*a^2))`;
  if (value <= 10) return `LET(a,${adjusted},EXP(1.2937-5.709*a+0.0186*a^2))`;
  return `IF(${adjusted}>10,3.7E-24,"no")`;
}

/**
 * The check that a fitted power is the most likely one: the slope of the log-likelihood in it, per score, is 0, or still leads outwards at
 * the end of the range from −5 to 5. With l the logarithms less their mean and y = (e^{λl} − 1)/λ that slope is −cov(dy/dλ, y)/var(y).
 */
export function fittedPowerCheck(range: string, { shape, power = 0 }: Curve, { minimum, maximum }: Sample): Step {
  const lambda = literal(power);
  const logs = `l,IF(${range}<"",LN(${range}),""),g,AVERAGE(l)`;
  const far = Math.abs(power) * Math.log(maximum / minimum) > NEAR;
  const slope = far
    ? `LET(${logs},u,IF(${range}<"",EXP(${lambda}*(l-g)),""),1/${lambda}-SUM(IF(${range}<"",u*(l-g)*(u-AVERAGE(u)),0))/DEVSQ(u))`
    : `LET(${logs},w,IF(${range}<"",${lambda}*(l-g),""),y,IF(${range}<"",(l-g)*${nested(RISE, "w")},""),` +
      `-SUM(IF(${range}<"",(l-g)^2*${nested(BEND, "w")}*(y-AVERAGE(y)),0))/DEVSQ(y))`;
  const source = "Box & Cox 1964: the power of greatest likelihood";
  if (Math.abs(power) === 5) {
    const meaning = "check: the log-likelihood still rises at this end of the range of powers, must be TRUE";
    return asStep(meaning, true, `${slope}${power > 0 ? ">" : "<"}0`, source);
  }
  const meaning = `check: slope of the log-likelihood in the power, per score, at ${shape.kind}(${power}), must be 0`;
  return asStep(meaning, 0, slope, source);
}

/** The sum of the powers of w over the divisors: 1/2+w/3+w^2/8 … */
function nested(divisors: readonly number[], w: string): string {
  return `(${divisors.map((divisor, i) => (i === 0 ? `1/${divisor}` : `${w}${i > 1 ? `^${i}` : ""}/${divisor}`)).join("+")})`;
}

/** ln of the variance with divisor n on the shape's scale. */
export function logVarianceNative(range: string, { shape, power }: Curve): string {
  return `LN(VAR.P(${shiftedNative(range, shape, power)}))`;
}

/** Σ ln dy/dx over the scores. */
export function logJacobianNative(range: string, { shape, power = 0 }: Curve): string {
  if (shape.kind === "normal") return "0";
  if (shape.kind === "lognormal") return `-SUM(IF(${range}<"",LN(${range}),0))`;
  if (shape.kind === "boxcox") return `${literal(power - 1)}*SUM(IF(${range}<"",LN(${range}),0))`;
  const [low, high] = [literal(shape.low), literal(shape.high)];
  return `SUM(IF(${range}<"",LN((${high}-${low})/((${range}-${low})*(${high}-${range}))),0))`;
}
