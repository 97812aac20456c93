import type { Port } from "../hosts/port";
import { callFunction } from "../functions/call";
import { columnPart } from "./column/columnPart";
import { followSelection, type Selection } from "./column/followSelection";
import type { Column } from "./column/readColumn";
import type { PaneContext } from "./context";
import type { CutoffAnswer } from "./cutoff/answerCutoff";
import { cutoffPart } from "./cutoff/cutoffPart";
import { keptQuestion } from "./cutoff/question";
import { button } from "./dom/choice";
import { element, fill } from "./dom/element";
import type { PanePart } from "./dom/part";
import { keptSearch } from "./search/searchQuestion";
import { searchPart } from "./search/searchPart";
import { functionsPart } from "./functions/functionsPart";
import { numbersFor } from "./numbers";
import { observable } from "./observable";
import { en, type Texts } from "./texts/en";
import { usePart } from "./use/usePart";
import { watchPart } from "./watch/watchPart";
import "./pane.css";

/** Puts the pane into an element and lets it work on whatever world the port opens. */
export function mountPane(root: HTMLElement, port: Port): void {
  root.classList.add("weirmark-pane");
  const followTheme = () => (root.dataset.theme = port.theme());
  followTheme();
  // Not every host tells when its theme changes: look again when the user comes back, and when the system changes.
  window.addEventListener("focus", followTheme);
  matchMedia("(prefers-color-scheme: dark)").addEventListener("change", followTheme);
  void start(root, port, en);
}

async function start(root: HTMLElement, port: Port, texts: Texts): Promise<void> {
  const kept = (key: string) => port.readSetting(key).catch(() => undefined);
  const [cutoff, searched] = await Promise.all([kept("cutoff"), kept("search")]);
  const context: PaneContext = {
    port,
    call: (name, given, invocation) => callFunction(name, given, "null", invocation),
    texts,
    numbers: numbersFor(port.separators(), texts.percentGap),
    column: observable<Column | undefined>(undefined),
    selected: observable<string | undefined>(undefined),
    question: observable(keptQuestion(cutoff)),
    answer: observable<CutoffAnswer | undefined>(undefined),
  };
  const selection = observable<Selection>({ kind: "reading" });
  const follower = followSelection(port, context.column, context.selected, selection);
  const parts = [
    columnPart(context, follower),
    cutoffPart(context),
    usePart(context),
    searchPart(context, observable(keptSearch(searched))),
    watchPart(context),
    functionsPart(context),
  ];
  root.lang = "en";
  fill(root, navigation(texts, parts), ...parts.map(({ root: section }) => section));
}

/** The words that lead to each part. The host keeps the top right corner for its own button. */
function navigation(texts: Texts, parts: readonly PanePart[]): HTMLElement {
  return element(
    "nav",
    { "aria-label": texts.jumpTo },
    ...parts.map((one) => button(one.heading, () => one.goTo(), "plain")),
  );
}
