import { scaleLinear } from "d3-scale";
import { curveLinear, line as lineShape } from "d3-shape";
import { bottomAxis, leftAxis, plainTicks, textWidth, within, type Scale } from "./axis";
import { binScores, type Bins } from "./binScores";
import { curveDensity, type FittedCurve } from "./curveDensity";
import { hatch } from "./hatch";
import type { Decimal } from "./numberStyle";
import { box, line, path, round, text, type Part, type PictureModel, type Size } from "./picture";

export interface HistogramMark {
  readonly cutoff: number;
  readonly lower?: number;
  readonly upper?: number;
  /** "cutoff 82.0", "limits 79.4 to 85.4": the words that stand at the line and at the band. */
  readonly cutoffWords: string;
  readonly limitsWords?: string;
}

export interface HistogramInput {
  /** The scores in rising order, at least one. */
  readonly sorted: Float64Array;
  readonly curve?: FittedCurve;
  readonly mark?: HistogramMark;
  readonly words: {
    readonly title: string;
    readonly description: string;
    readonly score: string;
    readonly count: string;
  };
  readonly decimal: Decimal;
}

const TOP = 42;
const BARE_TOP = 12;
const BOTTOM = 46;
const LEFT = 34;
const RIGHT = 12;
const RUG = 8;
/** Bold letters of 12 are as wide as plain ones of 14. */
const BOLD_SIZE = 14;

/** The scores as they lie: a pale histogram, a stroke for every score below it, the fitted curve, the cutoff and the band of its limits. */
export function histogram(input: HistogramInput, { width, height }: Size): PictureModel {
  const { sorted, curve, mark, words, decimal } = input;
  const bins = binScores(sorted);
  const floor = height - BOTTOM;
  const top = mark ? TOP : BARE_TOP;
  const [low, high] = shownRange(bins, mark);
  const x = scaleLinear([low, high], [LEFT, width - RIGHT]);
  const density = curve && curveDensity(curve, (high - low) * 1e-5);
  const perShare = sorted.length * bins.width;
  const tallest = Math.max(...bins.counts, density ? perShare * highest(density, low, high) : 0);
  const y = scaleLinear([0, tallest * 1.03], [floor, top]);
  const curveParts = density ? [path("curve", curveLine(density, perShare, x, y))] : [];
  return {
    width,
    height,
    title: words.title,
    description: words.description,
    parts: [
      ...leftAxis(y, LEFT, width - RIGHT, plainTicks(decimal)),
      path("bar", bars(bins, x, y)),
      ...(mark ? bandParts(mark, x, floor) : []),
      ...curveParts,
      path("rug", rug(sorted, x, floor + 2)),
      ...bottomAxis(x, floor, plainTicks(decimal), "", RUG + 3),
      ...(mark ? markParts(mark, x, floor) : []),
      text("label", 0, height - 2, words.count, "start"),
      text("label", width - RIGHT, height - 2, words.score, "end"),
    ],
  };
}

/** From the first bin to the last, widened to hold the mark and its limits, but never so far that the scores shrink to a stroke. */
function shownRange({ start, width, counts }: Bins, mark?: HistogramMark): [number, number] {
  const end = start + width * counts.length;
  if (!mark) return [start, end];
  const room = 0.75 * (end - start);
  const points = [mark.cutoff, mark.lower ?? mark.cutoff, mark.upper ?? mark.cutoff];
  const margin = 0.04 * (end - start);
  const low = Math.min(...points) < start ? Math.min(...points) - margin : start;
  const high = Math.max(...points) > end ? Math.max(...points) + margin : end;
  return [Math.max(low, start - room), Math.min(high, end + room)];
}

function bars({ start, width, counts }: Bins, x: Scale, y: Scale): string {
  const step = x(start + width) - x(start);
  const floor = y(0);
  return Array.from(counts, (count, index) =>
    count === 0 ? "" : box(x(start) + index * step, y(count), step, floor - y(count)),
  ).join("");
}

/** One stroke a pixel column at most: more would not be seen, and a file of 100,000 strokes would not be opened. */
function rug(sorted: Float64Array, x: Scale, top: number): string {
  const strokes: string[] = [];
  const [low, high] = x.domain() as [number, number];
  const [left, right] = x.range() as [number, number];
  const slope = (right - left) / (high - low);
  let last = -Infinity;
  for (let i = 0; i < sorted.length; i++) {
    const column = Math.round(2 * (left + (sorted[i]! - low) * slope)) / 2;
    if (column === last) continue;
    last = column;
    strokes.push(`M${column},${top}v${RUG}`);
  }
  return strokes.join("");
}

const CURVE_POINTS = 160;

function curveLine(density: (score: number) => number, perShare: number, x: Scale, y: Scale): string {
  const [low, high] = x.domain() as [number, number];
  const points = Array.from({ length: CURVE_POINTS + 1 }, (_, i) => low + (i / CURVE_POINTS) * (high - low));
  const draw = lineShape<number>(
    (score) => round(x(score)),
    (score) => round(y(perShare * density(score))),
  ).curve(curveLinear);
  return draw(points) ?? "";
}

function highest(density: (score: number) => number, low: number, high: number): number {
  let most = 0;
  for (let i = 0; i <= CURVE_POINTS; i++) most = Math.max(most, density(low + (i / CURVE_POINTS) * (high - low)));
  return Number.isFinite(most) ? most : 0;
}

function bandParts({ lower, upper }: HistogramMark, x: Scale, floor: number): Part[] {
  if (lower === undefined || upper === undefined) return [];
  const [left, right] = inside([lower, upper], x);
  return [
    path("hatch", hatch(left, TOP, right - left, floor - TOP)),
    path("edge", [left, right].map((at) => line(at, TOP, at, floor)).join("")),
  ];
}

function markParts({ cutoff, lower, upper, cutoffWords, limitsWords }: HistogramMark, x: Scale, floor: number): Part[] {
  const [from, to] = x.range() as [number, number];
  const [at] = inside([cutoff], x);
  const parts: Part[] = [
    path("mark", line(at!, TOP - 4, at!, floor + RUG + 3)),
    text("mark-label", within(at!, cutoffWords, 0, to + RIGHT, BOLD_SIZE), 12, cutoffWords),
  ];
  if (limitsWords === undefined || lower === undefined || upper === undefined) return parts;
  const [left, right] = inside([lower, upper], x);
  const wide = textWidth(limitsWords);
  const middle = Math.max(from + wide / 2, Math.min(to + RIGHT - wide / 2, (left! + right!) / 2));
  return [...parts, text("label", middle, 27, limitsWords)];
}

function inside(values: readonly number[], x: Scale): number[] {
  const [low, high] = x.range() as [number, number];
  return values.map((value) => Math.max(low, Math.min(high, x(value))));
}
