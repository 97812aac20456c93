import type { PaneContext } from "../context";
import { withoutHeading } from "../column/readColumn";
import { button } from "./choice";
import { element } from "./element";
import { field } from "./field";

export interface RangeField {
  readonly root: HTMLElement;
  readonly input: HTMLInputElement;
  problem(words: string): void;
}

/** A line for an address, with a button that takes the selection of the sheet into it. */
export function rangeField(
  { texts, selected, port }: Pick<PaneContext, "texts" | "selected" | "port">,
  label: string,
  value: string,
  typed: (text: string) => void,
  hint = "",
): RangeField {
  const made = field(label, value, typed, hint);
  const use = button(
    texts.useSelection,
    () => {
      const address = selected.get();
      if (address === undefined) return;
      const take = (text: string) => {
        made.input.value = text;
        typed(text);
      };
      port.read(address).then(
        (block) => take(withoutHeading(block)),
        () => take(address),
      );
    },
    "plain",
  );
  use.setAttribute("aria-label", `${texts.useSelection}: ${label}`);
  selected.watch((address) => (use.hidden = address === undefined));
  return { root: element("div", { class: "range" }, made.root, use), input: made.input, problem: made.problem };
}
