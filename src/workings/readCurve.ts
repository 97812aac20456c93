import type { Curve } from "../core/sample/curve";
import { fitCurve } from "../core/sample/fitCurve";
import { NORMAL, type Shape } from "../core/sample/shape";
import { readScores, type Scores } from "../sheet/readScores";
import { readShape } from "../sheet/readShape";
import type { WorkingsCall } from "./workingsCall";

/** The arguments `scores` and `shape` as the cell functions read them, with the text of the scores and the curve fitted to them. */
export function readCurve(call: WorkingsCall): Scores & { readonly range: string; readonly curve: Curve } {
  return curveOf(call, readShape(call.cell("shape")));
}

/** The same where a function takes the scores as normal. */
export function readNormalCurve(call: WorkingsCall): Scores & { readonly range: string; readonly curve: Curve } {
  return curveOf(call, NORMAL);
}

function curveOf(call: WorkingsCall, shape: Shape) {
  const scores = readScores("scores", call.range("scores"));
  return { ...scores, range: call.text("scores"), curve: fitCurve("scores", scores.sample, shape) };
}
