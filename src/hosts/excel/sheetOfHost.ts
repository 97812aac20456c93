import { Sheet, type FormulaCell } from "../../sheet/workbook";
import { cellsFromHost } from "./cells";

/** Of so many formulas the host is asked how far they spill; of a sheet with more only of those that call ours. */
const FEW_FORMULAS = 2_000;
const OUR_CALL = /WEIR[._][A-Z]/i;

/** Puts a piece of what the host told into a sheet: values, and formulas where there are any. */
export function addCells(
  sheet: Sheet,
  top: number,
  left: number,
  formulas: readonly (readonly unknown[])[],
  values: readonly (readonly unknown[])[],
  types: readonly (readonly string[])[],
): void {
  const cells = cellsFromHost(values, types);
  formulas.forEach((line, r) =>
    line.forEach((formula, c) => {
      const [row, column] = [top + r, left + c];
      const value = cells[r]?.[c] ?? null;
      // A text that begins with "=" is told as it is, in both places.
      const calculated = typeof formula === "string" && formula.startsWith("=") && formula !== value;
      if (calculated) sheet.addFormula({ row, column, formula: formula.slice(1), dynamic: false, calculated: true });
      // A formula that gives an empty text is no blank cell.
      if (value !== null || calculated) sheet.set(row, column, value ?? "");
    }),
  );
}

/** The formulas of which the host is asked how many cells they fill. */
export function wantsSpill(sheet: Sheet): FormulaCell[] {
  const all = [...sheet.formulas.values()];
  return all.length <= FEW_FORMULAS ? all : all.filter(({ formula }) => OUR_CALL.test(formula));
}

/** Notes how many cells a formula fills. Hosts that give the formula at each of these cells mean the one in the first. */
export function setSpill(sheet: Sheet, cell: FormulaCell, rows: number, columns: number): void {
  const { row, column, formula } = cell;
  if (sheet.formulaAt(row, column) !== cell) return;
  const array = { top: row, left: column, bottom: row + rows - 1, right: column + columns - 1 };
  sheet.addFormula({ ...cell, array, dynamic: true });
  for (let r = row; r <= array.bottom; r++)
    for (let c = column; c <= array.right; c++)
      if ((r !== row || c !== column) && sheet.formulaAt(r, c)?.formula === formula)
        sheet.formulas.delete(Sheet.key(r, c));
}
