import { requireCount, requireFraction } from "../domain";
import { binomialCdf } from "../distribution/binomialCdf";
import { binomialUpperTail } from "../distribution/binomialUpperTail";
import { smallestInteger } from "../numeric/smallestInteger";
import { between } from "../sample/sampleQuantile";
import type { Sample } from "../sample/sample";
import type { Better } from "./better";

export interface RankCutoff {
  readonly count: number;
  /** Place of the cutoff from the best score (1), between two scores where it is no whole number. */
  readonly place: number;
  readonly cutoff: number;
  /** What may be left out on either side, (1 − confidence)/2. */
  readonly alpha: number;
  /** Ranks from the best score of the two limits; undefined where the sample is too small for one. */
  readonly nearRank: number | undefined;
  readonly farRank: number | undefined;
  /** The chances that the true mark lies before the near limit, and beyond the far one. */
  readonly nearTail: number;
  readonly farTail: number;
  readonly lowerLimit: number | undefined;
  readonly upperLimit: number | undefined;
  readonly actualConfidence: number;
}

/**
 * A mark and its limits without any curve: the sample quantile, and order statistics that the true mark lies between.
 *
 * Domain     at least 2 scores; fraction and confidence in (0, 1).
 * Edges      a limit that no order statistic gives is undefined, its chance of missing 0.
 * Method     Of the scores, a binomial number W lies beyond the true mark. The r-th best is beyond it with chance P(W ≥ r): the near limit
 *            is the best rank with P(W ≥ r) ≤ α, the far limit the deepest with P(W ≤ r − 1) ≤ α, α = (1 − confidence)/2. Ranks count from
 *            the best, so "high" and "low" mirror exactly. The quantile is Hyndman & Fan's 7, as spreadsheets have it.
 * Reference  Hyndman & Fan (1996), Sample quantiles in statistical packages, Amer. Statist. 50; David & Nagaraja (2003), Order
 *            Statistics, 7.1.
 *
 * @throws {DomainError}
 */
export function rankCutoff(sample: Sample, fraction: number, confidence: number, better: Better): RankCutoff {
  const { count, sorted } = sample;
  requireCount("count", count, 2);
  requireFraction("fraction", fraction);
  requireFraction("confidence", confidence);
  const best = (rank: number) => sorted[better === "low" ? rank - 1 : count - rank];
  const place = 1 + (count - 1) * fraction;
  const whole = Math.floor(place);
  const part = place - whole;
  const cutoff = part > 0 ? between(best(whole), best(whole + 1), part) : best(whole);

  const alpha = (1 - confidence) / 2;
  // A chance that equals α on paper counts as met.
  const allowed = alpha * (1 + 1e-12);
  const near = smallestInteger((rank) => binomialUpperTail(rank, count, fraction) <= allowed, 1, count);
  const beyond = smallestInteger((rank) => !(binomialCdf(rank - 1, count, fraction) <= allowed), 1, count);
  const far = Math.min(beyond, count + 1) - 1;
  const nearRank = near <= count ? near : undefined;
  const farRank = far >= 1 ? far : undefined;
  const nearTail = nearRank === undefined ? 0 : binomialUpperTail(nearRank, count, fraction);
  const farTail = farRank === undefined ? 0 : binomialCdf(farRank - 1, count, fraction);
  const limits = [nearRank, farRank].map((rank) => (rank === undefined ? undefined : best(rank)));
  if (better === "low") limits.reverse();
  const [lowerLimit, upperLimit] = limits;
  return {
    count,
    place,
    cutoff,
    alpha,
    nearRank,
    farRank,
    nearTail,
    farTail,
    lowerLimit,
    upperLimit,
    actualConfidence: 1 - nearTail - farTail,
  };
}
