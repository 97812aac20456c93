import type { Curve } from "../core/sample/curve";

export type FittedCurve = Pick<Curve, "toScale" | "mean" | "sd">;

/**
 * How densely scores lie at a score under a fitted curve, in shares per unit of the score; 0 where the curve doesn't reach. The slope of
 * the scale is taken over `step`, far narrower than a pixel: good enough to draw, never to compute on.
 */
export function curveDensity({ toScale, mean, sd }: FittedCurve, step: number): (score: number) => number {
  const height = 1 / (sd * Math.sqrt(2 * Math.PI));
  return (score) => {
    const deviate = (toScale(score) - mean) / sd;
    const slope = (toScale(score + step) - toScale(score - step)) / (2 * step);
    const density = height * Math.exp(-0.5 * deviate * deviate) * slope;
    return density >= 0 && density < Infinity ? density : 0;
  };
}
