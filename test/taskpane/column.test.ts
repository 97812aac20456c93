import { describe, expect, test } from "vitest";
import { gridMark, scoreDecimals } from "../../src/sheet/scoreGrid";
import { cellAbove, numberColumns, readColumn } from "../../src/taskpane/column/readColumn";

describe("a selected column", () => {
  test("its heading, its blanks and what is no score in it are found by address", () => {
    const block = {
      address: "'Round 2'!F1:F9",
      values: [["rope score"], [70.5], [null], ["n/a"], [64], [{ code: "#N/A" }], [true], [71], [""]],
    };
    const column = readColumn(block, 0)!;
    expect(column.heading).toBe("rope score");
    expect(column.address).toBe("'Round 2'!F2:F8");
    expect(column.count).toBe(3);
    expect(column.blanks).toEqual(["F3"]);
    expect(column.offenders).toEqual([
      { address: "F4", cell: "n/a" },
      { address: "F6", cell: { code: "#N/A" } },
      { address: "F7", cell: true },
    ]);
    expect([...column.sorted]).toEqual([64, 70.5, 71]);
  });

  test("without a heading it begins at its first number", () => {
    expect(readColumn({ address: "Bids!C4:C7", values: [[null], [3], [4], [null]] }, 0)).toMatchObject({
      address: "Bids!C5:C6",
      heading: "",
      blanks: [],
    });
  });

  test("of several columns only those with numbers can be taken", () => {
    const block = {
      address: "Bids!A1:C3",
      values: [
        ["name", "score", "note"],
        ["a", 1, ""],
        ["b", 2, "x"],
      ],
    };
    expect(numberColumns(block)).toEqual([1]);
    expect(readColumn(block, 1)!.address).toBe("Bids!B2:B3");
    expect(readColumn(block, 0)).toBeUndefined();
  });

  test("the cell above is where a heading may stand that was not selected", () => {
    expect(cellAbove("'Round 2'!F2:F61")).toBe("'Round 2'!F1");
    expect(cellAbove("Bids!F1:F9")).toBeUndefined();
  });
});

describe("the mark on the grid of the scores", () => {
  test("the decimals are those of the finest score", () => {
    expect(scoreDecimals(Float64Array.of(70, 71.5, 64.25))).toBe(2);
    expect(scoreDecimals(Float64Array.of(0.29, 0.57, 1.1))).toBe(2);
    expect(scoreDecimals(Float64Array.of(1 / 3))).toBeUndefined();
  });

  test("it takes exactly the entries that the cutoff takes", () => {
    expect(gridMark(81.9527, "high", 1, 8)).toEqual({ mark: 82, decimals: 1 });
    expect(gridMark(42.7357, "low", 2, 8)).toEqual({ mark: 42.73, decimals: 2 });
    expect(gridMark(-3.21, "high", 0, 2)).toEqual({ mark: -3, decimals: 0 });
  });

  test("a cutoff that is a score but for the last bits stays that score", () => {
    expect(gridMark(0.1 + 0.2, "high", 1, 1).mark).toBe(0.3);
    expect(gridMark(71.4 - 1e-13, "low", 1, 8).mark).toBe(71.4);
  });

  test("without a grid it is rounded to the strict side", () => {
    const { mark, decimals } = gridMark(81.952712, "high", undefined, 8);
    expect(decimals).toBe(3);
    expect(mark).toBe(81.953);
  });
});
