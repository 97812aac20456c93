import { element, newId, type Child } from "./element";

export interface PanePart {
  readonly heading: string;
  readonly root: HTMLElement;
  /** Brings the part into view and puts the keyboard there: only on the user's own request. */
  goTo(): void;
  /** Stops what it listens to: called when the pane is built anew. */
  leave?(): void;
}

/** A part of the pane: a section under its heading. */
export function part(name: string, heading: string, ...children: readonly Child[]): PanePart {
  const id = newId(name);
  const title = element("h2", { id, tabindex: "-1" }, heading);
  const root = element("section", { class: `part ${name}`, "aria-labelledby": id }, title, ...children);
  return {
    heading,
    root,
    goTo() {
      title.scrollIntoView({ block: "start" });
      title.focus({ preventScroll: true });
    },
  };
}

/** A fold whose inside is worked out only while it is open: `draw` is called on opening, and by `refresh` while open. */
export function lazyFold(words: string, draw: () => void, ...children: readonly Child[]) {
  const root = fold(words, false, ...children);
  const refresh = () => root.open && draw();
  root.addEventListener("toggle", refresh);
  return { root, refresh };
}

/** What is only shown on request, under its own words. */
export function fold(words: string, open: boolean, ...children: readonly Child[]): HTMLDetailsElement {
  return element("details", { open }, element("summary", {}, words), ...children);
}
