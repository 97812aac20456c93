import { describe, expect, test } from "vitest";
import { workings } from "../../src/workings/index";
import { callParts, caseFiles, readCases } from "../support/cases";
import { expectProven, nativeSheetOf, workedOutcome } from "../support/provenWorkings";

/*
 * Every derivation on every public case: its last rows are the function's value to the bit, and each formula without the add-in, put into an
 * engine that knows none of our functions, computes what the step says.
 */
const workedFiles = caseFiles.filter((file) =>
  readCases(file).cases.some(({ formula }) => callParts(formula).name in workings),
);

describe.each(workedFiles)("the workings of the cases in %s", (file) => {
  const { columns, cases } = readCases(file);
  const sheet = nativeSheetOf(columns);
  for (const one of cases.filter(({ formula }) => callParts(formula).name in workings)) {
    test(one.formula, () => {
      if (one.error === undefined) return void expectProven(one.formula, columns, sheet);
      expect(workedOutcome(one.formula, columns).outcome).toMatchObject({ error: one.error });
    });
  }
});
