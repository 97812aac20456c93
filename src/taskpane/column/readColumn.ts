import { formatAddress, parseAddress, type Area } from "../../sheet/address";
import { isBlank, type Cell } from "../../sheet/cell";
import { sampleOf } from "../../sheet/sampleMemo";
import type { Block } from "../../hosts/port";

/** One column as the pane takes it: where its scores stand, its heading, and what is no score in it. */
export interface Column {
  /** The scores alone, heading left out: what goes into a formula. */
  readonly address: string;
  readonly heading: string;
  /** The cells of `address`, one a row. */
  readonly cells: readonly (readonly [Cell])[];
  readonly count: number;
  /** Addresses on the column's own sheet, without the sheet in front. */
  readonly blanks: readonly string[];
  readonly offenders: readonly Offender[];
  /** The numbers in rising order. */
  readonly sorted: Float64Array;
  /** The numbers in the order of the sheet. */
  readonly values: Float64Array;
}

const LAST_ROW = 1_048_575;

export interface Offender {
  readonly address: string;
  readonly cell: Cell;
}

/** The columns of a block that hold at least `least` numbers, by their place in it. */
export function numberColumns({ values }: Block, least = 1): number[] {
  const counts = (values[0] ?? []).map(() => 0);
  let short = counts.length;
  for (const row of values) {
    for (let i = 0; i < row.length; i++) if (typeof row[i] === "number" && ++counts[i]! === least) short--;
    if (short === 0) break;
  }
  return counts.flatMap((count, place) => (count >= least ? [place] : []));
}

/**
 * Reads one column of a block. A text in its first cell, with numbers below, is its heading; blanks before the first and after the last
 * cell in use belong to nobody and are cut off. Undefined where the column holds no number.
 */
export function readColumn(block: Block, place: number): Column | undefined {
  const area = parseAddress(block.address);
  if (!area) return undefined;
  const cells = block.values.map((row) => row[place] ?? null);
  let first = cells.findIndex((cell) => !isBlank(cell));
  let last = cells.length - 1;
  while (last > first && isBlank(cells[last])) last--;
  const numbers = cells.reduce<number>((count, cell) => (typeof cell === "number" ? count + 1 : count), 0);
  if (first < 0 || numbers === 0) return undefined;
  let heading = "";
  if (typeof cells[first] === "string") heading = String(cells[first++]).trim();
  while (isBlank(cells[first])) first++;
  const column = area.left + place;
  const at = (row: number): Area => ({ top: area.top + row, bottom: area.top + row, left: column, right: column });
  const used = cells.slice(first, last + 1);
  const values = new Float64Array(numbers);
  const blanks: string[] = [];
  const offenders: Offender[] = [];
  let count = 0;
  used.forEach((cell, index) => {
    if (typeof cell === "number") values[count++] = cell;
    else if (isBlank(cell)) blanks.push(formatAddress(at(first + index)));
    else offenders.push({ address: formatAddress(at(first + index)), cell });
  });
  return {
    address: formatAddress({ ...area, ...at(first), bottom: area.top + last }),
    heading,
    cells: used.map((cell) => [cell] as const),
    count,
    blanks,
    offenders,
    values,
    // The cell functions meet the same scores under the same memory: sorted once for all.
    sorted: sampleOf(values).sorted,
  };
}

/** The cell right above a column, where a heading may stand that was not selected; undefined in the first row. */
export function cellAbove(address: string): string | undefined {
  const area = parseAddress(address);
  if (!area || area.top === 0) return undefined;
  return formatAddress({ ...area, top: area.top - 1, bottom: area.top - 1, right: area.left });
}

/** So many cells right below a column; undefined where it ends in the last row. */
export function cellsBelow(address: string, most: number): string | undefined {
  const area = parseAddress(address);
  if (!area || area.bottom >= LAST_ROW) return undefined;
  const bottom = Math.min(area.bottom + most, LAST_ROW);
  return formatAddress({ ...area, top: area.bottom + 1, bottom, right: area.left });
}

/** The address of a block without its first row, where that holds only texts and numbers stand below: headings are no data. */
export function withoutHeading({ address, values }: Block): string {
  const area = parseAddress(address);
  const [first, ...rest] = values;
  const texts = first !== undefined && first.every((cell) => typeof cell === "string" || isBlank(cell));
  const numbers = rest.some((row) => row.some((cell) => typeof cell === "number"));
  return area && texts && numbers ? formatAddress({ ...area, top: area.top + 1 }) : address;
}
