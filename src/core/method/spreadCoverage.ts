import { chiSquareCdf } from "../distribution/chiSquareCdf";
import { chiSquareUpperTail } from "../distribution/chiSquareUpperTail";

/** How often the variance of `count` normal scores comes out between two multiples of the true one, and how often outside. */
export interface SpreadCoverage {
  readonly degrees: number;
  readonly below: number;
  readonly above: number;
  readonly covered: number;
}

/**
 * P(lowRatio ≤ s²/σ² ≤ highRatio) for the variance s² (n − 1) of `count` normal scores, whose multiple (n − 1)s²/σ² is chi-square.
 *
 * Domain     count a whole number of at least 2; 0 ≤ lowRatio < highRatio. Unchecked: the methods that use it check their arguments.
 * Accuracy   1e-13 in each tail; test/core/method/samplesForSdPrecision.test.ts.
 */
export function spreadCoverage(count: number, lowRatio: number, highRatio: number): SpreadCoverage {
  const degrees = count - 1;
  const below = chiSquareCdf(lowRatio * degrees, degrees);
  const above = chiSquareUpperTail(highRatio * degrees, degrees);
  return { degrees, below, above, covered: 1 - below - above };
}
