import { formatAddress } from "../../sheet/address";
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
  const below = area.bottom === LAST_ROW ? 0 : run(range, area.bottom + 1, 1);
  const above = run(range, area.top - 1, -1);
  if (below + above === 0) return [];
  const parts: string[] = [];
  if (below > 0)
    parts.push(`ends at row ${area.bottom + 1}, but ${goesOn(below)} below it, to row ${area.bottom + 1 + below}`);
  if (above > 0)
    parts.push(`begins at row ${area.top + 1}, but ${goesOn(above)} above it, from row ${area.top + 1 - above}`);
  const also = others > 0 ? ` (${counted(others, "more cell")} take${others === 1 ? "s" : ""} the same range)` : "";
  const why = `The range ${rangeAddress(range)} ${parts.join(", and ")}: left out, on purpose or by mistake${also}. Take them into the range if they are scores too.`;
  return [{ sheet: judgement.sheet.name, address: judgement.address, kind: "leaves data out", why }];
}

const goesOn = (rows: number) => `${counted(rows, "row")} of numbers ${rows === 1 ? "stands" : "stand"}`;

/** Stretches of numbers found so far: many ranges of one column would walk the same rows again and again. */
const stretches = new WeakMap<Sheet, Map<string, { top: number; bottom: number }>>();

/** How many rows in one piece from `row` on hold numbers in the columns of the range and are no total. */
function run({ sheet, area }: CallRange, row: number, step: 1 | -1): number {
  const known = stretches.get(sheet) ?? new Map<string, { top: number; bottom: number }>();
  stretches.set(sheet, known);
  const columns = `${area.left}:${area.right}`;
  let stretch = known.get(columns);
  if (!stretch || row < stretch.top || row > stretch.bottom) {
    if (row < 0 || !holdsNumber(sheet, row, area.left, area.right)) return 0;
    stretch = { top: row, bottom: row };
    while (stretch.top > 0 && holdsNumber(sheet, stretch.top - 1, area.left, area.right)) stretch.top--;
    while (holdsNumber(sheet, stretch.bottom + 1, area.left, area.right)) stretch.bottom++;
    known.set(columns, stretch);
  }
  return step === 1 ? stretch.bottom - row + 1 : row - stretch.top + 1;
}

function holdsNumber(sheet: Sheet, row: number, left: number, right: number): boolean {
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
