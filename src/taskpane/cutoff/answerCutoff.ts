import type { Cell } from "../../sheet/cell";
import type { Outcome } from "../../sheet/invoke";
import { gridMark, scoreDecimals, type GridMark } from "../../sheet/scoreGrid";
import type { Column } from "../column/readColumn";
import type { Call } from "../context";
import type { CutoffQuestion } from "./question";

export interface Refusal {
  readonly error: string;
  readonly message: string;
  /** The function that refused. */
  readonly name: string;
}

/** The cutoff as the cells would show it, read from the report by its labels. */
export interface CutoffAnswer {
  readonly column: Column;
  readonly question: CutoffQuestion;
  readonly refusal?: Refusal;
  readonly report?: CutoffFigures;
  /** The report row by row, for the table. */
  readonly rows: readonly (readonly [label: string, value: Cell])[];
}

export interface CutoffFigures {
  readonly count: number;
  readonly cutoff: number;
  readonly lower: number;
  readonly upper: number;
  readonly safe: number;
  readonly next: number | undefined;
  readonly passing: number;
  readonly lowestPassing: number;
  readonly highestPassing: number;
  readonly looksHalf: number | undefined;
  readonly looksMost: number | undefined;
  readonly fitP: number | undefined;
  /** The cutoff by rank, which assumes no curve: asked for only where the shape fits badly. */
  readonly rank: RankCutoff | undefined;
  /** The first score on the grid of the scores that clears the cutoff. */
  readonly spoken: GridMark;
  readonly decimals: number | undefined;
  readonly spread: number;
}

export interface RankCutoff {
  readonly cutoff: number;
  /** "none" where the sample is too small for a limit on that side. */
  readonly lower: Cell;
  readonly upper: Cell;
}

/** Below this p-value the shape is said not to fit; 5 % is common practice, no source. */
const POOR_FIT = 0.05;

/** Asks the cell functions for the cutoff of a column. */
export function answerCutoff(call: Call, column: Column, question: CutoffQuestion): CutoffAnswer {
  const { fraction, confidence, better, shape } = question;
  const outcome = call("CUTOFF_REPORT", [column.cells, fraction, confidence, shape, better]);
  const refusal = refusalOf("CUTOFF_REPORT", outcome);
  if (refusal) return { column, question, refusal, rows: [] };
  const rows = (outcome as { value: [string, Cell][] }).value;
  const value = new Map(rows);
  const numberAt = (label: string) => {
    const cell = value.get(label);
    return typeof cell === "number" ? cell : undefined;
  };
  const spread = column.sorted[column.count - 1]! - column.sorted[0]!;
  const decimals = scoreDecimals(column.values);
  const next = call("NEXT_SCORE_CUTOFF", [column.cells, fraction, shape, better]);
  const cutoff = numberAt("cutoff")!;
  const fitP = numberAt("Anderson-Darling p-value");
  return {
    column,
    question,
    rows,
    report: {
      count: numberAt("scores used") ?? column.count,
      cutoff,
      lower: numberAt("lower limit")!,
      upper: numberAt("upper limit")!,
      safe: numberAt("safe cutoff")!,
      next: next && "value" in next && typeof next.value === "number" ? next.value : undefined,
      passing: numberAt("passing now")!,
      lowestPassing: numberAt("lowest passing fraction")!,
      highestPassing: numberAt("highest passing fraction")!,
      looksHalf: numberAt("looks for a 50% chance"),
      looksMost: numberAt("looks for a 90% chance"),
      fitP,
      rank: fitP !== undefined && fitP < POOR_FIT ? rankCutoff(call, column, question) : undefined,
      spoken: gridMark(cutoff, better, decimals, spread),
      decimals,
      spread,
    },
  };
}

function rankCutoff(
  call: Call,
  column: Column,
  { fraction, confidence, better }: CutoffQuestion,
): RankCutoff | undefined {
  const outcome = call("RANK_CUTOFF", [column.cells, fraction, confidence, better]);
  if (!outcome || "error" in outcome) return undefined;
  const value = new Map(outcome.value as [string, Cell][]);
  const cutoff = value.get("cutoff");
  if (typeof cutoff !== "number") return undefined;
  return { cutoff, lower: value.get("lower limit"), upper: value.get("upper limit") };
}

/** Why a call gave no value, or undefined where it gave one. */
export function refusalOf(name: string, outcome: Outcome | undefined): Refusal | undefined {
  if (!outcome) return { name, error: "#NAME?", message: "" };
  return "error" in outcome ? { name, error: outcome.error, message: outcome.message } : undefined;
}
