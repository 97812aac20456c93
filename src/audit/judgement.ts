import type { Cell } from "../sheet/cell";
import type { FormulaCell, Sheet } from "../sheet/workbook";
import type { OwnCall } from "./evaluation";

export type Verdict = "agrees" | "differs" | "not checkable";

/** What is kept of a call: not its formula, nor the cells of the ranges it was given. Of many calls nobody could keep them all. */
export type JudgedCall = Pick<OwnCall, "entry" | "values" | "given"> & { readonly answered: boolean };

/** What was found about one cell that calls a function of ours. */
export interface Judgement {
  readonly sheet: Sheet;
  readonly cell: FormulaCell;
  /** Its address, without the sheet. */
  readonly address: string;
  /** The formula as it is typed. */
  readonly formula: string;
  readonly stored: Cell | Cell[][];
  /** Undefined where it can't be worked out. */
  readonly recomputed: Cell | Cell[][] | undefined;
  readonly verdict: Verdict;
  /** One or more sentences. */
  readonly why: string;
  /** The calls of ours that took part. */
  readonly calls: readonly JudgedCall[];
}

/** Something beside a wrong value that an auditor should look at. */
export interface Notice {
  readonly sheet: string;
  readonly address: string;
  readonly kind: NoticeKind;
  readonly why: string;
  readonly stored?: Cell;
  readonly recomputed?: Cell;
}

export type NoticeKind =
  | "typed over"
  | "leaves data out"
  | "skips rows"
  | "ranges out of line"
  | "takes in a total"
  | "hidden rows"
  | "asked in two ways"
  | "fixed mark moved"
  | "second opinion differs";
