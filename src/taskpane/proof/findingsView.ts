import type { PaneContext } from "../context";
import { button, tickBox } from "../dom/choice";
import { element, fill } from "../dom/element";
import { localFormula } from "../formula";
import type { Finding } from "./findings";
import { foundWords } from "./foundWords";

const FIRST_SHOWN = 40;

export interface FindingsView {
  readonly root: HTMLElement;
  show(findings: readonly Finding[]): void;
}

/** What a check found, a line a cell, each with the way to it. */
export function findingsView(context: PaneContext): FindingsView {
  const { texts, numbers, port } = context;
  let all: readonly Finding[] = [];
  let narrowed = false;
  let whole = false;
  const filter = element("div");
  const list = element("ul", { class: "findings" });
  const message = element("p", { "aria-live": "polite" });

  const jump = async (address: string) => {
    fill(message);
    try {
      await port.select(address);
    } catch (failure) {
      const reason = failure instanceof Error ? failure.message : String(failure);
      message.textContent = texts.jumpFailed(address, reason);
    }
  };
  const line = ({ address, found, formula, why }: Finding) =>
    element(
      "li",
      { class: found === "agrees" ? undefined : "to-look-at" },
      element(
        "p",
        { class: "found" },
        button(address, () => void jump(address), "plain"),
        element("span", { class: found === "agrees" ? "quiet" : "verdict" }, foundWords(found, texts)),
      ),
      formula !== "" && element("code", {}, localFormula(formula, numbers.separators)),
      element("p", { class: found === "agrees" ? "quiet" : undefined, lang: "en" }, why),
    );
  const draw = () => {
    const fitting = narrowed ? all.filter(({ found }) => found !== "agrees") : all;
    const shown = whole ? fitting : fitting.slice(0, FIRST_SHOWN);
    const more = button(texts.showAllFound(numbers.count(fitting.length)), () => {
      whole = true;
      draw();
      list.querySelectorAll("button")[FIRST_SHOWN]?.focus();
    });
    fill(list, ...shown.map(line), shown.length < fitting.length && element("li", {}, more));
  };
  return {
    root: element("div", {}, filter, list, message),
    show(findings) {
      const agreeing = findings.filter(({ found }) => found === "agrees").length;
      const mixed = agreeing > 0 && agreeing < findings.length;
      all = findings;
      narrowed = mixed;
      whole = false;
      fill(message);
      fill(
        filter,
        mixed &&
          tickBox(texts.onlyToLookAt, narrowed, (ticked) => {
            narrowed = ticked;
            draw();
          }),
      );
      draw();
    },
  };
}
