import type { AstExpression, CallExpression } from "@borgar/fx/xlsx";
import type { Cell, Range } from "../sheet/cell";
import type { FunctionEntry } from "../sheet/functionTable";
import type { Argument, BlankPolicy, Outcome } from "../sheet/invoke";
import type { Sheet, Workbook } from "../sheet/workbook";
import { unwrapped } from "./broadcast";
import { evaluateNode } from "./evaluateNode";
import { cellsOf, intersect } from "./reference";
import { isArray, NotKnown, Reference, type Value } from "./value";

/** A name given by LET, and the ones given before it. */
export interface Scope {
  readonly name: string;
  readonly value: Value;
  readonly outer?: Scope;
}

/** Where and how a formula is evaluated. */
export interface Setting {
  readonly workbook: Workbook;
  readonly sheet: Sheet;
  /** The cell that the formula stands in. */
  readonly row: number;
  readonly column: number;
  readonly blanks: BlankPolicy;
  /** The text that is being evaluated, with its "=". */
  readonly source: string;
  /** How far relative references move: in a shared formula, and in a name. */
  readonly shift: { readonly rows: number; readonly columns: number };
  /** True in an old-style formula, where an operator takes the one cell of a range that stands in line with its own. */
  readonly single: boolean;
  /** Whole columns and rows in full, blanks below and all, instead of their used part. */
  readonly inFull: boolean;
  readonly scope?: Scope;
  /** The defined names that are being worked out. */
  readonly names: readonly string[];
  /** What the formula as a whole has left to spend, and the names that it has worked out already. */
  readonly budget: Budget;
}

/** What all formulas of one audit have left to spend together. */
export interface SharedWork {
  steps: number;
}

export interface Budget {
  steps: number;
  readonly names: Map<string, Value>;
  /** The calls of our functions, noted here where somebody asks for them. */
  readonly calls?: OwnCall[];
}

/** One call of a function of ours, as it was worked out. */
export interface OwnCall {
  readonly entry: FunctionEntry;
  /** The arguments as they came; undefined for one left out. */
  readonly values: readonly (Value | undefined)[];
  /** The same as the function got them. */
  readonly given: readonly Argument[];
  readonly outcome: Outcome;
  /** Where it stands: the formula's text, and from where to where in it. */
  readonly source: string;
  readonly node: CallExpression;
}

/** Fifty formulas that each take all they may: far more than any sheet in use. */
export function newSharedWork(): SharedWork {
  return { steps: 50 * MOST_STEPS };
}

/** About two seconds' worth of steps. */
const MOST_STEPS = 4_000_000;

export function newBudget(calls?: OwnCall[]): Budget {
  return { steps: MOST_STEPS, names: new Map(), calls };
}

/** One formula being evaluated on stored values. */
export class Evaluation {
  constructor(readonly setting: Setting) {}

  /** The same evaluation with something changed: a name more in scope, arrays allowed. */
  with(changes: Partial<Setting>): Evaluation {
    return new Evaluation({ ...this.setting, ...changes });
  }

  get withArrays(): Evaluation {
    return this.setting.single ? this.with({ single: false }) : this;
  }

  value(node: AstExpression | null): Value {
    const value = node === null ? null : evaluateNode(node, this);
    this.spend(isArray(value) ? 1 + (value.length * (value[0]?.length ?? 0)) / 4 : 1);
    return value;
  }

  /** Counts steps, so that no formula of a file can keep the reader busy for ever. */
  spend(steps: number): void {
    if ((this.setting.budget.steps -= steps) < 0) throw new NotKnown("it takes too many steps");
  }

  /** The cells behind a value, as one value where there is one. */
  cells(value: Value): Cell | Range {
    return value instanceof Reference ? unwrapped(cellsOf(value, this)) : unwrapped(value);
  }

  /** The same as an operator sees it: in an old-style formula one cell of a range. */
  operand(value: Value): Cell | Range {
    return this.setting.single && value instanceof Reference ? this.cells(intersect(value, this)) : this.cells(value);
  }

  /** Always rows of cells. */
  rows(value: Value): Range {
    const cells = this.cells(value);
    return isArray(cells) ? cells : [[cells]];
  }

  /** One cell: the first of an array. */
  cell(value: Value): Cell {
    const cells = this.operand(value);
    return isArray(cells) ? (cells[0]?.[0] ?? null) : cells;
  }
}
