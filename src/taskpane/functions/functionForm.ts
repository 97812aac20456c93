import type { Cell } from "../../sheet/cell";
import type { FunctionEntry } from "../../sheet/functionTable";
import type { Argument, Outcome } from "../../sheet/invoke";
import type { PaneContext } from "../context";
import { choice } from "../dom/choice";
import { element, fill } from "../dom/element";
import { field } from "../dom/field";
import { rangeField } from "../dom/rangeField";
import { formulaText, localFormula, type FormulaArgument } from "../formula";
import { formulaTarget } from "../target/formulaTarget";
import { outcomeView } from "./outcomeView";
import { referredValue, typedArgument } from "./typedArgument";

const QUIET_MS = 200;

/** The form of one function: a line an argument, the value that the cell would show, and the formula with its way into a cell. */
export function functionForm(context: PaneContext, entry: FunctionEntry): HTMLElement {
  const { texts, numbers, port, call } = context;
  const typed = entry.parameters.map(() => "");
  const value = element("div", { class: "value", "aria-live": "polite" });
  const target = formulaTarget(context);
  let turn = 0;
  let timer: ReturnType<typeof setTimeout> | undefined;

  const work = async () => {
    const mine = ++turn;
    const given = entry.parameters.map((parameter, index) => typedArgument(typed[index]!, parameter, numbers.decimal));
    const missing = entry.parameters.filter(({ optional }, index) => !optional && given[index] === undefined);
    if (missing.length > 0) {
      target.show(undefined, undefined);
      return fill(
        value,
        element("p", { class: "quiet" }, texts.argumentsMissing(missing.map(({ name }) => name).join(", "))),
      );
    }
    const outcome = await compute(given).catch((failure: unknown): Outcome => ({
      error: "",
      message: String(failure),
    }));
    if (mine !== turn) return;
    fill(value, outcomeView(context, outcome));
    const rows = outcome && "value" in outcome && Array.isArray(outcome.value) ? outcome.value : [[""]];
    const reads = given.find((one): one is { reference: string } => typeof one === "object")?.reference;
    target.show({ text: formulaText(entry.name, given), rows: rows.length, columns: rows[0]!.length }, reads);
  };

  async function compute(given: readonly FormulaArgument[]): Promise<Outcome | undefined> {
    const addresses = given.map((one) => (typeof one === "object" ? one.reference : undefined));
    const read = async (one: FormulaArgument): Promise<Argument> =>
      typeof one === "object" ? referredValue((await port.read(one.reference)).values) : (one as Cell);
    const values = await Promise.all(given.map(read));
    return call(entry.name, values, { parameterAddresses: addresses });
  }

  const change = (index: number, text: string) => {
    typed[index] = text;
    clearTimeout(timer);
    timer = setTimeout(() => void work(), QUIET_MS);
  };
  const lines = entry.parameters.map((parameter, index) => {
    const label = parameter.optional ? texts.argumentOptional(parameter.name) : parameter.name;
    if (parameter.choices) {
      const options = [["", texts.argumentLeftOut] as const, ...parameter.choices.map((word) => [word, word] as const)];
      const made = choice(label, options, "", (word) => change(index, word));
      return element(
        "div",
        { class: "wide" },
        made.root,
        element("p", { class: "hint", lang: "en" }, parameter.description),
      );
    }
    const takes = (text: string) => change(index, text);
    const made =
      parameter.dimensionality === "matrix"
        ? rangeField(context, label, "", takes, parameter.description)
        : field(label, "", takes, parameter.description);
    made.root.classList.add("wide");
    return made.root;
  });
  void work();
  return element(
    "div",
    { class: "form" },
    element("p", { lang: "en" }, entry.description),
    ...examples(context, entry),
    helpLink(context, entry),
    ...entry.cautions.map((caution) => element("p", { class: "caution", lang: "en" }, caution)),
    element("div", { class: "fields" }, ...lines),
    value,
    target.root,
  );
}

/** The examples of the table, each with its value: the tests hold them. */
function examples({ texts, numbers }: PaneContext, { examples: list }: FunctionEntry): HTMLElement[] {
  if (list.length === 0) return [];
  const line = ({ formula, value }: FunctionEntry["examples"][number]) =>
    element("li", {}, element("code", {}, localFormula(formula, numbers.separators)), ` → ${value}`);
  return [
    element("p", { class: "formula-label" }, texts.examples),
    element("ul", { class: "examples" }, ...list.map(line)),
  ];
}

/** The page of the function: what it assumes, how it was checked, where it hurts. */
function helpLink({ texts }: PaneContext, { helpPath, name }: FunctionEntry): HTMLElement {
  const link = element("a", { href: helpPath, target: "_blank", rel: "noopener" }, texts.helpPage(`WEIR.${name}`));
  return element("p", {}, link);
}
