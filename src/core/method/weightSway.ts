import { DomainError, requireCount, requireFraction } from "../domain";
import { nthSmallest } from "../numeric/nthSmallest";
import { powerOfTwoBelow } from "../numeric/powerOfTwoBelow";
import { SeededRandom } from "../numeric/seededRandom";
import { requireWeights } from "./weightedScores";

/** runs × entries × criteria that one call may ask for. */
export const MOST_SWAY_TERMS = 20_000_000;

/**
 * How the ranking depends on the weights: the share of runs in which each entry is among the first `top_count`, every weight being multiplied
 * in every run by its own uniform draw from (1 − spread, 1 + spread).
 *
 * Domain     values row by row, one row an entry, no blanks; weights ≥ 0, not all 0; 1 ≤ top_count ≤ entries; 0 < spread < 1.
 * Edges      g entries tied for m remaining places get m/g each.
 * Method     Plain simulation. The sum of the weights is left out, being the same for all entries of a run. Values and weights are scaled
 *            by powers of two, which changes no digit and keeps sums finite.
 * Accuracy   standard error √(share·(1 − share)/runs); the same seed gives the same bits. test/core/method/weightSway.test.ts.
 * @throws {DomainError} if an argument is outside its domain, or the work passes 20 million terms.
 */
export function weightSway(
  values: Float64Array,
  weights: Float64Array,
  topCount: number,
  spread = 0.25,
  runs = 10_000,
  seed = 1,
): Float64Array {
  requireWeights("weights", weights);
  const criteria = weights.length;
  const entries = values.length / criteria;
  requireCount("top_count", topCount, 1);
  if (topCount > entries) throw new DomainError("top_count", topCount, `at most the number of entries, ${entries}`);
  requireFraction("spread", spread);
  requireCount("runs", runs, 1);
  requireCount("seed", seed);
  if (runs * values.length > MOST_SWAY_TERMS) {
    const fitting = Math.floor(MOST_SWAY_TERMS / values.length);
    throw new DomainError("runs", runs, `at most ${fitting} for ${entries} entries and ${criteria} criteria`);
  }
  const weightScale = powerOfTwoBelow(Math.max(...weights));
  const valueScale = powerOfTwoBelow(values.reduce((most, value) => Math.max(most, Math.abs(value)), 0));
  const scaledValues = values.map((value) => value / valueScale);
  const swayed = new Float64Array(criteria);
  const scores = new Float64Array(entries);
  const reordered = new Float64Array(entries);
  const shares = new Float64Array(entries);
  const random = new SeededRandom(seed);
  for (let run = 0; run < runs; run++) {
    for (let j = 0; j < criteria; j++)
      swayed[j] = (weights[j] / weightScale) * (1 + spread * (2 * random.fraction() - 1));
    for (let entry = 0, i = 0; entry < entries; entry++) {
      let sum = 0;
      for (let j = 0; j < criteria; j++) sum += swayed[j] * scaledValues[i++];
      scores[entry] = sum;
    }
    reordered.set(scores);
    countTop(scores, nthSmallest(reordered, entries - topCount), topCount, shares);
  }
  return shares.map((sum) => sum / runs);
}

/** Adds to each entry's sum 1 where it beats the last score among the top, and its part of the places left where it ties with it. */
function countTop(scores: Float64Array, last: number, topCount: number, sums: Float64Array): void {
  let above = 0;
  let tied = 0;
  for (const score of scores) {
    if (score > last) above++;
    else if (score === last) tied++;
  }
  const part = (topCount - above) / tied;
  for (let entry = 0; entry < scores.length; entry++) {
    const score = scores[entry];
    if (score > last) sums[entry] += 1;
    else if (score === last) sums[entry] += part;
  }
}
