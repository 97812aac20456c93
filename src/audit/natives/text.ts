import { isCellError, type Cell } from "../../sheet/cell";
import { toNumber, toText, toTruth } from "../coerce";
import type { Evaluation } from "../evaluation";
import { errorCell, type Value } from "../value";
import { formatNumber } from "./formatNumber";
import { wildcard } from "./criteria";
import { areasOf, lifted, textual, type NativeTable } from "./native";

const VALUE = errorCell("#VALUE!");
const LONGEST = 32_767;

/** Texts: their parts, their length, joined. */
export const text: NativeTable = {
  LEN: textual(1, 1, (string) => string.length),
  LEFT: lifted(1, 2, ([string, count]) => part(string, 1, count === undefined ? 1 : toNumber(count))),
  RIGHT: lifted(1, 2, ([string, count]) => {
    const all = toText(string) as string;
    const length = count === undefined ? 1 : toNumber(count);
    if (isCellError(length)) return length;
    return length < 0 ? VALUE : all.slice(Math.max(0, all.length - Math.trunc(length)));
  }),
  MID: lifted(3, 3, ([string, start, count]) => {
    const from = toNumber(start);
    return isCellError(from) ? from : part(string, from, toNumber(count));
  }),
  TRIM: textual(1, 1, (string) => string.replace(/^ +| +$/g, "").replace(/ {2,}/g, " ")),
  UPPER: textual(1, 1, (string) => string.toUpperCase()),
  LOWER: textual(1, 1, (string) => string.toLowerCase()),
  PROPER: textual(1, 1, (string) =>
    string.toLowerCase().replace(/(^|[^\p{L}])(\p{L})/gu, (_, a, b) => a + b.toUpperCase()),
  ),
  EXACT: textual(2, 2, (a, b) => a === b),
  REPT: lifted(2, 2, ([string, count]) => {
    const times = toNumber(count);
    const once = toText(string) as string;
    if (isCellError(times)) return times;
    return times < 0 || once.length * Math.trunc(times) > LONGEST ? VALUE : once.repeat(Math.trunc(times));
  }),
  FIND: lifted(2, 3, ([wanted, within, start]) => found(wanted, within, start, false)),
  SEARCH: lifted(2, 3, ([wanted, within, start]) => found(wanted, within, start, true)),
  SUBSTITUTE: lifted(3, 4, ([string, old, fresh, which]) => substituted(string, old, fresh, which)),
  REPLACE: lifted(4, 4, ([string, start, count, fresh]) => {
    const [from, length] = [toNumber(start), toNumber(count)];
    if (isCellError(from)) return from;
    if (isCellError(length)) return length;
    if (from < 1 || length < 0) return VALUE;
    const all = toText(string) as string;
    return all.slice(0, Math.trunc(from) - 1) + toText(fresh) + all.slice(Math.trunc(from) - 1 + Math.trunc(length));
  }),
  VALUE: lifted(1, 1, ([cell]) =>
    cell === null || cell === undefined ? 0 : typeof cell === "boolean" ? VALUE : toNumber(cell),
  ),
  TEXT: lifted(2, 2, ([cell, format]) => {
    const pattern = toText(format) as string;
    if (typeof cell === "string" && typeof toNumber(cell) !== "number") return cell;
    const number = toNumber(cell);
    return isCellError(number) ? number : formatNumber(number, pattern);
  }),
  FIXED: lifted(1, 3, ([cell, places, plain]) => {
    const number = toNumber(cell);
    const digits = places === undefined ? 2 : toNumber(places);
    const bare = plain === undefined ? false : toTruth(plain);
    for (const one of [number, digits, bare]) if (isCellError(one)) return one;
    if ((digits as number) < 0 || (digits as number) > 30) return VALUE;
    const zeros = (digits as number) >= 1 ? `.${"0".repeat(Math.trunc(digits as number))}` : "";
    return formatNumber(number as number, `${bare ? "0" : "#,##0"}${zeros}`);
  }),
  CHAR: lifted(1, 1, ([cell]) => {
    const code = toNumber(cell);
    if (isCellError(code)) return code;
    return code >= 32 && code < 127
      ? String.fromCharCode(code)
      : code === 10 || code === 13 || code === 9
        ? String.fromCharCode(code)
        : VALUE;
  }),
  CONCAT: { least: 1, most: 254, run: (args, at) => joined("", false, args, at) },
  CONCATENATE: lifted(1, 255, (cells) => cells.map((cell) => toText(cell)).join("")),
  TEXTJOIN: {
    least: 3,
    most: 254,
    run: ([separator, skip, ...args], at) => {
      const between = toText(at.cell(separator!));
      const skips = toTruth(at.cell(skip!));
      if (isCellError(between)) return between;
      return isCellError(skips) ? skips : joined(between, skips, args, at);
    },
  },
};

function part(string: Cell, from: number, count: ReturnType<typeof toNumber>): Cell {
  if (isCellError(count)) return count;
  if (from < 1 || count < 0) return VALUE;
  return (toText(string) as string).slice(Math.trunc(from) - 1, Math.trunc(from) - 1 + Math.trunc(count));
}

function found(wanted: Cell, within: Cell, start: Cell, loose: boolean): Cell {
  const from = start === undefined ? 1 : toNumber(start);
  if (isCellError(from)) return from;
  const [pattern, all] = [toText(wanted) as string, toText(within) as string];
  if (from < 1 || from > all.length + 1) return VALUE;
  const at = Math.trunc(from) - 1;
  if (!loose) return all.indexOf(pattern, at) < 0 ? VALUE : all.indexOf(pattern, at) + 1;
  if (!/[?*~]/.test(pattern)) {
    const place = all.toLowerCase().indexOf(pattern.toLowerCase(), at);
    return place < 0 ? VALUE : place + 1;
  }
  const matches = wildcard(`${pattern}*`);
  for (let place = at; place <= all.length; place++) if (matches(all.slice(place))) return place + 1;
  return VALUE;
}

function substituted(string: Cell, old: Cell, fresh: Cell, which: Cell): Cell {
  const [all, from, to] = [string, old, fresh].map((cell) => toText(cell) as string) as [string, string, string];
  if (from === "") return all;
  if (which === undefined) return all.split(from).join(to);
  const number = toNumber(which);
  if (isCellError(number)) return number;
  if (number < 1) return VALUE;
  const parts = all.split(from);
  const place = Math.trunc(number);
  return place >= parts.length ? all : parts.slice(0, place).join(from) + to + parts.slice(place).join(from);
}

function joined(between: string, skips: boolean, args: readonly Value[], at: Evaluation): Cell {
  const texts: string[] = [];
  for (const rows of args.flatMap((arg) => areasOf(arg, at)))
    for (const row of rows)
      for (const cell of row) {
        const one = toText(cell);
        if (isCellError(one)) return one;
        if (!skips || one !== "") texts.push(one);
      }
  const all = texts.join(between);
  return all.length > LONGEST ? VALUE : all;
}
