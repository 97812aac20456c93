import { requireFraction } from "../domain";
import { chiSquareUpperTailQuantile } from "../distribution/chiSquareUpperTailQuantile";
import { findRoot } from "../numeric/findRoot";
import { spreadCoverage } from "./spreadCoverage";
import { requireScored } from "./requireScored";

/**
 * The precision that `count` scores buy for a standard deviation: the p with P(|s/σ − 1| ≤ p) = confidence.
 *
 * Domain     count a whole number of at least 2; confidence in (0, 1).
 * Edges      the answer may exceed 1 (few scores, high confidence): then only the upper side binds.
 * Method     The root of the coverage in p, taken on the smaller of coverage and its complement; above 1 the chi-square quantile itself.
 * Accuracy   1e-12 relative up to a billion scores, 1e-10 up to 1e15 (the rounding of 1 + precision); test/core/method/samplesForSdPrecision.test.ts.
 * Reference  as samplesForSdPrecision.
 *
 * @throws {DomainError} naming count or confidence.
 */
export function sdPrecision(count: number, confidence: number): { degrees: number; precision: number } {
  requireScored(count);
  requireFraction("confidence", confidence);
  const degrees = count - 1;
  const upperOnly = Math.sqrt(chiSquareUpperTailQuantile(1 - confidence, degrees) / degrees) - 1;
  if (upperOnly >= 1) return { degrees, precision: upperOnly };
  const excess = (precision: number) => {
    const { covered, below, above } = spreadCoverage(
      count,
      (1 - precision) ** 2,
      (1 + precision) ** 2,
      -precision,
      precision,
    );
    return confidence < 0.5 ? covered - confidence : 1 - confidence - (below + above);
  };
  return { degrees, precision: findRoot(excess, 0, 1) };
}
