import type { Point } from "../../plot/drawnLine";
import type { Cell } from "../../sheet/cell";
import type { Column } from "../column/readColumn";
import type { Call } from "../context";
import { refusalOf, type Refusal } from "../cutoff/answerCutoff";

export interface Drift {
  /** The scores after the first ones, each with its number in the column. */
  readonly scores: readonly Point[];
  readonly smoothed: readonly Point[];
  readonly lower: readonly Point[];
  readonly upper: readonly Point[];
  readonly flagged: readonly Point[];
  readonly mean: number;
  /** Number of the first score at which the course leaves its limits, and whether upwards; undefined where it never does. */
  readonly first: { readonly number: number; readonly up: boolean } | undefined;
  /** DRIFT_COMPARISON of the later scores with the first ones, by label. */
  readonly comparison: ReadonlyMap<string, Cell>;
}

/** How many scores are taken as the first ones unless the user says otherwise: half of them, at most 60. */
export function usualBaseline(count: number): number {
  return Math.max(2, Math.min(60, Math.floor(count / 2)));
}

/** Holds the later scores of a column, in the order of the sheet, against its first ones. */
export function answerDrift(call: Call, column: Column, baseline: number): Drift | Refusal {
  const rows = (values: Float64Array) => Array.from(values, (value) => [value]);
  const before = rows(column.values.subarray(0, baseline));
  const after = rows(column.values.subarray(baseline));
  const ask = (name: string, given: Parameters<Call>[1]) => {
    const outcome = call(name, given);
    return refusalOf(name, outcome) ?? (outcome as { value: Cell | Cell[][] }).value;
  };
  const mean = ask("SCORE_SUMMARY", [before, "mean"]);
  const sd = ask("SCORE_SUMMARY", [before, "standard deviation"]);
  if (typeof mean !== "number" || typeof sd !== "number") return asRefusal(mean) ?? asRefusal(sd)!;
  const flags = ask("DRIFT_FLAGS", [after, mean, sd]);
  if (!Array.isArray(flags)) return asRefusal(flags)!;
  const compared = ask("DRIFT_COMPARISON", [before, after]);
  const course = flags.slice(1) as [number, number, number, number, boolean][];
  const line = (at: 1 | 2 | 3): Point[] => course.map((row) => [baseline + row[0], row[at]]);
  const outside = course.filter((row) => row[4]);
  const [first] = outside;
  return {
    scores: after.map(([score], index) => [baseline + index + 1, score!]),
    smoothed: line(1),
    lower: line(2),
    upper: line(3),
    flagged: outside.map((row) => [baseline + row[0], row[1]]),
    mean,
    first: first && { number: baseline + first[0], up: first[1] > first[3] },
    comparison: new Map(Array.isArray(compared) ? (compared as [string, Cell][]) : []),
  };
}

function asRefusal(value: unknown): Refusal | undefined {
  return typeof value === "object" && value !== null && "message" in value ? (value as Refusal) : undefined;
}
