import { tokenize } from "@borgar/fx/xlsx";
import type { Area } from "../../sheet/address";
import { isCellError, type Cell } from "../../sheet/cell";
import { endSpills, type EndedSpill } from "../../sheet/endSpills";
import type { Workbook } from "../../sheet/workbook";
import { compareStored } from "../compareStored";
import { evaluate } from "../evaluate";
import { newSharedWork, type OwnCall, type SharedWork } from "../evaluation";
import { storedFormula, typedFormula } from "../formulaText";
import { mayCallOurs } from "../functionName";
import type { Judgement } from "../judgement";
import { hostNeeded } from "./hostNeeded";
import { nativeCall } from "./nativeCall";

/** What becomes of one cell in a copy that is to work without the add-in. */
export interface Replacement {
  readonly judgement: Judgement;
  readonly becomes: "formula" | "value" | "as it was";
  /** The formula of the host, in the spelling of files and as it is typed. */
  readonly stored?: string;
  readonly typed?: string;
  /** The value to put in where the file holds none. */
  readonly value?: Cell;
  readonly note: string;
}

const MOST_CALLS_IN_A_CELL = 20;
const LONGEST_FORMULA = 8_192;

/** Puts a formula as typed into the spelling of files, without its "=". */
export type Spelling = (formula: string) => string;

/** Decides for every judged cell: the host's own functions where they give the same value, else its value, else nothing. */
export function planHandover(judgements: readonly Judgement[], workbook: Workbook, spelling: Spelling): Replacement[] {
  const work = newSharedWork();
  const replacements = judgements.map((judgement) => replacementOf(judgement, workbook, work, spelling));
  const ended = endedSpills(replacements);
  return replacements.map((one) => {
    if (one.stored === undefined) return one;
    const stored = ended ? endSpills(one.stored, one.judgement.sheet.name, ended) : one.stored;
    return { ...one, stored, typed: typedFormula(`=${stored}`) };
  });
}

/** What the replaced results filled that spilled by themselves: none of them does any more. */
export function endedSpills(replacements: readonly Replacement[]): EndedSpill | undefined {
  const areas = new Map<string, Area>();
  for (const { becomes, judgement } of replacements)
    if (becomes !== "as it was" && judgement.cell.array)
      areas.set(spillKey(judgement.sheet.name, judgement.cell.row, judgement.cell.column), judgement.cell.array);
  return areas.size === 0 ? undefined : (sheet, row, column) => areas.get(spillKey(sheet, row, column));
}

function spillKey(sheet: string, row: number, column: number): string {
  return `${row},${column},${sheet.toLowerCase()}`;
}

function replacementOf(judgement: Judgement, workbook: Workbook, work: SharedWork, spelling: Spelling): Replacement {
  const formula = judgement.recomputed === undefined ? undefined : nativeFormula(judgement, workbook, work, spelling);
  const differs = judgement.verdict === "differs" ? ` Mind: ${judgement.why}` : "";
  if (formula !== undefined) {
    const year = hostNeeded(`=${formula}`);
    const asks = year === undefined ? "" : `, of ${year} or later,`;
    const held = heldNumber(formula, judgement.formula);
    const follow = held
      ? `, for as many scores as there are now: ${held} in it was worked out from their number and the other arguments when the copy was made.`
      : " and follow their inputs.";
    const note = `The host's own functions${asks} give the same value${follow}${differs}`;
    return { judgement, becomes: "formula", stored: formula, note };
  }
  const { recomputed } = judgement;
  const refused = isCellError(recomputed as Cell)
    ? "The call gives no value, and its error stays where it was."
    : "The host has no functions for it: the value stays as it was stored and follows nothing.";
  if (judgement.cell.calculated) return { judgement, becomes: "value", note: `${refused}${differs}` };
  if (recomputed === undefined || Array.isArray(recomputed))
    return { judgement, becomes: "as it was", note: `Left as it was. ${judgement.why}` };
  const fresh = "The file held no value for it: this one was worked out when the copy was made, and follows nothing.";
  return { judgement, becomes: "value", value: recomputed, note: fresh };
}

/** The cell's formula with every call of ours put in the host's words, innermost first; undefined where one can't be, or where the value would change. */
function nativeFormula(
  { sheet, cell, recomputed }: Judgement,
  workbook: Workbook,
  work: SharedWork,
  spelling: Spelling,
): string | undefined {
  if (recomputed === undefined || Array.isArray(recomputed)) return undefined;
  const { row, column } = cell;
  const place = { workbook, sheet, row, column, work };
  let text = storedFormula(cell);
  for (let i = 0; i < MOST_CALLS_IN_A_CELL && mayCallOurs(text); i++) {
    const calls: OwnCall[] = [];
    evaluate(text, { ...place, single: !cell.array, calls });
    // A call inside a name of the workbook stands in another text.
    const innermost = calls.filter(({ source }) => source === text).sort((a, b) => length(a) - length(b))[0];
    const native = innermost && nativeCall(innermost);
    if (!native || !innermost.node.loc) return undefined;
    const [from, to] = innermost.node.loc;
    // The link to the add-in's file that some hosts put before the name.
    const before = text.slice(0, from).replace(/\[\d+\]!$/, "");
    const alone = before.replace(/[@=]/g, "") === "" && to === text.length;
    text = alone ? `=${native}` : `${before}(${native})${text.slice(to)}`;
  }
  if (mayCallOurs(text)) return undefined;
  const stored = `=${spelling(text)}`;
  if (stored.length > LONGEST_FORMULA) return undefined;
  const answer = evaluate(stored, place);
  if (!("value" in answer) || Array.isArray(answer.value)) return undefined;
  return compareStored([[recomputed]], [[answer.value]], 1e-9).same ? stored.slice(1) : undefined;
}

/** A number with many digits that nobody typed: a factor that belongs to the count of the scores. */
function heldNumber(formula: string, typed: string): string | undefined {
  return tokenize(`=${formula}`).find(
    ({ type, value }) => type === "number" && /\d\.\d{6,}/.test(value) && !typed.includes(value),
  )?.value;
}

function length({ node }: OwnCall): number {
  return node.loc ? node.loc[1] - node.loc[0] : Infinity;
}
