import { DomainError } from "../domain";
import { ordinal } from "../ordinal";
import { powerOfTwoBelow } from "../numeric/powerOfTwoBelow";

/** Weighted scores of entries, with the sum of the weights that they are divided by. */
export interface WeightedScores {
  readonly weightTotal: number;
  /** One an entry; NaN where the entry is blank. */
  readonly scores: Float64Array;
}

/**
 * The weighted mean of each entry's values: Σ wⱼvⱼ / Σ wⱼ.
 *
 * Domain     values row by row, one row an entry, all numbers or all NaN; weights ≥ 0 and finite, not all 0.
 * Edges      an entry of NaN gives NaN.
 * Method     The sum of products over the sum of weights, as one would on paper, with the weights scaled by a power of two (which changes no
 *            digit) so that their sum can't overflow.
 * Accuracy   a few roundings of the products' size; test/core/method/weightedScores.test.ts.
 * @throws {DomainError} if weights are negative or all 0, or a score passes the largest number.
 */
export function weightedScores(values: Float64Array, weights: Float64Array): WeightedScores {
  requireWeights("weights", weights);
  const columns = weights.length;
  const scale = powerOfTwoBelow(Math.max(...weights));
  const scaled = weights.map((weight) => weight / scale);
  const total = scaled.reduce((sum, weight) => sum + weight, 0);
  const scores = new Float64Array(values.length / columns);
  for (let entry = 0, i = 0; entry < scores.length; entry++) {
    let sum = 0;
    for (let j = 0; j < columns; j++) sum += scaled[j] * values[i++];
    scores[entry] = sum / total;
    if (Math.abs(sum) === Infinity)
      throw new DomainError(
        "values",
        sum,
        "small enough to be added up",
        `those of the ${ordinal(entry + 1)} row are not`,
      );
  }
  return { weightTotal: total * scale, scores };
}

/** Fails unless every weight is 0 or above and one of them above 0. */
export function requireWeights(argument: string, weights: Float64Array): void {
  const bad = weights.findIndex((weight) => !(weight >= 0 && weight < Infinity));
  if (bad >= 0)
    throw new DomainError(argument, weights[bad], "0 or above", `the ${ordinal(bad + 1)} of them is ${weights[bad]}`);
  if (!weights.some((weight) => weight > 0))
    throw new DomainError(argument, 0, "above 0 at least once", "all of them are 0");
}
