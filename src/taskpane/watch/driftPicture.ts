import { driftChart } from "../../plot/driftChart";
import type { PaneContext } from "../context";
import type { Column } from "../column/readColumn";
import { figure, table } from "../dom/table";
import type { DrawnPicture } from "../picture/pictureFigure";
import type { Drift } from "./answerDrift";

const MOST_POINTS = 2000;

/** The later scores in their order, with the smoothed course and its limits. Of very many the last are drawn. */
export function driftPicture(drift: Drift, column: Column, { texts, numbers }: PaneContext): DrawnPicture {
  const last = <T>(points: readonly T[]) => points.slice(-MOST_POINTS);
  const scores = last(drift.scores);
  const start = scores[0]![0];
  const words = {
    title: texts.driftTitle(column.heading === "" ? column.address : column.heading),
    description: driftSentence(drift, { texts, numbers }),
    score: column.heading === "" ? texts.pictureScore : column.heading,
    order: texts.driftOrder,
  };
  const drawn = {
    scores,
    smoothed: last(drift.smoothed),
    lower: last(drift.lower),
    upper: last(drift.upper),
    flagged: drift.flagged.filter(([at]) => at >= start),
    mean: drift.mean,
    words,
    decimal: numbers.decimal,
  };
  return {
    model: (size) => driftChart(drawn, size),
    table: () =>
      table(
        words.title,
        [
          texts.driftNumber,
          texts.pictureScore,
          texts.driftSmoothed,
          texts.driftLower,
          texts.driftUpper,
          texts.driftState,
        ],
        scores.slice(-200).map(([at, score]) => {
          const row = drift.smoothed.findIndex(([number]) => number === at);
          const value = (points: Drift["smoothed"]) => figure(numbers.telling(points[row]![1]));
          const outside = drift.flagged.some(([number]) => number === at);
          return [
            figure(numbers.count(at)),
            figure(numbers.telling(score)),
            value(drift.smoothed),
            value(drift.lower),
            value(drift.upper),
            outside ? texts.driftOutside : texts.driftInside,
          ];
        }),
      ),
    fileName: words.title,
  };
}

/** What the course says, in a sentence. */
export function driftSentence(
  { first, scores }: Drift,
  { texts, numbers }: Pick<PaneContext, "texts" | "numbers">,
): string {
  if (!first) return texts.driftNone(numbers.count(scores.length));
  const at = numbers.count(first.number);
  return first.up ? texts.driftUp(at) : texts.driftDown(at);
}
