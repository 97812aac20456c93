import type { Cell } from "../../sheet/cell";
import type { WorkedStep } from "./workingsOf";

/** The workings as cells: a line that says of what, the headings, and a row a step with its formula live beside its value. */
export function workingsCells(title: string, headings: readonly string[], steps: readonly WorkedStep[]): Cell[][] {
  return [
    [title, ...headings.slice(1).map(() => null)],
    [...headings],
    ...steps.map(({ meaning, value, formula, source }, index) => [
      index + 1,
      asConstant(meaning),
      asConstant(value),
      formula === "" ? null : formula,
      asConstant(source),
    ]),
  ];
}

/** A text out of the sheet that begins with "=" is shown, never worked out. */
function asConstant(cell: Cell): Cell {
  return typeof cell === "string" && cell.startsWith("=") ? `="${cell.replace(/"/g, '""')}"` : cell;
}
