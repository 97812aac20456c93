import type { PaneContext } from "../context";
import { element } from "../dom/element";
import { field } from "../dom/field";
import { problemWords } from "../problemWords";
import { typedCount, typedFraction, typedNumber, type Typed } from "../typed";
import type { Observable } from "../observable";
import type { SearchQuestion } from "./searchQuestion";
import { stageFields } from "./stageFields";

type Part = Pick<PaneContext, "texts" | "numbers">;
type Key = "hits" | "chance" | "arrivals" | "lookCost" | "looksLeft";

/** One line of the search that changes the question as it is typed; an optional one may stay empty. */
function line(
  { texts, numbers }: Part,
  search: Observable<SearchQuestion>,
  key: Key,
  label: string,
  read: (text: string) => Typed,
  hint = "",
): HTMLElement {
  const optional = key !== "hits" && key !== "chance";
  const first = search.get()[key];
  const shown = first === undefined ? "" : key === "chance" ? numbers.exactPercent(first) : numbers.full(first);
  const made = field(
    label,
    shown,
    (text) => {
      const empty = optional && text.trim() === "";
      const typed = read(text);
      made.problem(empty ? "" : problemWords(typed, text, texts, numbers));
      if (empty) search.set({ ...search.get(), [key]: undefined });
      else if ("value" in typed) search.set({ ...search.get(), [key]: typed.value });
    },
    hint,
  );
  return made.root;
}

/** What the search is about: hits, certainty, time, and the stages with their costs. */
export function searchForm(context: Part, search: Observable<SearchQuestion>): HTMLElement[] {
  const { texts, numbers } = context;
  const { decimal } = numbers;
  return [
    element(
      "div",
      { class: "fields" },
      line(context, search, "hits", texts.hits, (text) => typedCount(text, decimal)),
      line(context, search, "chance", texts.searchChance, (text) => typedFraction(text, decimal)),
      line(context, search, "arrivals", texts.arrivals, (text) => typedPositive(text, decimal), texts.arrivalsHint),
    ),
    stageFields(context, search.get().stages, (stages) => search.set({ ...search.get(), stages })),
  ];
}

/** What a look costs in points of the score, and how many are left. */
export function reserveForm(context: Part, search: Observable<SearchQuestion>): HTMLElement {
  const { texts, numbers } = context;
  const { decimal } = numbers;
  return element(
    "div",
    { class: "fields" },
    line(context, search, "lookCost", texts.lookCost, (text) => typedPositive(text, decimal)),
    line(context, search, "looksLeft", texts.looksLeft, (text) => typedCount(text, decimal)),
  );
}

function typedPositive(text: string, decimal: "." | ","): Typed {
  const value = typedNumber(text, decimal);
  if (value === undefined) return { problem: text.trim() === "" ? "empty" : "no-number" };
  return value > 0 ? { value } : { problem: "not-positive" };
}
