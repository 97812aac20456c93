import { element, newId } from "./element";

export interface Field {
  readonly root: HTMLElement;
  readonly input: HTMLInputElement;
  /** Shows what is wrong with what was typed, or takes it away with "". */
  problem(words: string): void;
}

/** A line to type in, with its word above, and what is wrong with it below: said once, tied to the line. */
export function field(label: string, value: string, typed: (text: string) => void, hint = "", wide = false): Field {
  const id = newId("field");
  const input = element("input", {
    id,
    type: "text",
    value,
    autocomplete: "off",
    spellcheck: "false",
    "aria-describedby": `${id}-hint ${id}-problem`,
    input: () => typed(input.value),
  });
  const message = element("p", { id: `${id}-problem`, class: "problem", "aria-live": "polite" });
  const root = element(
    "div",
    { class: wide ? "field wide" : "field" },
    element("label", { for: id }, label),
    input,
    hint !== "" && element("p", { id: `${id}-hint`, class: "hint" }, hint),
    message,
  );
  return {
    root,
    input,
    problem(words) {
      if (message.textContent !== words) message.textContent = words;
      if (words === "") input.removeAttribute("aria-invalid");
      else input.setAttribute("aria-invalid", "true");
    },
  };
}
