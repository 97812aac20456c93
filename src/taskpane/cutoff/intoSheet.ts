import type { PaneContext } from "../context";
import { formulaChooser } from "../target/formulaChooser";
import { cutoffFormula, FORMULA_KINDS, type FormulaKind } from "./formulas";

/** The cutoff, as a formula in a cell of the user's choice. */
export function intoSheet(context: PaneContext): HTMLElement {
  const { texts, column, question } = context;
  const words: Readonly<Record<FormulaKind, string>> = {
    report: texts.putReport,
    cutoff: texts.putCutoff,
    limits: texts.putLimits,
    safe: texts.putSafe,
    next: texts.putNext,
    rank: texts.putRank,
  };
  const chooser = formulaChooser(context, texts.formulaHeading, true);
  const offer = () => {
    const address = column.get()?.address;
    chooser.offer(
      address === undefined
        ? []
        : FORMULA_KINDS.map((kind) => ({
            words: words[kind],
            formula: cutoffFormula(kind, address, question.get()),
            reads: address,
          })),
    );
  };
  column.watch(offer);
  question.watch(offer);
  return chooser.root;
}
