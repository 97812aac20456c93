import { isCellError, type Cell, type Range } from "../../sheet/cell";
import { compareCells, toTruth } from "../coerce";
import type { Evaluation } from "../evaluation";
import { errorCell, type Value } from "../value";
import { oneNumber, type NativeTable } from "./native";

const VALUE = errorCell("#VALUE!");

/** Choosing and ordering rows. */
export const sorting: NativeTable = {
  FILTER: { least: 2, most: 3, takesArrays: true, run: filter },
  SORT: { least: 1, most: 4, takesArrays: true, run: sort },
  SORTBY: { least: 2, most: 254, takesArrays: true, run: sortBy },
  UNIQUE: { least: 1, most: 3, takesArrays: true, run: unique },
};

const turned = (rows: Range): Cell[][] => (rows[0] ?? []).map((_, column) => rows.map((row) => row[column]!));

function filter([source, keep, otherwise]: readonly Value[], at: Evaluation): Value {
  const rows = at.rows(source!);
  const kept = at.rows(keep!);
  const flags: boolean[] = [];
  for (const cell of kept.flat()) {
    const truth = toTruth(cell);
    if (typeof truth !== "boolean") return truth;
    flags.push(truth);
  }
  const down = kept.length === rows.length && (kept[0]?.length ?? 0) === 1;
  const across = kept.length === 1 && kept[0]!.length === rows[0]?.length;
  if (!down && !across) return VALUE;
  const answer = down
    ? rows.filter((_, row) => flags[row])
    : rows.map((row) => row.filter((_, column) => flags[column]));
  if (answer.length === 0 || answer[0]!.length === 0) return otherwise === undefined ? errorCell("#CALC!") : otherwise;
  return answer;
}

/** Blanks come last whichever way it goes. */
function compareForSort(a: Cell, b: Cell, way: number): number {
  const [blankA, blankB] = [a === null || a === undefined, b === null || b === undefined];
  if (blankA || blankB) return Number(blankA) - Number(blankB);
  if (isCellError(a) || isCellError(b)) return (Number(isCellError(a)) - Number(isCellError(b))) * way;
  return compareCells(a, b) * way;
}

function sort([source, placeArg, wayArg, acrossArg]: readonly Value[], at: Evaluation): Value {
  const place = placeArg === null ? 1 : oneNumber(placeArg, at, 1);
  const way = wayArg === null ? 1 : oneNumber(wayArg, at, 1);
  const across = acrossArg === undefined ? false : toTruth(at.cell(acrossArg));
  for (const one of [place, way, across]) if (isCellError(one)) return one;
  const rows = across ? turned(at.rows(source!)) : at.rows(source!);
  const index = Math.trunc(place as number) - 1;
  if (index < 0 || index >= (rows[0]?.length ?? 0) || Math.abs(way as number) !== 1) return VALUE;
  const sorted = [...rows].sort((a, b) => compareForSort(a[index]!, b[index]!, way as number));
  return across ? turned(sorted) : sorted;
}

function sortBy([source, ...keys]: readonly Value[], at: Evaluation): Value {
  const rows = at.rows(source!);
  const columns: { cells: readonly Cell[]; way: number }[] = [];
  for (let i = 0; i < keys.length; i += 2) {
    const cells = at.rows(keys[i]!).flat();
    const way = oneNumber(keys[i + 1], at, 1);
    if (isCellError(way)) return way;
    if (cells.length !== rows.length || Math.abs(way) !== 1) return VALUE;
    columns.push({ cells, way });
  }
  const order = rows.map((_, index) => index);
  order.sort((a, b) => {
    for (const { cells, way } of columns) {
      const compared = compareForSort(cells[a]!, cells[b]!, way);
      if (compared !== 0) return compared;
    }
    return a - b;
  });
  return order.map((index) => rows[index]!);
}

function unique([source, acrossArg, onceArg]: readonly Value[], at: Evaluation): Value {
  const across = acrossArg === undefined ? false : toTruth(at.cell(acrossArg));
  const once = onceArg === undefined ? false : toTruth(at.cell(onceArg));
  for (const one of [across, once]) if (isCellError(one)) return one;
  const rows = across ? turned(at.rows(source!)) : at.rows(source!);
  const seen = new Map<string, { first: number; count: number }>();
  const keys = rows.map((row) =>
    JSON.stringify(row.map((cell) => (typeof cell === "string" ? cell.toLowerCase() : cell))),
  );
  keys.forEach((key, index) => {
    const known = seen.get(key);
    if (known) known.count++;
    else seen.set(key, { first: index, count: 1 });
  });
  const answer = rows.filter((_, index) => {
    const { first, count } = seen.get(keys[index]!)!;
    return first === index && (!once || count === 1);
  });
  if (answer.length === 0) return errorCell("#CALC!");
  return across ? turned(answer) : answer;
}
