import { formatAddress } from "../../sheet/address";
import { isBlank } from "../../sheet/cell";
import type { Sheet } from "../../sheet/workbook";
import { mayCallOurs } from "../functionName";
import type { Judgement, Notice } from "../judgement";
import { LAST_ROW } from "../reference";
import { counted } from "../showCell";
import { Reference } from "../value";
import { rangeAddress, type CallRange } from "./callRanges";
import { namesTotal, summaryCells } from "./totals";

/** So many parts of one column are a way of working, not a slip each. */
const MANY = 10;

/** The same for all ranges; where many parts of one column leave the rest out, they are told of once. */
export function allDataLeftOut(ranges: readonly CallRange[]): Notice[] {
  const byColumn = new Map<string, Notice[]>();
  for (const range of ranges) {
    const key = `${range.sheet.name}!${range.area.left}:${range.area.right}`;
    const known = byColumn.get(key) ?? [];
    known.push(...dataLeftOut(range));
    if (known.length > 0) byColumn.set(key, known);
  }
  return [...byColumn.values()].flatMap((notices) => {
    if (notices.length <= MANY) return notices;
    const [first] = notices;
    return [
      { ...first!, why: `${first!.why} ${notices.length - 1} more ranges of the same columns leave out data too.` },
    ];
  });
}

/** A range that ends above the last number of its column, or begins below the first. */
export function dataLeftOut(range: CallRange): Notice[] {
  const { area, judgement, others } = range;
  const below = area.bottom === LAST_ROW ? { rows: 0, last: 0 } : run(range, area.bottom + 1, 1);
  const above = run(range, area.top - 1, -1);
  if (below.rows + above.rows === 0) return [];
  const parts: string[] = [];
  if (below.rows > 0)
    parts.push(`ends at row ${area.bottom + 1}, but ${goesOn(below.rows)} below it, to row ${below.last + 1}`);
  if (above.rows > 0)
    parts.push(`begins at row ${area.top + 1}, but ${goesOn(above.rows)} above it, from row ${above.last + 1}`);
  const also = others > 0 ? ` (${counted(others, "more cell")} take${others === 1 ? "s" : ""} the same range)` : "";
  const why = `The range ${rangeAddress(range)} ${parts.join(", and ")}: left out, on purpose or by mistake${also}. Take them into the range if they are scores too.`;
  return [{ sheet: judgement.sheet.name, address: judgement.address, kind: "leaves data out", why }];
}

const goesOn = (rows: number) => `${counted(rows, "row")} of numbers ${rows === 1 ? "stands" : "stand"}`;

/** Rows of one table that hang together: numbers, and between them entries that have no score yet. */
interface Stretch {
  readonly top: number;
  readonly bottom: number;
  /** How many rows hold numbers, from `top` to each row. */
  readonly upTo: readonly number[];
}

/** Stretches found so far: many ranges of one column would walk the same rows again and again. */
const stretches = new WeakMap<Sheet, Map<string, Stretch>>();

/** How many rows from `row` on, down or up, belong to the same table, hold numbers in the columns of the range and are no total; and the last of them. */
function run({ sheet, area: { left, right } }: CallRange, row: number, step: 1 | -1): { rows: number; last: number } {
  const known = stretches.get(sheet) ?? new Map<string, Stretch>();
  stretches.set(sheet, known);
  const columns = `${left}:${right}`;
  let stretch = known.get(columns);
  if (!stretch || row < stretch.top || row > stretch.bottom) {
    if (row < 0 || !belongs(sheet, row, left, right)) return { rows: 0, last: row };
    known.set(columns, (stretch = stretchAt(sheet, row, left, right)));
  }
  const { top, upTo } = stretch;
  const before = upTo[row - top - 1] ?? 0;
  if (step === 1) return { rows: upTo[upTo.length - 1]! - before, last: stretch.bottom };
  return { rows: upTo[Math.min(row, stretch.bottom) - top] ?? 0, last: top };
}

function stretchAt(sheet: Sheet, row: number, left: number, right: number): Stretch {
  let [top, bottom] = [row, row];
  while (top > 0 && belongs(sheet, top - 1, left, right)) top--;
  while (belongs(sheet, bottom + 1, left, right)) bottom++;
  while (top < bottom && !holdsScore(sheet, top, left, right)) top++;
  while (bottom > top && !holdsScore(sheet, bottom, left, right)) bottom--;
  let count = 0;
  const upTo: number[] = [];
  for (let at = top; at <= bottom; at++) upTo.push((count += holdsScore(sheet, at, left, right) ? 1 : 0));
  return { top, bottom, upTo };
}

/** A row with a score, or one of an entry that has none yet: blank here, with a text in the cell to the left, and a score within two rows below. */
function belongs(sheet: Sheet, row: number, left: number, right: number): boolean {
  if (holdsScore(sheet, row, left, right)) return true;
  return isUnscored(sheet, row, left, right) && [1, 2].some((down) => holdsScore(sheet, row + down, left, right));
}

function isUnscored(sheet: Sheet, row: number, left: number, right: number): boolean {
  if (left === 0 || row > sheet.lastRow || typeof sheet.cell(row, left - 1) !== "string") return false;
  for (let column = left; column <= right; column++) if (!isBlank(sheet.cell(row, column))) return false;
  return !sheet.formulaAt(row, left) && !namesTotal(sheet, row, left);
}

/** A number that is neither worked out by a call of ours nor a sum or mean of others. */
export function holdsScore(sheet: Sheet, row: number, left: number, right: number): boolean {
  for (let column = left; column <= right; column++) {
    if (typeof sheet.cell(row, column) !== "number") continue;
    const formula = sheet.formulaAt(row, column);
    if (formula && (mayCallOurs(formula.formula) || summaryCells(sheet).has(formula))) continue;
    if (!namesTotal(sheet, row, column)) return true;
  }
  return false;
}

/** Two ranges of one call that have as many rows, but not the same ones. */
export function rangesOutOfLine(judgement: Judgement): Notice[] {
  for (const { values } of judgement.calls) {
    const places = values.flatMap((value) =>
      value instanceof Reference && value.places.length === 1 ? [value.places[0]!] : [],
    );
    for (const [index, a] of places.entries()) {
      for (const b of places.slice(index + 1)) {
        const rows = a.area.bottom - a.area.top;
        const apart = Math.abs(a.area.top - b.area.top);
        if (a.sheet !== b.sheet || rows < 2 || b.area.bottom - b.area.top !== rows || apart === 0 || apart > rows)
          continue;
        const [first, second] = [a, b].map(({ sheet, area }) => formatAddress({ sheet: sheet.name, ...area }));
        const why = `${first} and ${second} are taken side by side, but stand ${counted(apart, "row")} apart: each value may meet the wrong partner. Let both begin in the same row.`;
        return [{ sheet: judgement.sheet.name, address: judgement.address, kind: "ranges out of line", why }];
      }
    }
  }
  return [];
}
