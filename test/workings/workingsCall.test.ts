import { describe, expect, test } from "vitest";
import { addTable } from "../../src/workings/tableSteps";
import { Steps } from "../../src/workings/steps";
import { WorkingsCall } from "../../src/workings/workingsCall";

function call(value: ConstructorParameters<typeof WorkingsCall>[1][number], text?: string): WorkingsCall {
  return new WorkingsCall(["scores"], [value], [text]);
}

describe("what stands for an argument in a native formula", () => {
  test.each([
    "B2:B61",
    "'Round 2'!$A$1",
    "5%",
    '"a-b, c"',
    "{1,-2;3,4}",
    "SUM(B2:B3,-4)",
    "Bids[Score]",
    "A1#",
    "(B2+1)",
  ])("%s stands as it was typed", (typed) => expect(call(1, typed).text("scores")).toBe(typed));

  test.each(["B2+1", "-5", "1-5%", "B2:B9*2", 'B2&""', "SUM(B2)/3"])("%s is put in parentheses", (typed) =>
    expect(call(1, typed).text("scores")).toBe(`(${typed})`),
  );

  test("a part of an address is an address, of anything else its values", () => {
    const cells = [
      [1, 2],
      [3, null],
    ];
    expect(call(cells, "Bids!$C$4:$D$5").partText("scores", 1, 0, 1, 1)).toBe("Bids!C5:D5");
    expect(call(cells).partText("scores", 1, 0, 1, 1)).toBe('{3,""}');
    expect(call(cells).partText("scores", 0, 1)).toBe("2");
    expect(call(cells, "{1,2;3,4}").partText("scores", 0, 1)).toBe("2");
  });

  test("a cell of a name, a table's column or a calculation follows it, and one cell stands as it was typed", () => {
    expect(call([[1], [3]], "Bids[Score]").firstCellText("scores")).toBe("INDEX(Bids[Score],1,1)");
    expect(call(7, "INDEX(E2#,2,2)").firstCellText("scores")).toBe("INDEX(E2#,2,2)");
    expect(call(7, "DAY(C4)+60").firstCellText("scores")).toBe("(DAY(C4)+60)");
    expect(call([[7]], "$B2").firstCellText("scores")).toBe("$B2");
    expect(call([[7]], "B2:B2").firstCellText("scores")).toBe("B2");
  });

  test("the first cell that holds something is found row by row, with its address", () => {
    const cells = [
      [null, " "],
      ["", 7],
    ];
    expect(call(cells, "B2:C3").firstFilled("scores")).toEqual({ row: 1, column: 1, cell: 7, text: "C3" });
    expect(call([[null], [""]], "B2:B3").firstFilled("scores")).toMatchObject({ row: 0, column: 0, text: "B2" });
  });
});

describe("the cells of a headed table", () => {
  const laidOut = (rows: number) =>
    addTable(new Steps(), ["a", "b"], rows, (i) => ({ name: `row ${i + 1}`, cells: [[i], [i / 2, "1/2"]] })).rows;

  test("are laid out row by row up to 200", () => {
    const rows = laidOut(100);
    expect(rows.map((row) => row.value)).toEqual(Array.from({ length: 100 }, (_, i) => [i, i / 2]).flat());
    expect(rows[3]).toEqual({ meaning: "row 2: b", value: 0.5, formula: "=1/2", source: "" });
  });

  test("are laid out from both ends beyond, and those left out are counted", () => {
    const rows = laidOut(1_000_000);
    expect(rows).toHaveLength(201);
    expect(rows[100]).toMatchObject({ meaning: expect.stringContaining("51st to the 999950th"), value: 999_900 });
    expect(rows[101]!.meaning).toBe("row 999951: a");
    expect(rows[200]!.value).toBe(999_999 / 2);
  });
});

test("a formula too long for a sheet is left out", () => {
  const { rows } = new Steps().add("fits", 1, "1".repeat(8191)).add("does not", 1, "1".repeat(8192));
  expect(rows.map((row) => row.formula.length)).toEqual([8192, 0]);
});
