import { callFunction } from "../../functions/call";
import type { BookToWrite, CellToWrite, PrintSetup, SheetToWrite } from "../../hosts/file/write/book";
import type { ChartToWrite, SeriesToWrite } from "../../hosts/file/write/chart";
import { chartTable, type ChartTable, type PlanSeries } from "../../plan/chartTable";
import { layPlan } from "../../plan/layPlan";
import type { PlanName, PlanQuestion } from "../../plan/planModel";
import { SERIES_LOOKS } from "../../plan/seriesLooks";
import { absoluteAddress, formatAddress } from "../../sheet/address";
import { isCellError, type Cell } from "../../sheet/cell";
import { gridMark, scoreDecimals } from "../../sheet/scoreGrid";
import { readShape } from "../../sheet/readShape";
import { Sheet, type DefinedName, type Workbook } from "../../sheet/workbook";
import { Stop } from "../io";
import { calculateCells, numberAt, type Failed } from "./calculateCells";
import type { PlanColumn } from "./readPlanColumn";

const ONE_WIDE: PrintSetup = {
  paper: "A4",
  orientation: "landscape",
  pagesWide: 1,
  footer: { left: "&F, &A", right: "page &P of &N" },
};

export interface PlannedBook {
  readonly book: BookToWrite;
  /** The plan as it was calculated, and which of its cells hold an error. */
  readonly plan: Sheet;
  readonly failed: readonly Failed[];
}

/** The workbook of a plan: the plan in front, the scores with all their columns, and the numbers of the chart. */
export function planBook(
  source: Sheet,
  column: PlanColumn,
  asked: Omit<PlanQuestion, "scores" | "heading">,
): PlannedBook {
  const scores = copyOf(source);
  const names = freeNames(scores.name);
  const plan = new Sheet(names.plan);
  const chart = new Sheet(names.chart);
  const question: PlanQuestion = {
    ...asked,
    scores: formatAddress({ ...column.area, sheet: scores.name }),
    heading: column.heading,
  };
  const range = scores.range(column.area);
  const outcome = callFunction("TOP_FRACTION_CUTOFF", [range, asked.fraction, asked.shape, asked.better])!;
  // A shape that can't hold these scores makes a plan full of errors: better none.
  if ("error" in outcome && outcome.error === "#VALUE!") throw new Stop(outcome.message);
  const cutoff = "value" in outcome && typeof outcome.value === "number" ? outcome.value : undefined;
  const { sorted } = column;
  const spread = sorted[sorted.length - 1]! - sorted[0]!;
  const mark = cutoff === undefined ? undefined : gridMark(cutoff, asked.better, scoreDecimals(sorted), spread).mark;
  const model = layPlan(question, { count: sorted.length, mark });
  const table = chartTable(column.sorted, readShape(asked.shape), asked.shape);
  const named = [...namesOn(plan.name, model.names), ...namesOn(chart.name, table.names)];
  const workbook: Workbook = { sheets: [plan, scores, chart], names: named, tables: [], date1904: false };
  const planned = calculateCells(workbook, plan, model.rows, "by rows");
  const drawn = calculateCells(workbook, chart, table.rows, "by columns");
  const page: SheetToWrite = {
    name: plan.name,
    rows: asRows(planned.cells),
    widths: model.widths,
    heights: model.heights,
    merged: model.merged,
    choices: model.choices.map((one) => ({ ...one, strict: true })),
    gridLines: false,
    print: {
      paper: "A4",
      orientation: "portrait",
      pagesWide: 1,
      area: { top: 0, left: 0, bottom: model.rows.length - 1, right: model.widths.length - 1 },
      titleRows: [0, 0],
      breaksBefore: model.breaksBefore,
      footer: { left: "&F, &A", right: "page &P of &N" },
    },
    charts: model.picture ? [planChart(table, chart, column.heading, model.picture)] : [],
  };
  const sheets: SheetToWrite[] = [
    page,
    {
      name: scores.name,
      rows: scoreRows(scores, column.headingRow),
      frozenRows: column.headingRow + 1,
      print: ONE_WIDE,
    },
    { name: chart.name, rows: asRows(drawn.cells), frozenRows: 3, print: ONE_WIDE },
  ];
  const title = `Plan for a pass mark on “${column.heading}”`;
  return { book: { sheets, names: named, title }, plan, failed: planned.failed };
}

/** Values alone: what the other file calculated stays what it was. */
function copyOf(source: Sheet): Sheet {
  const copy = new Sheet(sheetName(source.name));
  for (let row = 0; row <= source.lastRow; row++)
    for (let column = 0; column <= source.lastColumn; column++) {
      const cell = source.cell(row, column);
      if (cell !== null && cell !== undefined) copy.set(row, column, cell);
    }
  return copy;
}

/** A name that every host takes: up to 31 letters, none of those that addresses are made of, no apostrophe at the ends. */
function sheetName(name: string): string {
  const plain = name
    .replace(/[[\]:*?/\\]/g, " ")
    .slice(0, 31)
    .replace(/^[\s']+|[\s']+$/g, "");
  return plain === "" || plain.toLowerCase() === "history" ? "Scores" : plain;
}

function freeNames(taken: string): { plan: string; chart: string } {
  const free = (name: string) => (name.toLowerCase() === taken.toLowerCase() ? `${name} 2` : name);
  return { plan: free("Plan"), chart: free("Plan chart") };
}

function namesOn(sheet: string, names: readonly PlanName[]): DefinedName[] {
  return names.map(({ name, area }) => ({ name, formula: absoluteAddress({ ...area, sheet: area.sheet ?? sheet }) }));
}

function asRows(cells: readonly (readonly (CellToWrite | undefined)[])[]): (readonly (Cell | CellToWrite)[])[] {
  return cells.map((row) => Array.from(row, (cell) => cell ?? null));
}

function scoreRows(sheet: Sheet, headingRow: number): (Cell | CellToWrite)[][] {
  return Array.from({ length: sheet.lastRow + 1 }, (_, row) =>
    Array.from({ length: sheet.lastColumn + 1 }, (_unused, column): Cell | CellToWrite => {
      const value = sheet.cell(row, column);
      if (row === headingRow && !isCellError(value)) return { value, role: "heading" };
      return typeof value === "string" && /^[=+\-@\t\r]/.test(value) ? { value, role: "text" } : value;
    }),
  );
}

function planChart(
  table: ChartTable,
  sheet: Sheet,
  heading: string,
  place: { top: number; bottom: number },
): ChartToWrite {
  const series = table.series.map((one) => seriesOf(one, sheet));
  return {
    title: `${heading}: entries, fitted curve and cutoffs`,
    xTitle: heading,
    yTitle: "entries",
    xFrom: table.from,
    xTo: table.to,
    series,
    from: { row: place.top, column: 0 },
    to: { row: place.bottom + 1, column: 4 },
    description:
      "How many entries have which score, the fitted curve over them, and where the plain and the safe cutoff stand with the limits of the true mark.",
  };
}

function seriesOf({ name, column, first, last, look }: PlanSeries, sheet: Sheet): SeriesToWrite {
  const at = (c: number, top: number, bottom: number) =>
    absoluteAddress({ sheet: sheet.name, top, left: c, bottom, right: c });
  const numbers = (c: number) => Array.from({ length: last - first + 1 }, (_, i) => numberAt(sheet, first + i, c));
  return {
    name,
    nameAt: at(column + 1, first - 1, first - 1),
    xAt: at(column, first, last),
    yAt: at(column + 1, first, last),
    x: numbers(column),
    y: numbers(column + 1),
    ...SERIES_LOOKS[look],
  };
}
