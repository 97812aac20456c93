import { requireFraction } from "../domain";
import { smallestInteger } from "../numeric/smallestInteger";
import { reachesChance } from "./reachesChance";
import { MOST_SCORES, requireReachable } from "./requireReachable";
import { spreadCoverage, type SpreadCoverage } from "./spreadCoverage";

export interface SpreadSamples extends SpreadCoverage {
  readonly count: number;
  readonly lowRatio: number;
  readonly highRatio: number;
}

/**
 * The smallest number of scores whose standard deviation lies within ±precision of the true one with this confidence:
 * P(|s/σ − 1| ≤ precision) ≥ confidence.
 *
 * Domain     precision and confidence in (0, 1).
 * Edges      a confidence met on paper counts as met (1e-12).
 * Method     (n − 1)s²/σ² is chi-square with n − 1 degrees of freedom; the coverage rises with n throughout (checked for
 *            n ≤ 3000 over the whole range of precisions), so doubling and halving finds the smallest.
 * Accuracy   exact; test/core/method/samplesForSdPrecision.test.ts.
 * Reference  Greenwood & Sandomire (1950), Sample size required for estimating the standard deviation as a per cent of its true
 *            value, J. Am. Statist. Assoc. 45, 257–260.
 *
 * @throws {DomainError} naming precision or confidence; {NoAnswerError} if no number of scores that a number can hold is enough.
 */
export function samplesForSdPrecision(precision: number, confidence: number): SpreadSamples {
  requireFraction("precision", precision);
  requireFraction("confidence", confidence);
  return spreadSamples(precision, confidence, [(1 - precision) ** 2, (1 + precision) ** 2, -precision, precision]);
}

/** The same for the variance: P(|s²/σ² − 1| ≤ precision) ≥ confidence. */
export function samplesForVariancePrecision(precision: number, confidence: number): SpreadSamples {
  requireFraction("precision", precision);
  requireFraction("confidence", confidence);
  const [low, high] = [-precision / (1 + Math.sqrt(1 - precision)), precision / (1 + Math.sqrt(1 + precision))];
  return spreadSamples(precision, confidence, [1 - precision, 1 + precision, low, high]);
}

type Ends = readonly [lowRatio: number, highRatio: number, low: number, high: number];

function spreadSamples(precision: number, confidence: number, ends: Ends): SpreadSamples {
  const holds = (count: number) => {
    const { covered, below, above } = spreadCoverage(count, ...ends);
    return reachesChance(
      confidence,
      () => covered,
      () => below + above,
    );
  };
  const count = requireReachable("precision", precision, smallestInteger(holds, 2, MOST_SCORES));
  return { count, lowRatio: ends[0], highRatio: ends[1], ...spreadCoverage(count, ...ends) };
}
