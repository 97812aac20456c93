import { describe, expect, test } from "vitest";
import { callFunction } from "../../src/functions/call";
import type { Cell } from "../../src/sheet/cell";
import { callParts, caseFiles, readCases } from "../support/cases";
import { expectProven, nativeSheetOf, workedOutcome } from "../support/provenWorkings";
import { withSpaces } from "../support/spacedCases";

const files = caseFiles
  .map((file) => ({ file, ...withSpaces(readCases(file)) }))
  .filter(({ cases }) => cases.length > 0);

describe.each(files)("the cases in $file that meet a cell of spaces", ({ file, columns, cases }) => {
  const sheet = nativeSheetOf(columns);
  test.each(cases)("$formula: every formula gives the same as on a blank cell", ({ formula }) => {
    const blank = workedOutcome(formula, readCases(file).columns).outcome;
    expect(workedOutcome(formula, columns).outcome).toEqual(blank);
    expectProven(formula, columns, sheet);
  });
});

test("enough functions meet such a cell", () => {
  const names = new Set(files.flatMap(({ cases }) => cases.map(({ formula }) => callParts(formula).name)));
  expect(names.size).toBeGreaterThanOrEqual(20);
});

test.each<[string, Cell]>([
  ["a text", "absent"],
  ["TRUE", true],
  ["an error", { code: "#N/A" }],
])("%s among the scores is refused, so that no formula stands for it", (_, cell) => {
  const scores = [[60], [cell], [70], [75]];
  expect(callFunction("WORKINGS", ["TOP_FRACTION_CUTOFF", scores, 0.1])).toMatchObject({ error: "#VALUE!" });
});
