import { compensatedSum } from "../../core/numeric/compensatedSum";
import type { Sample } from "../../core/sample/sample";
import { sampleQuantile } from "../../core/sample/sampleQuantile";
import { isCellError, type CellError } from "../../sheet/cell";
import { broadcast } from "../broadcast";
import { toNumber } from "../coerce";
import type { Evaluation } from "../evaluation";
import { errorCell, firstError, type Value } from "../value";
import { numberOrError, numbersOf, ofNumbers, oneNumber, type Native, type NativeTable } from "./native";
import { sampleOf } from "./sampleOf";

const NUM = errorCell("#NUM!");
const quartile = ordered((sample, part) => inclusive(sample, Math.trunc(part) / 4));
const percentile = ordered(inclusive);
const rank = ranked((above) => above + 1);

/** What depends on the order of many cells. */
export const order: NativeTable = {
  MEDIAN: ofNumbers((numbers) => sampleQuantile(sampleOf(numbers), 0.5), 1, NUM),
  "QUARTILE.INC": quartile,
  QUARTILE: quartile,
  "QUARTILE.EXC": ordered((sample, part) => exclusive(sample, Math.trunc(part) / 4)),
  "PERCENTILE.INC": percentile,
  PERCENTILE: percentile,
  "PERCENTILE.EXC": ordered(exclusive),
  LARGE: ordered(({ sorted, count }, k) => sorted[count - Math.ceil(k)] ?? NUM),
  SMALL: ordered(({ sorted }, k) => sorted[Math.ceil(k) - 1] ?? NUM),
  TRIMMEAN: ordered(trimmedMean),
  "RANK.EQ": rank,
  RANK: rank,
  "RANK.AVG": ranked((above, alike) => above + (alike + 1) / 2),
};

/** A function of many numbers and one number beside them, which may be an array: one answer for each of it. */
function ordered(answer: (sample: Sample, place: number) => number | CellError): Native {
  return {
    least: 2,
    most: 2,
    run: ([many, places], at) => {
      const numbers = numbersOf([many!], at);
      if (!Array.isArray(numbers)) return numbers as CellError;
      if (numbers.length === 0) return NUM;
      const sample = sampleOf(numbers);
      return broadcast([at.operand(places!)], (cells) => {
        const place = firstError(cells) ?? toNumber(cells[0]!);
        return typeof place === "number" ? numberOrError(() => answer(sample, place)) : place;
      });
    },
  };
}

function inclusive(sample: Sample, p: number): number | CellError {
  return p >= 0 && p <= 1 ? sampleQuantile(sample, p) : NUM;
}

/** Definition 6 of Hyndman & Fan: the place (n + 1)p counted from 1, and no answer before the first or behind the last. */
function exclusive({ sorted, count }: Sample, p: number): number | CellError {
  const place = (count + 1) * p;
  if (!(p > 0 && p < 1 && place >= 1 && place <= count)) return NUM;
  const below = sorted[Math.floor(place) - 1]!;
  const above = sorted[Math.min(Math.floor(place), count - 1)]!;
  return below + (place - Math.floor(place)) * (above - below);
}

function trimmedMean({ sorted, count }: Sample, part: number): number | CellError {
  if (!(part >= 0 && part < 1)) return NUM;
  const off = Math.floor((count * part) / 2);
  const kept = sorted.slice(off, count - off);
  return compensatedSum(kept) / kept.length;
}

function ranked(answer: (above: number, alike: number) => number): Native {
  return {
    least: 2,
    most: 3,
    run: ([values, many, rising], at: Evaluation) => {
      const numbers = numbersOf([many as Value], at);
      if (!Array.isArray(numbers)) return numbers as CellError;
      const upwards = oneNumber(rising, at, 0);
      if (isCellError(upwards)) return upwards;
      return broadcast([at.operand(values!)], ([cell]) => {
        const wanted = toNumber(cell);
        if (typeof wanted !== "number") return wanted;
        const alike = numbers.filter((x) => x === wanted).length;
        const above = numbers.filter((x) => (upwards === 0 ? x > wanted : x < wanted)).length;
        return alike === 0 ? errorCell("#N/A") : answer(above, alike);
      });
    },
  };
}
