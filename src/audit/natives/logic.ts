import { isCellError, isBlank, type Cell, type CellError } from "../../sheet/cell";
import { toNumber, toTruth } from "../coerce";
import type { Evaluation } from "../evaluation";
import { errorCell, isArray, Reference, type Value } from "../value";
import { areasOf, lifted, type Native, type NativeTable } from "./native";

/** Truth, and what kind of thing a cell holds. */
export const logic: NativeTable = {
  TRUE: { least: 0, most: 0, run: () => true },
  FALSE: { least: 0, most: 0, run: () => false },
  NA: { least: 0, most: 0, run: () => errorCell("#N/A") },
  NOT: lifted(1, 1, ([cell]) => {
    const truth = toTruth(cell);
    return typeof truth === "boolean" ? !truth : truth;
  }),
  AND: ofTruths((truths) => truths.every(Boolean)),
  OR: ofTruths((truths) => truths.some(Boolean)),
  XOR: ofTruths((truths) => truths.filter(Boolean).length % 2 === 1),
  ISNUMBER: telling((cell) => typeof cell === "number"),
  ISTEXT: telling((cell) => typeof cell === "string"),
  ISNONTEXT: telling((cell) => typeof cell !== "string"),
  ISLOGICAL: telling((cell) => typeof cell === "boolean"),
  ISBLANK: telling((cell) => cell === null || cell === undefined),
  ISERROR: telling(isCellError),
  ISERR: telling((cell) => isCellError(cell) && cell.code !== "#N/A"),
  ISNA: telling((cell) => isCellError(cell) && cell.code === "#N/A"),
  ISREF: { least: 1, most: 1, run: ([value]) => value instanceof Reference },
  ISEVEN: lifted(1, 1, ([cell]) => parity(cell, 0)),
  ISODD: lifted(1, 1, ([cell]) => parity(cell, 1)),
  N: telling((cell) => (typeof cell === "number" || isCellError(cell) ? cell : cell === true ? 1 : 0)),
  T: telling((cell) => (typeof cell === "string" || isCellError(cell) ? cell : "")),
};

/** Of cells only numbers and truths count; a text typed in must be TRUE or FALSE. */
function ofTruths(answer: (truths: boolean[]) => boolean): Native {
  return {
    least: 1,
    most: 255,
    run: (args, at) => {
      const truths: boolean[] = [];
      for (const arg of args) {
        const cells = arg instanceof Reference || isArray(arg) ? manyTruths(arg, at) : toTruth(arg);
        if (isCellError(cells)) return cells;
        truths.push(...(typeof cells === "boolean" ? [cells] : cells));
      }
      return truths.length === 0 ? errorCell("#VALUE!") : answer(truths);
    },
  };
}

function manyTruths(value: Value, at: Evaluation): boolean[] | CellError {
  const truths: boolean[] = [];
  for (const rows of areasOf(value, at))
    for (const row of rows)
      for (const cell of row) {
        if (isCellError(cell)) return cell;
        if (typeof cell === "number" || typeof cell === "boolean") truths.push(Boolean(cell));
      }
  return truths;
}

/** Cell by cell, errors not passed on but told of. */
function telling(answer: (cell: Cell) => Cell): Native {
  return {
    least: 1,
    most: 1,
    run: ([value], at) => {
      const cells = at.operand(value!);
      return isArray(cells) ? cells.map((row) => row.map(answer)) : answer(cells);
    },
  };
}

function parity(cell: Cell, wanted: 0 | 1): Cell {
  const number = toNumber(cell);
  if (typeof number !== "number") return number;
  return isBlank(cell) ? wanted === 0 : Math.abs(Math.trunc(number) % 2) === wanted;
}
