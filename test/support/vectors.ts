import { readFileSync } from "node:fs";
import { join } from "node:path";
import { relativeError } from "./relativeError";

/** A point of a reference file: `value` holds all digits, `Number(value)` is the nearest double. */
export interface VectorRow {
  readonly fn: string;
  readonly args: readonly number[];
  readonly value: string;
}

export interface Worst {
  readonly error: number;
  readonly args: readonly number[];
  readonly got: number;
  readonly expected: string;
}

/** The smallest normal double; below it a value has lost digits of its own. */
const SMALLEST_NORMAL = 2 ** -1022;

export function readVectors(path: string): VectorRow[] {
  return JSON.parse(readFileSync(join(__dirname, "../reference", path), "utf8")) as VectorRow[];
}

/** The row at which `f` is farthest from the expected value, by relative error; rows below 2.2e-308 are left out. */
export function worstRow(rows: readonly VectorRow[], f: (...args: number[]) => number): Worst {
  let worst: Worst = { error: -1, args: [], got: NaN, expected: "" };
  for (const { args, value } of rows) {
    const expected = Number(value);
    if (Math.abs(expected) < SMALLEST_NORMAL) continue;
    const got = f(...args);
    const error = relativeError(got, expected);
    if (error > worst.error) worst = { error, args, got, expected: value };
  }
  return worst;
}
