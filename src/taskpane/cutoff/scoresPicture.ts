import { fitCurve } from "../../core/sample/fitCurve";
import { binScores } from "../../plot/binScores";
import { histogram, type HistogramMark } from "../../plot/histogram";
import { readShape } from "../../sheet/readShape";
import { sampleOf } from "../../sheet/sampleMemo";
import { decimalsOfStep } from "../../plot/numberText";
import type { PaneContext } from "../context";
import { figure, table } from "../dom/table";
import type { DrawnPicture } from "../picture/pictureFigure";
import type { CutoffAnswer } from "./answerCutoff";
import { markText } from "./sentences";

/** The scores with their curve, cutoff and limits, ready to draw in any size. */
export function scoresPicture(answer: CutoffAnswer, { texts, numbers }: PaneContext): DrawnPicture {
  const { column, question, report } = answer;
  const { sorted, count, heading, address } = column;
  const name = heading === "" ? address : heading;
  const ends = (value: number) => (report ? markText(value, report, numbers) : numbers.telling(value));
  const middle = (sorted[(count - 1) >> 1]! + sorted[count >> 1]!) / 2;
  const [all, low, high] = [numbers.count(count), numbers.telling(sorted[0]!), numbers.telling(sorted[count - 1]!)];
  const sentences = [
    low === high ? texts.pictureAllAlike(all, low) : texts.pictureSentence(all, low, high, numbers.telling(middle)),
  ];
  let mark: HistogramMark | undefined;
  if (report) {
    const [cutoff, lower, upper] = [report.cutoff, report.lower, report.upper].map(ends) as [string, string, string];
    sentences.push(texts.pictureMark(cutoff, lower, upper));
    mark = {
      cutoff: report.cutoff,
      lower: report.lower,
      upper: report.upper,
      cutoffWords: texts.pictureCutoff(cutoff),
      limitsWords: texts.pictureLimits(lower, upper),
    };
  }
  const words = {
    title: texts.pictureTitle(name),
    description: sentences.join(" "),
    score: heading === "" ? texts.pictureScore : heading,
    count: texts.pictureCount,
  };
  const curve = report && fitCurve("scores", sampleOf(column.values), readShape(question.shape));
  return {
    model: (size) => histogram({ sorted, curve, mark, words, decimal: numbers.decimal }, size),
    table() {
      const { start, width, counts } = binScores(sorted);
      const edge = (index: number) => figure(numbers.number(start + index * width, decimalsOfStep(width)));
      const rows = Array.from(counts, (inBin, i) => [edge(i), edge(i + 1), figure(numbers.count(inBin))]);
      return table(words.title, [texts.tableFrom, texts.tableBelow, texts.tableEntries], rows);
    },
    fileName: words.title,
  };
}
