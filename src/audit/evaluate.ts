import { isCellError, type Cell } from "../sheet/cell";
import type { BlankPolicy } from "../sheet/invoke";
import type { Sheet, Workbook } from "../sheet/workbook";
import { UnknownFunction } from "./evaluateNode";
import { Evaluation, newBudget, type OwnCall, type SharedWork } from "./evaluation";
import { readFormula } from "./readFormula";
import { intersect } from "./reference";
import { errorCell, isArray, NotKnown, Reference, UnreadableFormula } from "./value";

/** Where a formula stands, and how it is to be taken. */
export interface FormulaPlace {
  readonly workbook: Workbook;
  readonly sheet: Sheet;
  readonly row: number;
  readonly column: number;
  readonly shift?: { readonly rows: number; readonly columns: number };
  /** An old-style formula, which takes one cell of a range where one is wanted. */
  readonly single?: boolean;
  readonly blanks?: BlankPolicy;
  /** Whole columns and rows in full instead of their used part. */
  readonly inFull?: boolean;
  /** Takes down the calls of our functions. */
  readonly calls?: OwnCall[];
  /** What all formulas have left together; each formula has its own bound beside it. */
  readonly work?: SharedWork;
}

/** A value as a cell would show it (errors are values), or the reason why it can't be known or read. */
export type Answer =
  | { readonly value: Cell | Cell[][] }
  | { readonly notKnown: string; readonly unknownFunction?: UnknownFunction }
  | { readonly unreadable: string };

/** Evaluates a formula on the stored values of a workbook, as if it stood in the given cell. Never throws. */
export function evaluate(formula: string, place: FormulaPlace): Answer {
  const source = formula.startsWith("=") ? formula : `=${formula}`;
  const { workbook, sheet, row, column, shift = { rows: 0, columns: 0 } } = place;
  const { single = false, blanks = "null", inFull = false, calls, work } = place;
  if (work && work.steps < 0) return { notKnown: "the calls before it took all the work that one audit does" };
  const budget = newBudget(calls);
  const allowed = budget.steps;
  try {
    const ast = readFormula(source);
    const where = { workbook, sheet, row, column, shift, single, blanks, inFull, source };
    const at = new Evaluation({ ...where, names: [], budget });
    const value = at.value(ast);
    const shown = single && value instanceof Reference ? intersect(value, at) : value;
    return { value: asShown(at.cells(shown)) };
  } catch (failure) {
    if (failure instanceof UnreadableFormula) return { unreadable: failure.message };
    if (failure instanceof UnknownFunction) return { notKnown: failure.message, unknownFunction: failure };
    if (failure instanceof NotKnown) return { notKnown: failure.message };
    // The stack is the last limit: nothing that a file holds may end the program.
    if (failure instanceof RangeError) return { notKnown: "it is nested too deep" };
    throw failure;
  } finally {
    if (work) work.steps -= allowed - budget.steps;
  }
}

/** A blank that a formula leads to is shown as 0. */
function asShown(value: Cell | readonly (readonly Cell[])[]): Cell | Cell[][] {
  return isArray(value) ? value.map((row) => row.map(shownCell)) : shownCell(value);
}

function shownCell(cell: Cell): Cell {
  if (cell === null || cell === undefined) return 0;
  return isCellError(cell) && cell.message === undefined ? errorCell(cell.code) : cell;
}
