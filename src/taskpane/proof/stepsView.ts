import { isCellError, type Cell } from "../../sheet/cell";
import type { PaneContext } from "../context";
import { button } from "../dom/choice";
import { element, fill } from "../dom/element";
import { fold } from "../dom/part";
import { localFormula } from "../formula";
import type { WorkedCall, WorkedStep } from "./workingsOf";

const FIRST_SHOWN = 30;
/** A longer formula fills the pane: it is shown on request. */
const LONGEST_SHOWN = 240;

/** The steps of one call, under one another: what it is, its value, the formula that gives it without the add-in, its source. */
export function stepsView(context: PaneContext, { steps, refusal }: WorkedCall): HTMLElement {
  if (refusal !== "") return element("p", { class: "message", lang: "en" }, refusal);
  const { texts, numbers } = context;
  const list = element("ol", { class: "steps" });
  const draw = (shown: readonly WorkedStep[]) => fill(list, ...shown.map((step) => line(step, context)));
  draw(steps.slice(0, FIRST_SHOWN));
  if (steps.length <= FIRST_SHOWN) return list;
  const more = button(texts.workingsAll(numbers.count(steps.length)), () => {
    draw(steps);
    const next = list.children[FIRST_SHOWN] as HTMLElement;
    next.tabIndex = -1;
    next.focus();
    more.remove();
  });
  return element("div", {}, list, element("p", { class: "actions" }, more));
}

function line({ meaning, value, formula, source }: WorkedStep, { texts, numbers }: PaneContext): HTMLElement {
  const typed = localFormula(formula, numbers.separators);
  const code = element("code", {}, typed);
  return element(
    "li",
    {},
    element(
      "p",
      { class: "step" },
      element("span", { lang: "en" }, meaning),
      element("span", { class: "value" }, shown(value)),
    ),
    formula === ""
      ? element("p", { class: "quiet" }, texts.workingsNoFormula)
      : typed.length <= LONGEST_SHOWN
        ? code
        : fold(texts.workingsLong(numbers.count(typed.length)), false, code),
    source !== "" && element("p", { class: "quiet", lang: "en" }, source),
  );

  function shown(cell: Cell): string {
    if (typeof cell === "number") return numbers.full(cell);
    if (typeof cell === "boolean") return cell ? "TRUE" : "FALSE";
    return isCellError(cell) ? cell.code : String(cell ?? "");
  }
}
