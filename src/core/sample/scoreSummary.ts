import { fitCurve } from "./fitCurve";
import { moments } from "./moments";
import type { Sample } from "./sample";
import { sampleQuantile } from "./sampleQuantile";
import { NORMAL } from "./shape";

export interface ScoreSummary {
  readonly count: number;
  readonly mean: number;
  readonly sumOfSquares: number;
  readonly sd: number;
  /** Standard error of the mean. */
  readonly meanError: number;
  readonly minimum: number;
  readonly lowerQuartile: number;
  readonly median: number;
  readonly upperQuartile: number;
  readonly maximum: number;
  /** Undefined below 3 scores. */
  readonly skewness: number | undefined;
  /** Undefined below 4 scores. */
  readonly excessKurtosis: number | undefined;
}

/**
 * A score column in a few numbers: count, mean, spread, quartiles, skewness and kurtosis.
 *
 * Domain     at least two scores with a spread.
 * Accuracy   that of its parts: sample, sampleQuantile and moments.
 *
 * @throws {DomainError} naming `argument` where the scores have no spread that can be computed.
 */
export function scoreSummary(argument: string, sample: Sample): ScoreSummary {
  const { count, mean, sd } = fitCurve(argument, sample, NORMAL);
  const { minimum, maximum, sumOfSquares } = sample;
  return {
    count,
    mean,
    sumOfSquares,
    sd,
    meanError: sd / Math.sqrt(count),
    minimum,
    lowerQuartile: sampleQuantile(sample, 0.25),
    median: sampleQuantile(sample, 0.5),
    upperQuartile: sampleQuantile(sample, 0.75),
    maximum,
    ...moments(sample),
  };
}
