import { describe, expect, test } from "vitest";
import { formatAddress } from "../../src/sheet/address";
import { storedSpelling } from "../../src/hosts/file/write/storedSpelling";
import type { Cell } from "../../src/sheet/cell";
import { isBlank, isCellError } from "../../src/sheet/cell";
import { caseFiles, readCases, type CaseFile } from "../support/cases";
import { Lacking, officeFormula } from "../support/officeFormula";
import { workedOutcome, type WorkedRow } from "../support/provenWorkings";
import { recalculated, withoutOffice } from "../support/recalculated";
import { withSpaces } from "../support/spacedCases";
import { sheetRows, type CellXml } from "../support/auditBook";
import { xlsxFile } from "../support/xlsxFile";

/** The share of all formulas that LibreOffice 7.4 can compute; what it can't is counted by name and computed by IronCalc in test/workings. */
const LEAST_SHARE = 0.97;
const LARGEST_ERROR = 1e-9;
/** Formulas stand in the column CV, one below another. */
const COLUMN = 99;
const addressOf = (index: number) => formatAddress({ top: index, left: COLUMN, bottom: index, right: COLUMN });
const letters = "ABCDEFGHIJKLMNOPQRSTUVWXYZ";

interface Native {
  readonly formula: string;
  readonly value: Cell;
  readonly step: string;
}

/** Every formula of every step of the workings of the cases in a file, each once. */
function nativesOf({ columns, cases }: CaseFile): Native[] {
  const natives = new Map<string, Native>();
  for (const { formula, error } of cases) {
    if (error !== undefined) continue;
    const { outcome } = workedOutcome(formula, columns);
    const rows = (outcome as { value: Cell[][] }).value.slice(1) as unknown as WorkedRow[];
    for (const [, meaning, value, native] of rows)
      if (native !== "") natives.set(native, { formula: native, value, step: `${formula}: ${meaning}` });
  }
  return [...natives.values()];
}

function bookOf(columns: CaseFile["columns"], formulas: readonly string[]): Uint8Array {
  const cells: Record<string, Cell | CellXml> = {};
  columns.forEach(({ heading, cells: values }, column) =>
    [heading, ...values].forEach((cell, row) => {
      const error = typeof cell === "string" && /^#[A-Z/0]+[!?A]$/.test(cell);
      if (cell !== null && cell !== "") cells[`${letters[column]!}${row + 1}`] = error ? { v: { code: cell } } : cell;
    }),
  );
  formulas.forEach((formula, index) => {
    const place = addressOf(index);
    cells[place] = { f: storedSpelling(formula), formulaAttributes: ` t="array" ref="${place}"` };
  });
  return xlsxFile({ sheets: [{ name: "Sheet1", rows: sheetRows(cells) }] });
}

describe.skipIf(withoutOffice)("the workings of every public case, computed by LibreOffice", () => {
  const lacking = new Map<string, number>();
  const spaced = caseFiles.map((file) => ({ file: `${file}, spaces for blanks`, data: withSpaces(readCases(file)) }));
  const sources = [...caseFiles.map((file) => ({ file, data: readCases(file) })), ...spaced];
  const files = sources.map(({ file, data }, index) => {
    const able: (Native & { row: number })[] = [];
    const formulas: string[] = [];
    const cellFor = (formula: string) => addressOf(formulas.push(`=${formula}`) - 1);
    for (const native of nativesOf(data)) {
      try {
        const formula = officeFormula(native.formula, cellFor);
        able.push({ ...native, row: formulas.push(`=${formula}`) - 1 });
      } catch (failure) {
        if (!(failure instanceof Lacking)) throw failure;
        lacking.set(failure.message, (lacking.get(failure.message) ?? 0) + 1);
      }
    }
    return { file, name: `book${index}`, able, book: bookOf(data.columns, formulas) };
  });
  const books = withoutOffice ? {} : recalculated(Object.fromEntries(files.map(({ name, book }) => [name, book])));

  test.each(files)("$file: every formula that it can compute gives what its step says, to 1e-9", ({ name, able }) => {
    const sheet = books[name]!.sheets[0]!;
    const faults = able.flatMap(({ value, step, formula, row }) => {
      const got = sheet.cell(row, COLUMN);
      const same =
        typeof value === "number" && typeof got === "number"
          ? Math.abs(got - value) <= LARGEST_ERROR * Math.max(1, Math.abs(value))
          : // An array formula there may hold 1 and 0 for TRUE and FALSE.
            (typeof value === "boolean" ? Number(got) === Number(value) : got === value) ||
            (isBlank(got) && isBlank(value));
      return same
        ? []
        : [`${step} gives ${isCellError(got) ? got.code : String(got)}, not ${String(value)}: ${formula}`];
    });
    expect(faults).toEqual([]);
  });

  test("most of them are computed, and what it lacks is counted by name", () => {
    const computed = files.reduce((sum, { able }) => sum + able.length, 0);
    const left = [...lacking.values()].reduce((sum, count) => sum + count, 0);
    const names = [...lacking].sort(([, a], [, b]) => b - a).map(([name, count]) => `${name} ${count}`);
    console.log(`LibreOffice computed ${computed} of ${computed + left} formulas; it lacks ${names.join(", ")}.`);
    expect(computed / (computed + left)).toBeGreaterThan(LEAST_SHARE);
  });
});
