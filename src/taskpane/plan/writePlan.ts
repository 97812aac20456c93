import type { HostChart, NamedCells, Port } from "../../hosts/port";
import { chartTable } from "../../plan/chartTable";
import { layPlan, type PlanFacts } from "../../plan/layPlan";
import type { PlanModel, PlanQuestion } from "../../plan/planModel";
import { SERIES_LOOKS } from "../../plan/seriesLooks";
import { formatAddress } from "../../sheet/address";
import { readShape } from "../../sheet/readShape";
import { findPlan, keepPlan, PLAN_SHEET } from "./findPlan";
import { cellsOf, pictureArea } from "./planCells";
import type { PlanOutcome } from "./planOutcome";
import { updatePlan } from "./updatePlan";

/** The names of a plan are taken by something else: nothing was written. */
export class NamesTaken extends Error {
  override readonly name = "NamesTaken";
  constructor(readonly names: readonly string[]) {
    super(names.join(", "));
  }
}

/** What the writing needs of the scores: to set up bins, and for the constants of the plan. */
export interface PlanScores extends PlanFacts {
  readonly sorted: Float64Array;
}

/**
 * Writes the plan on a sheet of its own, or brings the one that is there up to date. Cells are found by their names, so that rows which the
 * user put in don't matter; what the user added or changed is left alone.
 */
export async function writePlan(port: Port, question: PlanQuestion, scores: PlanScores): Promise<PlanOutcome> {
  const model = layPlan(question, scores);
  const there = await findPlan(port, model);
  if (there.kind === "taken") throw new NamesTaken(there.names);
  if (there.kind === "plan") return updatePlan(port, model, there);
  const sheet = await port.addSheet(PLAN_SHEET);
  const names = model.names.map(({ name, area }) => ({
    name,
    address: formatAddress({ ...area, sheet: area.sheet ?? sheet }),
  }));
  await port.dress(sheet, { ...model, cells: model.rows });
  // The names first: a formula written before would be refused, or take them for unknown.
  await port.defineNames(names);
  await port.write(
    formatAddress({ sheet, top: 0, left: 0, bottom: 0, right: 0 }),
    cellsOf(model.rows, model.widths.length),
  );
  await keepPlan(port, model, sheet);
  if (port.insertChart && model.picture) await drawChart(port, sheet, model.picture, question, scores.sorted);
  const { top, left, bottom, right } = pictureArea(model);
  const picture = port.insertChart ? undefined : formatAddress({ sheet, top, left, bottom, right });
  return { sheet, updated: false, left: [], picture };
}

/** The numbers of the chart on a sheet of their own, and the chart over its rows of the plan. */
async function drawChart(
  port: Port,
  plan: string,
  { top, bottom }: NonNullable<PlanModel["picture"]>,
  { shape, heading }: PlanQuestion,
  sorted: Float64Array,
): Promise<void> {
  const { rows, series, names, from, to } = chartTable(sorted, readShape(shape), shape);
  const sheet = await port.addSheet(`${PLAN_SHEET} chart`);
  const columns = Math.max(...rows.map((row) => row.length));
  await port.defineNames(
    names.map(({ name, area }): NamedCells => ({ name, address: formatAddress({ ...area, sheet }) })),
  );
  await port.write(formatAddress({ sheet, top: 0, left: 0, bottom: 0, right: 0 }), cellsOf(rows, columns));
  const at = (column: number, first: number, last: number) =>
    formatAddress({ sheet, top: first, left: column, bottom: last, right: column });
  const chart: HostChart = {
    title: `${heading}: entries, fitted curve and cutoffs`,
    xTitle: heading,
    yTitle: "entries",
    from,
    to,
    series: series.map(({ name, column, first, last, look }) => ({
      name,
      x: at(column, first, last),
      y: at(column + 1, first, last),
      ...SERIES_LOOKS[look],
    })),
  };
  await port.insertChart!(formatAddress({ sheet: plan, top, left: 0, bottom, right: 3 }), chart);
}
