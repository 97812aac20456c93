import type { PaneContext } from "../context";
import { choice } from "../dom/choice";
import { element } from "../dom/element";
import { field, type Field } from "../dom/field";
import { problemWords } from "../problemWords";
import { typedFraction, typedNumber } from "../typed";
import type { CutoffQuestion } from "./question";

/** The four things that can be asked differently. Every change that can be read counts at once; what can't be read is said beside it. */
export function questionForm({ texts, numbers, question }: PaneContext): HTMLElement {
  const change = (changed: Partial<CutoffQuestion>) => question.set({ ...question.get(), ...changed });
  const first = question.get();
  const fractionField = (label: string, key: "fraction" | "confidence", hint: string): Field => {
    const made = field(
      label,
      numbers.exactPercent(first[key]),
      (text) => {
        const typed = typedFraction(text, numbers.decimal);
        made.problem(problemWords(typed, text, texts, numbers));
        if ("value" in typed) change({ [key]: typed.value });
      },
      hint,
    );
    return made;
  };
  const hint = texts.fractionHint(numbers.exactPercent(0.05), numbers.number(0.05, 2));
  return element(
    "div",
    { class: "fields" },
    fractionField(texts.fraction, "fraction", hint).root,
    fractionField(texts.confidence, "confidence", "").root,
    choice(
      texts.better,
      [
        ["high", texts.betterHigh],
        ["low", texts.betterLow],
      ],
      first.better,
      (value) => change({ better: value === "low" ? "low" : "high" }),
    ).root,
    ...shapeFields(first.shape, (shape) => change({ shape }), texts, numbers),
  );
}

function shapeFields(
  first: string,
  changed: (shape: string) => void,
  texts: PaneContext["texts"],
  numbers: PaneContext["numbers"],
): HTMLElement[] {
  const [, lowest = "0", highest = "100"] = /^logit\(([^,]+),([^)]+)\)$/.exec(first) ?? [];
  const local = (text: string) => text.replace(".", numbers.decimal);
  const bounds = { low: Number(lowest), high: Number(highest) };
  const bound = (label: string, key: "low" | "high", value: string) => {
    const made = field(label, local(value), (text) => {
      const typed = typedNumber(text, numbers.decimal);
      made.problem(typed === undefined ? texts.problemNoNumber(text.trim()) : "");
      if (typed === undefined) return;
      bounds[key] = typed;
      changed(logit());
    });
    return made.root;
  };
  const logit = () => `logit(${bounds.low},${bounds.high})`;
  const boundFields = [bound(texts.shapeLow, "low", lowest), bound(texts.shapeHigh, "high", highest)];
  const kind = first.replace(/\(.*/, "");
  const about = element("p", { class: "hint wide" });
  const abouts: Readonly<Record<string, string>> = {
    normal: texts.aboutNormal,
    lognormal: texts.aboutLognormal,
    logit: texts.aboutLogit,
    boxcox: texts.aboutBoxcox,
  };
  const showKind = (chosen: string) => {
    boundFields.forEach((one) => (one.hidden = chosen !== "logit"));
    about.textContent = abouts[chosen] ?? "";
  };
  showKind(kind);
  const shapes = choice(
    texts.shape,
    [
      ["normal", texts.shapeNormal],
      ["lognormal", texts.shapeLognormal],
      ["logit", texts.shapeLogit],
      ["boxcox", texts.shapeBoxcox],
    ],
    kind,
    (value) => {
      showKind(value);
      changed(value === "logit" ? logit() : value);
    },
  );
  return [shapes.root, ...boundFields, about];
}
