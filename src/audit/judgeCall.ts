import { NUMBERS_REVISION } from "../core/release";
import { formatAddress } from "../sheet/address";
import { isCellError, type Cell, type Range } from "../sheet/cell";
import type { Workbook } from "../sheet/workbook";
import type { CallCell } from "./callCells";
import { compareStored, type Comparison } from "./compareStored";
import { evaluate, type Answer, type FormulaPlace } from "./evaluate";
import type { OwnCall, SharedWork } from "./evaluation";
import { isReleaseCell } from "./fileRevision";
import { explainAgreement, explainDifference } from "./explain";
import { storedFormula, typedFormula } from "./formulaText";
import type { JudgedCall, Judgement } from "./judgement";
import { LAST_ROW } from "./reference";
import { isArray, Reference } from "./value";

export interface JudgeSetting {
  readonly workbook: Workbook;
  readonly tolerance: number;
  /** The revision of the numbers that the file says it was computed by. */
  readonly fileRevision: number | undefined;
  readonly work: SharedWork;
}

const SAVE_ANEW = "Open the file where the add-in is loaded, let it calculate, and save it.";

/** What a host stores while a call is not there to be answered, and what to do about it. */
const NO_ANSWER: Readonly<Record<string, readonly [why: string, next: string]>> = {
  "#NAME?": ["the file was saved by a program that didn't have the add-in at hand", SAVE_ANEW],
  "#BUSY!": ["the file was saved while the call was still being worked out", SAVE_ANEW],
  "#GETTING_DATA": ["the file was saved while the call was still being worked out", SAVE_ANEW],
  "#CONNECT!": ["the file was saved while the add-in could not be reached", SAVE_ANEW],
  "#BLOCKED!": ["the add-in was blocked where the file was saved", SAVE_ANEW],
  "#SPILL!": [
    "other cells stood where the result should spill",
    "Clear the cells beside and below it, and save the file.",
  ],
};

/** Judges one cell: its stored value against the one that comes out of the stored inputs. Hands on the calls as they were worked out. */
export function judgeCall(call: CallCell, setting: JudgeSetting): { judgement: Judgement; calls: readonly OwnCall[] } {
  const calls: OwnCall[] = [];
  const judgement = judgedBy(call, setting, calls);
  return { judgement: { ...judgement, calls: calls.map(judgedCall) }, calls };
}

function judgedCall({ entry, values, given, outcome }: OwnCall): JudgedCall {
  const single = given.map((argument) => (Array.isArray(argument) ? undefined : argument));
  return {
    entry,
    values: values.map((value) => (isArray(value ?? null) ? undefined : value)),
    given: single,
    answered: "value" in outcome,
  };
}

