import { DomainError } from "../domain";
import type { Curve } from "./curve";
import { fitPower } from "./fitPower";
import { geometricMean } from "./geometricMean";
import type { Sample } from "./sample";
import { logitScale, logScale, NORMAL_SCALE, powerOfLog, powerScale, type Scale } from "./scales";
import { shapeText, type Shape } from "./shape";

/** Below this the squares of deviations have no digits left. */
const LEAST_SD = 1e-145;
const remembered = new WeakMap<Sample, Map<string, Curve>>();

/**
 * The normal curve through a sample on a shape's scale: mean and sample standard deviation (n − 1) of the transformed scores.
 *
 * Domain     at least two scores with a spread; all above 0 for lognormal and Box-Cox, strictly inside the bounds for logit.
 * Edges      a Box-Cox power that carries the scores out of the range of numbers is refused.
 * Method     Scores over their geometric mean for the logarithm and the powers (see Curve); the power by maximum likelihood (fitPower).
 *            A curve once fitted is remembered with its sample, so that several cells on one column fit it once.
 * Accuracy   1e-12 relative for mean and deviation, 1e-9 for a fitted power (test/core/sample/fitCurve.test.ts).
 * Reference  Box & Cox (1964), J. R. Statist. Soc. B 26, 211–252.
 *
 * @throws {DomainError} naming `argument` where scores lie outside the shape, with how many do and the first of them.
 */
export function fitCurve(argument: string, sample: Sample, shape: Shape): Curve {
  const key = shapeText(shape);
  let curves = remembered.get(sample);
  if (!curves) remembered.set(sample, (curves = new Map<string, Curve>()));
  let curve = curves.get(key);
  if (!curve) curves.set(key, (curve = fit(argument, sample, shape)));
  return curve;
}

function fit(argument: string, sample: Sample, shape: Shape): Curve {
  const { scale, scaled, power } = scaledSample(argument, sample, shape);
  const { mean, sd } = scaled;
  const shownMean = scale.shownMean(mean);
  const shownSd = scale.shownSd(sd);
  // Squares and powers may overflow or vanish: what is left then would look like a curve and be none.
  if (!(sd > LEAST_SD && sd < Infinity && shownSd > 0 && shownSd < Infinity && Number.isFinite(shownMean))) {
    throw new DomainError(
      argument,
      sample.values[0],
      `numbers with a spread that can be computed on the scale of the shape "${shapeText(shape)}"`,
      `they run from ${sample.minimum} to ${sample.maximum}`,
    );
  }
  return {
    shape,
    ...(power !== undefined && { power }),
    powerFitted: shape.kind === "boxcox" && shape.power === undefined,
    count: sample.count,
    mean,
    sd,
    shownMean,
    shownSd,
    scaled,
    toScale: scale.toScale,
    fromScale: scale.fromScale,
  };
}

function scaledSample(
  argument: string,
  sample: Sample,
  shape: Shape,
): { scale: Scale; scaled: Sample; power?: number } {
  if (shape.kind === "normal") return { scale: NORMAL_SCALE, scaled: sample };
  if (shape.kind === "logit") {
    requireInside(argument, sample, shape, shape.low, shape.high);
    const scale = logitScale(shape.low, shape.high);
    return { scale, scaled: sample.mapped(scale.toScale) };
  }
  requireInside(argument, sample, shape, 0, Infinity);
  const centre = geometricMean(sample.sorted);
  if (shape.kind === "lognormal") {
    const scale = logScale(centre);
    return { scale, scaled: sample.mapped(scale.toScale) };
  }
  const logs = fitCurve(argument, sample, { kind: "lognormal" }).scaled;
  const power = shape.power ?? fitPower(logs.sorted);
  return { scale: powerScale(power, centre), scaled: logs.mapped(powerOfLog(power)), power };
}

function requireInside(argument: string, { values, count }: Sample, shape: Shape, low: number, high: number): void {
  let outside = 0;
  let first = NaN;
  for (let i = 0; i < count; i++) if (!(values[i]! > low && values[i]! < high) && outside++ === 0) first = values[i]!;
  if (outside > 0) {
    const where = high === Infinity ? "above 0" : `strictly between ${low} and ${high}`;
    const came = `${outside} of ${count} ${outside === 1 ? "is" : "are"} not, the first is ${first}`;
    throw new DomainError(argument, first, `numbers ${where} for the shape "${shapeText(shape)}"`, came);
  }
}
