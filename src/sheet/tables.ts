import { DomainError } from "../core/domain";
import { isBlank, type Cell } from "./cell";
import { inWords } from "./readArgument";

export type LabelRow = readonly [label: string, value: Cell];

/** A table of two columns, label and value; with `item` (any case) just the value beside that label. */
export function labelTable(rows: readonly LabelRow[], item?: Cell): Cell | Cell[][] {
  if (isBlank(item)) return rows.map(([label, value]) => [label, value]);
  const typed = typeof item === "string" ? item.trim().toLowerCase() : undefined;
  const row = rows.find(([label]) => label.toLowerCase() === typed);
  if (row === undefined) throw new DomainError("item", item, inWords(rows.map(([label]) => label)));
  return row[1];
}

/** Refuses an unknown `item` before any long work is done for it. */
export function requireItem(labels: readonly string[], item: Cell): void {
  labelTable(
    labels.map((label) => [label, ""] as const),
    item,
  );
}

/** A table with one heading row. */
export function headedTable(headings: readonly string[], rows: readonly (readonly Cell[])[]): Cell[][] {
  return [[...headings], ...rows.map((row) => [...row])];
}
