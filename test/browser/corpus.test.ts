import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { callFunction, functionEntry, functionTable } from "../../src/functions/call";
import { columnLetters } from "../../src/sheet/address";
import { isBlank, type Cell } from "../../src/sheet/cell";
import type { Outcome } from "../../src/sheet/invoke";
import { callParts, caseFiles, cellAt, parseArgument, readCases, type CaseFile } from "../support/cases";
import { withoutBrowser } from "./browser";
import { startTrial, type TrialBrowser, type TrialPage } from "./trialPage";

/*
 * The call without a sheet is made twice. In the page, so that every bit must agree: the sheet adds and loses nothing. And here in Node,
 * where they may differ in the last places: Math.exp and its kin are free to round either way, and the two engines do.
 */
const ENGINES_DIFFER = 1e-9;

function asRows(outcome: Outcome): Cell[][] {
  if ("error" in outcome) return [[{ code: outcome.error, message: outcome.message }]];
  return Array.isArray(outcome.value) ? outcome.value : [[outcome.value]];
}

/** A blank is null in one place and "" in another. */
function comparable(rows: readonly (readonly Cell[])[]): Cell[][] {
  return rows.map((row) => row.map((cell) => (isBlank(cell) ? null : cell)));
}

function expectClose(got: Cell[][], expected: Cell[][], formula: string): void {
  const close = (cell: Cell, other: Cell): boolean =>
    typeof cell === "number" && typeof other === "number"
      ? Math.abs(cell - other) <= ENGINES_DIFFER * Math.max(Math.abs(other), 1e-3)
      : JSON.stringify(cell) === JSON.stringify(other);
  const agree =
    got.length === expected.length && got.every((row, i) => row.every((cell, j) => close(cell, expected[i]![j])));
  if (!agree) expect(got, `${formula} in the browser and in Node`).toEqual(expected);
}

/** Puts each formula where its table finds room, waits, and compares what stands there with the calls without a sheet. */
async function compareAll(sheet: TrialPage, name: string, formulas: readonly string[], columns: CaseFile["columns"]) {
  await sheet.addSheet(name);
  const height = Math.max(0, ...columns.map(({ cells }) => cells.length)) + 1;
  const data = Array.from({ length: height }, (_, row) => columns.map((_, column) => cellAt(columns, row + 1, column)));
  if (columns.length > 0) await sheet.write(`${name}!A1`, data);
  const calls = formulas.map((formula) => {
    const { name: called, args } = callParts(formula);
    const given = args.map((text) => parseArgument(text, columns));
    while (given.length > 0 && given[given.length - 1] === undefined) given.pop();
    return { name: called, given };
  });
  const outcomes = (await sheet.call(calls)).map(asRows);
  const typed: Cell[][] = [];
  const tops = outcomes.map((rows, index) => {
    const top = typed.length;
    typed.push([formulas[index]], ...Array.from({ length: rows.length }, () => [null]));
    return top;
  });
  const left = columns.length + 1;
  const right = left + Math.max(...outcomes.map((rows) => rows[0]!.length)) - 1;
  // Also beside the formulas, so that the sheet is wide enough for every table.
  typed[0]!.push(...Array<null>(right - left).fill(null));
  await sheet.write(`${name}!${columnLetters(left)}1`, typed);
  const { values } = await sheet.read(`${name}!${columnLetters(left)}1:${columnLetters(right)}${typed.length}`);
  outcomes.forEach((rows, index) => {
    const formula = formulas[index]!;
    const top = tops[index]!;
    const stands = values.slice(top, top + rows.length).map((row) => row.slice(0, rows[0]!.length));
    expect(comparable(stands), formula).toEqual(comparable(rows));
    const { name: called, given } = calls[index]!;
    expectClose(comparable(stands), comparable(asRows(callFunction(called, given)!)), formula);
  });
}

describe.skipIf(withoutBrowser)("in the trial sheet every formula gives what the call without a sheet gives", () => {
  let trial: TrialBrowser;
  let sheet: TrialPage;
  beforeAll(async () => {
    trial = await startTrial();
    sheet = await trial.open();
  });
  afterAll(() => trial?.close());

  test("the examples of the table of functions", async () => {
    const examples = functionTable.flatMap((entry) => entry.examples.map(({ formula }) => formula));
    await compareAll(sheet, "examples", examples, []);
  });

  for (const file of caseFiles)
    test(`the cases of ${file}`, async () => {
      const { columns, cases } = readCases(file);
      const formulas = cases.map(({ formula }) => formula).filter((formula) => functionEntry(callParts(formula).name));
      if (formulas.length > 0) await compareAll(sheet, file.replace(/\W/g, ""), formulas, columns);
    });
});
