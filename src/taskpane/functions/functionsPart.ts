import { functionTable } from "../../functions/call";
import type { FunctionEntry } from "../../sheet/functionTable";
import type { PaneContext } from "../context";
import { button, choice } from "../dom/choice";
import { element, fill } from "../dom/element";
import { field } from "../dom/field";
import { part, type PanePart } from "../dom/part";
import { findFunctions, TOPICS, type Topic } from "./findFunctions";
import { functionForm } from "./functionForm";

const FIRST_SHOWN = 8;

/** The finder: every cell function by topic and by question, with a form that builds its formula. */
export function functionsPart(context: PaneContext): PanePart {
  const { texts, numbers } = context;
  let typed = "";
  let topic = "";
  let all = false;
  const count = element("p", { class: "quiet", "aria-live": "polite" });
  const list = element("ul", { class: "finder" });
  const room = element("div");

  const open = (entry: FunctionEntry) => {
    const back = button(texts.backToList, () => {
      fill(room);
      found.hidden = false;
      search.input.focus();
    });
    found.hidden = true;
    const title = element("h3", { tabindex: "-1" }, `WEIR.${entry.name}`);
    fill(room, back, title, functionForm(context, entry));
    title.focus();
  };
  const item = (entry: FunctionEntry) =>
    element(
      "li",
      {},
      button(entry.name, () => open(entry), "plain"),
      element("span", { class: "asked", lang: "en" }, entry.questions[0] ?? entry.description),
    );
  const draw = () => {
    const fitting = findFunctions(functionTable, typed, topic);
    const narrowed = typed.trim() !== "" || topic !== "" || all;
    count.textContent = fitting.length === 0 ? texts.noneFound : texts.functionsFound(numbers.count(fitting.length));
    const shown = narrowed ? fitting : fitting.slice(0, FIRST_SHOWN);
    const more = button(texts.showAll(numbers.count(fitting.length)), () => {
      all = true;
      draw();
      list.querySelectorAll("button")[FIRST_SHOWN]?.focus();
    });
    fill(list, ...shown.map(item), shown.length < fitting.length && element("li", {}, more));
  };
  const search = field(
    texts.functionsAsk,
    "",
    (text) => {
      typed = text;
      draw();
    },
    texts.functionsAskHint,
  );
  const topics = choice(
    texts.topic,
    [["", texts.topicAll], ...TOPICS.map((one) => [one, topicWords(one, texts)] as const)],
    "",
    (value) => {
      topic = value;
      draw();
    },
  );
  search.root.classList.add("wide");
  topics.root.classList.add("wide");
  const found = element("div", {}, element("div", { class: "fields" }, search.root, topics.root), count, list);
  draw();
  return part("functions", texts.functionsHeading, found, room);
}

function topicWords(topic: Topic, texts: PaneContext["texts"]): string {
  const words: Readonly<Record<Topic, string>> = {
    plan: texts.topicPlan,
    describe: texts.topicDescribe,
    cutoff: texts.topicCutoff,
    search: texts.topicSearch,
    stopping: texts.topicStopping,
    risk: texts.topicRisk,
    combine: texts.topicCombine,
    watch: texts.topicWatch,
    simulate: texts.topicSimulate,
    audit: texts.topicAudit,
  };
  return words[topic];
}
