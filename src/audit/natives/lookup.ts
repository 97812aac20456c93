import { isCellError, type Cell, type Range } from "../../sheet/cell";
import { broadcast } from "../broadcast";
import type { Evaluation } from "../evaluation";
import { LAST_COLUMN, LAST_ROW } from "../reference";
import { errorCell, isArray, NotKnown, Reference, type Value } from "../value";
import { findExact, findNearest, findSorted } from "./find";
import { oneNumber, type NativeTable } from "./native";

const NA = errorCell("#N/A");

/** Finding cells and telling where they are. */
export const lookup: NativeTable = {
  INDEX: { least: 2, most: 4, takesArrays: true, run: index },
  MATCH: { least: 2, most: 3, takesArrays: true, run: (args, at) => match(args, at, 1, false) },
  XMATCH: { least: 2, most: 4, takesArrays: true, run: (args, at) => match(args, at, 0, true) },
  XLOOKUP: { least: 3, most: 6, takesArrays: true, run: xlookup },
  VLOOKUP: { least: 3, most: 4, takesArrays: true, run: (args, at) => tableLookup(args, at, false) },
  HLOOKUP: { least: 3, most: 4, takesArrays: true, run: (args, at) => tableLookup(args, at, true) },
  ROWS: { least: 1, most: 1, run: ([value], at) => extent(value!, at, true) },
  COLUMNS: { least: 1, most: 1, run: ([value], at) => extent(value!, at, false) },
  ROW: { least: 0, most: 1, run: ([value], at) => place(value, at, true) },
  COLUMN: { least: 0, most: 1, run: ([value], at) => place(value, at, false) },
  AREAS: { least: 1, most: 1, run: ([value]) => (value instanceof Reference ? value.places.length : 1) },
};

/** With arrays for row or column it answers cell by cell. */
function index([source, rowArg = null, columnArg = undefined, areaArg]: readonly Value[], at: Evaluation): Value {
  const [rows, columns] = [rowArg, columnArg ?? null].map((arg) => at.cells(arg));
  if (!isArray(rows!) && !isArray(columns!)) return indexOne([source!, rowArg, columnArg, areaArg], at);
  return broadcast([rows!, columns!], ([row, column]) => {
    const wanted = columnArg === undefined ? undefined : column!;
    const found = at.cells(indexOne([source!, row!, wanted, areaArg], at) ?? null);
    if (isArray(found)) throw new NotKnown("it picks whole rows or columns by an array");
    return found;
  });
}

function indexOne([source, rowArg, columnArg, areaArg]: readonly (Value | undefined)[], at: Evaluation): Value {
  const numbers = [rowArg, columnArg, areaArg].map((arg, i) => oneNumber(arg, at, i === 2 ? 1 : 0));
  const error = numbers.find(isCellError);
  if (error) return error;
  let [row, column] = (numbers as number[]).map(Math.trunc) as [number, number];
  const reference = source instanceof Reference ? source.places[Math.trunc(numbers[2] as number) - 1] : undefined;
  const array = source instanceof Reference ? undefined : at.rows(source!);
  if (source instanceof Reference && !reference) return errorCell("#REF!");
  const height = reference ? reference.area.bottom - reference.area.top + 1 : array!.length;
  const width = reference ? reference.area.right - reference.area.left + 1 : (array![0]?.length ?? 0);
  // Of a single row the one number given is the column.
  if (columnArg === undefined && height === 1 && width > 1) [row, column] = [1, row];
  if (row < 0 || column < 0) return errorCell("#VALUE!");
  if (row > height || column > width) return errorCell("#REF!");
  if (array) {
    const rows = row === 0 ? array : [array[row - 1]!];
    const cells = column === 0 ? rows : rows.map((line) => [line[column - 1]!]);
    return cells.length === 1 && cells[0]!.length === 1 ? cells[0]![0]! : cells;
  }
  const { sheet, area } = reference!;
  const top = row === 0 ? area.top : area.top + row - 1;
  const left = column === 0 ? area.left : area.left + column - 1;
  const bottom = row === 0 ? area.bottom : top;
  const right = column === 0 ? area.right : left;
  return new Reference([{ sheet, area: { top, left, bottom, right } }]);
}

/** A single row or column as a list; undefined for a block. */
function line(range: Range): readonly Cell[] | undefined {
  if (range.length === 1) return range[0]!;
  return (range[0]?.length ?? 0) === 1 ? range.map((row) => row[0]!) : undefined;
}

