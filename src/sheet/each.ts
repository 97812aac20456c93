import { numberCells } from "./numberCells";
import type { Cell, Range } from "./cell";

/**
 * Answers for each cell of a range, in its shape: `answer` gets the numbers, a blank stays blank, and a text in any one cell refuses the
 * whole call.
 */
export function mapEach(argument: string, range: Range, answer: (value: number) => Cell): Cell[][] {
  numberCells(argument, range);
  return range.map((row) => row.map((cell) => (typeof cell === "number" ? answer(cell) : "")));
}
