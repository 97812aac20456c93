import { andersonDarling } from "./andersonDarling";
import type { Curve } from "./curve";
import { curveLikelihood, type CurveLikelihood } from "./curveLikelihood";
import { fitCurve } from "./fitCurve";
import type { Sample } from "./sample";
import { NORMAL, type Shape } from "./shape";

export interface RankedShape {
  readonly shape: Shape;
  readonly curve: Curve;
  readonly likelihood: CurveLikelihood;
  readonly aicc: number;
  readonly difference: number;
  /** Undefined below 8 scores and where the power was fitted. */
  readonly pValue: number | undefined;
}

export const LEAST_FOR_RANKING = 5;

/**
 * The shapes that can hold these scores, the one with the smallest corrected Akaike criterion first: normal; lognormal and Box-Cox where
 * all scores are above 0; logit where bounds are given and all scores lie strictly inside.
 *
 * Domain     at least 5 scores with a spread; low < high.
 * Edges      equal criteria keep the order above.
 * Reference  Burnham & Anderson (2002), Model Selection and Multimodel Inference, 2nd ed., ch. 2.
 *
 * @throws {DomainError} naming `argument` where the scores have no spread that can be computed.
 */
export function shapeRanking(argument: string, sample: Sample, bounds?: { low: number; high: number }): RankedShape[] {
  const { minimum, maximum } = sample;
  const shapes: Shape[] = [NORMAL];
  if (minimum > 0) shapes.push({ kind: "lognormal" }, { kind: "boxcox" });
  if (bounds && minimum > bounds.low && maximum < bounds.high) shapes.push({ kind: "logit", ...bounds });
  const ranked = shapes.map((shape) => {
    const curve = fitCurve(argument, sample, shape);
    const pValue = curve.powerFitted ? undefined : andersonDarling(curve.scaled).pValue;
    const likelihood = curveLikelihood(sample, curve);
    return { shape, curve, likelihood, aicc: likelihood.aicc!, pValue };
  });
  ranked.sort((a, b) => a.aicc - b.aicc);
  return ranked.map((one) => ({ ...one, difference: one.aicc - ranked[0]!.aicc }));
}
