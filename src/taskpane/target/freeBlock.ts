import type { Port } from "../../hosts/port";
import { formatAddress, type Area } from "../../sheet/address";
import { isBlank } from "../../sheet/cell";
import { overlap } from "./overlap";

const FARTHEST = 80;
const LAST_ROW = 1_048_575;
const LAST_COLUMN = 16_383;

/**
 * The nearest empty cells right of a cell, from its row down, with an empty column before them. `apart` are ranges that they must not
 * touch, even where these are empty. Undefined where none are near.
 */
export async function freeBlock(
  port: Port,
  cell: Area,
  rows: number,
  columns: number,
  apart: readonly Area[],
): Promise<Area | undefined> {
  const bottom = cell.top + rows - 1;
  const first = cell.left + 1;
  const last = Math.min(first + FARTHEST + columns, LAST_COLUMN);
  if (bottom > LAST_ROW) return undefined;
  const { values } = await port.read(formatAddress({ ...cell, left: first, bottom, right: last }));
  const empty = (column: number): boolean =>
    values.every((row) => isBlank(row[column - first])) &&
    !apart.some((area) => overlap(area, { ...cell, left: column, bottom, right: column }));
  let run = 0;
  for (let column = first; column <= last; column++) {
    run = empty(column) ? run + 1 : 0;
    if (run > columns) return { ...cell, left: column - columns + 1, bottom, right: column };
  }
  return undefined;
}
