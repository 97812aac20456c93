import { describe, expect, test } from "vitest";
import { run } from "../../src/cli/run";
import { functionTable } from "../../src/functions/call";
import type { Cell } from "../../src/sheet/cell";
import { callParts, caseFiles, expectOutcome, readCases, type CaseFile } from "../support/cases";

/** The columns of a case file as delimited text, headings in row 1. */
function delimited({ columns }: CaseFile, separator: string, decimal: string): string {
  const rows = Math.max(...columns.map(({ cells }) => cells.length)) + 1;
  const field = (cell: Cell): string => {
    if (cell === null || cell === undefined) return "";
    if (typeof cell === "number") return String(cell).replace(".", decimal);
    if (typeof cell === "boolean") return cell ? "TRUE" : "FALSE";
    return /[",;\n]/.test(String(cell)) ? `"${String(cell).replace(/"/g, '""')}"` : String(cell);
  };
  const line = (row: number) =>
    columns.map(({ heading, cells }) => field(row === 0 ? heading : cells[row - 1])).join(separator);
  return Array.from({ length: rows }, (_, row) => line(row)).join("\r\n");
}

async function calculated(text: string, formulas: readonly string[]): Promise<Record<string, unknown>[]> {
  let out = "";
  const code = await run(["calc", "data.csv", "--formulas", "list.txt", "--json"], {
    out: (piece) => (out += piece),
    err: (piece) => expect.fail(piece),
    read: async (path) => new TextEncoder().encode(path === "data.csv" ? text : formulas.join("\n")),
    write: async () => expect.fail("calc writes no file"),
  });
  expect(code).toBe(0);
  return out
    .trimEnd()
    .split("\n")
    .map((line) => JSON.parse(line));
}

describe.each([
  ["commas and decimal points", ",", "."],
  ["semicolons and decimal commas", ";", ","],
  ["tabs and decimal points", "\t", "."],
])("the worked values come out of weirmark calc, from %s", (_, separator, decimal) => {
  test.each(caseFiles)("%s", async (file) => {
    const cases = readCases(file);
    const lines = await calculated(
      delimited(cases, separator, decimal),
      cases.cases.map(({ formula }) => formula),
    );
    expect(lines).toHaveLength(cases.cases.length);
    cases.cases.forEach((one, index) => {
      const { formula, error, message, value } = lines[index]!;
      expect(formula).toBe(one.formula);
      expectOutcome(
        error === undefined ? { value: value as Cell } : { error: error as string, message: message as string },
        one,
      );
    });
  });
});

test("every function of the worked values is in the table", () => {
  const table = new Set(functionTable.map(({ name }) => name));
  const asked = caseFiles.flatMap((file) => readCases(file).cases.map(({ formula }) => callParts(formula).name));
  expect(asked.filter((name) => !table.has(name))).toEqual([]);
});
