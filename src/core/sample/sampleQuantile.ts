import type { Sample } from "./sample";

/**
 * The p-quantile of a sample by linear interpolation between its ordered values, at the place (n − 1)p counted from 0.
 *
 * Domain     at least one score; p from 0 to 1.
 * Edges      p = 0 and 1 give the minimum and the maximum.
 * Method     Definition 7 of Hyndman & Fan, the one that spreadsheets use; definition 6, of many handbooks, lies further out.
 * Accuracy   rounding of one multiplication and one addition; test/core/sample/sampleQuantile.test.ts.
 * Reference  Hyndman & Fan (1996), Sample quantiles in statistical packages, The American Statistician 50, 361–365.
 */
export function sampleQuantile({ sorted, count }: Sample, p: number): number {
  const place = (count - 1) * p;
  const below = Math.min(Math.floor(place), count - 1);
  const left = sorted[below]!;
  const right = sorted[Math.min(below + 1, count - 1)]!;
  return between(left, right, place - below);
}

/** The point a share of the way from one score to another, whose distance may be no number where both are. */
export function between(from: number, to: number, share: number): number {
  const distance = to - from;
  return Number.isFinite(distance) ? from + share * distance : from * (1 - share) + to * share;
}
