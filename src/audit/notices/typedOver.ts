import { formatAddress } from "../../sheet/address";
import { isCellError, type Cell } from "../../sheet/cell";
import type { FormulaCell, Sheet } from "../../sheet/workbook";
import { compareStored } from "../compareStored";
import { evaluate } from "../evaluate";
import { relativeFormula } from "../formulaText";
import type { JudgeSetting } from "../judgeCall";
import type { Judgement, Notice } from "../judgement";
import { showCell } from "../showCell";

/** So many calls alike in a row make a pattern that goes on beyond its end. */
const PATTERN = 3;
const WIDEST_GAP = 50;

/** A number that stands where the cells beside it, down or across, call a function of ours by one and the same formula. */
export function typedOver(
  judgements: readonly Judgement[],
  { workbook, tolerance, work }: Pick<JudgeSetting, "workbook" | "tolerance" | "work">,
): Notice[] {
  const notices: Notice[] = [];
  const seen = new Set<string>();
  for (const sheet of workbook.sheets) {
    const cells = judgements.filter((one) => one.sheet === sheet && isSingle(one.cell)).map(({ cell }) => cell);
    for (const down of [true, false])
      for (const line of lines(cells, down))
        for (const { row, column, like } of suspects(sheet, line, down)) {
          const address = formatAddress({ top: row, left: column, bottom: row, right: column });
          if (seen.has(`${sheet.name}!${address}`)) continue;
          seen.add(`${sheet.name}!${address}`);
          const notice = noticeOf({ workbook, tolerance, work }, sheet, row, column, like);
          if (notice) notices.push({ ...notice, address });
        }
  }
  return notices;
}

function isSingle({ array }: FormulaCell): boolean {
  return !array || (array.top === array.bottom && array.left === array.right);
}

/** The cells column by column (row by row), each in order. */
function lines(cells: readonly FormulaCell[], down: boolean): FormulaCell[][] {
  const byLine = new Map<number, FormulaCell[]>();
  for (const cell of cells) {
    const key = down ? cell.column : cell.row;
    const known = byLine.get(key);
    if (known) known.push(cell);
    else byLine.set(key, [cell]);
  }
  const place = (cell: FormulaCell) => (down ? cell.row : cell.column);
  return [...byLine.values()].map((line) => line.sort((a, b) => place(a) - place(b)));
}

interface Suspect {
  readonly row: number;
  readonly column: number;
  /** The neighbour whose formula should stand there. */
  readonly like: FormulaCell;
}

function suspects(sheet: Sheet, line: readonly FormulaCell[], down: boolean): Suspect[] {
  const place = (cell: FormulaCell) => (down ? cell.row : cell.column);
  const at = (like: FormulaCell, position: number): Suspect =>
    down ? { row: position, column: like.column, like } : { row: like.row, column: position, like };
  const typed = ({ row, column }: Suspect) =>
    row >= 0 && column >= 0 && typeof sheet.cell(row, column) === "number" && !sheet.formulaAt(row, column);
  const found: Suspect[] = [];
  line.forEach((cell, index) => {
    const next = line[index + 1];
    const gap = next ? place(next) - place(cell) - 1 : 0;
    if (!next || gap < 1 || gap > WIDEST_GAP) return;
    const between = Array.from({ length: gap }, (_, i) => at(cell, place(cell) + 1 + i));
    if (between.every(typed) && relativeFormula(cell) === relativeFormula(next)) found.push(...between);
  });
  for (const [end, inner, step] of [
    [line[0]!, line.slice(1, PATTERN), -1],
    [line[line.length - 1]!, line.slice(-PATTERN, -1), 1],
  ] as const) {
    const suspect = at(end, place(end) + step);
    if (line.length < PATTERN || !typed(suspect)) continue;
    const alike = inner.every(
      (one) => Math.abs(place(one) - place(end)) < PATTERN && relativeFormula(one) === relativeFormula(end),
    );
    if (alike) found.push(suspect);
  }
  return found;
}

function noticeOf(
  { workbook, tolerance, work }: Pick<JudgeSetting, "workbook" | "tolerance" | "work">,
  sheet: Sheet,
  row: number,
  column: number,
  like: FormulaCell,
): Omit<Notice, "address"> | undefined {
  const shift = {
    rows: row - like.row + (like.shift?.rows ?? 0),
    columns: column - like.column + (like.shift?.columns ?? 0),
  };
  const answer = evaluate(like.formula, { workbook, sheet, row, column, shift, single: !like.array, work });
  const recomputed: Cell = "value" in answer && !Array.isArray(answer.value) ? answer.value : undefined;
  // Where the formula has nothing to work on, the number belongs to something else: a total below the column.
  if (recomputed === undefined || isCellError(recomputed)) return undefined;
  const stored = sheet.cell(row, column);
  const { same } = compareStored([[stored]], [[recomputed]], tolerance);
  const neighbour = formatAddress({ top: like.row, left: like.column, bottom: like.row, right: like.column });
  const outcome = same ? `and it is what the formula would give` : `and the formula would give ${showCell(recomputed)}`;
  const why = `The number ${showCell(stored)} is typed in where the cells beside it (${neighbour}) call a function; it will not follow the scores, ${outcome}. Fill the formula into it, or note beside it who typed it and why.`;
  return { sheet: sheet.name, kind: "typed over", why, stored, recomputed };
}
