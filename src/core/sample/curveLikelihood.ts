import { symmetricSum } from "../numeric/symmetricSum";
import type { Curve } from "./curve";
import type { Sample } from "./sample";

export interface CurveLikelihood {
  /** ln of the variance with divisor n, on the shape's scale. */
  readonly logVariance: number;
  /** Σ ln dy/dx: what carries the density from the scale to the scores. */
  readonly logJacobian: number;
  readonly logLikelihood: number;
  /** 2 for mean and deviation, 3 where a power was fitted too. */
  readonly parameters: number;
  /** Undefined where n ≤ parameters + 1. */
  readonly aicc: number | undefined;
}

/**
 * The log-likelihood of the scores themselves under a fitted curve, and Akaike's criterion corrected for small samples:
 * ℓ = −n/2 (ln 2π + 1 + ln s²(n−1)/n) + Σ ln dy/dx, AICc = 2k − 2ℓ + 2k(k+1)/(n−k−1).
 *
 * Domain     a curve fitted to this sample.
 * Method     The spread is the maximum-likelihood one (divisor n) on the shape's scale. Without the Jacobian Σ ln dy/dx the shapes
 *            would be measured in different units and could not be compared.
 * Accuracy   1e-12 relative to the larger of the result and n; test/core/sample/curveLikelihood.test.ts.
 * Reference  Box & Cox (1964), J. R. Statist. Soc. B 26; Hurvich & Tsai (1989), Biometrika 76, 297–307.
 */
export function curveLikelihood(sample: Sample, curve: Curve): CurveLikelihood {
  const n = sample.count;
  const logVariance = 2 * Math.log(curve.shownSd) + Math.log((n - 1) / n);
  const logJacobian = logJacobianOf(sample, curve);
  const logLikelihood = (-n / 2) * (Math.log(2 * Math.PI) + 1 + logVariance) + logJacobian;
  const parameters = curve.powerFitted ? 3 : 2;
  const room = n - parameters - 1;
  const aicc = room > 0 ? 2 * parameters - 2 * logLikelihood + (2 * parameters * (parameters + 1)) / room : undefined;
  return { logVariance, logJacobian, logLikelihood, parameters, aicc };
}

function logJacobianOf({ sorted }: Sample, { shape, power = 0 }: Curve): number {
  if (shape.kind === "normal") return 0;
  if (shape.kind === "logit") {
    const { low, high } = shape;
    return symmetricSum(sorted, (x) => logOfShares(x - low, high - x, high - low));
  }
  return (power - 1) * symmetricSum(sorted, Math.log);
}

/** ln(whole/(below·above)), also where the quotient itself is no number. */
function logOfShares(below: number, above: number, whole: number): number {
  const quotient = whole / below / above;
  return quotient < Infinity ? Math.log(quotient) : Math.log(whole) - Math.log(below) - Math.log(above);
}
