import { isCellError, type Cell } from "../../sheet/cell";
import { compareCells } from "../coerce";
import { wildcard } from "./criteria";

/** The place of `wanted` among `cells`, -1 where it is not there. Texts in any case, with `?` and `*` where `wild`. */
export function findExact(wanted: Cell, cells: readonly Cell[], wild: boolean, backwards = false): number {
  const target = wanted ?? 0;
  const matches = wild && typeof target === "string" && /[?*~]/.test(target) ? wildcard(target) : undefined;
  const same = (cell: Cell) =>
    matches
      ? typeof cell === "string" && matches(cell)
      : typeof cell === typeof target && !isCellError(cell) && compareCells(cell, target) === 0;
  if (!backwards) return cells.findIndex(same);
  for (let i = cells.length - 1; i >= 0; i--) if (same(cells[i]!)) return i;
  return -1;
}

/** Of cells in rising order the place of the last that is not above `wanted`; other kinds of value are passed over. */
export function findSorted(wanted: Cell, cells: readonly Cell[], falling = false): number {
  const target = wanted ?? 0;
  let found = -1;
  for (let i = 0; i < cells.length; i++) {
    const cell = cells[i];
    if (cell === null || cell === undefined || typeof cell !== typeof target || isCellError(cell)) continue;
    const order = compareCells(cell, target);
    if (falling ? order < 0 : order > 0) break;
    found = i;
  }
  return found;
}

/** In any order: the same value, else the nearest below (`-1`) or above (`1`); -1 where there is none. */
export function findNearest(wanted: Cell, cells: readonly Cell[], side: -1 | 1, backwards: boolean): number {
  const exact = findExact(wanted, cells, false, backwards);
  if (exact >= 0) return exact;
  const target = wanted ?? 0;
  let best = -1;
  cells.forEach((cell, index) => {
    if (cell === null || cell === undefined || typeof cell !== typeof target || isCellError(cell)) return;
    if (compareCells(cell, target) * side < 0) return;
    if (best < 0 || compareCells(cell, cells[best]!) * side < 0) best = index;
  });
  return best;
}
