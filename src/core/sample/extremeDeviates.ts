import { DomainError, requireCount, requireFraction } from "../domain";
import { studentTUpperTailQuantile } from "../distribution/studentTUpperTailQuantile";
import { studentTUpperTail } from "../distribution/studentTUpperTail";
import type { Sample } from "./sample";

export interface ExtremeDeviates {
  /** How many scores are called outliers. */
  readonly outliers: number;
  /** R₁ … R_most: the largest deviate, in standard deviations, before each removal. */
  readonly deviates: Float64Array;
  /** For each removal 1 where the upper end goes, 0 where the lower one does. */
  readonly upper: Uint8Array;
  /** Scores at or below `lowest`, or at or above `highest`, are outliers; ±∞ where there is none on that side. */
  readonly lowest: number;
  readonly highest: number;
}

export const LEAST_FOR_OUTLIERS = 10;

/**
 * The generalised extreme Studentised deviate test for up to `most` outliers: the score furthest from the mean is taken away `most` times,
 * and the last removal whose deviate Rᵢ exceeds its critical value λᵢ tells how many outliers there are.
 *
 * Domain     at least 10 scores with a spread; most a whole number from 1 to n − 2; alpha in (0, 1). Two-sided.
 * Edges      of two scores equally far out the upper one goes first; equal scores count one by one and share a flag.
 * Method     Only an end of the ordered scores can be furthest out, so a removal costs one comparison; means are taken from sums
 *            outwards from the median, which no outlier contaminates, and the deviates in the reverse order, adding one score at a time
 *            (taking squares away would leave nothing beside an outlier of 1e9). Rᵢ is judged by its own t tail, which is cheaper than λᵢ.
 * Accuracy   1e-10 relative in Rᵢ; Rosner's approximation itself is good from 25 scores and tolerable from 15;
 *            test/core/sample/extremeDeviates.test.ts.
 * Reference  Rosner (1983), Percentage points for a generalized ESD many-outlier procedure, Technometrics 25, 165–172.
 *
 * @throws {DomainError} naming most or alpha.
 */
export function extremeDeviates(sample: Sample, most: number, alpha: number): ExtremeDeviates {
  const { sorted, count } = sample;
  requireCount("most", most, 1);
  if (most > count - 2) throw new DomainError("most", most, `at most ${count - 2}, 2 fewer than the scores`);
  requireFraction("alpha", alpha);
  const upper = removals(sorted, most);
  const ends = { low: 0, high: count };
  for (const isUpper of upper)
    if (isUpper) ends.high--;
    else ends.low++;
  const deviates = deviatesOf(sorted, upper, { ...ends });
  let outliers = most;
  while (outliers > 0 && !isExtreme(deviates[outliers - 1]!, count - outliers + 1, alpha)) outliers--;
  let above = 0;
  for (let i = 0; i < outliers; i++) above += upper[i]!;
  return {
    outliers,
    deviates,
    upper,
    lowest: outliers > above ? sorted[outliers - above - 1]! : -Infinity,
    highest: above > 0 ? sorted[count - above]! : Infinity,
  };
}

/** λ of a removal from `left` scores: (left − 1)t/√((left − 2 + t²)left), t at 1 − alpha/(2 left) with left − 2 degrees of freedom. */
export function criticalDeviate(left: number, alpha: number): number {
  const t = studentTUpperTailQuantile(alpha / (2 * left), left - 2);
  return ((left - 1) * t) / Math.sqrt((left - 2 + t * t) * left);
}

/** Whether a deviate exceeds its critical value: the same by the tail of the t that belongs to it. */
function isExtreme(deviate: number, left: number, alpha: number): boolean {
  const room = (left - 1) ** 2 - left * deviate * deviate;
  if (!(room > 0)) return deviate > 1;
  const t = deviate * Math.sqrt(((left - 2) * left) / room);
  return studentTUpperTail(t, left - 2) < alpha / (2 * left);
}

/** For each removal whether the upper end goes. */
function removals(sorted: Float64Array, most: number): Uint8Array {
  const count = sorted.length;
  const middle = count >> 1;
  const median = sorted[middle]!;
  // Sums from the median to each place, its own deviation of 0 included on both sides.
  const outward = new Float64Array(count);
  for (let i = middle - 1; i >= 0; i--) outward[i] = outward[i + 1]! + (sorted[i]! - median);
  for (let i = middle + 1; i < count; i++) outward[i] = outward[i - 1]! + (sorted[i]! - median);
  const sumOf = (low: number, high: number) => {
    if (low > middle) return outward[high]! - outward[low - 1]!;
    return high < middle ? outward[low]! - outward[high + 1]! : outward[low]! + outward[high]!;
  };
  const upper = new Uint8Array(most);
  let low = 0;
  let high = count - 1;
  for (let i = 0; i < most; i++) {
    const mean = sumOf(low, high) / (high - low + 1);
    upper[i] = sorted[high]! - median - mean >= mean - (sorted[low]! - median) ? 1 : 0;
    if (upper[i]) high--;
    else low++;
  }
  return upper;
}

/** The deviates from the last removal back to the first, mean and squares updated as each score is put back. */
function deviatesOf(
  sorted: Float64Array,
  upper: Uint8Array,
  { low, high }: { low: number; high: number },
): Float64Array {
  let size = 0;
  let mean = 0;
  let squares = 0;
  const add = (score: number) => {
    const distance = score - mean;
    size++;
    mean += distance / size;
    const fromMean = (distance * (size - 1)) / size;
    squares += distance * fromMean;
    return Math.abs(fromMean);
  };
  for (let i = low; i < high; i++) add(sorted[i]!);
  const deviates = new Float64Array(upper.length);
  for (let i = upper.length - 1; i >= 0; i--) {
    const deviation = add(sorted[upper[i] ? high++ : --low]!);
    deviates[i] = squares > 0 ? deviation / Math.sqrt(squares / (size - 1)) : 0;
  }
  return deviates;
}
