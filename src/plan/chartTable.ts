import type { Shape } from "../core/sample/shape";
import type { Cell } from "../sheet/cell";
import { chartBins } from "./chartBins";
import { curveCells, densityFormula } from "./densityFormula";
import type { PlanCell, PlanName } from "./planModel";

/** One line of the picture: where its numbers stand in the table, columns and rows from 0, the name above the first. */
export interface PlanSeries {
  readonly name: string;
  readonly column: number;
  readonly first: number;
  readonly last: number;
  readonly look: "bars" | "curve" | "mark" | "safe" | "limit";
}

/** The numbers that a native chart is drawn from: bins and grid as constants, all else as formulas on the names of the plan. */
export interface ChartTable {
  readonly rows: readonly (readonly (PlanCell | undefined)[])[];
  readonly series: readonly PlanSeries[];
  readonly names: readonly PlanName[];
  readonly from: number;
  readonly to: number;
}

const HEAD = 3;
const GRID = 60;
/** Columns: three of bins, then pairs of x and y. */
const [LOW, HIGH, COUNT, BAR_X, CURVE_X, MARKS_X] = [0, 1, 2, 4, 7, 10] as const;
/** Where the parameters of the curve stand, in row 2. */
const PARAMETERS = [0, 3, 6] as const;
const MARKS = [
  ["plain cutoff", "weir_plain_cutoff", "mark"],
  ["safe cutoff", "weir_safe_cutoff", "safe"],
  ["lower limit", "weir_lower_limit", "limit"],
  ["upper limit", "weir_upper_limit", "limit"],
] as const;

/** The table of the chart for the scores as they stand when the plan is written; formulas speak of the plan and of columns further left. */
export function chartTable(sorted: Float64Array, shape: Shape, shapeText: string): ChartTable {
  const { edges, from, to, width } = chartBins(sorted, shape);
  const rows: (PlanCell | undefined)[][] = [];
  const put = (row: number, column: number, cell: PlanCell) => ((rows[row] ??= [])[column] = cell);
  const number = (row: number, column: number, value: Cell) => put(row, column, { value, role: "plain" });
  const formula = (row: number, column: number, text: string) => put(row, column, { formula: text, role: "plain" });
  const heading = (column: number, value: string) => put(HEAD - 1, column, { value, role: "heading" });

  put(0, 0, {
    value:
      "Numbers of the chart on the plan. Bins and grid are those of the day it was written: write the plan again after many more scores.",
    role: "plain",
  });
  const names = curveCells(shape).map(([name, label, text], index): PlanName => {
    const column = PARAMETERS[index]!;
    put(1, column, { value: label, role: "plain" });
    formula(1, column + 1, text);
    return { name, area: { top: 1, left: column + 1, bottom: 1, right: column + 1 }, input: false };
  });
  ["from", "below", "entries"].forEach((text, column) => heading(column, text));
  const bins = edges.length - 1;
  const last = HEAD + bins - 1;
  for (let bin = 0; bin < bins; bin++) {
    const row = HEAD + bin;
    const at = row + 1;
    number(row, LOW, edges[bin]!);
    number(row, HIGH, edges[bin + 1]!);
    formula(row, COUNT, `COUNTIFS(weir_scores,">="&A${at},weir_scores,"<"&B${at})`);
    // Up, along, down: the outline of a bar.
    [`A${at}`, `A${at}`, `B${at}`, `B${at}`].forEach((cell, i) => formula(HEAD + 4 * bin + i, BAR_X, cell));
    ["0", `C${at}`, `C${at}`, "0"].forEach((cell, i) => formula(HEAD + 4 * bin + i, BAR_X + 1, cell));
  }
  heading(BAR_X, "score");
  heading(BAR_X + 1, "entries");
  heading(CURVE_X, "score");
  heading(CURVE_X + 1, "fitted curve");
  for (let i = 0; i <= GRID; i++) {
    const row = HEAD + i;
    number(row, CURVE_X, from + ((to - from) * i) / GRID);
    formula(row, CURVE_X + 1, densityFormula(shape, shapeText, `H${row + 1}`, width));
  }
  MARKS.forEach(([name, defined], index) => {
    const [x, y] = [MARKS_X + 2 * index, MARKS_X + 2 * index + 1];
    heading(x, "score");
    heading(y, name);
    [0, 1].forEach((end) => formula(HEAD + end, x, defined));
    number(HEAD, y, 0);
    formula(HEAD + 1, y, `MAX(C${HEAD + 1}:C${last + 1})*1.1`);
  });
  const series: PlanSeries[] = [
    { name: "entries", column: BAR_X, first: HEAD, last: HEAD + 4 * bins - 1, look: "bars" },
    { name: "fitted curve", column: CURVE_X, first: HEAD, last: HEAD + GRID, look: "curve" },
    ...MARKS.map(([name, , look], index): PlanSeries => ({
      name,
      column: MARKS_X + 2 * index,
      first: HEAD,
      last: HEAD + 1,
      look,
    })),
  ];
  return { rows: Array.from(rows, (row) => Array.from(row ?? [])), series, names, from, to };
}
