import { callFunction } from "../functions/call";
import type { Port } from "../hosts/port";
import { columnPart } from "./column/columnPart";
import { followSelection, type Selection } from "./column/followSelection";
import type { Column } from "./column/readColumn";
import type { PaneContext } from "./context";
import type { CutoffAnswer } from "./cutoff/answerCutoff";
import { cutoffPart } from "./cutoff/cutoffPart";
import { keptQuestion } from "./cutoff/question";
import { button, choice } from "./dom/choice";
import { element, fill } from "./dom/element";
import type { PanePart } from "./dom/part";
import { functionsPart } from "./functions/functionsPart";
import { numbersFor } from "./numbers";
import { observable } from "./observable";
import { proofPart } from "./proof/proofPart";
import { searchPart } from "./search/searchPart";
import { keptSearch } from "./search/searchQuestion";
import type { Texts } from "./texts/en";
import { languageFor } from "./texts/languageFor";
import { languages } from "./texts/languages";
import { usePart } from "./use/usePart";
import { watchPart } from "./watch/watchPart";
import "./pane.css";
import "./controls.css";
import "./pictures.css";

/** Puts the pane into an element and lets it work on whatever world the port opens. */
export function mountPane(root: HTMLElement, port: Port): void {
  root.classList.add("weirmark-pane");
  const followTheme = () => (root.dataset.theme = port.theme());
  followTheme();
  // Not every host tells when its theme changes: look again when the user comes back, and when the system changes.
  window.addEventListener("focus", followTheme);
  matchMedia("(prefers-color-scheme: dark)").addEventListener("change", followTheme);
  void open(root, port);
}

/** Builds the pane with what was kept in the workbook; once more when the language changes, with the column that is in hand. */
async function open(root: HTMLElement, port: Port, inHand?: Column): Promise<void> {
  const kept = (key: string) => port.readSetting(key).catch(() => undefined);
  const [asked, searched, chosen] = await Promise.all([kept("cutoff"), kept("search"), kept("language")]);
  const language = languageFor(chosen, navigator.languages, Object.keys(languages));
  const texts = languages[language]!;
  const context: PaneContext = {
    port,
    call: (name, given, invocation) => callFunction(name, given, "null", invocation),
    texts,
    numbers: numbersFor(port.separators(), texts.percentGap),
    column: observable<Column | undefined>(inHand),
    selected: observable<string | undefined>(undefined),
    question: observable(keptQuestion(asked)),
    answer: observable<CutoffAnswer | undefined>(undefined),
  };
  const selection = observable<Selection>({ kind: "reading" });
  const follower = followSelection(port, context.column, context.selected, selection);
  const parts: PanePart[] = [
    columnPart(context, follower),
    cutoffPart(context),
    usePart(context),
    searchPart(context, observable(keptSearch(searched))),
    watchPart(context),
    proofPart(context),
    functionsPart(context),
  ];
  const speak = (code: string) => {
    follower.stop();
    for (const one of parts) one.leave?.();
    const again = () => open(root, port, context.column.get());
    port.keepSetting("language", code).then(again, again);
  };
  root.lang = language;
  fill(root, navigation(texts, parts), ...parts.map((one) => one.root), languageChoice(texts, language, speak));
}

/** The words that lead to each part. The host keeps the top right corner for its own button. */
function navigation(texts: Texts, parts: readonly PanePart[]): HTMLElement {
  return element(
    "nav",
    { "aria-label": texts.jumpTo },
    ...parts.map((one) => button(one.heading, () => one.goTo(), "plain")),
  );
}

function languageChoice(texts: Texts, language: string, speak: (code: string) => void): HTMLElement {
  const options = Object.entries(languages).map(([code, { languageName }]) => [code, languageName] as const);
  return element("footer", { class: "fields" }, choice(texts.language, options, language, speak).root);
}
