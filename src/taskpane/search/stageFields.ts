import type { PaneContext } from "../context";
import { button } from "../dom/choice";
import { element, fill } from "../dom/element";
import { field } from "../dom/field";
import { problemWords } from "../problemWords";
import { typedAmount, typedFraction } from "../typed";
import type { Stage } from "./searchQuestion";

const MOST_STAGES = 9;

/** The stages of one assessment: who gets there, and what a look costs there. */
export function stageFields(
  { texts, numbers }: Pick<PaneContext, "texts" | "numbers">,
  first: readonly Stage[],
  changed: (stages: readonly Stage[]) => void,
): HTMLElement {
  let stages = [...first];
  const rows = element("div");
  const put = (index: number, part: Partial<Stage>) => {
    stages = stages.map((stage, at) => (at === index ? { ...stage, ...part } : stage));
    changed(stages);
  };
  const row = ({ reach, cost }: Stage, index: number) => {
    const number = numbers.count(index + 1);
    const costField = field(texts.stageCost(number), numbers.full(cost), (text) => {
      const typed = typedAmount(text, numbers.decimal);
      costField.problem(problemWords(typed, text, texts, numbers));
      if ("value" in typed) put(index, { cost: typed.value });
    });
    if (index === 0) return element("div", { class: "fields" }, costField.root);
    const reachField = field(texts.stageReach(number), numbers.exactPercent(reach), (text) => {
      const typed = typedFraction(text, numbers.decimal, true);
      reachField.problem(problemWords(typed, text, texts, numbers));
      if ("value" in typed) put(index, { reach: typed.value });
    });
    return element("div", { class: "fields" }, reachField.root, costField.root);
  };
  const add = button(texts.addStage, () => {
    const last = stages[stages.length - 1]!;
    stages = [...stages, { reach: Number((last.reach / 2).toPrecision(2)), cost: last.cost }];
    changed(stages);
    draw();
    rows.querySelector<HTMLInputElement>(".fields:last-child input")?.focus();
  });
  const remove = button(texts.removeStage, () => {
    stages = stages.slice(0, -1);
    changed(stages);
    draw();
    add.focus();
  });
  const draw = () => {
    fill(rows, ...stages.map(row));
    add.hidden = stages.length >= MOST_STAGES;
    remove.hidden = stages.length < 2;
  };
  draw();
  return element(
    "fieldset",
    {},
    element("legend", {}, texts.stages),
    element("p", { class: "hint" }, texts.stagesHint),
    rows,
    element("p", { class: "actions" }, add, remove),
  );
}
