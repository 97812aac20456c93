import { fitCurve } from "../../core/sample/fitCurve";
import { quantilePlot } from "../../plot/quantilePlot";
import { quantilePoints } from "../../plot/quantilePoints";
import { readShape } from "../../sheet/readShape";
import { sampleOf } from "../../sheet/sampleMemo";
import type { PaneContext } from "../context";
import { figure, table } from "../dom/table";
import type { DrawnPicture } from "../picture/pictureFigure";
import type { CutoffAnswer } from "./answerCutoff";

const BAND = 0.95;

/** The scores against what the curve expects of them. */
export function fitPicture({ column, question }: CutoffAnswer, { texts, numbers }: PaneContext): DrawnPicture {
  const curve = fitCurve("scores", sampleOf(column.values), readShape(question.shape));
  const quantiles = quantilePoints(column.sorted, curve, BAND);
  const { points, lower, upper, outside } = quantiles;
  const confidence = numbers.exactPercent(BAND);
  const words = {
    title: texts.fitTitle(column.heading === "" ? column.address : column.heading),
    description:
      outside.length === 0
        ? texts.fitAll(confidence)
        : texts.fitOutside(numbers.count(outside.length), numbers.count(points.length), confidence),
    score: column.heading === "" ? texts.fitScore : column.heading,
    expected: texts.fitExpected,
  };
  return {
    model: (size) => quantilePlot({ quantiles, words, decimal: numbers.decimal }, size),
    table: () =>
      table(
        words.title,
        [texts.fitTableExpected, texts.fitTableScore, texts.fitTableLow, texts.fitTableHigh],
        points.map(([expected, score], index) => [
          figure(numbers.number(expected, 2)),
          figure(numbers.telling(score)),
          figure(numbers.telling(lower[index]![1])),
          figure(numbers.telling(upper[index]![1])),
        ]),
      ),
    fileName: words.title,
  };
}
