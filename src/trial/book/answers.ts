import { formatAddress, parseAddress, type Area } from "../../sheet/address";
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

/** A formula whose table spills, under a heading of its own; `formats` are those of its values, row by row or the same for each row. */
export function table(at: string, heading: string, formula: string, formats: Formats = {}): BookBlock[] {
  const { top, left } = parseAddress(at)!;
  const cell = (down: number, across: number) => formatAddress(oneCell(top + down, left + across));
  const { values = [], columns = [], rows = 0 } = formats;
  return [
    { at, style: "heading", cells: [[heading]] },
    { at: cell(1, 0), cells: [[formula]] },
    // Empty, but formatted: the table spills into them.
    ...values.flatMap((format, row): BookBlock[] =>
      format ? [{ at: cell(row + 1, 1), format, cells: [[null]] }] : [],
    ),
    ...columns.flatMap((format, column): BookBlock[] =>
      format ? [{ at: cell(2, column), format, cells: Array.from({ length: rows }, () => [null]) }] : [],
    ),
  ];
}

export interface Formats {
  /** Of a table of labels: the formats of its values, from the first row on. */
  readonly values?: readonly string[];
  /** Of a table with a heading row: the formats of its columns, and how many rows have them. */
  readonly columns?: readonly string[];
  readonly rows?: number;
}

function oneCell(row: number, column: number): Area {
  return { top: row, left: column, bottom: row, right: column };
}
