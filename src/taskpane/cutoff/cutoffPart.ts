import type { PaneContext } from "../context";
import { part, type PanePart } from "../dom/part";
import { keepChanges } from "../keepChanges";
import { answerCutoff } from "./answerCutoff";
import { answerView } from "./answerView";
import { closerLook } from "./closerLook";
import { intoSheet } from "./intoSheet";
import { questionForm } from "./questionForm";

/** The main job: from the column to the mark, and into a cell. */
export function cutoffPart(context: PaneContext): PanePart {
  const { column, question, answer, call, port, texts } = context;
  const ask = () => {
    const current = column.get();
    answer.set(current && answerCutoff(call, current, question.get()));
  };
  column.watch(ask);
  question.watch(ask);
  keepChanges(port, "cutoff", question);
  return part(
    "cutoff",
    texts.cutoffHeading,
    questionForm(context),
    answerView(context),
    closerLook(context),
    intoSheet(context),
  );
}
