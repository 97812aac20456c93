import { describe, expect, test } from "vitest";
import { functionTable } from "../../src/functions/call";
import { workings } from "../../src/workings/index";
import { caseFiles, readCases } from "../support/cases";
import { expectProven, nativeSheetOf, workedOutcome } from "../support/provenWorkings";

/*
 * Every derivation on every public case: its last rows are the function's value to the bit, and each formula without the add-in, put into an
 * engine that knows none of our functions, computes what the step says.
 */
describe("the workings", () => {
  test("stand for every function but WORKINGS itself and BLANK_CHECK, which only reports on the host", () => {
    const without = functionTable.map(({ name }) => name).filter((name) => !(name in workings));
    expect(without.sort()).toEqual(["BLANK_CHECK", "WORKINGS"]);
  });
});

describe.each(caseFiles)("the workings of the cases in %s", (file) => {
  const { columns, cases } = readCases(file);
  const sheet = nativeSheetOf(columns);
  for (const one of cases) {
    test(one.formula, () => {
      if (one.error === undefined) return void expectProven(one.formula, columns, sheet);
      expect(workedOutcome(one.formula, columns).outcome).toMatchObject({ error: one.error });
    });
  }
});
