import { element, newId } from "./element";

export type Option = readonly [value: string, words: string];

export interface Choice {
  readonly root: HTMLElement;
  readonly select: HTMLSelectElement;
  /** Other options in the place of the old; keeps the chosen one where it is still there. */
  offer(options: readonly Option[], chosen: string): void;
}

/** One of a few words, as the host's own list. */
export function choice(
  label: string,
  options: readonly Option[],
  chosen: string,
  changed: (value: string) => void,
): Choice {
  const id = newId("choice");
  const select = element("select", { id, change: () => changed(select.value) });
  const offer = (offered: readonly Option[], value: string) => {
    select.replaceChildren(...offered.map(([key, words]) => element("option", { value: key }, words)));
    select.value = value;
  };
  offer(options, chosen);
  return { root: element("div", { class: "field" }, element("label", { for: id }, label), select), select, offer };
}

/** A box to tick, its word behind it. */
export function tickBox(label: string, ticked: boolean, changed: (ticked: boolean) => void): HTMLElement {
  const input = element("input", { type: "checkbox", change: () => changed(input.checked) });
  input.checked = ticked;
  return element("label", { class: "tick" }, input, element("span", {}, label));
}

export function button(words: string, pressed: () => void, kind: "" | "main" | "plain" = ""): HTMLButtonElement {
  return element("button", { type: "button", class: kind === "" ? undefined : kind, click: pressed }, words);
}
