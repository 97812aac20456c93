import { auditWorkbook } from "../audit/auditWorkbook";
import { storedFormula } from "../audit/formulaText";
import { endedSpills, planHandover, type Replacement } from "../audit/handover/planHandover";
import { NUMBERS_REVISION, RELEASE_NAME, RELEASE_VERSION } from "../core/release";
import type { CellPatch } from "../hosts/file/patchSheet";
import { UnusableFile } from "../hosts/file/unusableFile";
import { storedSpelling } from "../hosts/file/write/storedSpelling";
import { formatSheetName } from "../sheet/address";
import { isCellError, type Cell } from "../sheet/cell";
import { Sheet } from "../sheet/workbook";
import { Stop, type Command, type Io } from "./io";
import { parseWorkbook } from "./loadWorkbook";
import { printable } from "../report/plainText";
import { readArguments } from "./readArguments";
import { inOneLine } from "../report/auditReport";

const OPTIONS = { out: "string", json: "boolean", help: "boolean" } as const;
const TOLERANCE = 1e-9;

export const handover: Command = {
  name: "handover",
  usage: "handover FILE.xlsx -o OUT.xlsx [--json]",
  summary: "make a copy of a workbook that works without the add-in",
  help: `Every call of these functions is put in the host's own functions where they give the same value; else its value stays, with a note
on the cell. A sheet "Hand-over" lists what was replaced. All other parts of the file keep every byte.

  -o, --out OUT     the copy, another file than FILE
  --json            one object a line: {"sheet","cell","formula","becomes","now","note"}

Exit code: 0 the copy was written, 2 it could not be.`,
  run: runHandover,
};

async function runHandover(args: readonly string[], io: Io): Promise<number> {
  const { positionals, values } = readArguments("handover", args, OPTIONS);
  const [path, ...more] = positionals;
  const out = values["out"] as string | undefined;
  if (path === undefined || more.length > 0) throw new Stop(`handover takes one file: weirmark ${handover.usage}`);
  if (out === undefined) throw new Stop(`handover needs a name for the copy: weirmark ${handover.usage}`);
  if (out === path) throw new Stop("The copy must be another file than the original.");
  if (!/\.xlsx$/i.test(out)) throw new Stop(`The copy is a workbook: its name ends in .xlsx; ${out} was given.`);
  const bytes = await io.read(path);
  const workbook = await parseWorkbook(bytes, path);
  if (!/\.xlsx$/i.test(path)) throw new Stop(`Only an .xlsx file can be handed over; ${path} was given.`);
  const { judgements } = await auditWorkbook(workbook, { tolerance: TOLERANCE });
  const replacements = planHandover(judgements, workbook, storedSpelling);
  await io.write(out, await patched(bytes, path, replacements));
  io.out(values["json"] ? jsonLines(replacements) : plainLines(out, replacements));
  return 0;
}

async function patched(bytes: Uint8Array, path: string, replacements: readonly Replacement[]): Promise<Uint8Array> {
  const { patchXlsx } = await import("../hosts/file/patchXlsx");
  const cells = cellPatches(replacements);
  const notes = cellNotes(replacements);
  try {
    return patchXlsx(bytes, { cells, notes, endedSpill: endedSpills(replacements), sheet: listSheet(replacements) });
  } catch (failure) {
    // A part that the audit had no need to read may be refused when it is copied.
    if (failure instanceof UnusableFile) throw new Stop(`${path}: ${failure.message}`);
    throw failure;
  }
}

function bySheet<Entry>(
  replacements: readonly Replacement[],
  entry: (one: Replacement) => Entry | undefined,
): Map<string, Map<number, Entry>> {
  const sheets = new Map<string, Map<number, Entry>>();
  for (const one of replacements) {
    const { sheet, cell } = one.judgement;
    const made = entry(one);
    if (made === undefined) continue;
    const cells = sheets.get(sheet.name) ?? new Map<number, Entry>();
    sheets.set(sheet.name, cells.set(Sheet.key(cell.row, cell.column), made));
  }
  return sheets;
}

function cellPatches(replacements: readonly Replacement[]): Map<string, Map<number, CellPatch>> {
  return bySheet(replacements, ({ becomes, judgement, stored, value }) => {
    if (becomes !== "as it was")
      return { ...(stored !== undefined && { formula: stored }), ...(value !== undefined && { value }) };
    // The cell that its shared formula is written at may lose it.
    return judgement.cell.shift ? { formula: storedFormula(judgement.cell).slice(1), ordinary: true } : undefined;
  });
}

/** A value that follows nothing any more says so where it stands. */
function cellNotes(replacements: readonly Replacement[]): Map<string, Map<number, string>> {
  return bySheet(replacements, ({ becomes, judgement, note }) =>
    becomes === "value" ? `${judgement.formula}\n${note}` : undefined,
  );
}

const HEADINGS = ["sheet", "cell", "formula before", "what stands there now", "formula now", "value", "note"];
const WORDS = { formula: "the host's own formula", value: "its value", "as it was": "as it was" } as const;

function listSheet(replacements: readonly Replacement[]) {
  const rows: Cell[][] = replacements.map(({ judgement, becomes, typed, value, note }) => [
    judgement.sheet.name,
    judgement.address,
    judgement.formula,
    WORDS[becomes],
    typed ?? "",
    inOneLine(value ?? judgement.stored),
    note,
  ]);
  const by = `Made by ${RELEASE_NAME} ${RELEASE_VERSION}, revision ${NUMBERS_REVISION} of the numbers: this copy works without the add-in.`;
  return { name: "Hand-over", rows: [HEADINGS, ...rows, [], [by]], widths: [14, 9, 50, 22, 50, 18, 90] };
}

function jsonLines(replacements: readonly Replacement[]): string {
  return replacements
    .map(({ judgement: { sheet, address, formula, stored }, becomes, typed, value, note }) => {
      const held = inOneLine(value ?? stored);
      const now = becomes === "formula" ? typed : isCellError(held) ? held.code : held;
      return `${JSON.stringify({ sheet: sheet.name, cell: address, formula, becomes, now, note })}\n`;
    })
    .join("");
}

function plainLines(out: string, replacements: readonly Replacement[]): string {
  const count = (kind: Replacement["becomes"]) => replacements.filter(({ becomes }) => becomes === kind).length;
  const calls = `${replacements.length} call${replacements.length === 1 ? "" : "s"}`;
  const left = count("as it was");
  const summary = `${out}: of ${calls}, ${count("formula")} became formulas of the host, ${count("value")} values${left > 0 ? `, ${left} stayed as they were` : ""}.`;
  const lines = replacements.map(
    ({ judgement: { sheet, address, formula }, becomes, typed }) =>
      `${formatSheetName(sheet.name)}!${address}  ${formula}  →  ${becomes === "formula" ? typed! : WORDS[becomes]}`,
  );
  return `${[summary, ...lines].map(printable).join("\n")}\n`;
}
