import type { Point } from "../../plot/drawnLine";
import { precisionCurve } from "../../plot/precisionCurve";
import type { Cell } from "../../sheet/cell";
import type { Call, PaneContext } from "../context";
import { figure, table } from "../dom/table";
import type { DrawnPicture } from "../picture/pictureFigure";
import type { CutoffAnswer } from "./answerCutoff";

/** How many more scores the pane tells about. */
export const MORE_SCORES = 20;
const STEPS = 30;

export interface Precision {
  readonly count: number;
  readonly lowest: number;
  readonly highest: number;
}

/** The share that the mark may really let through, for counts from a few to well beyond the present one. */
export function precisions(call: Call, count: number, fraction: number, confidence: number): Precision[] {
  const first = Math.max(3, Math.min(8, count));
  const last = Math.max(count + 2 * MORE_SCORES, Math.round(count * 1.5));
  const counts = new Set([count, count + MORE_SCORES]);
  // Evenly on the square root: the limits close in fast at first.
  for (let i = 0; i <= STEPS; i++)
    counts.add(Math.round((Math.sqrt(first) + (i / STEPS) * (Math.sqrt(last) - Math.sqrt(first))) ** 2));
  return [...counts]
    .sort((a, b) => a - b)
    .flatMap((at) => {
      const outcome = call("CUTOFF_PRECISION", [at, fraction, confidence]);
      if (!outcome || !("value" in outcome) || !Array.isArray(outcome.value)) return [];
      const [lowest, highest] = (outcome.value as Cell[][]).map((row) => row[1]);
      return typeof lowest === "number" && typeof highest === "number" ? [{ count: at, lowest, highest }] : [];
    });
}

/** What more scores would buy; undefined where the function gives nothing to draw. */
export function morePicture({ question, report }: CutoffAnswer, context: PaneContext): DrawnPicture | undefined {
  const { texts, numbers, call } = context;
  const { count } = report!;
  const all = precisions(call, count, question.fraction, question.confidence);
  const now = all.find((one) => one.count === count);
  const then = all.find((one) => one.count === count + MORE_SCORES);
  if (!now || !then) return undefined;
  const { percent } = numbers;
  const [here, there] = [numbers.count(count), numbers.count(then.count)];
  const words = {
    title: texts.moreTitle,
    description: texts.moreSentence(
      here,
      percent(now.lowest),
      percent(now.highest),
      there,
      percent(then.lowest),
      percent(then.highest),
    ),
    count: texts.moreCount,
    share: texts.moreShare,
  };
  const lowest: Point[] = all.map((one) => [one.count, one.lowest]);
  const highest: Point[] = all.map((one) => [one.count, one.highest]);
  const counts = [
    { count, words: texts.moreNow(here) },
    { count: then.count, words: texts.moreThen(there) },
  ];
  return {
    model: (size) =>
      precisionCurve({ lowest, highest, fraction: question.fraction, counts, words, style: numbers }, size),
    table: () =>
      table(
        words.title,
        [texts.moreCount, texts.moreLowest, texts.moreHighest],
        all.map((one) => [figure(numbers.count(one.count)), figure(percent(one.lowest)), figure(percent(one.highest))]),
      ),
    fileName: words.title,
  };
}
