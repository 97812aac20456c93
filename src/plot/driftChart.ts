import { scaleLinear } from "d3-scale";
import { bottomAxis, leftAxis, plainTicks } from "./axis";
import { dots, drawnLine, hatchBetween, type Point } from "./drawnLine";
import { frameOf } from "./frame";
import type { Decimal } from "./numberStyle";
import { line, path, text, type PictureModel, type Size } from "./picture";

export interface DriftChartInput {
  /** Number of the score, in the order in which it came, and the score. */
  readonly scores: readonly Point[];
  readonly smoothed: readonly Point[];
  readonly lower: readonly Point[];
  readonly upper: readonly Point[];
  /** The smoothed values that lie outside their limits. */
  readonly flagged: readonly Point[];
  /** The mean that the scores are held against. */
  readonly mean: number;
  readonly words: {
    readonly title: string;
    readonly description: string;
    readonly score: string;
    readonly order: string;
  };
  readonly decimal: Decimal;
}

/** Scores in the order in which they came, their smoothed course, and the limits that it leaves when the scores drift. */
export function driftChart(input: DriftChartInput, size: Size): PictureModel {
  const { scores, smoothed, lower, upper, flagged, mean, words, decimal } = input;
  const { left, right, top, floor } = frameOf(size, 10);
  const heights = [...scores, ...smoothed, ...lower, ...upper].map(([, up]) => up);
  const least = heights.reduce((a, b) => Math.min(a, b), Infinity);
  const most = heights.reduce((a, b) => Math.max(a, b), -Infinity);
  const x = scaleLinear([scores[0]![0] - 0.5, scores[scores.length - 1]![0] + 0.5], [left, right]);
  const y = scaleLinear([least, most === least ? least + 1 : most], [floor - 4, top]);
  return {
    ...size,
    title: words.title,
    description: words.description,
    parts: [
      ...leftAxis(y, left, right, plainTicks(decimal)),
      path("hatch", hatchBetween(lower, upper, x, y)),
      path("edge", drawnLine(lower, x, y) + drawnLine(upper, x, y)),
      path("guide", line(left, y(mean), right, y(mean))),
      path("dot", dots(scores, x, y, scores.length > 150 ? 0.9 : 1.6)),
      path("curve", drawnLine(smoothed, x, y)),
      path("flagged", dots(flagged, x, y, 3)),
      ...bottomAxis(x, floor, plainTicks(decimal)),
      text("label", 0, size.height - 3, words.score, "start"),
      text("label", right, size.height - 3, words.order, "end"),
    ],
  };
}
