import { DomainError, showValue } from "../core/domain";
import { isBlank, ordinalCell, type Cell, type Range } from "./cell";

/** The numbers of a range read row by row, each with its place; what is neither number nor blank is refused as a whole. */
export interface NumberCells {
  readonly values: Float64Array;
  readonly blanks: number;
}

/** A frozen range can't change: what was read of it once holds. A workbook that is audited hands the same ones to thousands of calls. */
const read = new WeakMap<Range, NumberCells>();

/**
 * Reads the numbers of a range, skipping blanks. Text, TRUE/FALSE and error cells are refused together, with how many there are and
 * where the first stands; a text in the very first cell alone is called what it probably is, a heading.
 */
export function numberCells(argument: string, range: Range): NumberCells {
  const frozen = Object.isFrozen(range);
  const known = frozen ? read.get(range) : undefined;
  if (known) return known;
  let cells = 0;
  for (const row of range) cells += row.length;
  const values = new Float64Array(cells);
  let used = 0;
  let blanks = 0;
  let position = 0;
  let offenders = 0;
  let first = 0;
  let firstCell: Cell = null;
  for (const row of range) {
    for (const cell of row) {
      position++;
      if (typeof cell === "number" && Number.isFinite(cell)) values[used++] = cell;
      else if (isBlank(cell)) blanks++;
      else if (offenders++ === 0) {
        first = position;
        firstCell = cell;
      }
    }
  }
  if (offenders > 0) refuseCells(argument, firstCell, first, offenders, cells);
  const numbers = { values: values.subarray(0, used), blanks };
  if (frozen) read.set(range, numbers);
  return numbers;
}

function refuseCells(argument: string, cell: Cell, place: number, offenders: number, cells: number): never {
  const where = `${ordinalCell(place)} holds ${showValue(cell)}`;
  if (offenders === 1 && place === 1 && cells > 1 && typeof cell === "string") {
    const came = `${where}, which looks like a heading: start the range one cell further down`;
    throw new DomainError(argument, cell, "numbers and blank cells only", came);
  }
  const many = offenders === 1 ? "1 cell is something else" : `${offenders} cells are something else`;
  throw new DomainError(argument, cell, "numbers and blank cells only", `${many}: ${where}`);
}
