import { DomainError, showValue } from "../core/domain";
import { ordinal } from "../core/ordinal";
import { isBlank, ordinalCell, type Cell, type Range } from "./cell";
import { numberCells } from "./numberCells";

/** The numbers of a range that keeps its rows and columns. */
export interface Grid {
  readonly rows: number;
  readonly columns: number;
  /** Row by row; NaN where the cell is blank. */
  readonly values: Float64Array;
  /** How many numbers each row holds. */
  readonly filled: Int32Array;
}

/** Reads a range of numbers and blanks as rows and columns; anything else in it is refused as numberCells does. */
export function readGrid(argument: string, range: Range): Grid {
  const rows = range.length;
  const columns = range[0]?.length ?? 0;
  const values = new Float64Array(rows * columns).fill(NaN);
  const filled = new Int32Array(rows);
  for (let row = 0; row < rows; row++) {
    for (let column = 0; column < columns; column++) {
      const cell = range[row][column];
      if (typeof cell === "number" && Number.isFinite(cell)) {
        values[row * columns + column] = cell;
        filled[row]++;
      } else if (!isBlank(cell)) numberCells(argument, range);
    }
  }
  return { rows, columns, values, filled };
}

/** Numbers as cells in the shape of the grid; NaN becomes a blank. */
export function gridCells({ columns }: Grid, values: Float64Array): Cell[][] {
  const cells: Cell[][] = [];
  for (let start = 0; start < values.length; start += columns) {
    const row: Cell[] = [];
    for (let i = start; i < start + columns; i++) row.push(Number.isNaN(values[i]) ? "" : values[i]);
    cells.push(row);
  }
  return cells;
}

/** Fails, naming the first of them, where a row is neither full nor empty. */
export function requireWholeRows(argument: string, { columns, filled }: Grid): void {
  const row = filled.findIndex((count) => count > 0 && count < columns);
  if (row < 0) return;
  const many = columns - filled[row];
  const came = `the ${ordinal(row + 1)} row has ${many} blank ${many === 1 ? "cell" : "cells"} of ${columns}`;
  throw new DomainError(argument, null, "complete in each row, or blank in all of it", came);
}

/**
 * One number for each criterion, written in one row or in one column: `count` of them, or as many as there are where it is left out.
 * With `blanks` "kept" a blank is NaN; else it is refused.
 */
export function readOneEach(argument: string, range: Range, blanks: "kept" | "refused", count?: number): Float64Array {
  const { rows, columns, values } = readGrid(argument, range);
  const many = count === undefined ? "" : ` (${count} in all)`;
  const requirement = `one number for each criterion${many}, in one row or one column`;
  if (rows > 1 && columns > 1) throw new DomainError(argument, range, requirement, sizeOf(rows, columns));
  if (count !== undefined && values.length !== count) {
    const came = values.length === 1 ? `only ${showValue(range[0][0])} was given` : `${values.length} cells were given`;
    throw new DomainError(argument, range, requirement, came);
  }
  if (blanks === "refused") requireNoBlank(argument, values, requirement);
  return values;
}

/** A table of numbers with `size` rows and columns and no blanks, row by row. */
export function readSquare(argument: string, range: Range, size: number): Float64Array {
  const { rows, columns, values } = readGrid(argument, range);
  const requirement = `a table of ${size} rows and ${size} columns, one for each criterion`;
  if (rows !== size || columns !== size) throw new DomainError(argument, range, requirement, sizeOf(rows, columns));
  requireNoBlank(argument, values, requirement);
  return values;
}

function requireNoBlank(argument: string, values: Float64Array, requirement: string): void {
  const blank = values.findIndex(Number.isNaN);
  if (blank >= 0) throw new DomainError(argument, null, requirement, `${ordinalCell(blank + 1)} is blank`);
}

function sizeOf(rows: number, columns: number): string {
  return `a range of ${rows} ${rows === 1 ? "row" : "rows"} and ${columns} ${columns === 1 ? "column" : "columns"} was given`;
}
