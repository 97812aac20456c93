import { line as lineShape } from "d3-shape";
import type { Scale } from "./axis";
import { round } from "./picture";

export type Point = readonly [x: number, y: number];

/** A line through points given in the units of the scales; where a point is no number the line is interrupted. */
export function drawnLine(points: readonly Point[], x: Scale, y: Scale): string {
  const draw = lineShape<Point>(
    (point) => round(x(point[0])),
    (point) => round(y(point[1])),
  ).defined(([along, up]) => Number.isFinite(along) && Number.isFinite(up));
  return draw([...points]) ?? "";
}

/** Small full circles as one path. */
export function dots(points: readonly Point[], x: Scale, y: Scale, radius: number): string {
  const [r, across] = [round(radius), round(2 * radius)];
  return points
    .map(
      ([along, up]) =>
        `M${round(x(along) - radius)},${round(y(up))}a${r},${r} 0 1 0 ${across},0a${r},${r} 0 1 0 ${-across},0Z`,
    )
    .join("");
}

/** The area between two lines, filled with slanting strokes: one stroke a few pixels, cut off at both lines. */
export function hatchBetween(lower: readonly Point[], upper: readonly Point[], x: Scale, y: Scale, gap = 6): string {
  const strokes: string[] = [];
  const [from, to] = x.range() as [number, number];
  for (let at = Math.ceil(from / gap) * gap; at <= to; at += gap) {
    const value = x.invert(at);
    const low = heightAt(lower, value);
    const high = heightAt(upper, value);
    if (low === undefined || high === undefined) continue;
    strokes.push(`M${round(at)},${round(y(low))}L${round(at)},${round(y(high))}`);
  }
  return strokes.join("");
}

/** Where a line stands at a point between two of its own; undefined beyond its ends. */
function heightAt(points: readonly Point[], at: number): number | undefined {
  for (let i = 1; i < points.length; i++) {
    const [x0, y0] = points[i - 1]!;
    const [x1, y1] = points[i]!;
    if (at < x0 || at > x1) continue;
    const height = x1 === x0 ? y0 : y0 + ((at - x0) / (x1 - x0)) * (y1 - y0);
    return Number.isFinite(height) ? height : undefined;
  }
  return undefined;
}
