import { describe, expect, test } from "vitest";
import { callFunction, functionTable, implementations } from "../../src/functions/call";
import { functionTable as generate } from "../../scripts/functionTable.mjs";
import { callParts, expectOutcome, parseArgument } from "../support/cases";

describe("the table of functions", () => {
  test("functions.json is what the JSDoc above the functions says (node scripts/functionTable.mjs writes it)", () => {
    expect(functionTable).toEqual(generate());
  });

  test("names the same functions as the code", () => {
    expect(functionTable.map((entry) => entry.name).sort()).toEqual(Object.keys(implementations).sort());
  });
});

describe("every example gives the value that its help page shows", () => {
  for (const entry of functionTable)
    for (const { formula, value } of entry.examples)
      test(formula, () => {
        const { name, args } = callParts(formula);
        expect(name).toBe(entry.name);
        const given = args.map((text) => parseArgument(text, []));
        while (given.length > 0 && given[given.length - 1] === undefined) given.pop();
        expectOutcome(callFunction(name, given)!, { formula, expected: JSON.parse(value), tolerance: 1e-6 });
      });
});
