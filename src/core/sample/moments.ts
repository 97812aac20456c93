import { symmetricSum } from "../numeric/symmetricSum";
import type { Sample } from "./sample";

export interface Moments {
  /** G1; undefined below 3 scores. */
  readonly skewness: number | undefined;
  /** G2; undefined below 4 scores. */
  readonly excessKurtosis: number | undefined;
}

/**
 * Skewness and excess kurtosis of a sample, both adjusted for small samples: G1 = n/((n−1)(n−2)) Σz³ and
 * G2 = n(n+1)/((n−1)(n−2)(n−3)) Σz⁴ − 3(n−1)²/((n−2)(n−3)), z the scores in standard deviations (n − 1) from their mean.
 *
 * Domain     scores with a spread.
 * Edges      undefined where there are too few scores.
 * Method     The deviations are divided by the deviation first: third and fourth powers of raw scores overflow. They are taken from the
 *            mean in twice the precision: its last digit can be a part of the spread.
 * Accuracy   1e-12 relative to the larger of the result and 1; test/core/sample/moments.test.ts.
 * Reference  Joanes & Gill (1998), Comparing measures of sample skewness and kurtosis, The Statistician 47, 183–189.
 */
export function moments({ sorted, count, mean, meanRest, sd }: Sample): Moments {
  const n = count;
  const deviate = (x: number) => (x - mean - meanRest) / sd;
  const squared = (x: number) => deviate(x) ** 2;
  const cubes = () => symmetricSum(sorted, (x) => squared(x) * deviate(x));
  const fourths = () => symmetricSum(sorted, (x) => squared(x) * squared(x));
  return {
    skewness: n < 3 ? undefined : (n / ((n - 1) * (n - 2))) * cubes(),
    excessKurtosis:
      n < 4
        ? undefined
        : ((n * (n + 1)) / ((n - 1) * (n - 2) * (n - 3))) * fourths() - (3 * (n - 1) ** 2) / ((n - 2) * (n - 3)),
  };
}
