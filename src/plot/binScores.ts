import { ticks } from "d3-array";

export interface Bins {
  readonly start: number;
  readonly width: number;
  readonly counts: Int32Array;
}

const MOST_BINS = 60;

/**
 * Counts scores in bins of equal, round width (Freedman & Diaconis 1981: twice the interquartile distance over the cube root of the
 * count). One pass over typed arrays; `sorted` in rising order. A score on the edge of two bins counts in the upper one.
 */
export function binScores(sorted: Float64Array): Bins {
  const count = sorted.length;
  const low = sorted[0]!;
  const high = sorted[count - 1]!;
  const span = high - low;
  if (!(span > 0)) return { start: low - 0.5, width: 1, counts: Int32Array.of(count) };
  const spread = sorted[Math.floor(0.75 * (count - 1))]! - sorted[Math.floor(0.25 * (count - 1))]!;
  const wanted = spread > 0 ? span / ((2 * spread) / Math.cbrt(count)) : Math.log2(count) + 1;
  // Round widths come in steps of two to two and a half: ask for a little more, so that it is rather too fine than too coarse.
  const edges = ticks(low, high, Math.min(Math.max(1.5 * wanted, 5), MOST_BINS));
  const width = edges.length > 1 ? edges[1]! - edges[0]! : span;
  const start = Math.floor(low / width) * width;
  const counts = new Int32Array(Math.floor((high - start) / width) + 1);
  for (let i = 0; i < count; i++) {
    // A score at a round edge such as 0.3 may come out a hair below it: the slack puts it where the axis says it is.
    const bin = Math.floor((sorted[i]! - start) / width + 1e-9);
    counts[bin < counts.length ? bin : counts.length - 1]!++;
  }
  return { start, width, counts };
}
