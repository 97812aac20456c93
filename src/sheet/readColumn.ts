import { DomainError } from "../core/domain";
import type { Cell, Range } from "./cell";
import { numberCells } from "./numberCells";

/** The cells of one column (or one row); a block of several rows and columns is refused. */
export function readColumn(argument: string, range: Range): readonly Cell[] {
  const columns = range[0]?.length ?? 0;
  if (range.length > 1 && columns > 1)
    throw new DomainError(
      argument,
      range,
      "one column",
      `a range of ${range.length} rows and ${columns} columns was given`,
    );
  return range.flat();
}

/** Two columns of equal length, cell beside cell. */
export function readColumns(first: string, one: Range, second: string, other: Range): readonly (readonly Cell[])[] {
  const cells = [readColumn(first, one), readColumn(second, other)];
  if (cells[0].length !== cells[1].length) {
    const came = `${first} has ${cells[0].length} cells, ${second} ${cells[1].length}`;
    throw new DomainError(second, other, `as long as ${first}`, came);
  }
  return cells;
}

/** The pairs of numbers of two columns of equal length; a pair with a blank is skipped. */
export function readPairs(
  first: string,
  one: Range,
  second: string,
  other: Range,
): readonly [Float64Array, Float64Array] {
  const [left, right] = readColumns(first, one, second, other);
  numberCells(first, one);
  numberCells(second, other);
  const paired = left.map((cell, index) => typeof cell === "number" && typeof right[index] === "number");
  const kept = (cells: readonly Cell[]) => Float64Array.from(cells.filter((_, index) => paired[index]) as number[]);
  return [kept(left), kept(right)];
}
