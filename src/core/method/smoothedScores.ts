import { DomainError, requireFinite, requirePositive } from "../domain";
import { representable } from "./representable";

export interface SmoothedScores {
  readonly smoothed: Float64Array;
  readonly lower: Float64Array;
  readonly upper: Float64Array;
  /** Strictly outside the limits. */
  readonly flags: boolean[];
}

/** How much a new score counts, and how wide the limits are in standard errors. */
export const SMOOTHING_WEIGHT = 0.2;
export const SMOOTHING_WIDTH = 3;
/** A score on a limit by its digits must not be flagged by the rounding of a root. */
const SLACK = 1e-12;
/** Farther from the mean than this many standard deviations nothing can be smoothed or summed without overflow. */
export const MOST_DEVIATIONS = 1e100;

/**
 * Exponentially weighted moving average of scores as they come, z = λx + (1 − λ)z from the mean on, with its exact limits
 * mean ± L·sd·√(λ/(2 − λ)·(1 − (1 − λ)^2t)).
 *
 * Domain     recent finite; mean finite; sd > 0; 0 < weight ≤ 1; width > 0. mean and sd are taken as known.
 * Method     The deviation from the mean is smoothed, and the mean added at the end, so that large scores keep their digits.
 * Accuracy   a few roundings; test/core/method/smoothedScores.test.ts (NIST/SEMATECH e-Handbook 6.3.2.4).
 * Reference  Roberts (1959), Control chart tests based on geometric moving averages, Technometrics 1(3); Lucas & Saccucci (1990),
 *            Exponentially weighted moving average control schemes, Technometrics 32(1).
 * @throws {DomainError} if an argument is outside its domain.
 */
export function smoothedScores(
  recent: Float64Array,
  mean: number,
  sd: number,
  weight = SMOOTHING_WEIGHT,
  width = SMOOTHING_WIDTH,
): SmoothedScores {
  requireWithinReach(recent, mean, sd);
  representable("sd", sd, Math.abs(mean) + width * sd);
  const smoothed = new Float64Array(recent.length);
  const lower = new Float64Array(recent.length);
  const upper = new Float64Array(recent.length);
  const flags: boolean[] = [];
  let deviation = 0;
  let fading = 1;
  for (let t = 0; t < recent.length; t++) {
    deviation += weight * (recent[t] - mean - deviation);
    fading *= (1 - weight) * (1 - weight);
    const reach = width * sd * Math.sqrt((weight / (2 - weight)) * (1 - fading));
    smoothed[t] = mean + deviation;
    lower[t] = mean - reach;
    upper[t] = mean + reach;
    flags.push(Math.abs(deviation) > reach * (1 + SLACK));
  }
  return { smoothed, lower, upper, flags };
}

/** Fails unless mean and sd are those of a curve, and no score lies absurdly far from it. */
export function requireWithinReach(recent: Float64Array, mean: number, sd: number): void {
  requireFinite("mean", mean);
  requirePositive("sd", sd);
  for (const score of recent) {
    if (!(Math.abs(score - mean) / sd <= MOST_DEVIATIONS))
      throw new DomainError("recent", score, `within ${MOST_DEVIATIONS} standard deviations of mean (${mean})`);
    // Two of them may lie on either side of the mean.
    representable("recent", score, 2 * (score - mean));
  }
}
