import { element, newId, type Child } from "./element";

export interface PanePart {
  readonly root: HTMLElement;
  /** Brings the part into view and puts the keyboard there: only on the user's own request. */
  goTo(): void;
}

/** A part of the pane: a section under its heading. */
export function part(name: string, heading: string, ...children: readonly Child[]): PanePart {
  const id = newId(name);
  const title = element("h2", { id, tabindex: "-1" }, heading);
  const root = element("section", { class: `part ${name}`, "aria-labelledby": id }, title, ...children);
  return {
    root,
    goTo() {
      title.scrollIntoView({ block: "start" });
      title.focus({ preventScroll: true });
    },
  };
}

/** What is only shown on request, under its own words. */
export function fold(words: string, open: boolean, ...children: readonly Child[]): HTMLDetailsElement {
  return element("details", { open }, element("summary", {}, words), ...children);
}
