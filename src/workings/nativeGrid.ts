import type { Grid } from "../sheet/readGrid";
import type { WorkingsCall } from "./workingsCall";

/** The first row of `values` that holds numbers, with its place, its numbers and its address. */
export interface FirstEntry {
  readonly row: number;
  readonly values: Float64Array;
  readonly text: string;
}

export function firstEntry(call: WorkingsCall, grid: Grid, argument = "values"): FirstEntry | undefined {
  const row = grid.filled.findIndex((count) => count > 0);
  if (row < 0) return undefined;
  const values = grid.values.subarray(row * grid.columns, (row + 1) * grid.columns);
  return { row, values, text: call.partText(argument, row, 0, row, grid.columns - 1) };
}

/** One number a criterion as a row, however it was written. */
export function acrossNative(call: WorkingsCall, argument: string): string {
  return call.range(argument).length > 1 ? `TRANSPOSE(${call.text(argument)})` : call.text(argument);
}

/** The same as a column. */
export function downNative(call: WorkingsCall, argument: string): string {
  return (call.range(argument)[0]?.length ?? 0) > 1 ? `TRANSPOSE(${call.text(argument)})` : call.text(argument);
}

/** The weighted mean of one entry, a row. */
export function weightedMeanNative(call: WorkingsCall, entry: string): string {
  return `SUM(${entry}*${acrossNative(call, "weights")})/SUM(${call.text("weights")})`;
}
