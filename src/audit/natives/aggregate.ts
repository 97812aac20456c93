import { compensatedSum } from "../../core/numeric/compensatedSum";
import { isCellError, type Cell } from "../../sheet/cell";
import { toNumber } from "../coerce";
import { errorCell, isArray, Reference, type Value } from "../value";
import { areasOf, numbersOf, ofNumbers, type Native, type NativeTable } from "./native";
import type { Evaluation } from "../evaluation";

/** Sums, counts and extremes of many cells. */
export const aggregate: NativeTable = {
  SUM: ofNumbers(compensatedSum),
  PRODUCT: ofNumbers((numbers) => (numbers.length === 0 ? 0 : numbers.reduce((product, x) => product * x, 1))),
  SUMSQ: ofNumbers((numbers) => compensatedSum(numbers.map((x) => x * x))),
  AVERAGE: ofNumbers((numbers) => compensatedSum(numbers) / numbers.length, 1),
  MIN: ofNumbers((numbers) => numbers.reduce((least, x) => Math.min(least, x), numbers[0] ?? 0)),
  MAX: ofNumbers((numbers) => numbers.reduce((most, x) => Math.max(most, x), numbers[0] ?? 0)),
  COUNT: counting((cell, typed) => typeof cell === "number" || (typed && typeof toNumber(cell) === "number")),
  COUNTA: counting((cell, typed) => typed || (cell !== null && cell !== undefined)),
  COUNTBLANK: { ...counting((cell) => cell === null || cell === undefined || cell === ""), most: 1 },
  SUMPRODUCT: { least: 1, most: Infinity, takesArrays: true, run: sumOfProducts },
  AVERAGEA: { least: 1, most: Infinity, run: averageOfAll },
};

function counting(counts: (cell: Cell, typed: boolean) => boolean): Native {
  return {
    least: 1,
    most: Infinity,
    run: (args, at) => {
      let count = 0;
      for (const arg of args) {
        if (!(arg instanceof Reference) && !isArray(arg)) count += counts(arg, true) ? 1 : 0;
        else
          for (const rows of areasOf(arg, at))
            for (const row of rows) for (const cell of row) if (counts(cell, false)) count++;
      }
      return count;
    },
  };
}

function sumOfProducts(args: readonly Value[], at: Evaluation): Cell {
  const arrays = args.map((arg) => at.rows(arg));
  const [first] = arrays;
  const width = first![0]?.length ?? 0;
  if (arrays.some((rows) => rows.length !== first!.length || rows[0]?.length !== width))
    return errorCell("#VALUE!", "The ranges are not of one shape.");
  const products: number[] = [];
  for (let row = 0; row < first!.length; row++) {
    for (let column = 0; column < width; column++) {
      let product = 1;
      for (const rows of arrays) {
        const cell = rows[row]![column];
        if (isCellError(cell)) return cell;
        product *= typeof cell === "number" ? cell : 0;
      }
      products.push(product);
    }
  }
  return compensatedSum(products);
}

/** Texts count as 0 and TRUE as 1. */
function averageOfAll(args: readonly Value[], at: Evaluation): Cell {
  const typed = numbersOf(
    args.filter((arg) => !(arg instanceof Reference) && !isArray(arg)),
    at,
  );
  if (!Array.isArray(typed)) return typed as Cell;
  const numbers = [...typed];
  for (const arg of args) {
    if (!(arg instanceof Reference) && !isArray(arg)) continue;
    for (const rows of areasOf(arg, at))
      for (const row of rows)
        for (const cell of row) {
          if (isCellError(cell)) return cell;
          if (cell !== null && cell !== undefined) numbers.push(typeof cell === "string" ? 0 : Number(cell));
        }
  }
  return numbers.length === 0 ? errorCell("#DIV/0!") : compensatedSum(numbers) / numbers.length;
}
