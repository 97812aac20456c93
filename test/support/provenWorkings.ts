import { expect } from "vitest";
import { callFunction, functionEntry } from "../../src/functions/call";
import type { Outcome } from "../../src/sheet/invoke";
import type { Cell } from "../../src/sheet/cell";
import { callParts, parseArgument, type CaseFile } from "./cases";
import { NativeSheet } from "./nativeSheet";

const LARGEST_ERROR = 1e-9;
/** What Excel takes as the length of a formula. */
const LONGEST_FORMULA = 8192;
export type WorkedRow = readonly [step: number, meaning: string, value: Cell, formula: string, source: string];
type Given = Parameters<typeof callFunction>[1][number][];

/** The sheet of an engine that knows none of our functions, with these columns in it. */
export function nativeSheetOf(columns: CaseFile["columns"]): NativeSheet {
  return new NativeSheet(columns.map(({ heading, cells }) => [heading, ...cells]));
}

/** `=WEIR.NAME(…)` as WORKINGS answers to it. */
export function workedOutcome(
  formula: string,
  columns: CaseFile["columns"],
): { name: string; given: Given; outcome: Outcome } {
  const { name, args } = callParts(formula);
  const given = args.map((text) => parseArgument(text, columns));
  while (given.length > 0 && given[given.length - 1] === undefined) given.pop();
  const invocation = { parameterTexts: [undefined, ...args] };
  return { name, given, outcome: callFunction("WORKINGS", [name, ...given], "null", invocation)! };
}

/**
 * Fails unless the workings of a call end with its value to the bit, and every formula without the add-in, put into `sheet`, computes what its step
 * says. Returns the steps.
 */
export function expectProven(formula: string, columns: CaseFile["columns"], sheet: NativeSheet): readonly WorkedRow[] {
  const { name, given, outcome } = workedOutcome(formula, columns);
  expect(outcome).not.toHaveProperty("error");
  const rows = (outcome as { value: Cell[][] }).value.slice(1) as unknown as WorkedRow[];
  expectEndsWithValue(rows, name, given);
  for (const [, meaning, value, native, source] of rows) {
    expect(meaning).not.toBe("");
    expect(typeof source).toBe("string");
    expect(native.length, meaning).toBeLessThanOrEqual(LONGEST_FORMULA);
    if (native !== "") expectSame(sheet.evaluate(native), value, `${meaning}: ${native}`);
  }
  return rows;
}

/** One value: the last row. A table of labels: one row a label at the end, in order. A headed or column-wise table: its cells, last. */
function expectEndsWithValue(rows: readonly WorkedRow[], name: string, given: Given): void {
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
