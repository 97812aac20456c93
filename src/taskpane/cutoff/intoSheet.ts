import type { PaneContext } from "../context";
import { choice } from "../dom/choice";
import { element } from "../dom/element";
import { fold } from "../dom/part";
import { formulaTarget } from "../target/formulaTarget";
import { cutoffFormula, FORMULA_KINDS, type FormulaKind } from "./formulas";

/** What is shown, as a formula in a cell of the user's choice. */
export function intoSheet(context: PaneContext): HTMLElement {
  const { texts, column, question } = context;
  const words: Readonly<Record<FormulaKind, string>> = {
    report: texts.putReport,
    cutoff: texts.putCutoff,
    limits: texts.putLimits,
    safe: texts.putSafe,
    next: texts.putNext,
  };
  let kind: FormulaKind = "report";
  const target = formulaTarget(context);
  const show = () => {
    const current = column.get();
    target.show(current && cutoffFormula(kind, current.address, question.get()), current?.address);
  };
  const what = choice(
    texts.formulaWhat,
    FORMULA_KINDS.map((one) => [one, words[one]] as const),
    kind,
    (value) => {
      kind = value as FormulaKind;
      show();
    },
  );
  const root = fold(texts.formulaHeading, true, element("div", { class: "fields one" }, what.root), target.root);
  column.watch((current) => {
    root.hidden = !current;
    show();
  });
  question.watch(show);
  return root;
}
