import { chiSquareCdf } from "../distribution/chiSquareCdf";
import { chiSquareUpperTail } from "../distribution/chiSquareUpperTail";
import { gaussLegendre } from "../numeric/gaussLegendre";
import { log1pMinus } from "../special/log1pMinus";
import { stirlingError } from "../special/stirlingError";

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
 * Domain     count a whole number of at least 2; 0 ≤ lowRatio < 1 < highRatio. Unchecked: the methods that use it check their arguments.
 *            `low` and `high` are the ends of s/σ − 1, where the caller has them with more digits than the ratios do.
 * Method     The tails; where little is left between them the density of s/σ over the interval, which their difference would not show.
 * Accuracy   1e-13 in each tail, and in what is covered; test/core/method/samplesForSdPrecision.test.ts.
 */
export function spreadCoverage(
  count: number,
  lowRatio: number,
  highRatio: number,
  low = Math.sqrt(lowRatio) - 1,
  high = Math.sqrt(highRatio) - 1,
): SpreadCoverage {
  const degrees = count - 1;
  const below = chiSquareCdf(lowRatio * degrees, degrees);
  const above = chiSquareUpperTail(highRatio * degrees, degrees);
  const rest = 1 - below - above;
  return { degrees, below, above, covered: rest < 0.1 ? between(degrees, low, high) : rest };
}

/** P(low ≤ s/σ − 1 ≤ high) for a narrow interval about 0. */
function between(degrees: number, low: number, high: number): number {
  const { nodes, weights } = gaussLegendre(20);
  const [middle, half] = [(low + high) / 2, (high - low) / 2];
  const density = (x: number) => Math.exp(degrees * (log1pMinus(x) - (x * x) / 2) - Math.log1p(x));
  const mean = nodes.reduce((sum, node, i) => sum + weights[i] * density(middle + half * node), 0);
  return half * mean * Math.sqrt(degrees / Math.PI) * Math.exp(-stirlingError(degrees / 2));
}
