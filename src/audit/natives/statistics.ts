import { compensatedSum } from "../../core/numeric/compensatedSum";
import { moments } from "../../core/sample/moments";
import type { Sample } from "../../core/sample/sample";
import type { CellError } from "../../sheet/cell";
import { errorCell } from "../value";
import { ofNumbers, type NativeTable } from "./native";
import { sampleOf } from "./sampleOf";

const variance = ofNumbers((numbers) => sampleOf(numbers).sumOfSquares / (numbers.length - 1), 2);
const wholeVariance = ofNumbers((numbers) => sampleOf(numbers).sumOfSquares / numbers.length, 1);
const deviation = ofNumbers((numbers) => sampleOf(numbers).sd, 2);
const wholeDeviation = ofNumbers((numbers) => Math.sqrt(sampleOf(numbers).sumOfSquares / numbers.length), 1);
const mode = ofNumbers(mostFrequent, 1, errorCell("#N/A"));

/** Means, spreads and shapes of many cells. */
export const statistics: NativeTable = {
  "VAR.S": variance,
  VAR: variance,
  "VAR.P": wholeVariance,
  VARP: wholeVariance,
  "STDEV.S": deviation,
  STDEV: deviation,
  "STDEV.P": wholeDeviation,
  STDEVP: wholeDeviation,
  DEVSQ: ofNumbers((numbers) => sampleOf(numbers).sumOfSquares, 1, errorCell("#NUM!")),
  AVEDEV: ofNumbers((numbers) => {
    const { mean } = sampleOf(numbers);
    return compensatedSum(numbers.map((x) => Math.abs(x - mean))) / numbers.length;
  }, 1),
  GEOMEAN: ofNumbers(
    (numbers) => (numbers.some((x) => x <= 0) ? NaN : Math.exp(compensatedSum(numbers.map(Math.log)) / numbers.length)),
    1,
    errorCell("#NUM!"),
  ),
  HARMEAN: ofNumbers(
    (numbers) => (numbers.some((x) => x <= 0) ? NaN : numbers.length / compensatedSum(numbers.map((x) => 1 / x))),
    1,
    errorCell("#N/A"),
  ),
  SKEW: ofNumbers((numbers) => spread(numbers, (sample) => moments(sample).skewness!), 3),
  KURT: ofNumbers((numbers) => spread(numbers, (sample) => moments(sample).excessKurtosis!), 4),
  "SKEW.P": ofNumbers(
    (numbers) =>
      spread(numbers, ({ values, mean, count, sumOfSquares }) => {
        const sd = Math.sqrt(sumOfSquares / count);
        return compensatedSum(values.map((x) => ((x - mean) / sd) ** 3)) / count;
      }),
    3,
  ),
  "MODE.SNGL": mode,
  MODE: mode,
};

function spread(numbers: readonly number[], answer: (sample: Sample) => number): number | CellError {
  const sample = sampleOf(numbers);
  return sample.sumOfSquares === 0 ? errorCell("#DIV/0!") : answer(sample);
}

function mostFrequent(numbers: readonly number[]): number | CellError {
  const counts = new Map<number, number>();
  for (const x of numbers) counts.set(x, (counts.get(x) ?? 0) + 1);
  let best: number | undefined;
  for (const [x, count] of counts) if (count > 1 && count > (best === undefined ? 1 : counts.get(best)!)) best = x;
  return best ?? errorCell("#N/A");
}
