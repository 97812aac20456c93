import { ordinal } from "../core/ordinal";
import type { Cell } from "../sheet/cell";
import type { Steps } from "./steps";

/** One cell of a headed table: its value, and how the host computes it. */
export type TableCell = readonly [value: Cell, formula?: string, source?: string];

/** Up to this many cells a table is laid out in full. */
const MOST_CELLS = 200;

/**
 * Adds the body of a headed table, a step a cell, row by row. Of a long table the first and the last rows are laid out and the others, worked alike,
 * named in the step before the last ones. `row` is asked for those rows alone, counted from 0.
 */
export function addTable(
  steps: Steps,
  headings: readonly string[],
  rows: number,
  row: (index: number) => { readonly name: string; readonly cells: readonly TableCell[] },
): Steps {
  const long = rows * headings.length > MOST_CELLS;
  const ends = Math.max(1, Math.floor(MOST_CELLS / 2 / headings.length));
  for (let index = 0; index < rows; index++) {
    if (long && index === ends && rows > 2 * ends) {
      const left = rows - 2 * ends;
      steps.add(`rows left out here, from the ${ordinal(ends + 1)} to the ${ordinal(rows - ends)}, worked alike`, left);
      index = rows - ends;
    }
    const { name, cells } = row(index);
    headings.forEach((heading, i) => {
      const [value, formula, source] = cells[i]!;
      steps.add(`${name}: ${heading}`, value, formula, source);
    });
  }
  return steps;
}
