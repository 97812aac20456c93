import { isCellError, type Cell } from "../../sheet/cell";
import type { Outcome } from "../../sheet/invoke";
import type { PaneContext } from "../context";
import { element } from "../dom/element";
import { figure, table, type TableCell } from "../dom/table";

const MOST_ROWS = 25;

/** What a cell would show: a value, a table cut to what can be read here, or the error with its message. */
export function outcomeView(
  { texts, numbers }: Pick<PaneContext, "texts" | "numbers">,
  outcome: Outcome | undefined,
): HTMLElement {
  if (!outcome) return element("p", {}, texts.noAnswer);
  if ("error" in outcome)
    return element("p", { class: "message", lang: "en" }, `${outcome.error} ${outcome.message}`.trim());
  const { value } = outcome;
  const words = (cell: Cell): string => {
    if (typeof cell === "number") return numbers.full(cell);
    if (typeof cell === "boolean") return cell ? "TRUE" : "FALSE";
    return isCellError(cell) ? cell.code : String(cell ?? "");
  };
  if (!Array.isArray(value))
    return element("p", { class: "mark" }, words(value) === "" ? texts.emptyText : words(value));
  const shown = (cell: Cell): TableCell => (typeof cell === "number" ? figure(words(cell)) : { text: words(cell) });
  const rows = value.slice(0, MOST_ROWS).map((row) => row.map(shown));
  const all = table(texts.valueShown, [], rows);
  if (value.length <= MOST_ROWS) return all;
  return element(
    "div",
    {},
    all,
    element("p", { class: "quiet" }, texts.rowsMore(numbers.count(value.length - MOST_ROWS))),
  );
}
