import type { CutoffLimits } from "../core/method/cutoffLimits";
import type { PassingFractionLimits } from "../core/method/passingFractionLimits";
import { OWEN, zNative } from "./markNative";
import { literal, noncentralTNative } from "./native";
import type { Steps } from "./steps";

/** P(x̄ + factor·s lies above the mark of the true curve), z the place of that mark: F(k√n; n − 1, z√n). */
export function aboveTrueMarkNative(
  factor: number,
  n: string,
  zText: string,
  at: { count: number; z: number },
): string {
  const { count, z } = at;
  return noncentralTNative(
    `${literal(factor)}*SQRT(${n})`,
    `${n}-1`,
    `${zText}*SQRT(${n})`,
    count - 1,
    z * Math.sqrt(count),
  );
}

/** What the limits of a mark stand on, a step each: z, what is left out, the two factors and their proof. */
export function addLimitFactors(
  steps: Steps,
  limits: Pick<CutoffLimits, "count" | "z" | "alpha" | "noncentrality" | "nearFactor" | "farFactor">,
  [n, fraction, confidence]: readonly [string, string, string],
): Steps {
  const { z, alpha, noncentrality, nearFactor, farFactor } = limits;
  const at = (factor: number) => aboveTrueMarkNative(factor, n, zNative(fraction), limits);
  return steps
    .add("z of the fraction", z, zNative(fraction))
    .add("noncentrality: z times the square root of the count", noncentrality, `${zNative(fraction)}*SQRT(${n})`, OWEN)
    .add("chance left out on either side", alpha, `(1-${confidence})/2`)
    .add("factor of the near limit, in standard deviations from the mean", nearFactor, "", OWEN)
    .add("check: chance that it lies beyond the true mark, must be what is left out", alpha, at(nearFactor), OWEN)
    .add("factor of the far limit, in standard deviations from the mean", farFactor, "", OWEN)
    .add(
      "check: chance that it lies before the true mark, must be what is left out",
      alpha,
      `1-${at(farFactor)}`,
      OWEN,
    );
}

/** Where the plain mark comes to stand on the true curve at the worst, either way, and the proof. */
export function addPassingMarks(
  steps: Steps,
  { alpha, lowestMark, highestMark }: PassingFractionLimits,
  [n, fraction]: readonly [string, string],
  count: number,
): Steps {
  const at = (mark: number) =>
    noncentralTNative(
      `${zNative(fraction)}*SQRT(${n})`,
      `${n}-1`,
      `${literal(mark)}*SQRT(${n})`,
      count - 1,
      mark * Math.sqrt(count),
    );
  return steps
    .add("highest place of the mark, in deviations of the true curve", highestMark, "", OWEN)
    .add("check: chance that the mark stands higher, must be what is left out", alpha, at(highestMark), OWEN)
    .add("lowest place of the mark, in deviations of the true curve", lowestMark, "", OWEN)
    .add("check: chance that the mark stands lower, must be what is left out", alpha, `1-${at(lowestMark)}`, OWEN);
}
