import { formatAddress } from "../../sheet/address";
import type { Cell } from "../../sheet/cell";
import type { Sheet } from "../../sheet/workbook";
import type { Notice } from "../judgement";
import { usedPart } from "../reference";
import { counted, showCell } from "../showCell";
import { rangeAddress, type CallRange } from "./callRanges";
import { namesTotal, summaryCells, sumsUp } from "./totals";

/** A range whose cells hold, among the scores, a sum or mean of them: by its formula, by its label, or by its value in the last cell. */
export function totalTakenIn(range: CallRange): Notice[] {
  const { sheet, judgement } = range;
  const used = usedPart(range);
  const area = {
    ...used,
    bottom: Math.min(used.bottom, sheet.lastRow),
    right: Math.min(used.right, sheet.lastColumn),
  };
  for (let column = area.left; column <= area.right; column++) {
    const summary = [...summaryCells(sheet)].find(
      (cell) =>
        cell.column === column &&
        cell.row >= area.top &&
        cell.row <= area.bottom &&
        sumsUp(cell, { ...area, left: column, right: column }),
    );
    const last = lastNumber(sheet, column, area.top, area.bottom);
    const row = summary?.row ?? (last !== undefined && isTotal(sheet, column, area.top, last) ? last : undefined);
    if (row === undefined) continue;
    const cell = formatAddress({ top: row, left: column, bottom: row, right: column });
    const why = `The range ${rangeAddress(range)} takes in ${cell} (${showCell(sheet.cell(row, column))}), which sums up the cells above it: it counts as one more score. Let the range end above it.`;
    return [{ sheet: judgement.sheet.name, address: judgement.address, kind: "takes in a total", why }];
  }
  return [];
}

function lastNumber(sheet: Sheet, column: number, top: number, bottom: number): number | undefined {
  for (let row = bottom; row >= top; row--) if (typeof sheet.cell(row, column) === "number") return row;
  return undefined;
}

/** By a word in its row, or because it is the sum or the mean of at least three numbers above that are not all alike. */
function isTotal(sheet: Sheet, column: number, top: number, row: number): boolean {
  if (namesTotal(sheet, row, column)) return true;
  if (sheet.formulaAt(row, column)) return false;
  const value = sheet.cell(row, column) as number;
  let sum = 0;
  let count = 0;
  let unlike = false;
  for (let at = top; at < row; at++) {
    const cell = sheet.cell(at, column);
    if (typeof cell !== "number") continue;
    unlike ||= count > 0 && cell !== sheet.cell(top, column);
    sum += cell;
    count++;
  }
  const near = (other: number) => Math.abs(value - other) <= 1e-9 * Math.abs(other);
  // A score may well be the mean of a few others by chance; to ten digits of many it is not.
  const longMean = !Number.isInteger(value * 100) || count >= 30;
  return count >= 3 && unlike && value !== 0 && (near(sum) || (longMean && near(sum / count)));
}

/** Rows inside a range that nobody sees: they count all the same. */
export function hiddenRowsInside(range: CallRange): Notice[] {
  const { sheet, judgement } = range;
  if (sheet.hiddenRows.size === 0) return [];
  const area = usedPart(range);
  let hidden = 0;
  const holds = (row: number): boolean => {
    for (let column = area.left; column <= area.right; column++) if (isNumber(sheet.cell(row, column))) return true;
    return false;
  };
  for (const row of sheet.hiddenRows) if (row >= area.top && row <= area.bottom && holds(row)) hidden++;
  if (hidden === 0) return [];
  const filtered = sheet.filter && sheet.filter.top <= area.bottom && sheet.filter.bottom >= area.top;
  const how = filtered ? "hidden by a filter" : "hidden";
  const are = hidden === 1 ? "is" : "are";
  const why = `${counted(hidden, "row")} of ${rangeAddress(range)} with numbers ${are} ${how}: ${hidden === 1 ? "it counts" : "they count"} all the same. Show ${hidden === 1 ? "it" : "them"} and see whether ${hidden === 1 ? "it belongs" : "they belong"} to the scores.`;
  return [{ sheet: judgement.sheet.name, address: judgement.address, kind: "hidden rows", why }];
}

function isNumber(cell: Cell): boolean {
  return typeof cell === "number";
}
