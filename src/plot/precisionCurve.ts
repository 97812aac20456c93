import { scaleLinear } from "d3-scale";
import { bottomAxis, leftAxis, plainTicks, within } from "./axis";
import { drawnLine, hatchBetween, type Point } from "./drawnLine";
import { frameOf } from "./frame";
import type { NumberStyle } from "./numberStyle";
import { percentText } from "./percentText";
import { line, path, text, type Part, type PictureModel, type Size } from "./picture";

export interface PrecisionCurveInput {
  /** Count of scores and the share that the mark may really let through: the lowest and the highest. */
  readonly lowest: readonly Point[];
  readonly highest: readonly Point[];
  readonly fraction: number;
  /** Counts worth a line: now, and after some more. */
  readonly counts: readonly { readonly count: number; readonly words: string }[];
  readonly words: {
    readonly title: string;
    readonly description: string;
    readonly count: string;
    readonly share: string;
  };
  readonly style: NumberStyle;
}

/** What more scores would buy: how the limits of the share let through close in on the share meant. */
export function precisionCurve(input: PrecisionCurveInput, size: Size): PictureModel {
  const { lowest, highest, fraction, counts, words, style } = input;
  const { left, right, top, floor } = frameOf(size, 20 + 14 * Math.max(counts.length - 1, 0));
  const first = lowest[0]![0];
  const x = scaleLinear([first, lowest[lowest.length - 1]![0]], [left, right]);
  const y = scaleLinear([0, Math.max(...highest.map(([, share]) => share))], [floor, top]);
  return {
    ...size,
    title: words.title,
    description: words.description,
    parts: [
      ...leftAxis(y, left, right, (value) => percentText(value, style, true)),
      path("hatch", hatchBetween(lowest, highest, x, y)),
      path("curve", drawnLine(lowest, x, y) + drawnLine(highest, x, y)),
      path("second-curve", line(left, y(fraction), right, y(fraction))),
      ...counts.flatMap(({ count, words: said }, index): Part[] => {
        const above = top - 8 - 14 * (counts.length - 1 - index);
        return [
          path(index === 0 ? "mark" : "edge", line(x(count), above + 3, x(count), floor)),
          text(index === 0 ? "mark-label" : "label", within(x(count), said, 0, right, 12), above, said),
        ];
      }),
      ...bottomAxis(x, floor, plainTicks(style.decimal)),
      text("label", 0, size.height - 3, words.share, "start"),
      text("label", right, size.height - 3, words.count, "end"),
    ],
  };
}
