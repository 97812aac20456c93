import { afterEach, beforeEach, describe, expect, test, vi } from "vitest";
import { insertChart } from "../../../src/hosts/excel/charts";
import { dress } from "../../../src/hosts/excel/dress";
import { defineNames, readNames } from "../../../src/hosts/excel/names";

/*
 * As much of the host's objects as these calls touch, taking down what is set: they check what is asked of the host, not what the host makes
 * of it. Members and values are those of @types/office-js.
 */
const sync = vi.fn(async () => undefined);
const rangeAt = (_: unknown, address: string) => ({ address }) as unknown as Excel.Range;

beforeEach(() => {
  vi.stubGlobal("Office", { context: { requirements: { isSetSupported: () => true } } });
  vi.stubGlobal("Excel", {
    NamedItemType: { range: "Range" },
    ChartType: { xyscatterLinesNoMarkers: "XYScatterLinesNoMarkers" },
    ChartSeriesBy: { columns: "Columns" },
    PageOrientation: { portrait: "Portrait" },
  });
});
afterEach(() => vi.unstubAllGlobals());

describe("names in Excel", () => {
  const book = (items: { name: string; type?: string; formula: string }[]) => {
    const added: [string, unknown][] = [];
    const listed = items.map((item) => ({ type: "Range", load: () => undefined, isNullObject: false, ...item }));
    const names = {
      items: listed,
      load: () => undefined,
      getItemOrNullObject: (name: string) =>
        listed.find((one) => one.name === name) ?? { isNullObject: true, load: () => undefined },
      add: (name: string, range: { address: string }) => added.push([name, range.address]),
    };
    return { context: { workbook: { names }, sync } as unknown as Excel.RequestContext, added, listed };
  };

  test("are those that lead to cells; a deleted or computed one is left out", async () => {
    const { context } = book([
      { name: "weir_fraction", formula: "='My plan'!$B$7" },
      { name: "gone", type: "Error", formula: "=#REF!" },
      { name: "rate", type: "Double", formula: "=0.05" },
    ]);
    expect(await readNames(context)).toEqual([{ name: "weir_fraction", address: "'My plan'!B7" }]);
  });

  test("that are there are led elsewhere, others are added", async () => {
    const { context, added, listed } = book([{ name: "weir_scores", formula: "=Bids!$B$2:$B$6" }]);
    await defineNames(context, rangeAt, [
      { name: "weir_scores", address: "Bids!B2:B9" },
      { name: "weir_fraction", address: "Plan!B7" },
    ]);
    expect(listed[0]!.formula).toBe("=Bids!$B$2:$B$9");
    expect(added).toEqual([["weir_fraction", "Plan!B7"]]);
  });
});

test("a chart in Excel gets one series a line, each with its own numbers, width and dash", async () => {
  const lines: Record<string, any>[] = [];
  const line = () => {
    const made: Record<string, any> = { format: { line: {} } };
    made["setXAxisValues"] = (range: { address: string }) => (made["x"] = range.address);
    made["setValues"] = (range: { address: string }) => (made["y"] = range.address);
    lines.push(made);
    return made;
  };
  const axes = { categoryAxis: { title: {} }, valueAxis: { title: {} } } as Record<string, any>;
  const chart = { title: {}, legend: {}, axes, setPosition: () => undefined, series: { getItemAt: line, add: line } };
  const place = { worksheet: { charts: { add: () => chart } }, getCell: () => undefined, getLastCell: () => undefined };
  const at = (_: unknown, address: string) =>
    (address === "Plan!A49:D68" ? place : { address }) as unknown as Excel.Range;
  await insertChart({ sync } as unknown as Excel.RequestContext, at, "Plan!A49:D68", {
    title: "t",
    xTitle: "score",
    yTitle: "entries",
    from: 20,
    to: 110,
    series: [
      { name: "entries", x: "C!A1:A4", y: "C!B1:B4", colour: "8A959E", width: 1, dash: "solid" },
      { name: "safe cutoff", x: "C!D1:D2", y: "C!E1:E2", colour: "0B4A6B", width: 2, dash: "dash" },
    ],
  });
  expect(lines.map(({ name, x, y }) => [name, x, y])).toEqual([
    ["entries", "C!A1:A4", "C!B1:B4"],
    ["safe cutoff", "C!D1:D2", "C!E1:E2"],
  ]);
  expect(lines[1]!["format"].line).toEqual({ color: "#0B4A6B", weight: 2, lineStyle: "Dash" });
  expect(axes["categoryAxis"]).toMatchObject({ minimum: 20, maximum: 110 });
});

test("the looks of a sheet in Excel: formats, frames, widths, merged cells, one page wide", async () => {
  const cells = new Map<string, any>();
  const cell = (row: number, column: number) => {
    const key = `${row},${column}`;
    const made = cells.get(key) ?? {
      format: { font: {}, fill: {}, borders: { getItem: (edge: string) => (made.format.borders[edge] ??= {}) } },
      getEntireColumn: () => (made.column ??= { format: {} }),
      getEntireRow: () => (made.row ??= { format: {} }),
    };
    cells.set(key, made);
    return made;
  };
  const merge = vi.fn();
  const sheet = {
    getCell: cell,
    getRange: () => ({ merge }),
    pageLayout: { setPrintTitleRows: () => undefined } as Record<string, unknown>,
  };
  const context = { workbook: { worksheets: { getItem: () => sheet } }, sync } as unknown as Excel.RequestContext;
  await dress(context, "Plan", {
    cells: [[undefined, { role: "input", format: "0.0%" }]],
    widths: [10],
    heights: new Map([[0, 30]]),
    merged: [{ top: 0, left: 0, bottom: 0, right: 3 }],
  });
  const input = cells.get("0,1");
  expect(input.numberFormat).toEqual([["0.0%"]]);
  expect(Object.keys(input.format.borders).filter((edge) => edge.startsWith("Edge"))).toHaveLength(4);
  expect(cells.get("0,0").column.format.columnWidth).toBeCloseTo(56, 10);
  expect(cells.get("0,0").row.format.rowHeight).toBe(30);
  expect(merge).toHaveBeenCalledOnce();
  expect(sheet.pageLayout["zoom"]).toEqual({ horizontalFitToPages: 1 });
});
