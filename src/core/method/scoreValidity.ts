import { DomainError, NoAnswerError, requireFraction, requirePositive } from "../domain";
import { normalUpperTailQuantile } from "../distribution/normalUpperTailQuantile";
import { compensatedSum } from "../numeric/compensatedSum";
import { Sample } from "../sample/sample";
import { representable } from "./representable";

export interface ScoreValidity {
  readonly pairs: number;
  /** Sample standard deviation of the scores that have an outcome. */
  readonly scoreSd: number;
  readonly correlation: number;
  /** Fisher's z of the correlation, and half the width of its interval. */
  readonly fisherZ: number;
  readonly halfWidth: number;
  readonly lower: number;
  readonly upper: number;
  readonly beforeSelection: number | undefined;
}

const FEWEST_PAIRS = 4;

/**
 * Correlation of scores with outcomes, limits by Fisher's z: tanh(atanh r ± z/√(n − 3)); and, from the sd of the scores before
 * selection, the correlation before selection: rk/√(1 − r² + r²k²), k = unselectedSd over the sd of the scores.
 *
 * Domain     at least 4 pairs, either side with a spread; 0 < confidence < 1; unselectedSd > 0.
 * Edges      a perfect correlation has both limits at it.
 * Method     Deviations over their largest, so that no square overflows; sums compensated.
 * Accuracy   relative error ≤ 1e-13 (test/core/method/scoreValidity.test.ts).
 * Reference  Fisher (1921), Metron 1; Thorndike (1949), Personnel Selection, case 2.
 *
 * @throws {DomainError} if an argument is outside its domain. @throws {NoAnswerError} with fewer than 4 pairs.
 */
export function scoreValidity(
  scores: Float64Array,
  outcomes: Float64Array,
  confidence = 0.95,
  unselectedSd?: number,
): ScoreValidity {
  requireFraction("confidence", confidence);
  if (unselectedSd !== undefined) requirePositive("unselected_sd", unselectedSd);
  const pairs = scores.length;
  if (pairs < FEWEST_PAIRS) {
    const message = `scores and outcomes need at least ${FEWEST_PAIRS} rows with both, and there are ${pairs}: wait for more outcomes or take a longer range.`;
    throw new NoAnswerError("outcomes", message);
  }
  const x = unitDeviations("scores", scores);
  const y = unitDeviations("outcomes", outcomes);
  const correlation = Math.max(-1, Math.min(1, compensatedSum(x.deviations.map((d, i) => d * y.deviations[i]))));
  const scoreSd = x.norm / Math.sqrt(pairs - 1);
  const fisherZ = Math.atanh(correlation);
  const halfWidth = normalUpperTailQuantile((1 - confidence) / 2) / Math.sqrt(pairs - 3);
  const k = unselectedSd === undefined ? undefined : unselectedSd / scoreSd;
  return {
    pairs,
    scoreSd,
    correlation,
    fisherZ,
    halfWidth,
    lower: Math.tanh(fisherZ - halfWidth),
    upper: Math.tanh(fisherZ + halfWidth),
    beforeSelection:
      k === undefined
        ? undefined
        : correlation / Math.hypot(Math.sqrt((1 - correlation) * (1 + correlation)) / k, correlation),
  };
}

/** Deviations from the mean, scaled to length 1, and the length that they had. */
function unitDeviations(argument: string, values: Float64Array): { deviations: Float64Array; norm: number } {
  if (values.every((value) => value === values[0])) {
    const came = `all ${values.length} that have a partner are ${values[0]}`;
    throw new DomainError(argument, values[0], "numbers that differ from one another", came);
  }
  const largestOf = (numbers: Float64Array) => numbers.reduce((most, d) => Math.max(most, Math.abs(d)), 0);
  // A power of two takes nothing from the digits, and without it the sum of numbers near 1e308 overflows.
  const unit = 2 ** Math.floor(Math.log2(largestOf(values)));
  const inUnits = values.map((value) => value / unit);
  const { mean } = new Sample(inUnits);
  const deviations = inUnits.map((value) => value - mean);
  const largest = largestOf(deviations);
  const scaled = deviations.map((d) => d / largest);
  const length = Math.sqrt(compensatedSum(scaled.map((d) => d * d)));
  return {
    deviations: scaled.map((d) => d / length),
    norm: representable(argument, values[0], length * largest * unit),
  };
}
