import { isBlank, isCellError, type Cell } from "../sheet/cell";

/** How a stored value stands to the one worked out again. */
export interface Comparison {
  readonly same: boolean;
  /** The largest difference of two numbers, as a part of the larger; Infinity where two cells are not of one kind. */
  readonly gap: number;
  /** The first cell that is not the same, counted from 0. */
  readonly row: number;
  readonly column: number;
  readonly stored: Cell;
  readonly recomputed: Cell;
}

/** Beside an exact 0 this much is rounding. */
const ROUNDING = 1e-12;

/** Compares cell by cell, in the shape of the larger of the two; a cell that one of them doesn't have counts as blank. */
export function compareStored(
  stored: readonly (readonly Cell[])[],
  recomputed: readonly (readonly Cell[])[],
  tolerance: number,
): Comparison {
  const rows = Math.max(stored.length, recomputed.length);
  const columns = Math.max(stored[0]?.length ?? 0, recomputed[0]?.length ?? 0);
  let gap = 0;
  for (let row = 0; row < rows; row++) {
    for (let column = 0; column < columns; column++) {
      const held = stored[row]?.[column];
      const fresh = recomputed[row]?.[column];
      const distance = cellGap(held, fresh);
      if (!(distance <= tolerance)) return { same: false, gap: distance, row, column, stored: held, recomputed: fresh };
      gap = Math.max(gap, distance);
    }
  }
  return { same: true, gap, row: -1, column: -1, stored: null, recomputed: null };
}

function cellGap(stored: Cell, recomputed: Cell): number {
  if (typeof stored === "number" && typeof recomputed === "number") {
    const distance = Math.abs(stored - recomputed);
    const size = Math.max(Math.abs(stored), Math.abs(recomputed));
    if (distance === 0 || (distance <= ROUNDING && (stored === 0 || recomputed === 0))) return 0;
    return distance / size;
  }
  if (isCellError(stored) && isCellError(recomputed)) return stored.code === recomputed.code ? 0 : Infinity;
  if (isBlank(stored) && isBlank(recomputed)) return 0;
  return stored === recomputed ? 0 : Infinity;
}
