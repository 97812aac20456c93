import type { Cell } from "../../sheet/cell";
import type { PaneContext } from "../context";
import { element, fill } from "../dom/element";
import { fold } from "../dom/part";
import { figure, table, type TableCell } from "../dom/table";
import { pictureFigure } from "../picture/pictureFigure";
import type { CutoffAnswer } from "./answerCutoff";
import { scoresPicture } from "./scoresPicture";
import { markText, refusalAdvice, shapeWarnings, takeSentence, trustSentences } from "./sentences";

/** The answer: the mark in large, how far to trust it, the picture, the three cutoffs, the report. Or the refusal, and what to do next. */
export function answerView(context: PaneContext): HTMLElement {
  const { texts } = context;
  // One sentence is spoken when the answer changes; the rest waits to be read.
  const spoken = element("p", { class: "mark", role: "status" });
  const words = element("div", { class: "answer" });
  const picture = pictureFigure(context);
  const below = element("div");
  const reportRoom = element("div");
  const report = fold(texts.reportHeading, false, reportRoom);
  const root = element("div", {}, spoken, words, picture.root, below, report);
  context.answer.watch((answer) => {
    root.hidden = !answer;
    if (!answer) return;
    fill(words, ...(answer.report ? answerWords(context, answer) : refusalWords(context, answer)));
    const sentence = answer.report ? takeSentence(answer, texts, context.numbers) : texts.refused;
    if (spoken.textContent !== sentence) spoken.textContent = sentence;
    picture.show(scoresPicture(answer, context));
    fill(below, ...(answer.report ? belowPicture(context, answer) : []));
    report.hidden = !answer.report;
    fill(reportRoom, answer.report && reportTable(context, answer));
  });
  return root;
}

function answerWords({ texts, numbers }: PaneContext, answer: CutoffAnswer): HTMLElement[] {
  return [
    ...trustSentences(answer, texts, numbers).map((sentence) => element("p", {}, sentence)),
    ...shapeWarnings(answer, texts, numbers).map((sentence) => element("p", { class: "notice" }, sentence)),
  ];
}

function refusalWords({ texts }: PaneContext, { refusal, column }: CutoffAnswer): HTMLElement[] {
  const { error, message } = refusal!;
  return [
    message !== "" && element("p", { class: "message", lang: "en" }, `${error} ${message}`),
    element("p", {}, refusalAdvice(refusal!, column.offenders.length > 0, texts)),
  ].filter((one) => one instanceof HTMLElement);
}

function belowPicture({ texts, numbers }: PaneContext, answer: CutoffAnswer): HTMLElement[] {
  const { question, report } = answer;
  const figures = report!;
  const fraction = numbers.exactPercent(question.fraction);
  const mark = (value: number | undefined): TableCell =>
    value === undefined ? { text: texts.noAnswer } : figure(markText(value, figures, numbers));
  return [
    table(
      texts.threeHeading,
      [texts.threeKind, texts.threeMark, texts.threePromise],
      [
        [texts.plain, mark(figures.cutoff), texts.plainPromise(fraction)],
        [texts.safe, mark(figures.safe), texts.safePromise(fraction, numbers.exactPercent(question.confidence))],
        [texts.next, mark(figures.next), texts.nextPromise(fraction)],
      ],
    ),
    element("p", { class: "caution" }, texts.people),
  ];
}

function reportTable({ texts, numbers }: PaneContext, { rows }: CutoffAnswer): HTMLElement {
  const shown = (value: Cell): TableCell =>
    typeof value === "number" ? figure(numbers.full(value)) : { text: value === "" ? texts.noAnswer : String(value) };
  return table(
    texts.reportHeading,
    [texts.reportItem, texts.reportValue],
    rows.map(([label, value]) => [label, shown(value)]),
  );
}
