import { DomainError } from "../domain";
import type { Sample } from "../sample/sample";
import { brownForsytheTest, type BrownForsytheTest } from "./brownForsytheTest";
import { smirnovTest, type SmirnovTest } from "./smirnovTest";
import { welchTest, type Moments, type WelchTest } from "./welchTest";

export interface DriftComparison {
  readonly baseline: Moments;
  readonly recent: Moments;
  readonly welch: WelchTest;
  /** Recent variance over baseline variance. */
  readonly varianceRatio: number;
  readonly brownForsythe: BrownForsytheTest;
  readonly smirnov: SmirnovTest;
}

/**
 * Two batches of scores compared in place, spread and shape: Welch's t, the ratio of variances with Brown and Forsythe's test, and the distance of
 * Kolmogorov and Smirnov.
 *
 * Domain     two scores or more in each, and a spread above 0 that can be squared.
 * @throws {DomainError} naming baseline or recent.
 */
export function driftComparison(baseline: Sample, recent: Sample): DriftComparison {
  const before = momentsOf("baseline", baseline);
  const after = momentsOf("recent", recent);
  return {
    baseline: before,
    recent: after,
    welch: welchTest(before, after),
    varianceRatio: after.variance / before.variance,
    brownForsythe: brownForsytheTest([baseline, recent]),
    smirnov: smirnovTest(baseline, recent),
  };
}

function momentsOf(argument: string, sample: Sample): Moments {
  const variance = sample.sumOfSquares / (sample.count - 1);
  if (!(variance > 1e-290 && variance < 1e290))
    throw new DomainError(
      argument,
      variance,
      "scores that differ, by amounts that can be squared",
      `their variance is ${variance}`,
    );
  return { count: sample.count, mean: sample.mean, variance };
}
