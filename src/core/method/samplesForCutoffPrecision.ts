import { DomainError, requireFraction } from "../domain";
import { normalUpperTailQuantile } from "../distribution/normalUpperTailQuantile";
import { markAbove, markBelow } from "./passingFractionLimits";
import { reachesChance } from "./reachesChance";
import { MOST_SCORES, requireReachable } from "./requireReachable";

export interface CutoffSamples {
  readonly count: number;
  readonly z: number;
  /** Where marks that let through the low and the high fraction stand, in deviations above the true mean. */
  readonly highMark: number;
  readonly lowMark: number;
  /** Chances that the mark lets through fewer than the low fraction, and more than the high one. */
  readonly tooFew: number;
  readonly tooMany: number;
  readonly attained: number;
}

/** Up to here every count is tried; beyond, coverage changes slowly against the logarithm of the count. */
const EVERY_COUNT = 200;
const GRID = 1.03;

/**
 * The smallest number of scores at which the plain mark x̄ + z(1−fraction)s lets through between low_fraction and high_fraction of the
 * population with this confidence.
 *
 * Domain     0 < low_fraction < fraction < high_fraction < 1; confidence in (0, 1).
 * Edges      with very uneven bounds the coverage may rise, fall and rise again: the smallest count is given, and a larger may miss it.
 * Method     Exact by the noncentral t (passingFractionLimits). Every count up to 200, then a grid of 3 % steps whose first hit is bisected;
 *            a peak between two grid points that just fails is climbed before going on, since it may hold.
 * Accuracy   exact, against a walk through every count; test/core/method/samplesForCutoffPrecision.test.ts.
 * Reference  as passingFractionLimits.
 *
 * @throws {DomainError} naming the argument; {NoAnswerError} if no number of scores that a number can hold is enough.
 */
export function samplesForCutoffPrecision(
  fraction: number,
  lowFraction: number,
  highFraction: number,
  confidence: number,
): CutoffSamples {
  requireFraction("fraction", fraction);
  requireFraction("low_fraction", lowFraction);
  requireFraction("high_fraction", highFraction);
  requireFraction("confidence", confidence);
  if (!(lowFraction < fraction)) throw new DomainError("low_fraction", lowFraction, `below fraction, ${fraction}`);
  if (!(highFraction > fraction)) throw new DomainError("high_fraction", highFraction, `above fraction, ${fraction}`);
  const z = normalUpperTailQuantile(fraction);
  const highMark = normalUpperTailQuantile(lowFraction);
  const lowMark = normalUpperTailQuantile(highFraction);
  const missAt = (count: number) => markAbove(count, z, highMark) + markBelow(count, z, lowMark);
  const holds = (miss: number) =>
    reachesChance(
      confidence,
      () => 1 - miss,
      () => miss,
    );
  const found = requireReachable("high_fraction", highFraction, firstCount(missAt, holds, confidence));
  const tooFew = markAbove(found, z, highMark);
  const tooMany = markBelow(found, z, lowMark);
  return { count: found, z, highMark, lowMark, tooFew, tooMany, attained: 1 - tooFew - tooMany };
}

type Miss = (count: number) => number;

function firstCount(missAt: Miss, holds: (miss: number) => boolean, confidence: number): number {
  for (let count = 2; count <= EVERY_COUNT; count++) if (holds(missAt(count))) return count;
  let [before, here] = [EVERY_COUNT - 1, EVERY_COUNT];
  let [missBefore, missHere] = [missAt(before), missAt(here)];
  while (here < MOST_SCORES) {
    const next = Math.min(Math.ceil(here * GRID), MOST_SCORES);
    const missNext = missAt(next);
    if (missHere <= missBefore && missHere <= missNext && missHere - (1 - confidence) < 0.01) {
      const peak = climb(missAt, before, next);
      if (holds(missAt(peak))) return bisect(missAt, holds, before, peak);
    }
    if (holds(missNext)) return bisect(missAt, holds, here, next);
    [before, here, missBefore, missHere] = [here, next, missHere, missNext];
  }
  return Infinity;
}

/** The smallest count that holds, after one that fails and up to one that holds. */
function bisect(missAt: Miss, holds: (miss: number) => boolean, fails: number, passes: number): number {
  while (passes - fails > 1) {
    const middle = fails + Math.floor((passes - fails) / 2);
    if (holds(missAt(middle))) passes = middle;
    else fails = middle;
  }
  return passes;
}

/** The count of the smallest miss strictly inside a bracket with one dip. */
function climb(missAt: Miss, low: number, high: number): number {
  while (high - low > 2) {
    const left = low + Math.floor((high - low) / 2);
    if (missAt(left) <= missAt(left + 1)) high = left + 1;
    else low = left;
  }
  return low + 1;
}
