import type { PaneContext } from "../context";
import { choice } from "../dom/choice";
import { element } from "../dom/element";
import { fold } from "../dom/part";
import type { Formula } from "../formula";
import { formulaTarget } from "./formulaTarget";

export interface OfferedFormula {
  readonly words: string;
  readonly formula: Formula;
  /** The range that the formula reads, where it reads one. */
  readonly reads?: string;
}

export interface FormulaChooser {
  readonly root: HTMLElement;
  /** The formulas that can be put in now; none hides it all. */
  offer(formulas: readonly OfferedFormula[]): void;
}

/** What is shown, as a formula in a cell of the user's choice: first which, then where. */
export function formulaChooser(context: PaneContext, heading: string, open = false): FormulaChooser {
  const { texts } = context;
  const target = formulaTarget(context);
  let offered: readonly OfferedFormula[] = [];
  const show = () => {
    const chosen = offered[Number(what.select.value)] ?? offered[0];
    target.show(chosen?.formula, chosen?.reads);
  };
  const what = choice(texts.formulaWhat, [], "", show);
  const root = fold(heading, open, element("div", { class: "fields one" }, what.root), target.root);
  return {
    root,
    offer(formulas) {
      const kept = what.select.value;
      offered = formulas;
      root.hidden = formulas.length === 0;
      what.root.hidden = formulas.length < 2;
      what.offer(
        formulas.map(({ words }, index) => [String(index), words] as const),
        Number(kept) < formulas.length && kept !== "" ? kept : "0",
      );
      show();
    },
  };
}
