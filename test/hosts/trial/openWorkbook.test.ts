import type { IWorkbookData } from "@univerjs/core";
import { expect, test } from "vitest";
import { openWorkbook } from "../../../src/hosts/trial/openWorkbook";
import type { SavedBook } from "../../../src/hosts/trial/savedBook";

const saved: SavedBook = {
  snapshot: {
    id: "book",
    name: "trial",
    sheetOrder: ["two", "one"],
    custom: { file: "Spring.xlsx" },
    sheets: {
      one: {
        id: "one",
        name: "Bids",
        cellData: {
          0: { 0: { v: "score", t: 1 }, 2: { f: "=WEIR.CUTOFF_REPORT(A2:A4)", v: "scores used", t: 1 } },
          1: { 0: { v: 61.5, t: 2 }, 1: { si: "copy", v: 1, t: 2 } },
          2: { 0: { v: 1, t: 3 } },
        },
        rowData: { 2: { hd: 1 }, 3: { h: 30 } },
      },
      two: { id: "two", name: "Notes", hidden: 1, cellData: {} },
    },
  } as unknown as IWorkbookData,
  spilled: { one: { 0: { 3: { v: 3, t: 2 } } } },
  ranges: { one: { 0: { 2: { startRow: 0, startColumn: 2, endRow: 0, endColumn: 3 } } } },
  copied: { one: [[1, 1, "=COUNT(A2)"]] },
  names: [
    { name: "Scores", formula: "=Bids!$A$2:$A$4" },
    { name: "Here", formula: "Bids!$A$2", sheetId: "one" },
  ],
  activeSheetId: "one",
};

test("the trial workbook as the audit reads it: order, values, formulas, spills, hidden rows, names", () => {
  const book = openWorkbook(saved);
  expect(book.title).toBe("Spring.xlsx");
  expect(book.sheets.map(({ name, visible }) => [name, visible])).toEqual([
    ["Notes", false],
    ["Bids", true],
  ]);
  const sheet = book.sheets[1]!;
  expect(sheet.range({ top: 0, left: 0, bottom: 2, right: 3 })).toEqual([
    ["score", null, "scores used", 3],
    [61.5, 1, null, null],
    [true, null, null, null],
  ]);
  expect(sheet.formulaAt(0, 2)).toMatchObject({
    formula: "WEIR.CUTOFF_REPORT(A2:A4)",
    array: { top: 0, left: 2, bottom: 0, right: 3 },
  });
  expect(sheet.formulaAt(1, 1)).toMatchObject({
    formula: "COUNT(A2)",
    array: { top: 1, left: 1, bottom: 1, right: 1 },
  });
  expect([...sheet.hiddenRows]).toEqual([2]);
  expect(book.names).toEqual([
    { name: "Scores", formula: "Bids!$A$2:$A$4" },
    { name: "Here", formula: "Bids!$A$2", sheet: "Bids" },
  ]);
});
