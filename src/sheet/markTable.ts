import { requireOnScale } from "../core/method/markCurve";
import type { Cell } from "./cell";
import { labelTable, type LabelRow } from "./tables";

/** A label table of marks: one that is shown and falls off the scale of its shape is no answer; one that isn't asked for does no harm. */
export function markTable(rows: readonly LabelRow[], item?: Cell): Cell | Cell[][] {
  const table = labelTable(rows, item);
  if (typeof table === "number") requireOnScale(String(item).trim().toLowerCase(), table);
  if (Array.isArray(table))
    for (const [label, value] of rows) if (typeof value === "number") requireOnScale(label, value);
  return table;
}
