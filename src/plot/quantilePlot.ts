import { scaleLinear } from "d3-scale";
import { bottomAxis, leftAxis, plainTicks } from "./axis";
import { dots, drawnLine, hatchBetween } from "./drawnLine";
import { frameOf } from "./frame";
import type { Decimal } from "./numberStyle";
import { path, text, type PictureModel, type Size } from "./picture";
import type { QuantilePoints } from "./quantilePoints";

export interface QuantilePlotInput {
  readonly quantiles: QuantilePoints;
  readonly words: {
    readonly title: string;
    readonly description: string;
    readonly score: string;
    readonly expected: string;
  };
  readonly decimal: Decimal;
}

/** Scores against what the curve expects of them: on the line where the shape fits, outside the band (hollow) where it does not. */
export function quantilePlot({ quantiles, words, decimal }: QuantilePlotInput, size: Size): PictureModel {
  const { left, right, top, floor } = frameOf(size, 10);
  const { points, lower, upper, line, outside } = quantiles;
  const x = scaleLinear([points[0]![0] - 0.15, points[points.length - 1]![0] + 0.15], [left, right]);
  const y = scaleLinear(shownScores(quantiles), [floor, top]).clamp(true);
  const inside = points.filter((point) => !outside.includes(point));
  return {
    ...size,
    title: words.title,
    description: words.description,
    parts: [
      ...leftAxis(y, left, right, plainTicks(decimal)),
      path("hatch", hatchBetween(lower, upper, x, y)),
      path("edge", drawnLine(lower, x, y) + drawnLine(upper, x, y)),
      path("curve", drawnLine(line, x, y)),
      path("dot", dots(inside, x, y, points.length > 120 ? 1.5 : 2)),
      path("flagged", dots(outside, x, y, 3)),
      ...bottomAxis(x, floor, plainTicks(decimal)),
      text("label", 0, size.height - 3, words.score, "start"),
      text("label", right, size.height - 3, words.expected, "end"),
    ],
  };
}

/** The scores and some of the band: the limits of the outermost places can lie very far off. */
function shownScores({ points, lower, upper }: QuantilePoints): [number, number] {
  const least = points[0]![1];
  const most = points[points.length - 1]![1];
  const room = 0.2 * (most - least || 1);
  const limits = [...lower, ...upper].map(([, score]) => score).filter(Number.isFinite);
  return [
    Math.max(Math.min(least, ...limits), least - room) - 0.05 * room,
    Math.min(Math.max(most, ...limits), most + room) + 0.05 * room,
  ];
}
