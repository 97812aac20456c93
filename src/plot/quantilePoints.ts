import type { Curve } from "../core/sample/curve";
import { betaQuantile } from "../core/distribution/betaQuantile";
import { normalQuantile } from "../core/distribution/normalQuantile";
import type { Point } from "./drawnLine";

export interface QuantilePoints {
  /** Standard normal quantile and score. */
  readonly points: readonly Point[];
  readonly lower: readonly Point[];
  readonly upper: readonly Point[];
  /** The fitted curve as a line over the same quantiles. */
  readonly line: readonly Point[];
  /** The points outside the band. */
  readonly outside: readonly Point[];
}

const MOST_POINTS = 240;

/**
 * Each score against the quantile at which it would be expected: the i-th of n at the median of its place, with the limits between which
 * that place lies with the confidence asked for (the i-th of n uniform numbers is Beta(i, n + 1 − i)). Of many scores the ends are kept
 * and the middle is thinned. `sorted` in rising order.
 */
export function quantilePoints(sorted: Float64Array, curve: Curve, confidence = 0.95): QuantilePoints {
  const count = sorted.length;
  const tail = (1 - confidence) / 2;
  const scoreAt = (probability: number) => curve.fromScale(curve.mean + curve.sd * normalQuantile(probability));
  const points: Point[] = [];
  const lower: Point[] = [];
  const upper: Point[] = [];
  const line: Point[] = [];
  const outside: Point[] = [];
  for (const place of places(count)) {
    const middle = betaQuantile(0.5, place, count + 1 - place);
    const expected = normalQuantile(middle);
    const point: Point = [expected, sorted[place - 1]!];
    const low = scoreAt(betaQuantile(tail, place, count + 1 - place));
    const high = scoreAt(betaQuantile(1 - tail, place, count + 1 - place));
    points.push(point);
    lower.push([expected, low]);
    upper.push([expected, high]);
    line.push([expected, scoreAt(middle)]);
    if (point[1] < low || point[1] > high) outside.push(point);
  }
  return { points, lower, upper, line, outside };
}

/** All places of a small sample; of a large one the outermost fifty at each end, and the rest at even distances. */
function places(count: number): number[] {
  if (count <= MOST_POINTS) return Array.from({ length: count }, (_, index) => index + 1);
  const ends = 50;
  const middle = MOST_POINTS - 2 * ends;
  const step = (count - 2 * ends - 1) / (middle - 1);
  return [
    ...Array.from({ length: ends }, (_, index) => index + 1),
    ...Array.from({ length: middle }, (_, index) => Math.round(ends + 1 + index * step)),
    ...Array.from({ length: ends }, (_, index) => count - ends + 1 + index),
  ].filter((place, index, all) => index === 0 || place > all[index - 1]!);
}
