import { DomainError, NoAnswerError, UnsettledError } from "../../core/domain";
import { isCellError, type Cell, type CellError, type Range } from "../../sheet/cell";
import { broadcast } from "../broadcast";
import { toNumber, toText } from "../coerce";
import type { Evaluation } from "../evaluation";
import { errorCell, firstError, isArray, NotKnown, Reference, type Value } from "../value";

/** A function of the host itself, as it may stand in an argument of ours or around a call of ours. */
export interface Native {
  readonly least: number;
  readonly most: number;
  /** Its arguments are worked out as arrays even in an old-style formula. */
  readonly takesArrays?: boolean;
  run(args: readonly Value[], at: Evaluation): Value;
}

export type NativeTable = Readonly<Record<string, Native>>;

/** A function of single cells: over an array it answers cell by cell. Errors pass through. */
export function lifted(least: number, most: number, answer: (cells: Cell[], at: Evaluation) => Cell): Native {
  return {
    least,
    most,
    run: (args, at) =>
      broadcast(
        args.map((arg) => at.operand(arg)),
        (cells) => firstError(cells) ?? answer(cells, at),
      ),
  };
}

/** A function of numbers. What is no finite number, and what core refuses, is #NUM!. */
export function numeric(least: number, most: number, answer: (...numbers: number[]) => number | CellError): Native {
  return lifted(least, most, (cells) => {
    const numbers: number[] = [];
    for (const cell of cells) {
      const number = toNumber(cell);
      if (typeof number !== "number") return number;
      numbers.push(number);
    }
    return numberOrError(() => answer(...numbers));
  });
}

/** A function of texts. */
export function textual(least: number, most: number, answer: (...texts: string[]) => Cell): Native {
  return lifted(least, most, (cells) => answer(...cells.map((cell) => toText(cell) as string)));
}

export function numberOrError(answer: () => number | CellError): number | CellError {
  try {
    const value = answer();
    return typeof value === "number" && !Number.isFinite(value) ? errorCell("#NUM!") : value;
  } catch (failure) {
    if (failure instanceof DomainError || failure instanceof NoAnswerError) return errorCell("#NUM!");
    if (failure instanceof UnsettledError) throw new NotKnown(failure.message);
    throw failure;
  }
}

/**
 * The numbers that a function of many takes from its arguments: of cells and arrays only numbers, of a value typed in also TRUE and a
 * text that is one. The first error is handed back instead.
 */
export function numbersOf(args: readonly Value[], at: Evaluation): readonly number[] | CellError {
  const [only] = args;
  if (args.length > 1 || !(only instanceof Reference) || only.places.length !== 1) return gathered(args, at);
  const rows = at.rows(only);
  let known = numbersIn.get(rows);
  if (!known) numbersIn.set(rows, (known = gathered(args, at)));
  return known;
}

/** The numbers of a range that was read before: many formulas take the same one. */
const numbersIn = new WeakMap<Range, readonly number[] | CellError>();

function gathered(args: readonly Value[], at: Evaluation): readonly number[] | CellError {
  const numbers: number[] = [];
  for (const arg of args) {
    if (!(arg instanceof Reference) && !isArray(arg)) {
      const number = toNumber(arg);
      if (typeof number !== "number") return number;
      numbers.push(number);
      continue;
    }
    for (const rows of areasOf(arg, at))
      for (const row of rows)
        for (const cell of row) {
          if (typeof cell === "number") numbers.push(cell);
          else if (isCellError(cell)) return cell;
        }
  }
  return numbers;
}

/** The rows of each area of a value; a function of many takes a union area by area. */
export function areasOf(value: Value, at: Evaluation): (readonly (readonly Cell[])[])[] {
  if (!(value instanceof Reference)) return [at.rows(value)];
  return value.places.map((place) => at.rows(new Reference([place])));
}

/** A function of many numbers; fewer than `least` of them is an error. */
export function ofNumbers(
  answer: (numbers: readonly number[]) => number | CellError,
  fewest = 0,
  without = errorCell("#DIV/0!"),
): Native {
  return {
    least: 1,
    most: Infinity,
    run: (args, at) => {
      const numbers = numbersOf(args, at);
      if (!Array.isArray(numbers)) return numbers as CellError;
      return numbers.length < fewest ? without : numberOrError(() => answer(numbers));
    },
  };
}

/** One number argument of a function that is not lifted. */
export function oneNumber(arg: Value | undefined, at: Evaluation, fallback?: number): number | CellError {
  if (arg === undefined && fallback !== undefined) return fallback;
  // The host answers once for each: to answer for the first alone would be another value.
  if (isArray(arg ?? null) && isArray(at.cells(arg!)))
    throw new NotKnown("it hands an array to where one number is taken");
  return toNumber(at.cell(arg ?? null));
}