function judgedBy(
  { sheet, cell, unknown }: CallCell,
  setting: JudgeSetting,
  calls: OwnCall[],
): Omit<Judgement, "calls"> {
  const { row, column, array } = cell;
  const stored = array ? sheet.range(array) : [[sheet.cell(row, column)]];
  const place: FormulaPlace = {
    workbook: setting.workbook,
    sheet,
    row,
    column,
    shift: cell.shift,
    single: !array,
    calls,
    work: setting.work,
  };
  const answer = evaluate(cell.formula, place);
  const judged = {
    sheet,
    cell,
    address: formatAddress({ top: row, left: column, bottom: row, right: column }),
    formula: typedFormula(storedFormula(cell)),
    stored: oneOrRows(stored),
    recomputed: "value" in answer && unknown.length === 0 ? shownOf(answer.value, !array) : undefined,
  };
  const hindrance = cell.calculated
    ? whatHinders(answer, stored[0]![0], unknown)
    : (["the file holds no value for it, since it was never calculated", SAVE_ANEW] as const);
  if (hindrance !== undefined || !("value" in answer)) {
    const [reason, next] = hindrance ?? ["", ""];
    return { ...judged, verdict: "not checkable", why: `Not checkable: ${reason}. ${next}` };
  }
  const { value } = answer;
  const compared = comparedWith(stored, value, !array, setting);
  if (compared.same) return { ...judged, verdict: "agrees", why: explainAgreement(compared) };
  if (isReleaseCell(cell.formula)) {
    const told =
      setting.fileRevision === undefined ? "another release" : `revision ${setting.fileRevision} of the numbers`;
    const why = `Not checkable: it tells which release computed this file, ${told}; this is revision ${NUMBERS_REVISION}.`;
    return { ...judged, verdict: "not checkable", why };
  }
  const again = (changes: Partial<FormulaPlace>) => evaluate(cell.formula, { ...place, calls: undefined, ...changes });
  // Hosts differ in whether a whole column comes with the blanks below its last cell.
  const full = calls.some(takesWholeColumn) ? again({ inFull: true }) : undefined;
  if (full && "value" in full && comparedWith(stored, full.value, !array, setting).same) {
    const why = "Worked out again from the stored inputs, the whole column with its blank cells: the same.";
    return { ...judged, recomputed: shownOf(full.value, !array), verdict: "agrees", why };
  }
  const zero = calls.some(getsBlanks) ? again({ blanks: "zero" }) : undefined;
  const blanksAsZero = zero !== undefined && "value" in zero && comparedWith(stored, zero.value, !array, setting).same;
  const older =
    setting.fileRevision !== undefined && setting.fileRevision < NUMBERS_REVISION ? setting.fileRevision : undefined;
  const why = explainDifference(compared, stored, { blanksAsZero, olderRevision: older, calls });
  return { ...judged, verdict: "differs", why };
}

/** The reason why a call can't be judged, and what to do next. */
function whatHinders(
  answer: Answer,
  stored: Cell,
  unknown: readonly string[],
): readonly [reason: string, next: string] | undefined {
  if (unknown.length > 0)
    return [
      `this release has no function ${unknown.join(" and ")}`,
      "Audit with a newer release, or correct the name if it is misspelt.",
    ];
  if ("unreadable" in answer)
    return [`the formula can't be read (${answer.unreadable})`, "Correct it in the sheet, and save the file."];
  if ("notKnown" in answer)
    return [
      answer.notKnown,
      "Check it by hand, or put that part into a cell of its own: the stored values of other cells are taken as they are.",
    ];
  const code = isCellError(stored) ? stored.code.toUpperCase() : undefined;
  const recomputed = Array.isArray(answer.value) ? undefined : answer.value;
  if (code === undefined || (isCellError(recomputed) && recomputed.code === code)) return undefined;
  const known = NO_ANSWER[code];
  return known && [`it holds ${code}, since ${known[0]}`, known[1]];
}

/** In an old-style cell only the first cell of a table is shown. */
function shownOf(value: Cell | Cell[][], single: boolean): Cell | Cell[][] {
  return single && Array.isArray(value) ? (value[0]?.[0] ?? null) : value;
}

function comparedWith(
  stored: readonly (readonly Cell[])[],
  value: Cell | Cell[][],
  single: boolean,
  { tolerance }: JudgeSetting,
): Comparison {
  const shown = shownOf(value, single);
  return compareStored(stored, Array.isArray(shown) ? shown : [[shown]], tolerance);
}

function oneOrRows(rows: readonly (readonly Cell[])[]): Cell | Cell[][] {
  return rows.length === 1 && rows[0]!.length === 1 ? rows[0]![0]! : rows.map((row) => [...row]);
}

const blanksInside = new WeakMap<Range, boolean>();

function getsBlanks({ given }: OwnCall): boolean {
  return given.some((argument) => {
    if (!Array.isArray(argument)) return argument === null;
    const range = argument as Range;
    let blanks = blanksInside.get(range);
    if (blanks === undefined) blanksInside.set(range, (blanks = range.some((row) => row.includes(null))));
    return blanks;
  });
}

function takesWholeColumn({ values }: OwnCall): boolean {
  return values.some(
    (value) => value instanceof Reference && value.places.some(({ area }) => area.bottom === LAST_ROW),
  );
}
