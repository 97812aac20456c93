import { describe, expect, test } from "vitest";
import { callFunction, functionEntry } from "../../src/functions/call";
import type { Cell } from "../../src/sheet/cell";
import { workings } from "../../src/workings/index";
import { callParts, caseFiles, parseArgument, readCases } from "../support/cases";
import { NativeSheet } from "../support/nativeSheet";

/*
 * Every derivation on every public case: its last rows are the function's value to the bit, and each formula without the add-in, put into an
 * engine that knows none of our functions, computes what the step says.
 */
const LARGEST_ERROR = 1e-9;
type Row = readonly [step: number, meaning: string, value: Cell, formula: string, source: string];

function workedRows(formula: string, columns: ReturnType<typeof readCases>["columns"]) {
  const { name, args } = callParts(formula);
  const given = args.map((text) => parseArgument(text, columns));
  while (given.length > 0 && given[given.length - 1] === undefined) given.pop();
  const invocation = { parameterTexts: [undefined, ...args] };
  return { name, given, outcome: callFunction("WORKINGS", [name, ...given], "null", invocation)! };
}

const workedFiles = caseFiles.filter((file) =>
  readCases(file).cases.some(({ formula }) => callParts(formula).name in workings),
);

describe.each(workedFiles)("the workings of the cases in %s", (file) => {
  const { columns, cases } = readCases(file);
  const sheet = new NativeSheet(columns.map(({ heading, cells }) => [heading, ...cells]));
  for (const one of cases.filter(({ formula }) => callParts(formula).name in workings)) {
    test(one.formula, () => {
      const { name, given, outcome } = workedRows(one.formula, columns);
      if (one.error !== undefined) return void expect(outcome).toMatchObject({ error: one.error });
      expect(outcome).not.toHaveProperty("error");
      const rows = (outcome as { value: Cell[][] }).value.slice(1) as unknown as Row[];
      expectEndsWithValue(rows, name, given);
      for (const [, meaning, value, formula, source] of rows) {
        expect(meaning).not.toBe("");
        expect(typeof source).toBe("string");
        if (formula !== "") expectSame(sheet.evaluate(formula), value, `${meaning}: ${formula}`);
      }
    });
  }
});

/** One value: the last row. A table of labels: one row a label at the end, in order. A headed or column-wise table: its cells, last. */
function expectEndsWithValue(
  rows: readonly Row[],
  name: string,
  given: readonly Parameters<typeof callFunction>[1][number][],
): void {
  const { value } = callFunction(name, given) as { value: Cell | Cell[][] };
  const values = rows.map((row) => row[2]);
  if (!Array.isArray(value)) return void expect(values[values.length - 1]).toBe(value);
  const labelled =
    value.every((row) => row.length === 2 && typeof row[0] === "string") &&
    functionEntry(name)!.parameters.some((one) => one.name === "item");
  if (labelled) {
    const last = rows.slice(-value.length).map((row) => [row[1], row[2]]);
    return void expect(last).toEqual(value);
  }
  const [headings, ...body] = value;
  const cells = body.flat();
  // Headed: every cell of the body, row by row; of a long table the first rows and the last cells.
  if (headings!.length > 1 && headings!.every(isText) && cells.some((cell) => !isText(cell))) {
    if (cells.length <= 200) return void expect(values.slice(-cells.length)).toEqual(cells);
    expect(values.slice(-headings!.length)).toEqual(body[body.length - 1]);
    return void expect(values.join()).toContain(cells.slice(0, 90).join());
  }
  // Column-wise: the first cell that holds something.
  expect(value.flat()).toContainEqual(values[values.length - 1]);
}

function isText(cell: Cell): boolean {
  return typeof cell === "string" && cell !== "";
}

function expectSame(got: Cell, expected: Cell, what: string): void {
  if (typeof expected !== "number") return void expect(got, what).toEqual(expected);
  expect(typeof got, `${what} gives ${JSON.stringify(got)}`).toBe("number");
  expect(
    Math.abs((got as number) - expected),
    `${what} gives ${String(got)} instead of ${expected}`,
  ).toBeLessThanOrEqual(LARGEST_ERROR * Math.max(1, Math.abs(expected)));
}
