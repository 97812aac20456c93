import { describe, expect, test } from "vitest";
import { gridCells, readGrid, readOneEach, readSquare, requireWholeRows } from "../../src/sheet/readGrid";

describe("readGrid", () => {
  test("keeps rows and columns, with NaN for every kind of blank, and counts what each row holds", () => {
    const grid = readGrid("values", [
      [1, null, 3],
      ["", "  ", undefined],
      [4, 5, 6],
    ]);
    expect(grid).toEqual({
      rows: 3,
      columns: 3,
      values: Float64Array.of(1, NaN, 3, NaN, NaN, NaN, 4, 5, 6),
      filled: Int32Array.of(2, 0, 3),
    });
    expect(gridCells(grid, grid.values)).toEqual([
      [1, "", 3],
      ["", "", ""],
      [4, 5, 6],
    ]);
    expect(() => requireWholeRows("values", grid)).toThrow("the 1st row has 1 blank cell of 3");
  });

  test.each([["text"], [true], [NaN], [Infinity], [{ code: "#REF!" }]])(
    "refuses %j as numbers elsewhere are refused",
    (cell) => {
      expect(() =>
        readGrid("values", [
          [1, 2],
          [3, cell],
        ]),
      ).toThrow(
        expect.objectContaining({
          name: "DomainError",
          argument: "values",
          message: expect.stringContaining("the 4th cell"),
        }),
      );
    },
  );
});

describe("readOneEach and readSquare", () => {
  test("take a row, a column or one cell, and as many as there are where no number is asked for", () => {
    expect(readOneEach("weights", [[5, 2]], "refused", 2)).toEqual(Float64Array.of(5, 2));
    expect(readOneEach("weights", [[5], [2]], "refused")).toEqual(Float64Array.of(5, 2));
    expect(readOneEach("minimums", [["", 2]], "kept", 2)).toEqual(Float64Array.of(NaN, 2));
    expect(readSquare("correlations", [[1]], 1)).toEqual(Float64Array.of(1));
  });

  test.each([
    [[[5, 2, 1]], "3 cells were given"],
    [[[5]], "only 5 was given"],
    [
      [
        [5, 2],
        [1, 1],
      ],
      "a range of 2 rows and 2 columns was given",
    ],
    [[[5, ""]], "the 2nd cell is blank"],
  ])("refuse %j where two are asked for", (range, came) => {
    expect(() => readOneEach("weights", range, "refused", 2)).toThrow(came);
    expect(() => readSquare("weights", range, 3)).toThrow("a table of 3 rows and 3 columns");
  });
});
