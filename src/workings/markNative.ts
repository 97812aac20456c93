import type { Better } from "../core/method/better";
import type { Curve } from "../core/sample/curve";
import type { Sample } from "../core/sample/sample";
import { literal } from "./native";
import { fittedPowerCheck } from "./nativeFit";
import { backNative, countNative, scaleNative, shiftedNative } from "./nativeScale";
import type { Steps } from "./steps";

/** Who showed that x̄ + k·s, k a noncentral t quantile over √n, is exact. */
export const OWEN = "Owen 1968: the mark of a normal sample has a noncentral t distribution";

/** z(1 − fraction), without the digits that the difference would lose. */
export function zNative(fraction: string): string {
  return `-NORM.S.INV(${fraction})`;
}

/** A factor as it follows the mean: "+k" where the mark lies above it, "-k" below; `factor` may carry one sign of its own. */
export function signedNative(factor: string, better: Better): string {
  const negative = factor.startsWith("-");
  return `${negative === (better === "low") ? "+" : "-"}${negative ? factor.slice(1) : factor}`;
}

/** The score at mean + factor·sd of a curve fitted to a range; `factor` with its sign (signedNative). */
export function markNative(range: string, { shape, power }: Curve, factor: string): string {
  if (shape.kind === "normal") return `AVERAGE(${range})${factor}*STDEV.S(${range})`;
  const point = `AVERAGE(y)${factor}*STDEV.S(y)`;
  // On x^λ/λ: of (x^λ − 1)/λ the 1 would swallow the digits of a small x^λ.
  const back =
    shape.kind === "boxcox" && power !== undefined && power !== 0
      ? `(${literal(power)}*(${point}))^(1/${literal(power)})`
      : backNative(point, shape, power);
  return `LET(y,${shiftedNative(range, shape, power)},${back})`;
}

/** The check of a fitted power, which everything about the curve stands on. */
export function addFittedPower(steps: Steps, range: string, curve: Curve, sample: Sample): Steps {
  if (curve.powerFitted) {
    steps.rows.push(fittedPowerCheck(range, curve, sample));
    steps.add("power of the shape", curve.power!);
  }
  return steps;
}

/** The curve fitted to a range: how many scores, mean, standard deviation, on the scale of the shape. */
export function addCurve(steps: Steps, range: string, curve: Curve, sample: Sample): Steps {
  const { shape, power } = curve;
  const scale = shape.kind === "normal" ? "" : ", on the scale of the shape";
  return addFittedPower(steps, range, curve, sample)
    .add("scores used", curve.count, countNative(range))
    .add(`curve mean${scale}`, curve.shownMean, `AVERAGE(${scaleNative(range, shape, power)})`)
    .add(`curve standard deviation${scale}`, curve.shownSd, `STDEV.S(${shiftedNative(range, shape, power)})`);
}
