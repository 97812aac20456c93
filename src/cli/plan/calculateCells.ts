import { evaluate } from "../../audit/evaluate";
import type { PlanCell } from "../../plan/planModel";
import type { Cell } from "../../sheet/cell";
import type { Sheet, Workbook } from "../../sheet/workbook";

/** What a formula of a plan came to, where it failed. */
export interface Failed {
  readonly row: number;
  readonly column: number;
  readonly message: string;
}

/**
 * Works out the formulas of a sheet in the order given, each on what stands there before it, and puts their values into `sheet`: cells as
 * they are written, and those that hold an error.
 */
export function calculateCells(
  workbook: Workbook,
  sheet: Sheet,
  rows: readonly (readonly (PlanCell | undefined)[])[],
  order: "by rows" | "by columns",
): { readonly cells: (PlanCell | undefined)[][]; readonly failed: readonly Failed[] } {
  const cells = rows.map((row) => [...row]);
  const failed: Failed[] = [];
  const places = cells.flatMap((row, r) => row.map((_, c) => [r, c] as const));
  if (order === "by columns") places.sort(([r, c], [s, d]) => c - d || r - s);
  // Constants first: a formula may speak of an input further down.
  for (const [row, column] of places) {
    const cell = cells[row]![column];
    if (cell && cell.formula === undefined && cell.value !== null) sheet.set(row, column, cell.value);
  }
  for (const [row, column] of places) {
    const cell = cells[row]![column];
    if (cell?.formula === undefined) continue;
    const answer = evaluate(cell.formula, { workbook, sheet, row, column, single: true });
    if (!("value" in answer)) throw new Error(`${cell.formula} can't be worked out`);
    const value = Array.isArray(answer.value) ? (answer.value[0]?.[0] ?? null) : answer.value;
    sheet.set(row, column, value);
    cells[row]![column] = { ...cell, value };
    if (typeof value === "object" && value !== null) failed.push({ row, column, message: value.message ?? value.code });
  }
  return { cells, failed };
}

/** The value of a cell, by the name that the plan gave it. */
export function numberAt(sheet: Sheet, row: number, column: number): number | undefined {
  const cell: Cell = sheet.cell(row, column);
  return typeof cell === "number" && Number.isFinite(cell) ? cell : undefined;
}
