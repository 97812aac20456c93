import type { Cell, Range } from "../sheet/cell";
import { errorCell, isArray, NotKnown } from "./value";

/** A result of more cells than this is not made. */
export const MOST_RESULT_CELLS = 5_000_000;

export function requireSize(rows: number, columns: number): void {
  if (rows * columns > MOST_RESULT_CELLS)
    throw new NotKnown(`it makes an array of ${rows} rows and ${columns} columns`);
}

/**
 * Answers cell by cell: one value or a single row or column goes along with every other, and where one array ends before another the
 * answer is #N/A. All values single: one answer.
 */
export function broadcast(operands: readonly (Cell | Range)[], answer: (cells: Cell[]) => Cell): Cell | Cell[][] {
  if (!operands.some(isArray)) return answer(operands as Cell[]);
  let rows = 1;
  let columns = 1;
  for (const operand of operands) {
    if (!isArray(operand)) continue;
    rows = Math.max(rows, operand.length);
    columns = Math.max(columns, operand[0]?.length ?? 0);
  }
  requireSize(rows, columns);
  const lines: Cell[][] = [];
  for (let row = 0; row < rows; row++) {
    const line: Cell[] = [];
    for (let column = 0; column < columns; column++) {
      const cells: Cell[] = [];
      let inside = true;
      for (const operand of operands) {
        if (!isArray(operand)) cells.push(operand);
        else {
          const source = operand.length === 1 ? operand[0]! : operand[row];
          const at = source?.length === 1 ? 0 : column;
          if (source === undefined || at >= source.length) inside = false;
          else cells.push(source[at]!);
        }
      }
      line.push(inside ? answer(cells) : errorCell("#N/A"));
    }
    lines.push(line);
  }
  return lines;
}

/** A 1 × 1 array is its one value. */
export function unwrapped(value: Cell | Range): Cell | Range {
  return isArray(value) && value.length === 1 && value[0]!.length === 1 ? value[0]![0]! : value;
}
