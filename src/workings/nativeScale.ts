import type { Shape } from "../core/sample/shape";
import { literal } from "./native";

/*
 * A score column on the scale of a shape, as native text. `power` is the Box-Cox power in use (a curve's `power`), needed where it was fitted.
 */

/** How many scores a range holds; written-out arrays are counted by hand, since not every host lets COUNT see into one. */
export function countNative(range: string): string {
  return range.startsWith("{") ? `SUM(IF(${range}<"",1,0))` : `COUNT(${range})`;
}

/** One score on the shape's scale: ln x, ln((x − low)/(high − x)), (x^λ − 1)/λ. `score` is an address, a literal or something in parentheses. */
export function pointNative(score: string, shape: Shape, power?: number): string {
  if (shape.kind === "normal") return score;
  if (shape.kind === "logit") return `LN((${score}-${literal(shape.low)})/(${literal(shape.high)}-${score}))`;
  const exponent = powerOf(shape, power);
  return exponent === 0 ? `LN(${score})` : `((${score}^${literal(exponent)}-1)/${literal(exponent)})`;
}

/** The scores of a range on the shape's scale, for use inside AVERAGE, STDEV.S and the like, which skip what was blank. */
export function scaleNative(range: string, shape: Shape, power?: number): string {
  return shape.kind === "normal" ? range : `IF(${range}<"",${pointNative(range, shape, power)},"")`;
}

/**
 * The same up to a constant, x^λ/λ in place of (x^λ − 1)/λ, for STDEV.S, VAR.P and whatever else a constant doesn't change: where x^λ is small beside
 * 1, the 1 would swallow its digits.
 */
export function shiftedNative(range: string, shape: Shape, power?: number): string {
  return shape.kind === "normal" ? range : `IF(${range}<"",${shiftedPoint(range, shape, power)},"")`;
}

/** The scores up to a constant as one column in rising order, without the blanks, of a range of any form. Needs TOCOL (Excel 365). */
export function orderedNative(range: string, shape: Shape, power?: number): string {
  const point = shape.kind === "normal" ? `${range}*1` : shiftedPoint(range, shape, power);
  return `SORT(TOCOL(IF(${range}<"",${point},NA()),3))`;
}

/** From a point of the scale back to a score. */
export function backNative(point: string, shape: Shape, power?: number): string {
  if (shape.kind === "normal") return point;
  if (shape.kind === "logit") {
    const [low, high] = [literal(shape.low), literal(shape.high)];
    return `(${low}+(${high}-${low})/(1+EXP(-(${point}))))`;
  }
  const exponent = powerOf(shape, power);
  return exponent === 0 ? `EXP(${point})` : `((${literal(exponent)}*(${point})+1)^(1/${literal(exponent)}))`;
}

function shiftedPoint(score: string, shape: Shape, power?: number): string {
  const exponent = powerOf(shape, power);
  return exponent === 0 ? pointNative(score, shape, power) : `${score}^${literal(exponent)}/${literal(exponent)}`;
}

/** A lognormal curve is that of power 0; logit is no power and passes for 0 too. */
function powerOf(shape: Shape, power?: number): number {
  if (shape.kind !== "boxcox") return 0;
  const exponent = power ?? shape.power;
  if (exponent === undefined) throw new Error("a fitted Box-Cox power must be handed over");
  return exponent;
}
