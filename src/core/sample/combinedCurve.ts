import { requireCount, requireFinite, requireNotNegative } from "../domain";
import { representable } from "../method/representable";

export interface Batch {
  readonly count: number;
  readonly mean: number;
  readonly sd: number;
}

export interface CombinedCurve extends Batch {
  /** The second mean less the first. */
  readonly apart: number;
}

/**
 * Count, mean and standard deviation of two batches taken as one: the squares within each, and those of the distance between the means.
 *
 * Domain     counts whole numbers of at least 2; means finite; deviations (n − 1) not below 0.
 * Method     The pairwise update, without the difference of large squares that raw sums need.
 * Accuracy   4 ulp; test/core/sample/combinedCurve.test.ts.
 * Reference  Chan, Golub & LeVeque (1983), Algorithms for computing the sample variance, The American Statistician 37, 242–247.
 *
 * @throws {DomainError} naming count_1, mean_1, sd_1, count_2, mean_2 or sd_2.
 */
export function combinedCurve(one: Batch, two: Batch): CombinedCurve {
  [one, two].forEach((batch, index) => {
    requireCount(`count_${index + 1}`, batch.count, 2);
    requireFinite(`mean_${index + 1}`, batch.mean);
    requireNotNegative(`sd_${index + 1}`, batch.sd);
  });
  const count = one.count + two.count;
  const apart = representable("mean_2", two.mean, two.mean - one.mean);
  const mean = one.mean + apart * (two.count / count);
  // In units of the largest part no square overflows, and none vanishes beside it.
  const unit = Math.max(one.sd, two.sd, Math.abs(apart)) || 1;
  const variance =
    (one.sd / unit) ** 2 * ((one.count - 1) / (count - 1)) +
    (two.sd / unit) ** 2 * ((two.count - 1) / (count - 1)) +
    (apart / unit) ** 2 * (one.count / count) * (two.count / (count - 1));
  return { count, apart, mean, sd: unit * Math.sqrt(variance) };
}
