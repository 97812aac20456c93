import { DomainError, requireFraction, requirePositive } from "../domain";
import { chiSquareCdf } from "../distribution/chiSquareCdf";
import { chiSquareUpperTail } from "../distribution/chiSquareUpperTail";
import { normalUpperTailQuantile } from "../distribution/normalUpperTailQuantile";
import { studentTUpperTailQuantile } from "../distribution/studentTUpperTailQuantile";
import { smallestInteger } from "../numeric/smallestInteger";
import { reachesChance } from "./reachesChance";
import { MOST_SCORES, requireReachable } from "./requireReachable";

export interface MeanSamples {
  readonly count: number;
  /** The normal or Student quantile at (1 + confidence)/2. */
  readonly quantile: number;
  /** Half the width of the interval at that count: quantile · sd/√n. */
  readonly expectedHalfWidth: number;
  /** The chance that the realised interval is no wider than asked; only with an assurance. */
  readonly assured?: number;
}

/**
 * The smallest number of scores that fixes the mean to ± half_width: quantile · sd/√n ≤ half_width, the quantile normal where sd is
 * known, else Student's with n − 1 degrees of freedom; with an assurance, the smallest at which the interval from the sample's own s is
 * that narrow with at least this chance.
 *
 * Domain     half_width and sd above 0; confidence and assurance in (0, 1); an assurance only with sd unknown.
 * Edges      at least 2 scores where sd is unknown.
 * Method     t(n − 1)/√n falls with n. The assured chance P(χ²(n−1) ≤ (n−1) n h²/(t sd)²) falls from its value at n = 2 and then
 *            rises, so that the smallest n is 2 or lies where it rises: doubling and halving finds either.
 * Accuracy   exact; test/core/method/samplesForMeanPrecision.test.ts.
 * Reference  Kupper & Hafner (1989), How appropriate are popular sample size formulas?, The American Statistician 43, 101–105.
 *
 * @throws {DomainError} naming the argument; {NoAnswerError} if no number of scores that a number can hold is enough.
 */
export function samplesForMeanPrecision(
  halfWidth: number,
  sd: number,
  confidence: number,
  sdKnown: boolean,
  assurance?: number,
): MeanSamples {
  requirePositive("half_width", halfWidth);
  requirePositive("sd", sd);
  requireFraction("confidence", confidence);
  if (assurance !== undefined) {
    requireFraction("assurance", assurance);
    if (sdKnown)
      throw new DomainError(
        "assurance",
        assurance,
        "left out where sd_known is TRUE: a known sd leaves nothing to chance",
      );
  }
  const tail = (1 - confidence) / 2;
  const quantileAt = (count: number) =>
    sdKnown ? normalUpperTailQuantile(tail) : studentTUpperTailQuantile(tail, count - 1);
  const halfWidthAt = (count: number) => (quantileAt(count) * sd) / Math.sqrt(count);
  let holds = (count: number) => halfWidthAt(count) <= halfWidth * (1 + 1e-12);
  if (assurance !== undefined) {
    holds = (count) =>
      reachesChance(
        assurance,
        () => assuredChance(count, halfWidthAt(count) / halfWidth),
        () => assuredMiss(count, halfWidthAt(count) / halfWidth),
      );
  }
  const count = requireReachable("half_width", halfWidth, smallestInteger(holds, sdKnown ? 1 : 2, MOST_SCORES));
  const expectedHalfWidth = halfWidthAt(count);
  return {
    count,
    quantile: quantileAt(count),
    expectedHalfWidth,
    ...(assurance !== undefined && { assured: assuredChance(count, expectedHalfWidth / halfWidth) }),
  };
}

/** The chance that s is small enough: s/sd ≤ 1/ratio. */
function assuredChance(count: number, ratio: number): number {
  return chiSquareCdf((count - 1) / (ratio * ratio), count - 1);
}

function assuredMiss(count: number, ratio: number): number {
  return chiSquareUpperTail((count - 1) / (ratio * ratio), count - 1);
}
