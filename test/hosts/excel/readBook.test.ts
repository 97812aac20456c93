import { afterEach, expect, test, vi } from "vitest";
import { readBook } from "../../../src/hosts/excel/readBook";

/*
 * As much of the host as reading a workbook needs: one sheet with a heading, two scores, a report that spills and a hidden row. What
 * was not loaded and synchronised can't be read, as in the host.
 */
function host(versions: readonly string[]) {
  vi.stubGlobal("Office", {
    context: { requirements: { isSetSupported: (_: string, v: string) => versions.includes(v) } },
  });
  vi.stubGlobal("Excel", { SheetVisibility: { visible: "Visible" } });
  const waiting: (() => void)[] = [];
  const proxy = <Told extends object>(told: Told, more: object = {}): any => {
    const made: any = { ...more, load: () => (waiting.push(() => Object.assign(made, told)), made) };
    return made;
  };
  const formulas = [
    ["score", "=WEIR.CUTOFF_REPORT(A2:A3)", ""],
    [61.5, "", ""],
    [64, "", ""],
  ];
  const values = [
    ["score", "scores used", 2],
    [61.5, "", ""],
    [64, "", ""],
  ];
  const type = (value: unknown) => (value === "" ? "Empty" : typeof value === "number" ? "Double" : "String");
  const rangeAt = (row: number, column: number, rows: number, columns: number) => {
    const cut = (cells: readonly (readonly unknown[])[]) =>
      cells.slice(row, row + rows).map((line) => line.slice(column, column + columns));
    return proxy(
      { formulas: cut(formulas), values: cut(values), valueTypes: cut(values).map((line) => line.map(type)) },
      {
        getRowProperties: () => {
          const answer: { value?: unknown } = {};
          waiting.push(
            () => (answer.value = Array.from({ length: rows }, (_, down) => ({ rowHidden: row + down === 1 }))),
          );
          return answer;
        },
        getSpillingToRangeOrNullObject: () => proxy({ isNullObject: false, rowCount: 1, columnCount: 2 }),
      },
    );
  };
  const used = { isNullObject: false, rowIndex: 0, columnIndex: 0, rowCount: 3, columnCount: 3 };
  const empty = { isNullObject: true };
  const sheet = (name: string, visibility: string, told: object, names: object[]) => ({
    name,
    visibility,
    names: proxy({ items: names }),
    getUsedRangeOrNullObject: () => proxy(told),
    getRangeByIndexes: rangeAt,
  });
  const sheets = [
    sheet("Bids", "Visible", used, [{ name: "Here", formula: "=Bids!$A$2" }]),
    sheet("Aside", "VeryHidden", empty, []),
  ];
  const table = {
    name: "Scores",
    showHeaders: true,
    showTotals: false,
    getRange: () => proxy({ address: "Bids!A1:A3" }),
    columns: proxy({ items: [{ name: "score" }] }),
  };
  const workbook = proxy(
    { name: "Spring.xlsx" },
    {
      worksheets: proxy({ items: sheets }),
      names: proxy({ items: [{ name: "All", formula: "=Bids!$A$2:$A$3" }] }),
      tables: proxy({ items: [table] }),
    },
  );
  return { workbook, sync: async () => waiting.splice(0).forEach((tell) => tell()) } as unknown as Excel.RequestContext;
}

afterEach(() => vi.unstubAllGlobals());

test("the workbook in Excel as the audit reads it", async () => {
  const book = await readBook(host(["1.9", "1.12"]));
  expect(book).toMatchObject({
    title: "Spring.xlsx",
    names: [
      { name: "All", formula: "Bids!$A$2:$A$3" },
      { name: "Here", formula: "Bids!$A$2", sheet: "Bids" },
    ],
    tables: [{ name: "Scores", sheet: "Bids", columns: ["score"], headerRows: 1, totalsRows: 0 }],
  });
  expect(book.sheets.map(({ name, visible }) => [name, visible])).toEqual([
    ["Bids", true],
    ["Aside", false],
  ]);
  const [bids] = book.sheets;
  expect(bids!.range({ top: 0, left: 0, bottom: 2, right: 2 })).toEqual([
    ["score", "scores used", 2],
    [61.5, null, null],
    [64, null, null],
  ]);
  expect([...bids!.hiddenRows]).toEqual([1]);
  expect(bids!.formulaAt(0, 1)).toMatchObject({
    formula: "WEIR.CUTOFF_REPORT(A2:A3)",
    array: { top: 0, left: 1, bottom: 0, right: 2 },
    dynamic: true,
  });
});

test("an older Excel tells neither hidden rows nor spills: the rest is read all the same", async () => {
  const [bids] = (await readBook(host([]))).sheets;
  expect(bids!.hiddenRows.size).toBe(0);
  expect(bids!.formulaAt(0, 1)).toMatchObject({ dynamic: false });
  expect(bids!.formulaAt(0, 1)!.array).toBeUndefined();
});
