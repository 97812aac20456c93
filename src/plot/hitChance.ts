import { scaleLinear } from "d3-scale";
import { bottomAxis, leftAxis, plainTicks, textWidth, within } from "./axis";
import { drawnLine, type Point } from "./drawnLine";
import { frameOf } from "./frame";
import type { NumberStyle } from "./numberStyle";
import { percentText } from "./percentText";
import { line, path, text, type Part, type PictureModel, type Size } from "./picture";

export interface HitChanceInput {
  /** Looks and the chance of what is sought within so many looks. */
  readonly chance: readonly Point[];
  /** The same if the mark were known exactly: drawn dashed, where it differs. */
  readonly known?: readonly Point[];
  /** Points worth a word: the looks for an even chance, and for a good one. */
  readonly points: readonly { readonly looks: number; readonly chance: number; readonly words: string }[];
  readonly words: {
    readonly title: string;
    readonly description: string;
    readonly looks: string;
    readonly chance: string;
    readonly estimated?: string;
    readonly known?: string;
  };
  readonly style: NumberStyle;
}

/** How the chance of a hit grows with every look. */
export function hitChance({ chance, known, points, words, style }: HitChanceInput, size: Size): PictureModel {
  const { left, right, top, floor } = frameOf(size, 14);
  const most = chance[chance.length - 1]![0];
  const x = scaleLinear([0, most], [left, right]);
  const y = scaleLinear([0, 1], [floor, top]);
  const guides = points.map(
    ({ looks, chance: up }) => line(left, y(up), x(looks), y(up)) + line(x(looks), y(up), x(looks), floor),
  );
  return {
    ...size,
    title: words.title,
    description: words.description,
    parts: [
      ...leftAxis(y, left, right, (value) => percentText(value, style)),
      path("guide", guides.join("")),
      ...(known ? [path("second-curve", drawnLine(known, x, y))] : []),
      path("curve", drawnLine(chance, x, y)),
      ...points.flatMap(({ looks, chance: up, words: said }): Part[] => {
        const beside = x(looks) + 6 + textWidth(said, 12) <= right;
        return [
          path("mark", line(x(looks), y(up) - 4, x(looks), y(up) + 4)),
          beside
            ? text("mark-label", x(looks) + 6, y(up) + 17, said, "start")
            : text("mark-label", within(x(looks), said, left, right, 12), y(up) + 18, said),
        ];
      }),
      ...bottomAxis(x, floor, plainTicks(style.decimal)),
      text("label", 0, size.height - 3, words.chance, "start"),
      text("label", right, size.height - 3, words.looks, "end"),
      ...(known && words.known && words.estimated
        ? [
            text("label", right, floor - 20, `— ${words.estimated}`, "end"),
            text("label", right, floor - 6, `- - ${words.known}`, "end"),
          ]
        : []),
    ],
  };
}
