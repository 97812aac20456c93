import { parseA1Ref, tokenize } from "@borgar/fx/xlsx";
import type { Area } from "../../sheet/address";
import type { FormulaCell, Sheet } from "../../sheet/workbook";
import { mayCallOurs } from "../functionName";
import { storedFormula } from "../formulaText";

const SUMMARY = /^[+(]*(SUM|SUBTOTAL|AGGREGATE|AVERAGE|MEDIAN|MIN|MAX|COUNT|COUNTA|PRODUCT|STDEV|VAR)\b[A-Z.]*\(/i;
/** The word alone or with what it is of: “Total Rope Ltd” is a supplier. */
const TOTAL_WORD =
  /^\s*(grand |sub-?)?(total|sum|average|mean|median|gesamt|summe|zwischensumme|mittelwert|durchschnitt|schnitt|moyenne|promedio)\s*(:|=|(of|all|score|scores|points|von|aller)\b.*)?\s*$/i;

/** A longer text is no such word; and what looks for one in it would walk its spaces again and again. */
const LONGEST_WORD = 80;

const remembered = new WeakMap<Sheet, ReadonlySet<FormulaCell>>();

/** The cells of a sheet that sum up others by a formula of the host. */
export function summaryCells(sheet: Sheet): ReadonlySet<FormulaCell> {
  let cells = remembered.get(sheet);
  if (!cells) {
    const found = [...sheet.formulas.values()].filter(({ formula }) => SUMMARY.test(formula) && !mayCallOurs(formula));
    cells = new Set(found);
    remembered.set(sheet, cells);
  }
  return cells;
}

/** True where the cell sums up cells of the area, by what its formula refers to on its own sheet. */
export function sumsUp(cell: FormulaCell, area: Area): boolean {
  return tokenize(storedFormula(cell)).some(({ type, value }) => {
    if (type !== "range" && type !== "range_beam") return false;
    const reference = parseA1Ref(value);
    if (!reference || !("range" in reference) || reference.sheetName) return false;
    const { top, left, bottom, right } = reference.range;
    return (
      (top ?? 0) <= area.bottom &&
      (bottom ?? Infinity) >= area.top &&
      (left ?? 0) <= area.right &&
      (right ?? Infinity) >= area.left
    );
  });
}

/** A row that calls itself a total, by a word to the left of the column. */
export function namesTotal(sheet: Sheet, row: number, column: number): boolean {
  for (let left = column - 1; left >= Math.max(0, column - 6); left--) {
    const cell = sheet.cell(row, left);
    if (typeof cell === "string" && cell.length <= LONGEST_WORD && TOTAL_WORD.test(cell)) return true;
  }
  return false;
}
