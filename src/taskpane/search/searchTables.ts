import type { Cell } from "../../sheet/cell";
import type { PaneContext } from "../context";
import { figure, table, type TableCell } from "../dom/table";

type Rows = readonly (readonly Cell[])[];
type Part = Pick<PaneContext, "texts" | "numbers">;

/** STAGE_LOAD as it comes: its own words in cells are English, the pane's headings are the user's. */
export function loadTable({ texts, numbers }: Part, rows: Rows): HTMLElement {
  const shown = (cell: Cell): TableCell =>
    typeof cell === "number"
      ? figure(numbers.telling(cell))
      : { text: cell === "all stages" ? texts.loadAll : String(cell) };
  return table(
    texts.loadHeading,
    [texts.loadStage, texts.loadLearning, texts.loadSearching, texts.loadTotal, texts.loadCost],
    rows.slice(1).map((row) => row.map((cell, column) => (column === 0 ? { text: shown(cell).text } : shown(cell)))),
  );
}

/** RESERVE_SCHEDULE: the mark by looks left. */
export function scheduleTable({ texts, numbers }: Part, rows: Rows, better: "high" | "low"): HTMLElement {
  const shown = (cell: Cell, column: number): TableCell => {
    if (typeof cell !== "number") return { text: texts.scheduleLast };
    if (column === 0) return figure(numbers.count(cell));
    return figure(column === 3 ? numbers.percent(cell) : numbers.telling(cell));
  };
  return table(
    texts.scheduleHeading,
    [
      texts.scheduleLooks,
      better === "low" ? texts.scheduleAcceptLow : texts.scheduleAccept,
      texts.scheduleExpected,
      texts.scheduleChance,
    ],
    rows.slice(1).map((row) => row.map(shown)),
  );
}
