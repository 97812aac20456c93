import type { BookBlock } from "../../hosts/trial/book";

/** One line of an area: a question, the formula that answers it, and how its number is shown. */
export type Answer = readonly [question: string, formula: string, format?: string];

/** An area of one group of functions: a heading, then a question and its answer a line. */
export function answers(row: number, heading: string, lines: readonly Answer[]): BookBlock[] {
  return [
    { at: `A${row}`, style: "heading", cells: [[heading, null]] },
    { at: `A${row + 1}`, cells: lines.map(([question]) => [question]) },
    ...lines.map(([, formula, format], line): BookBlock => ({
      at: `B${row + 1 + line}`,
      cells: [[formula]],
      ...(format && { format }),
    })),
  ];
}

/** A formula that spills, under a heading of its own. */
export function table(at: string, heading: string, formula: string): BookBlock[] {
  const match = /^([A-Z]+)(\d+)$/.exec(at)!;
  return [
    { at, style: "heading", cells: [[heading]] },
    { at: `${match[1]}${Number(match[2]) + 1}`, cells: [[formula]] },
  ];
}
