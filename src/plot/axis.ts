import type { ScaleLinear } from "d3-scale";
import type { Decimal } from "./numberStyle";
import { decimalsOfStep, numberText } from "./numberText";
import { line, path, text, type Part } from "./picture";

export type Scale = ScaleLinear<number, number>;
export type TickText = (value: number, step: number) => string;

/** Where the marks of a scale stand, and how far apart they are. */
export function ticksOf(scale: Scale, wanted: number): { ticks: number[]; step: number } {
  const ticks = scale.ticks(Math.max(wanted, 2));
  return { ticks, step: ticks.length > 1 ? Math.abs(ticks[1]! - ticks[0]!) : 1 };
}

export function plainTicks(decimal: Decimal): TickText {
  return (value, step) => numberText(value, decimalsOfStep(step), decimal);
}

/** The axis below a picture: a line, short strokes, numbers, and the word for what is measured at its right end. */
export function bottomAxis(scale: Scale, y: number, tickText: TickText, word = "", gap = 0): Part[] {
  const [left, right] = scale.range() as [number, number];
  const { ticks, step } = ticksOf(scale, (right - left) / 55);
  const strokes = ticks.map((tick) => line(scale(tick), y + gap, scale(tick), y + gap + 4));
  return [
    path("axis", [line(left, y + gap, right, y + gap), ...strokes].join("")),
    ...ticks.map((tick) => {
      const label = tickText(tick, step);
      return text("label", within(scale(tick), label, left - 20, right + 8), y + gap + 16, label);
    }),
    ...(word === "" ? [] : [text("label", right, y + gap + 30, word, "end")]),
  ];
}

/** The scale at the left: faint lines across and numbers, the word for what is counted above them. */
export function leftAxis(scale: Scale, left: number, right: number, tickText: TickText, word = ""): Part[] {
  const [bottom, top] = scale.range() as [number, number];
  const { ticks, step } = ticksOf(scale, (bottom - top) / 40);
  const shown = ticks.filter((tick) => scale(tick) < bottom - 6 || tick === 0);
  return [
    path("grid", shown.map((tick) => line(left, scale(tick), right, scale(tick))).join("")),
    ...shown.map((tick) => text("label", left - 6, scale(tick) + 4, tickText(tick, step), "end")),
    ...(word === "" ? [] : [text("label", 0, top - 8, word, "start")]),
  ];
}

/** About how wide a text of the small size is drawn: system fonts differ, so a little is added. */
export function textWidth(words: string, size = 11): number {
  return words.length * size * 0.56;
}

/** The middle of a text, moved so that it doesn't leave the space from `left` to `right`. */
export function within(x: number, words: string, left: number, right: number, size = 11): number {
  const half = textWidth(words, size) / 2;
  return Math.max(left + half, Math.min(right - half, x));
}