function match(
  [wanted, range, modeArg, searchArg]: readonly Value[],
  at: Evaluation,
  usual: number,
  extended: boolean,
): Value {
  const cells = line(at.rows(range!));
  const mode = oneNumber(modeArg, at, usual);
  const search = oneNumber(searchArg, at, 1);
  if (isCellError(mode)) return mode;
  if (isCellError(search)) return search;
  if (!cells) return NA;
  return broadcast([at.operand(wanted!)], ([cell]) => {
    if (isCellError(cell)) return cell;
    at.spend(cells.length / 10);
    const found = extended ? findBy(cell, cells, mode, search) : matchPlace(cell, cells, mode);
    return found < 0 ? NA : found + 1;
  });
}

function matchPlace(cell: Cell, cells: readonly Cell[], mode: number): number {
  return mode === 0 ? findExact(cell, cells, true) : findSorted(cell, cells, mode < 0);
}

/** The modes of XLOOKUP and XMATCH. The two searches by halving ask for sorted cells, where any way finds the same. */
function findBy(cell: Cell, cells: readonly Cell[], mode: number, search: number): number {
  const backwards = search < 0;
  if (mode === 2) return findExact(cell, cells, true, backwards);
  if (mode === -1 || mode === 1) return findNearest(cell, cells, mode, backwards);
  if (mode !== 0) throw new NotKnown(`the match mode ${mode} is not known here`);
  return findExact(cell, cells, false, backwards);
}

function xlookup([wanted, keys, results, missing, modeArg, searchArg]: readonly Value[], at: Evaluation): Value {
  const keyRows = at.rows(keys!);
  const cells = line(keyRows);
  const rows = at.rows(results!);
  const down = keyRows.length > 1 || rows.length === 1 ? keyRows.length > 1 : (keyRows[0]?.length ?? 0) === 1;
  const mode = oneNumber(modeArg, at, 0);
  const search = oneNumber(searchArg, at, 1);
  if (isCellError(mode)) return mode;
  if (isCellError(search)) return search;
  if (!cells || (down ? rows.length : rows[0]?.length) !== cells.length) return errorCell("#VALUE!");
  const key = at.operand(wanted!);
  const otherwise = () => (missing === undefined || missing === null ? NA : missing);
  if (!isArray(key)) {
    if (isCellError(key)) return key;
    const found = findBy(key, cells, mode, search);
    if (found < 0) return otherwise();
    const answer = down ? [rows[found]!] : rows.map((row) => [row[found]!]);
    return answer.length === 1 && answer[0]!.length === 1 ? answer[0]![0]! : answer;
  }
  if ((down ? rows[0]?.length : rows.length) !== 1) throw new NotKnown("XLOOKUP of several keys into several columns");
  return broadcast([key], ([cell]) => {
    if (isCellError(cell)) return cell;
    at.spend(cells.length / 10);
    const found = findBy(cell, cells, mode, search);
    if (found < 0) return at.cell(otherwise());
    return down ? rows[found]![0]! : rows[0]![found]!;
  });
}

function tableLookup([wanted, table, place, near]: readonly Value[], at: Evaluation, across: boolean): Value {
  const rows = at.rows(table!);
  const keys = across ? rows[0]! : rows.map((row) => row[0]!);
  const number = oneNumber(place, at);
  const sorted = near === undefined ? 1 : oneNumber(near, at);
  if (isCellError(number)) return number;
  if (isCellError(sorted)) return sorted;
  const at0 = Math.trunc(number) - 1;
  if (at0 < 0) return errorCell("#VALUE!");
  if (at0 >= (across ? rows.length : (rows[0]?.length ?? 0))) return errorCell("#REF!");
  return broadcast([at.operand(wanted!)], ([cell]) => {
    if (isCellError(cell)) return cell;
    at.spend(keys.length / 10);
    const found = sorted === 0 ? findExact(cell, keys, true) : findSorted(cell, keys);
    if (found < 0) return NA;
    return across ? rows[at0]![found]! : rows[found]![at0]!;
  });
}

function extent(value: Value, at: Evaluation, rows: boolean): Value {
  if (!(value instanceof Reference)) return rows ? at.rows(value).length : (at.rows(value)[0]?.length ?? 0);
  const [only, ...others] = value.places;
  if (!only || others.length > 0) return errorCell("#REF!");
  const { top, left, bottom, right } = only.area;
  return rows ? bottom - top + 1 : right - left + 1;
}

function place(value: Value | undefined, at: Evaluation, rows: boolean): Value {
  if (value === undefined) return 1 + (rows ? at.setting.row : at.setting.column);
  const area = value instanceof Reference ? value.places[0]?.area : undefined;
  if (!area) return errorCell("#VALUE!");
  const [first, last] = rows ? [area.top, area.bottom] : [area.left, area.right];
  if (first === last || at.setting.single) return first + 1;
  if (last === (rows ? LAST_ROW : LAST_COLUMN)) throw new NotKnown("it numbers a whole row or column");
  const numbers = Array.from({ length: last - first + 1 }, (_, index) => first + index + 1);
  return rows ? numbers.map((one) => [one]) : [numbers];
}
