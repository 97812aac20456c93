import { isBlank, type Cell } from "../sheet/cell";
import type { Step } from "./steps";

/**
 * The steps of a table of labels: its last `labels` rows are one a label, meaning = label. With `item` the derivation ends with the row of that label, and
 * the other labels' rows are left out.
 */
export function pickItem(rows: readonly Step[], labels: number, item: Cell): readonly Step[] {
  if (isBlank(item)) return rows;
  const wanted = String(item).trim().toLowerCase();
  const first = rows.length - labels;
  return rows.filter((row, i) => i < first || row.meaning.toLowerCase() === wanted);
}
