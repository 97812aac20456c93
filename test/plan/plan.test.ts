import { describe, expect, test } from "vitest";
import { functionEntry } from "../../src/functions/call";
import { chartTable } from "../../src/plan/chartTable";
import { layPlan } from "../../src/plan/layPlan";
import type { PlanCell, PlanQuestion } from "../../src/plan/planModel";
import { usualStages } from "../../src/plan/sections/usualStages";

const QUESTION: PlanQuestion = {
  scores: "Bids!C2:C61",
  heading: "score",
  fraction: 0.05,
  confidence: 0.95,
  better: "high",
  shape: "normal",
  day: "2025-03-14",
};
const model = layPlan(QUESTION, { count: 60, mark: 77.6 });
const formulas = model.rows.flatMap((row, at) =>
  row.flatMap((cell, column) => (cell?.formula === undefined ? [] : [{ at, column, formula: cell.formula }])),
);

describe("the plan", () => {
  test("names every input and result once, by a name that no host takes for a cell or a function", () => {
    const names = model.names.map(({ name }) => name);
    expect(new Set(names).size).toBe(names.length);
    // ECMA-376 Part 1, 18.2.5: a letter or underscore first; then letters, digits, points, underscores; not like an address.
    for (const name of names) expect(name).toMatch(/^weir_[a-z_]+(_\d)?$/);
    const named = new Set(model.names.map(({ area }) => area.top));
    expect(formulas.filter(({ at }) => !named.has(at))).toEqual([]);
  });

  test("speaks only of names that it gives, and only of lines above or of inputs", () => {
    const rowOf = new Map(
      model.names.map(({ name, area, input }) => [name, { row: area.sheet ? -1 : area.top, input }]),
    );
    for (const { at, formula } of formulas) {
      for (const [name] of formula.matchAll(/weir_[a-z_0-9]+/g)) {
        const known = rowOf.get(name);
        expect(known, `${name} in ${formula}`).toBeDefined();
        expect(known!.input || known!.row < at, `${name} in ${formula}`).toBe(true);
      }
    }
  });

  test("calls only functions that there are", () => {
    for (const { formula } of formulas)
      for (const [, name] of formula.matchAll(/WEIR\.([A-Z_]+)\(/g)) expect(functionEntry(name!), name).toBeDefined();
  });

  test("has a sentence beside every input and result, and the cautions, sources and revision", () => {
    const texts = model.rows.flat().flatMap((cell) => (typeof cell?.value === "string" ? [cell.value] : []));
    for (const { area } of model.names.filter(
      (one) => one.area.sheet === undefined && one.name !== "weir_stage_2" && one.name !== "weir_stage_3",
    ))
      expect(String(model.rows[area.top]![3]!.value).length, `row ${area.top + 1}`).toBeGreaterThan(2);
    expect(texts).toContain("The number is no decision. A person decides, and answers for it.");
    expect(texts.join("\n")).toMatch(/Local law and licensed practice come first/);
    expect(texts.join("\n")).toMatch(/Greenwood & Sandomire 1950/);
    expect(formulas.some(({ formula }) => formula === 'WEIR.RELEASE("revision")')).toBe(true);
  });

  test("counts the day as a sheet does: 2025-03-14 is day 45730 (by hand: 45658 is 2025-01-01, plus 31 + 28 + 13)", () => {
    const row = model.names.find(({ name }) => name === "weir_written")!.area.top;
    expect(model.rows[row]![1]!.value).toBe(45_730);
  });

  test.each([0.01, 0.05, 0.2, 0.6, 0.99])(
    "offers stages that fit a fraction of %d: falling, none below it",
    (fraction) => {
      const reach = usualStages(fraction).map((stage) => stage.reach);
      expect(reach[0]).toBe(1);
      expect(reach[1]).toBeLessThanOrEqual(reach[0]!);
      expect(reach[2]).toBeLessThanOrEqual(reach[1]!);
      expect(reach[2]).toBeGreaterThanOrEqual(fraction);
    },
  );
});

test("what was already said of the search stands in the inputs, and isn't called assumed", () => {
  const search = {
    hits: 3,
    chance: 0.8,
    arrivals: 12,
    lookCost: 0.5,
    looks: 40,
    stages: [
      { reach: 1, cost: 1 },
      { reach: 0.2, cost: 4 },
    ],
  };
  const { rows, names } = layPlan({ ...QUESTION, search }, { count: 60, mark: 77.6 });
  const line = (name: string) => rows[names.find((one) => one.name === `weir_${name}`)!.area.top]!;
  expect(["hits", "chance", "arrivals", "look_cost", "looks"].map((name) => line(name)[1]!.value)).toEqual([
    3, 0.8, 12, 0.5, 40,
  ]);
  expect(String(line("chance")[3]!.value)).not.toMatch(/assumed/i);
  const reach = names.find((one) => one.name === "weir_stage_reach")!.area;
  expect([rows[reach.top]![1]!.value, rows[reach.bottom]![1]!.value]).toEqual([1, 0.2]);
  expect(names.some(({ name }) => name === "weir_stage_2")).toBe(true);
  expect(names.some(({ name }) => name === "weir_stage_3")).toBe(false);
});

describe("the numbers of the chart", () => {
  const sorted = Float64Array.from([0.1, 0.2, 0.25, 0.3, 0.3, 0.4, 0.55, 0.6]);

  test.each([
    { kind: "normal" } as const,
    { kind: "lognormal" } as const,
    { kind: "logit", low: -1, high: 1 } as const,
    { kind: "boxcox" } as const,
  ])("stay where the shape $kind reaches, with an axis around all scores", (shape) => {
    const { from, to, series, rows } = chartTable(sorted, shape, shape.kind);
    expect(from).toBeLessThan(0.1);
    expect(to).toBeGreaterThan(0.6);
    if (shape.kind === "lognormal" || shape.kind === "boxcox") expect(from).toBeGreaterThan(0);
    if (shape.kind === "logit") expect([from, to].every((end) => end > -1 && end < 1)).toBe(true);
    const { last } = series.find(({ look }) => look === "curve")!;
    expect(rows.length).toBeGreaterThan(last);
  });

  test("edges of bins are the numbers that one reads, so that a score on an edge is counted where it belongs", () => {
    const { rows } = chartTable(sorted, { kind: "normal" }, "normal");
    const edges = rows
      .map((row) => row[0] as PlanCell | undefined)
      .flatMap((cell) => (typeof cell?.value === "number" ? [cell.value] : []));
    for (const edge of edges) expect(String(edge).length).toBeLessThan(8);
  });
});
