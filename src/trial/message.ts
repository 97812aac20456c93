import { element, fill } from "../taskpane/dom/element";
import { button } from "../taskpane/dom/choice";

export interface Message {
  /** What is going on, what is asked, what was refused, what was done. */
  readonly kind: "busy" | "question" | "refusal" | "done";
  readonly text: string;
  readonly more?: readonly string[];
  /** A sentence that is English in every language: why a reader refuses a file. */
  readonly reason?: string;
  readonly actions: readonly (readonly [words: string, pressed: () => void])[];
}

/** Shows one message under the frame, in the place of the one before. A question and a refusal take the focus to what can be done. */
export function showMessage({ kind, text, more = [], reason, actions }: Message): void {
  const place = document.getElementById("message")!;
  const words = element(
    "div",
    { role: kind === "refusal" ? "alert" : "status" },
    element("p", {}, text),
    reason !== undefined && element("p", { lang: "en" }, reason),
    ...more.map((one) => element("p", {}, one)),
  );
  const buttons = actions.map(([said, pressed]) => button(said, pressed));
  place.hidden = false;
  fill(
    place,
    words,
    kind === "busy" && element("progress", { "aria-label": text }),
    element("p", { class: "actions" }, ...buttons),
  );
  if (kind === "question" || kind === "refusal") buttons[0]?.focus();
}

export function hideMessage(): void {
  const place = document.getElementById("message")!;
  const held = place.contains(document.activeElement);
  place.hidden = true;
  fill(place);
  if (held) document.getElementById("open")!.focus();
}
