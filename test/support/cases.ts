import { readFileSync, readdirSync } from "node:fs";
import { join } from "node:path";
import { expect, test } from "vitest";
import { callFunction, functionEntry } from "../../src/functions/call";
import type { Argument, BlankPolicy, Outcome } from "../../src/sheet/invoke";
import type { Cell } from "../../src/sheet/cell";

/*
 * The formula → value cases of test/reference/cases, made by an independent program (see the README there). This runner reads their
 * simple formulas (one call, plain arguments) itself, so that the functions are tested without the evaluator of formulas.
 */
export interface Case {
  readonly formula: string;
  readonly expected?: Cell | Cell[][];
  readonly tolerance?: number;
  readonly absolute?: number;
  readonly error?: string;
  readonly mentions?: readonly string[];
  readonly kind?: "simulation";
}
export interface CaseFile {
  readonly columns: readonly { heading: string; cells: readonly Cell[] }[];
  readonly cases: readonly Case[];
}

const folder = join(__dirname, "../reference/cases");
export const caseFiles = readdirSync(folder).filter((file) => file.endsWith(".json"));

export function readCases(file: string): CaseFile {
  return JSON.parse(readFileSync(join(folder, file), "utf8")) as CaseFile;
}

/** One test a case: those of `file` whose function is in `names` (all where left out). */
export function testCases(file: string, names?: readonly string[], blanks: BlankPolicy = "null"): void {
  const { columns, cases } = readCases(file);
  const chosen = cases.filter(({ formula }) => !names || names.includes(callParts(formula).name));
  expect(chosen.length, `cases of ${file}`).toBeGreaterThan(0);
  for (const one of chosen) {
    test(`${file}: ${one.formula}`, () => {
      const { name, args } = callParts(one.formula);
      expect(functionEntry(name), `the function ${name}`).toBeDefined();
      const given = args.map((text) => parseArgument(text, columns));
      while (given.length > 0 && given[given.length - 1] === undefined) given.pop();
      expectOutcome(callFunction(name, given, blanks)!, one);
    });
  }
}

export function expectOutcome(outcome: Outcome, one: Case): void {
  if (one.error !== undefined) {
    expect(outcome).toMatchObject({ error: one.error });
    const message = (outcome as { message: string }).message.toLowerCase();
    for (const mention of one.mentions ?? []) expect(message).toContain(mention.toLowerCase());
    return;
  }
  expect(outcome).not.toHaveProperty("error");
  const { value } = outcome as { value: Cell | Cell[][] };
  compare(value, one.expected!, one);
}

function compare(got: unknown, expected: unknown, one: Case): void {
  if (Array.isArray(expected)) {
    expect(Array.isArray(got) ? got.length : got).toBe(expected.length);
    expected.forEach((part, index) => compare((got as unknown[])[index], part, one));
  } else if (typeof expected === "number") {
    expect(typeof got).toBe("number");
    const allowed = one.kind === "simulation" ? one.absolute! : Math.max(one.tolerance! * Math.abs(expected), 1e-12);
    expect(Math.abs((got as number) - expected), `${String(got)} against ${expected}`).toBeLessThanOrEqual(allowed);
  } else expect(got).toBe(expected);
}

/** `=WEIR.NAME(a,b)` → its name and the texts of its arguments. Commas in quotes, braces or brackets don't part. */
export function callParts(formula: string): { name: string; args: string[] } {
  const [, name, inside] = /^=WEIR\.([A-Z0-9_]+)\((.*)\)$/.exec(formula)!;
  const args: string[] = [];
  let depth = 0;
  let quoted = false;
  let current = "";
  for (const c of inside!) {
    if (c === '"') quoted = !quoted;
    if (!quoted && (c === "(" || c === "{")) depth++;
    if (!quoted && (c === ")" || c === "}")) depth--;
    if (c === "," && !quoted && depth === 0) {
      args.push(current.trim());
      current = "";
    } else current += c;
  }
  if (inside !== "") args.push(current.trim());
  return { name: name!, args };
}

export function parseArgument(text: string, columns: CaseFile["columns"]): Argument {
  if (text === "") return undefined;
  if (text.startsWith('"')) return text.slice(1, -1).replace(/""/g, '"');
  if (/^(TRUE|FALSE)$/i.test(text)) return text.toUpperCase() === "TRUE";
  if (text.startsWith("{")) {
    const rows = text.slice(1, -1).split(";");
    return rows.map((row) => row.split(",").map((cell) => parseArgument(cell.trim(), columns) as Cell));
  }
  const reference = /^([A-Z]+)(\d+)(?::([A-Z]+)(\d+))?$/.exec(text);
  if (reference) {
    const [, left, top, right = left, bottom = top] = reference;
    const rows: Cell[][] = [];
    for (let row = Number(top); row <= Number(bottom); row++) {
      const cells: Cell[] = [];
      for (let column = columnIndex(left!); column <= columnIndex(right!); column++)
        cells.push(cellAt(columns, row, column));
      rows.push(cells);
    }
    return rows;
  }
  const number = text.endsWith("%") ? Number((Number(text.slice(0, -1)) / 100).toPrecision(15)) : Number(text);
  if (Number.isNaN(number)) throw new Error(`the runner can't read ${text}`);
  return number;
}

function columnIndex(letters: string): number {
  return [...letters].reduce((index, letter) => index * 26 + letter.charCodeAt(0) - 64, 0) - 1;
}

export function cellAt(columns: CaseFile["columns"], row: number, column: number): Cell {
  const cell = row === 1 ? columns[column]?.heading : columns[column]?.cells[row - 2];
  if (cell === undefined || cell === "") return null;
  return typeof cell === "string" && /^#(N\/A|VALUE!|REF!|DIV\/0!|NUM!|NAME\?|NULL!)$/.test(cell)
    ? { code: cell }
    : cell;
}
