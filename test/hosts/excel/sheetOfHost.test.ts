import { describe, expect, test } from "vitest";
import { addCells, setSpill, wantsSpill } from "../../../src/hosts/excel/sheetOfHost";
import { Sheet } from "../../../src/sheet/workbook";

/** Formulas, values and types as the documentation of Range says that the host tells them. */
function told(): Sheet {
  const sheet = new Sheet("Bids");
  addCells(
    sheet,
    1,
    2,
    [
      ["=WEIR.CUTOFF_REPORT(A2:A61)", 57, ""],
      ["=WEIR.CUTOFF_REPORT(A2:A61)", '=IF(A1,"","")', "=no formula"],
      ["#N/A", "", true],
    ],
    [
      ["scores used", 57, ""],
      ["blanks skipped", "", "=no formula"],
      ["#N/A", "", true],
    ],
    [
      ["String", "Double", "Empty"],
      ["String", "String", "String"],
      ["Error", "Empty", "Boolean"],
    ],
  );
  return sheet;
}

describe("a sheet as Excel tells it", () => {
  test("values, errors and blanks are told apart, a formula that gives an empty text is none of the blanks", () => {
    const sheet = told();
    expect(sheet.range({ top: 1, left: 2, bottom: 3, right: 4 })).toEqual([
      ["scores used", 57, null],
      ["blanks skipped", "", "=no formula"],
      [{ code: "#N/A" }, null, true],
    ]);
  });

  test("a text that begins with the sign of equality is no formula", () => {
    const sheet = told();
    expect(sheet.formulaAt(2, 4)).toBeUndefined();
    expect(sheet.formulaAt(1, 2)).toMatchObject({ formula: "WEIR.CUTOFF_REPORT(A2:A61)", calculated: true });
  });

  test("a spilled result is one formula, even where the host repeats it at each cell", () => {
    const sheet = told();
    for (const cell of wantsSpill(sheet)) setSpill(sheet, cell, cell.row === 1 ? 2 : 1, cell.row === 1 ? 2 : 1);
    expect([...sheet.formulas.values()].map(({ row, column, array }) => ({ row, column, array }))).toEqual([
      { row: 1, column: 2, array: { top: 1, left: 2, bottom: 2, right: 3 } },
      { row: 2, column: 3, array: { top: 2, left: 3, bottom: 2, right: 3 } },
    ]);
  });

  test("of very many formulas only those that call ours are asked about", () => {
    const sheet = new Sheet("Long");
    const rows = Array.from({ length: 2_500 }, (_, row) => (row === 7 ? "=WEIR.RELEASE()" : `=A${row + 1}*2`));
    addCells(
      sheet,
      0,
      1,
      rows.map((row) => [row]),
      rows.map(() => [1]),
      rows.map(() => ["Double"]),
    );
    expect(wantsSpill(sheet).map(({ row }) => row)).toEqual([7]);
  });
});
