import { formatAddress, parseAddress } from "../../sheet/address";
import type { Cell } from "../../sheet/cell";
import type { Outcome } from "../../sheet/invoke";
import type { Call } from "../context";
import type { CutoffAnswer } from "../cutoff/answerCutoff";
import { formulaText } from "../formula";

export interface GroupRate {
  readonly name: string;
  readonly assessed: number;
  readonly passed: number;
  readonly rate: number;
  readonly ratio: number | undefined;
  readonly below: boolean;
  readonly p: number | undefined;
}

/** The cells beside the scores that name each entry's group: the column that was picked, cut to the rows of the scores. */
export function groupsAddress(picked: string, scores: string): string | undefined {
  const [column, rows] = [parseAddress(picked), parseAddress(scores)];
  if (!column || !rows || column.left !== column.right) return undefined;
  const sheet = column.sheet ?? rows.sheet;
  return formatAddress({ ...column, ...(sheet !== undefined && { sheet }), top: rows.top, bottom: rows.bottom });
}

/** Asks for the pass rates at the mark. Entries without a score were not assessed: they count in no group. */
export function askPassRates(
  call: Call,
  answer: CutoffAnswer,
  groups: readonly (readonly Cell[])[],
): Outcome | undefined {
  const { column, question, report } = answer;
  const { cutoff } = report!;
  const clears = (score: number) => (question.better === "low" ? score <= cutoff : score >= cutoff);
  const scored = column.cells.map(([cell]) => typeof cell === "number");
  return call("GROUP_PASS_RATES", [
    scored.map((assessed, row) => [assessed ? (groups[row]?.[0] ?? null) : null]),
    column.cells.map(([cell]) => [typeof cell === "number" ? clears(cell) : null]),
  ]);
}

/** The same as a formula, with the mark as a constant on the grid of the scores. */
export function passRatesFormula(answer: CutoffAnswer, groups: string): string {
  const { column, question, report } = answer;
  const scores = column.address;
  const sign = question.better === "low" ? "<=" : ">=";
  return formulaText("GROUP_PASS_RATES", [
    { reference: `IF(ISNUMBER(${scores}),${groups},"")` },
    { reference: `IF(ISNUMBER(${scores}),${scores}${sign}${report!.spoken.mark},"")` },
  ]);
}

/** The table of the function as records. */
export function groupRates(rows: readonly (readonly Cell[])[]): GroupRate[] {
  const number = (cell: Cell) => (typeof cell === "number" ? cell : undefined);
  return rows.slice(1).map(([name, assessed, passed, rate, ratio, below, , p]) => ({
    name: String(name),
    assessed: number(assessed) ?? 0,
    passed: number(passed) ?? 0,
    rate: number(rate) ?? 0,
    ratio: number(ratio),
    below: below === true,
    p: number(p),
  }));
}
