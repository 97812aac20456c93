import { scaleLinear } from "d3-scale";
import { plainTicks, textWidth } from "./axis";
import type { NumberStyle } from "./numberStyle";
import { percentText } from "./percentText";
import { box, line, path, text, type PictureModel, type Size } from "./picture";

export interface PassRatesInput {
  readonly groups: readonly {
    readonly name: string;
    readonly rate: number;
    readonly passed: number;
    readonly assessed: number;
  }[];
  /** Four fifths of the highest rate: the line that a group's rate falls short of. */
  readonly line: number;
  readonly words: { readonly title: string; readonly description: string; readonly line: string };
  readonly style: NumberStyle;
}

const ROW = 34;

/** The pass rate of each group as a bar, against four fifths of the highest. The height follows from the count of groups. */
export function passRates({ groups, line: limit, words, style }: PassRatesInput, { width }: Size): PictureModel {
  const right = width - 12;
  const top = 22;
  const x = scaleLinear([0, Math.max(...groups.map(({ rate }) => rate), limit, 0.01)], [0, right - 50]);
  const height = top + ROW * groups.length + 8;
  const counted = plainTicks(style.decimal);
  const rowOf = (index: number) => top + ROW * index;
  const fitting = (name: string, said: string) => {
    const room = Math.floor((right - textWidth(said) - 16) / 6.2);
    return name.length > room ? `${name.slice(0, Math.max(room - 1, 1))}…` : name;
  };
  return {
    width,
    height,
    title: words.title,
    description: words.description,
    parts: [
      path("bar", groups.map(({ rate }, index) => box(0.5, rowOf(index) + 17, Math.max(x(rate), 1), 11)).join("")),
      ...groups.flatMap(({ name, rate, passed, assessed }, index) => {
        const said = `${counted(passed, 1)} / ${counted(assessed, 1)}`;
        return [
          text("strong-label", 0, rowOf(index) + 12, fitting(name, said), "start"),
          text("label", right, rowOf(index) + 12, said, "end"),
          text("label", x(rate) + 6, rowOf(index) + 27, percentText(rate, style), "start"),
        ];
      }),
      path("mark", line(x(limit), top - 4, x(limit), height - 4)),
      text("mark-label", Math.max(0, Math.min(x(limit), right - textWidth(words.line, 12))), 12, words.line, "start"),
    ],
  };
}
