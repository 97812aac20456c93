import { formatAddress, type Area } from "../sheet/address";
import type { Cell, Range } from "../sheet/cell";
import { Sheet } from "../sheet/workbook";
import type { Evaluation } from "./evaluation";
import { errorCell, isArray, NotKnown, Reference, type Place, type Value } from "./value";

export const LAST_ROW = 1_048_575;
export const LAST_COLUMN = 16_383;
const MOST_CELLS = 10_000_000;
const read = new WeakSet<Range>();

/** The stored cells of a reference. Whole columns and rows end with the used part of the sheet. */
export function cellsOf(reference: Reference, at: Evaluation): Range {
  const [place, ...others] = reference.places;
  if (place === undefined) return [[errorCell("#NULL!", "The ranges have no cell in common.")]];
  if (others.length > 0)
    return [[errorCell("#VALUE!", `One range is wanted here, and ${reference.places.length} were given.`)]];
  return placeCells(place, at);
}

export function placeCells(place: Place, at: Evaluation): Range {
  const area = usedPart(place);
  const count = (area.bottom - area.top + 1) * (area.right - area.left + 1);
  if (count > MOST_CELLS) throw new NotKnown(`the range ${formatAddress(place.area)} has too many cells`);
  refuseUncalculated(place.sheet, area);
  at.spend(1 + count / 100);
  const cells = place.sheet.range(area);
  // A range that was never read takes memory: a formula that reads many and large ones must not take all of it.
  if (!read.has(cells)) at.spend(count / 4);
  read.add(cells);
  return at.setting.inFull && place.area.bottom === LAST_ROW
    ? filledDown(cells, place.area.bottom - place.area.top + 1)
    : cells;
}

/** Blank rows behind the used part, one and the same row again and again. */
function filledDown(cells: Range, rows: number): Range {
  const blank: Cell[] = Array<Cell>(cells[0]?.length ?? 1).fill(null);
  return [...cells, ...Array<Cell[]>(rows - cells.length).fill(blank)];
}

/** The area cut to the used part of its sheet where it is open to the last row or column. */
export function usedPart({ sheet, area }: Place): Area {
  const bottom = area.bottom === LAST_ROW ? Math.max(area.top, sheet.lastRow) : area.bottom;
  const right = area.right === LAST_COLUMN ? Math.max(area.left, sheet.lastColumn) : area.right;
  return { top: area.top, left: area.left, bottom, right };
}

function refuseUncalculated(sheet: Sheet, { top, left, bottom, right }: Area): void {
  if (sheet.uncalculated.size === 0) return;
  for (const key of sheet.uncalculated) {
    const { row, column } = sheet.formulas.get(key)!;
    if (row >= top && row <= bottom && column >= left && column <= right) {
      const cell = formatAddress({ sheet: sheet.name, top: row, left: column, bottom: row, right: column });
      throw new NotKnown(`${cell} holds a formula without a stored value`);
    }
  }
}

/** The one cell of a range that stands in line with the formula's own; #VALUE! where there is none or more than one. */
export function intersect(reference: Reference, at: Evaluation): Reference | Cell {
  const { row, column } = at.setting;
  const [place, ...others] = reference.places;
  if (place === undefined || others.length > 0) return errorCell("#VALUE!");
  const { top, left, bottom, right } = place.area;
  const inColumn = left === right;
  const inRow = top === bottom;
  const atRow = inRow ? top : row >= top && row <= bottom ? row : undefined;
  const atColumn = inColumn ? left : column >= left && column <= right ? column : undefined;
  if (atRow === undefined || atColumn === undefined || !(inRow || inColumn))
    return errorCell("#VALUE!", `${formatAddress(place.area)} has no one cell in line with the formula.`);
  return new Reference([{ sheet: place.sheet, area: { top: atRow, left: atColumn, bottom: atRow, right: atColumn } }]);
}

/** What "@" makes of a value: of a range the cell in line, of an array the first. */
export function singleOf(value: Value, at: Evaluation): Value {
  if (value instanceof Reference) return intersect(value, at);
  return isArray(value) ? (value[0]?.[0] ?? null) : value;
}

/** What "#" makes of a reference: the cells that the array formula at its first cell fills. */
export function spilledFrom(value: Value): Value {
  const place = value instanceof Reference ? value.places[0] : undefined;
  const array = place && place.sheet.formulaAt(place.area.top, place.area.left)?.array;
  if (!array) return errorCell("#REF!", "No result spills from the cell before the #.");
  const { top, left, bottom, right } = array;
  return new Reference([{ sheet: place.sheet, area: { top, left, bottom, right } }]);
}

/** The reference operators: all cells between (":"), both ("," ), those in common (" "). */
export function combineReferences(operator: string, left: Value, right: Value): Value {
  if (!(left instanceof Reference)) return isArray(left) ? errorCell("#VALUE!") : left;
  if (!(right instanceof Reference)) return isArray(right) ? errorCell("#VALUE!") : right;
  if (operator === ",") return new Reference([...left.places, ...right.places]);
  if (operator === " ") return new Reference(left.places.flatMap((a) => right.places.flatMap((b) => common(a, b))));
  const [a, b] = [left.places[0], right.places[0]];
  if (!a || !b || a.sheet !== b.sheet || left.places.length + right.places.length > 2) return errorCell("#VALUE!");
  const area = {
    top: Math.min(a.area.top, b.area.top),
    left: Math.min(a.area.left, b.area.left),
    bottom: Math.max(a.area.bottom, b.area.bottom),
    right: Math.max(a.area.right, b.area.right),
  };
  return new Reference([{ sheet: a.sheet, area }]);
}

function common(a: Place, b: Place): Place[] {
  const top = Math.max(a.area.top, b.area.top);
  const left = Math.max(a.area.left, b.area.left);
  const bottom = Math.min(a.area.bottom, b.area.bottom);
  const right = Math.min(a.area.right, b.area.right);
  return a.sheet === b.sheet && top <= bottom && left <= right
    ? [{ sheet: a.sheet, area: { top, left, bottom, right } }]
    : [];
}
