import { compensatedSum } from "../../core/numeric/compensatedSum";
import { isCellError, type Cell, type CellError, type Range } from "../../sheet/cell";
import { broadcast } from "../broadcast";
import type { Evaluation } from "../evaluation";
import { errorCell, Reference, type Value } from "../value";
import { readCriterion } from "./criteria";
import type { Native, NativeTable } from "./native";

type Answer = (numbers: number[], cells: number) => number | CellError;

const sum: Answer = (numbers) => compensatedSum(numbers);
const average: Answer = (numbers) =>
  numbers.length === 0 ? errorCell("#DIV/0!") : compensatedSum(numbers) / numbers.length;
const least: Answer = (numbers) => numbers.reduce((a, b) => Math.min(a, b), numbers[0] ?? 0);
const most: Answer = (numbers) => numbers.reduce((a, b) => Math.max(a, b), numbers[0] ?? 0);
const number: Answer = (_, cells) => cells;

/** Sums, counts and extremes of the cells that meet criteria. */
export const conditional: NativeTable = {
  COUNTIF: { least: 2, most: 2, run: ([range, criterion], at) => answer(undefined, [range!, criterion!], number, at) },
  COUNTIFS: { least: 2, most: 254, run: (args, at) => answer(undefined, args, number, at) },
  SUMIF: single(sum),
  AVERAGEIF: single(average),
  SUMIFS: several(sum),
  AVERAGEIFS: several(average),
  MINIFS: several(least),
  MAXIFS: several(most),
};

function single(how: Answer): Native {
  return {
    least: 2,
    most: 3,
    run: ([range, criterion, summed], at) => answer(summed ?? range, [range!, criterion!], how, at, true),
  };
}

function several(how: Answer): Native {
  return { least: 3, most: 255, run: ([summed, ...pairs], at) => answer(summed, pairs, how, at) };
}

/** A criterion may be an array: one answer for each of it. */
function answer(summed: Value | undefined, pairs: readonly Value[], how: Answer, at: Evaluation, loose = false): Value {
  if (pairs.length % 2 === 1) return errorCell("#VALUE!", "Each range needs a criterion.");
  const ranges: Range[] = [];
  for (let i = 0; i < pairs.length; i += 2) {
    // The host takes a range here and no array.
    if (!(pairs[i] instanceof Reference)) return errorCell("#VALUE!", "A range of cells is wanted.");
    ranges.push(at.rows(pairs[i]!));
  }
  const [first] = ranges;
  const height = first!.length;
  const width = first![0]?.length ?? 0;
  const values = summed === undefined ? first! : at.rows(loose ? stretched(summed, height, width) : summed);
  const shaped = (rows: Range) => rows.length === height && rows[0]?.length === width;
  if (!ranges.every(shaped) || (!loose && !shaped(values)))
    return errorCell("#VALUE!", "The ranges are not of one shape.");
  const criteria = pairs.filter((_, index) => index % 2 === 1).map((criterion) => at.operand(criterion));
  return broadcast(criteria, (cells) => {
    const tests = cells.map(readCriterion);
    const numbers: number[] = [];
    let count = 0;
    at.spend(height * width);
    for (let row = 0; row < height; row++) {
      for (let column = 0; column < width; column++) {
        if (!tests.every((test, index) => test(ranges[index]![row]![column]!))) continue;
        count++;
        const cell: Cell = values[row]?.[column];
        if (isCellError(cell) && summed !== undefined) return cell;
        if (typeof cell === "number") numbers.push(cell);
      }
    }
    return how(numbers, count);
  });
}

/** SUMIF and AVERAGEIF take of the summed range only its first cell, and the shape of the other. */
function stretched(summed: Value, height: number, width: number): Value {
  if (!(summed instanceof Reference) || summed.places.length !== 1) return summed;
  const { sheet, area } = summed.places[0]!;
  const { top, left } = area;
  return new Reference([{ sheet, area: { top, left, bottom: top + height - 1, right: left + width - 1 } }]);
}
