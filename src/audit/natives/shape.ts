import { isCellError, type Cell, type CellError, type Range } from "../../sheet/cell";
import { requireSize } from "../broadcast";
import { toTruth } from "../coerce";
import type { Evaluation } from "../evaluation";
import { errorCell, type Value } from "../value";
import { oneNumber, type Native, type NativeTable } from "./native";

const CALC = errorCell("#CALC!");
const VALUE = errorCell("#VALUE!");
const width = (rows: Range) => rows[0]?.length ?? 0;

/** Cutting, joining and turning arrays. */
export const shape: NativeTable = {
  TRANSPOSE: whole(1, 1, ([rows]) => turned(rows!)),
  VSTACK: whole(1, 254, (parts) => {
    const most = Math.max(...parts.map(width));
    return parts.flatMap((rows) => rows.map((row) => padded(row, most)));
  }),
  HSTACK: whole(1, 254, (parts) => {
    const most = Math.max(...parts.map((rows) => rows.length));
    return Array.from({ length: most }, (_, at) =>
      parts.flatMap((rows) => [...(rows[at] ?? Array<Cell>(width(rows)).fill(errorCell("#N/A")))]),
    );
  }),
  TAKE: { least: 2, most: 3, takesArrays: true, run: (args, at) => cut(args, at, taken) },
  DROP: { least: 2, most: 3, takesArrays: true, run: (args, at) => cut(args, at, dropped) },
  CHOOSEROWS: { least: 2, most: 254, takesArrays: true, run: (args, at) => chosen(args, at, false) },
  CHOOSECOLS: { least: 2, most: 254, takesArrays: true, run: (args, at) => chosen(args, at, true) },
  TOCOL: {
    least: 1,
    most: 3,
    takesArrays: true,
    run: (args, at) => listed(args, at, (cells) => cells.map((cell) => [cell])),
  },
  TOROW: { least: 1, most: 3, takesArrays: true, run: (args, at) => listed(args, at, (cells) => [cells]) },
  SEQUENCE: { least: 1, most: 4, run: sequence },
};

function whole(least: number, most: number, answer: (parts: Range[]) => Cell[][]): Native {
  return { least, most, takesArrays: true, run: (args, at) => answer(args.map((arg) => at.rows(arg))) };
}

function turned(rows: Range): Cell[][] {
  return Array.from({ length: width(rows) }, (_, column) => rows.map((row) => row[column]!));
}

function padded(row: readonly Cell[], length: number): Cell[] {
  return Array.from({ length }, (_, at) => (at < row.length ? row[at]! : errorCell("#N/A")));
}

/** From which to which of `length` things: the first `count`, from the end where it is below 0. */
function taken(length: number, count: number): readonly [number, number] {
  return count >= 0 ? [0, Math.min(count, length)] : [Math.max(0, length + count), length];
}

function dropped(length: number, count: number): readonly [number, number] {
  return count >= 0 ? [Math.min(count, length), length] : [0, Math.max(0, length + count)];
}

function cut([source, rowArg, columnArg]: readonly Value[], at: Evaluation, part: typeof taken): Value {
  const rows = at.rows(source!);
  const counts = [rowArg, columnArg].map((arg) => (arg === undefined || arg === null ? undefined : oneNumber(arg, at)));
  const error = counts.find((count) => isCellError(count)) as CellError | undefined;
  if (error) return error;
  const [top, bottom] = counts[0] === undefined ? [0, rows.length] : part(rows.length, Math.trunc(counts[0] as number));
  const [left, right] = counts[1] === undefined ? [0, width(rows)] : part(width(rows), Math.trunc(counts[1] as number));
  if (top >= bottom || left >= right) return CALC;
  return rows.slice(top, bottom).map((row) => row.slice(left, right));
}

function chosen([source, ...places]: readonly Value[], at: Evaluation, columns: boolean): Value {
  const rows = at.rows(source!);
  const length = columns ? width(rows) : rows.length;
  const indexes: number[] = [];
  for (const cell of places.flatMap((place) => at.rows(place).flat())) {
    const number = oneNumber(cell, at);
    if (typeof number !== "number") return number;
    const index = number < 0 ? length + Math.trunc(number) : Math.trunc(number) - 1;
    if (number === 0 || index < 0 || index >= length) return VALUE;
    indexes.push(index);
  }
  return columns ? rows.map((row) => indexes.map((index) => row[index]!)) : indexes.map((index) => [...rows[index]!]);
}

function listed(
  [source, ignoreArg, downArg]: readonly Value[],
  at: Evaluation,
  answer: (cells: Cell[]) => Cell[][],
): Value {
  const ignore = oneNumber(ignoreArg, at, 0);
  const down = downArg === undefined ? false : toTruth(at.cell(downArg));
  if (isCellError(ignore)) return ignore;
  if (isCellError(down)) return down;
  const rows = at.rows(source!);
  const cells = (down ? turned(rows) : rows).flat();
  const kept = cells.filter(
    (cell) => !(ignore & 1 && (cell === null || cell === undefined)) && !(ignore & 2 && isCellError(cell)),
  );
  return kept.length === 0 ? CALC : answer(kept);
}

function sequence(args: readonly Value[], at: Evaluation): Value {
  const numbers = [0, 1, 2, 3].map((index) => {
    const arg = args[index];
    return arg === null ? 1 : oneNumber(arg, at, 1);
  });
  const error = numbers.find(isCellError);
  if (error) return error;
  const [rows, columns, start, step] = numbers as [number, number, number, number];
  const [height, across] = [Math.trunc(rows), Math.trunc(columns)];
  if (height < 0 || across < 0) return VALUE;
  if (height === 0 || across === 0) return CALC;
  requireSize(height, across);
  return Array.from({ length: height }, (_, row) =>
    Array.from({ length: across }, (__, column) => start + step * (row * across + column)),
  );
}
