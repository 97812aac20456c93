import { fUpperTail } from "../distribution/fUpperTail";
import { compensatedSum } from "../numeric/compensatedSum";
import { Sample } from "../sample/sample";

export interface BrownForsytheTest {
  /** Of each batch the median, and the mean distance from it. */
  readonly medians: readonly number[];
  readonly meanDistances: readonly number[];
  /** undefined where the distances from the medians don't vary within the batches: then no test is possible. */
  readonly statistic: number | undefined;
  readonly degreesBetween: number;
  readonly degreesWithin: number;
  readonly pValue: number | undefined;
}

/**
 * The test of Brown and Forsythe that batches have the same spread: the analysis of variance of the distances |x − median of its batch|.
 *
 * Domain     two or more batches of two or more scores.
 * Edges      batches of two have both scores equally far from the median; if nothing varies within any batch, statistic and p are undefined.
 * Accuracy   that of the F tail; test/core/method/brownForsytheTest.test.ts (NIST/SEMATECH e-Handbook 1.3.5.10).
 * Reference  Brown & Forsythe (1974), Robust tests for the equality of variances, J. Amer. Statist. Assoc. 69.
 */
export function brownForsytheTest(batches: readonly Sample[]): BrownForsytheTest {
  const medians = batches.map((batch) => middleOf(batch.sorted));
  const distances = batches.map((batch, i) => new Sample(batch.sorted.map((score) => Math.abs(score - medians[i]))));
  const count = compensatedSum(distances.map((batch) => batch.count));
  const mean = compensatedSum(distances.map((batch) => (batch.count / count) * batch.mean));
  const between = compensatedSum(distances.map((batch) => batch.count * (batch.mean - mean) ** 2));
  const within = compensatedSum(distances.map((batch) => batch.sumOfSquares));
  const degreesBetween = batches.length - 1;
  const degreesWithin = count - batches.length;
  const largest = Math.max(...batches.map((batch) => Math.max(Math.abs(batch.minimum), Math.abs(batch.maximum))));
  // What rounding alone leaves of distances that are equal by their digits.
  const rounding = count * (4 * Number.EPSILON * largest) ** 2;
  const known = { medians, meanDistances: distances.map((batch) => batch.mean), degreesBetween, degreesWithin };
  if (!(within > rounding)) return { ...known, statistic: undefined, pValue: undefined };
  const statistic = between / degreesBetween / (within / degreesWithin);
  return { ...known, statistic, pValue: fUpperTail(statistic, degreesBetween, degreesWithin) };
}

function middleOf(sorted: Float64Array): number {
  const half = sorted.length >> 1;
  const upper = sorted[half];
  return sorted.length % 2 === 1 ? upper : sorted[half - 1] / 2 + upper / 2;
}
