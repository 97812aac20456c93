import { isCellError, type Cell } from "../../sheet/cell";
import { toNumber } from "../coerce";
import type { Evaluation } from "../evaluation";
import { errorCell, NotKnown } from "../value";
import { lifted, type NativeTable } from "./native";

const NUM = errorCell("#NUM!");
const DAY = 86_400_000;
/** Days from 1899-12-30 to 1970-01-01; the day numbers from 61 on, since a day that never was stands at 60. */
const TO_1970 = 25_569;
const FROM_1904 = 1_462;

/** Dates as the numbers of days that a sheet counts in, from 1900 or 1904. */
export const date: NativeTable = {
  DATE: lifted(3, 3, (cells, at) => ofNumbers(cells, (year, month, day) => serial(year, month, day, at))),
  YEAR: lifted(1, 1, (cells, at) => ofNumbers(cells, (days) => parts(days, at)?.year ?? NUM)),
  MONTH: lifted(1, 1, (cells, at) => ofNumbers(cells, (days) => parts(days, at)?.month ?? NUM)),
  DAY: lifted(1, 1, (cells, at) => ofNumbers(cells, (days) => parts(days, at)?.day ?? NUM)),
  DAYS: lifted(2, 2, (cells) => ofNumbers(cells, (end, start) => Math.trunc(end) - Math.trunc(start))),
  EDATE: lifted(2, 2, (cells, at) => ofNumbers(cells, (days, months) => monthsOn(days, months, at, false))),
  EOMONTH: lifted(2, 2, (cells, at) => ofNumbers(cells, (days, months) => monthsOn(days, months, at, true))),
  WEEKDAY: lifted(1, 2, (cells, at) =>
    ofNumbers(cells, (days, kind = 1) => {
      const known = parts(days, at);
      if (!known) return NUM;
      const sunday = new Date(Date.UTC(known.year, known.month - 1, known.day)).getUTCDay();
      return kind === 1 ? sunday + 1 : kind === 2 ? ((sunday + 6) % 7) + 1 : kind === 3 ? (sunday + 6) % 7 : NUM;
    }),
  ),
  HOUR: lifted(1, 1, (cells) => ofNumbers(cells, (days) => Math.trunc(seconds(days) / 3600))),
  MINUTE: lifted(1, 1, (cells) => ofNumbers(cells, (days) => Math.trunc(seconds(days) / 60) % 60)),
  SECOND: lifted(1, 1, (cells) => ofNumbers(cells, (days) => seconds(days) % 60)),
  TODAY: changing("TODAY"),
  NOW: changing("NOW"),
  RAND: changing("RAND"),
  RANDBETWEEN: changing("RANDBETWEEN"),
  RANDARRAY: changing("RANDARRAY"),
};

function ofNumbers(cells: readonly Cell[], answer: (...numbers: number[]) => Cell): Cell {
  const numbers = cells.map(toNumber);
  const error = numbers.find(isCellError);
  return error ?? answer(...(numbers as number[]));
}

/** What it gave when the file was saved is not to be had again. */
function changing(name: string) {
  return {
    least: 0,
    most: 5,
    run(): never {
      throw new NotKnown(`${name} gives something else each time`);
    },
  };
}

function serial(yearArg: number, month: number, day: number, at: Evaluation): Cell {
  let year = Math.trunc(yearArg);
  const { date1904 } = at.setting.workbook;
  if (year < 0 || year > 9999) return NUM;
  if (!date1904 && year < 1900) year += 1900;
  const days = Date.UTC(year, Math.trunc(month) - 1, Math.trunc(day)) / DAY + TO_1970;
  if (date1904) return days - FROM_1904 >= 0 ? days - FROM_1904 : NUM;
  if (days < 61) throw new NotKnown("dates before March 1900 are counted differently by different programs");
  return days;
}

function parts(days: number, at: Evaluation): { year: number; month: number; day: number } | undefined {
  const counted = Math.floor(days) + (at.setting.workbook.date1904 ? FROM_1904 : 0);
  if (counted < 0 || counted > 2_958_465) return undefined;
  if (counted < 61) throw new NotKnown("dates before March 1900 are counted differently by different programs");
  const moment = new Date((counted - TO_1970) * DAY);
  return { year: moment.getUTCFullYear(), month: moment.getUTCMonth() + 1, day: moment.getUTCDate() };
}

function monthsOn(days: number, months: number, at: Evaluation, toEnd: boolean): Cell {
  const from = parts(days, at);
  if (!from) return NUM;
  const first = new Date(Date.UTC(from.year, from.month - 1 + Math.trunc(months), 1));
  const [year, month] = [first.getUTCFullYear(), first.getUTCMonth() + 1];
  const last = new Date(Date.UTC(year, month, 0)).getUTCDate();
  return serial(year, month, toEnd ? last : Math.min(from.day, last), at);
}

function seconds(days: number): number {
  return Math.round((days - Math.floor(days)) * 86_400) % 86_400;
}
