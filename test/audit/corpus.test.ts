import { describe, test } from "vitest";
import { evaluate } from "../../src/audit/evaluate";
import { functionTable } from "../../src/functions/call";
import { isCellError } from "../../src/sheet/cell";
import type { Outcome } from "../../src/sheet/invoke";
import { caseWorkbook } from "../support/caseWorkbook";
import { callParts, caseFiles, expectOutcome, readCases } from "../support/cases";

/** The answer of the evaluator in the terms of the case runner: an error is a value to the one and an outcome to the other. */
function outcome(formula: string, columns: Parameters<typeof caseWorkbook>[0]): Outcome {
  const workbook = caseWorkbook(columns);
  const answer = evaluate(formula, { workbook, sheet: workbook.sheets[0]!, row: 0, column: 100 });
  if (!("value" in answer)) throw new Error(JSON.stringify(answer));
  const { value } = answer;
  return isCellError(value) ? { error: value.code, message: value.message ?? "" } : { value };
}

describe("the evaluator gives the values of the independent program (test/reference/cases/README.md)", () => {
  const inTable = new Set(functionTable.map(({ name }) => name));
  for (const file of caseFiles) {
    const { columns, cases } = readCases(file);
    for (const one of cases)
      if (inTable.has(callParts(one.formula).name))
        test(`${file}: ${one.formula}`, () => expectOutcome(outcome(one.formula, columns), one));
  }
});

describe("the evaluator gives the values that the help pages show", () => {
  for (const { examples } of functionTable)
    for (const { formula, value } of examples)
      test(formula, () =>
        expectOutcome(outcome(formula, []), { formula, expected: JSON.parse(value), tolerance: 1e-6 }),
      );
});
