import { describe, expect, test } from "vitest";
import { callFunction } from "../../src/functions/call";
import type { Argument } from "../../src/sheet/invoke";
import { callParts, parseArgument, testCases } from "../support/cases";

function call(formula: string): unknown {
  const { name, args } = callParts(formula);
  return callFunction(
    name,
    args.map((text) => parseArgument(text, [])),
  );
}
const value = (formula: string) => (call(formula) as { value: unknown }).value;
const column = (...cells: unknown[]) => cells.map((cell) => [cell]);

describe("the public cases", () => {
  testCases("combine.json");
  testCases("combine-new.json", ["PANEL_SCORE"]);
});

describe("WEIGHTED_SCORE", () => {
  test("takes weights and minimums in a row or in a column", () => {
    const expected = column(62.2, "");
    expect(value("=WEIR.WEIGHTED_SCORE({80,6,70;60,8,90},{5;2;3},{70,5,60})")).toEqual(expected);
    expect(value("=WEIR.WEIGHTED_SCORE({80,6,70;60,8,90},{5,2,3},{70;5;60})")).toEqual(expected);
  });

  test("a value at its minimum meets it, also a negative one; white space in the minimums asks for nothing", () => {
    expect(value('=WEIR.WEIGHTED_SCORE({-2,6;-2.5,7},{1,1},{-2,"  "})')).toEqual(column(2, ""));
  });

  test("one blank cell as minimums is none at all", () => {
    expect(value('=WEIR.WEIGHTED_SCORE({80,6,70},{5,2,3},"")')).toBe(62.2);
    expect(value("=WEIR.WEIGHTED_SCORE({80,6,70},{5,2,3},)")).toBe(62.2);
  });

  test("a criterion of weight 0 doesn't count, but its minimum does", () => {
    expect(value("=WEIR.WEIGHTED_SCORE({80,1;60,9},{1,0})")).toEqual(column(80, 60));
    expect(value("=WEIR.WEIGHTED_SCORE({80,1;60,9},{1,0},{0,5})")).toEqual(column("", 60));
  });

  test("empty rows stay empty, and a table of nothing is nothing", () => {
    expect(value('=WEIR.WEIGHTED_SCORE({"","";4,6;" ",""},{1,1})')).toEqual(column("", 5, ""));
  });
});

describe("MINIMUMS_MET", () => {
  test("says TRUE, FALSE or nothing, and never looks at a criterion without a minimum", () => {
    expect(value('=WEIR.MINIMUMS_MET({80,6;"","";90,8},{"",7})')).toEqual(column(false, "", true));
    expect(value('=WEIR.MINIMUMS_MET({80,6;60,8},{"",""})')).toEqual(column(true, true));
  });
});

describe("PRICE_POINTS", () => {
  test("keeps the shape of the prices, blanks included", () => {
    expect(value('=WEIR.PRICE_POINTS({800,"";1600,1000},40)')).toEqual([
      [40, ""],
      [20, 32],
    ]);
    expect(value('=WEIR.PRICE_POINTS({"";""},40)')).toEqual(column("", ""));
    expect(value("=WEIR.PRICE_POINTS(1000,40,)")).toBe(40);
  });
});

describe("PANEL_SCORE", () => {
  test("leaves empty rows empty and raters without ratings aside", () => {
    expect(value('=WEIR.PANEL_SCORE({60,50,"";"","","";80,70,"";"",90,""})')).toEqual(
      column(expect.closeTo(55, 10), "", expect.closeTo(75, 10), expect.closeTo(95, 10)),
    );
    expect(value('=WEIR.PANEL_SCORE({"","";"",""})')).toEqual(column("", ""));
    expect(value("=WEIR.PANEL_SCORE(61.5)")).toBe(61.5);
  });
});

describe("WEIGHT_SWAY", () => {
  test("empty rows give nothing and don't count among the entries", () => {
    expect(value('=WEIR.WEIGHT_SWAY({9,9;"","";1,1},{1,1},2)')).toEqual(column(1, "", 1));
  });

  test("no entry yet is #N/A, more places than entries is a bad top_count", () => {
    expect(call('=WEIR.WEIGHT_SWAY({"","";"",""},{1,1},1)')).toMatchObject({ error: "#N/A" });
    expect(call("=WEIR.WEIGHT_SWAY({9,9;1,1},{1,1},3)")).toEqual({
      error: "#VALUE!",
      message: "top_count must be at most the number of entries, 2; 3 was given.",
    });
  });

  test("is refused beyond 20 million terms at once, naming runs", () => {
    const values = Array.from({ length: 3000 }, (_, i) => [i, 3000 - i, (i * 7) % 11]);
    const outcome = callFunction("WEIGHT_SWAY", [values, [[1, 1, 1]], 10] as Argument[]);
    expect(outcome).toMatchObject({ error: "#VALUE!", message: expect.stringContaining("runs must be at most 2222") });
  });
});

describe("refusals name the argument and show what came", () => {
  test.each([
    ['=WEIR.WEIGHTED_SCORE({80,"six"},{1,1})', "values", 'the 2nd cell holds "six"'],
    [
      '=WEIR.WEIGHTED_SCORE({"price","speed";80,6},{1,1})',
      "values",
      '2 cells are something else: the 1st cell holds "price"',
    ],
    ["=WEIR.WEIGHTED_SCORE({80,6;TRUE,5},{1,1})", "values", "TRUE"],
    ['=WEIR.WEIGHTED_SCORE({80,6;70,5;60,""},{1,1})', "values", "the 3rd row has 1 blank cell of 2"],
    ['=WEIR.WEIGHTED_SCORE({80,"","";70,5,6},{1,1,1})', "values", "the 1st row has 2 blank cells of 3"],
    ["=WEIR.WEIGHTED_SCORE({80,6},{1,1,1})", "weights", "3 cells were given"],
    ["=WEIR.WEIGHTED_SCORE({80,6},5)", "weights", "only 5 was given"],
    ["=WEIR.WEIGHTED_SCORE({80,6;1,2},{1,1;1,1})", "weights", "a range of 2 rows and 2 columns was given"],
    ["=WEIR.WEIGHTED_SCORE({80,6},{1,-1})", "weights", "the 2nd of them is -1"],
    ["=WEIR.WEIGHTED_SCORE({80,6},{0,0})", "weights", "all of them are 0"],
    ['=WEIR.WEIGHTED_SCORE({80,6},{1,""})', "weights", "the 2nd cell is blank"],
    ['=WEIR.WEIGHTED_SCORE({80,6},{1,"x"})', "weights", '"x"'],
    ["=WEIR.WEIGHTED_SCORE({80,6},{1,1},{1,2,3})", "minimums", "3 cells were given"],
    ['=WEIR.WEIGHTED_SCORE({80,6},{1,1},{1,"x"})', "minimums", '"x"'],
    ['=WEIR.MINIMUMS_MET({80,6;70,""},{1,1})', "values", "the 2nd row has 1 blank cell of 2"],
    ["=WEIR.MINIMUMS_MET({80,6},70)", "minimums", "only 70 was given"],
    ['=WEIR.MINIMUMS_MET({80,6},"")', "minimums", "only nothing was given"],
    ["=WEIR.PRICE_POINTS({800;0},30)", "prices", "the 2nd cell holds 0"],
    ['=WEIR.PRICE_POINTS({800;"";-1},30)', "prices", "the 3rd cell holds -1"],
    ["=WEIR.PRICE_POINTS({800;600},30,700)", "prices", "at or above lowest (700); the 2nd cell holds 600"],
    ['=WEIR.PRICE_POINTS({800;"dear"},30)', "prices", '"dear"'],
    ["=WEIR.PRICE_POINTS({800},0)", "points", "0 was given"],
    ['=WEIR.PRICE_POINTS({800},"all")', "points", '"all"'],
    ["=WEIR.PRICE_POINTS({800},30,-5)", "lowest", "-5"],
    ["=WEIR.COMPOSITE_SPREAD({1,1},{3,4,5},{1,0;0,1})", "sds", "3 cells"],
    ["=WEIR.COMPOSITE_SPREAD({1,1},{3,-4},{1,0;0,1})", "sds", "-4"],
    ['=WEIR.COMPOSITE_SPREAD({1,""},{3,4},{1,0;0,1})', "weights", "the 2nd cell is blank"],
    ["=WEIR.COMPOSITE_SPREAD({1,1},{3,4},{1,0})", "correlations", "a range of 1 row and 2 columns"],
    ['=WEIR.COMPOSITE_SPREAD({1,1},{3,4},{1,"";0,1})', "correlations", "the 2nd cell is blank"],
    ["=WEIR.COMPOSITE_SPREAD({1,1},{3,4},{1,0.2;0.3,1})", "correlations", "0.3 and 0.2"],
    ["=WEIR.COMPOSITE_SPREAD({1,1},{3,4},{1,2;2,1})", "correlations", "has 2"],
    ['=WEIR.PANEL_SCORE({5,"good"})', "ratings", '"good"'],
    ['=WEIR.PANEL_SCORE({5,"";"",4})', "ratings", "lacks a link"],
    ["=WEIR.WEIGHT_SWAY({9,9},{1,1},0)", "top_count", "0"],
    ["=WEIR.WEIGHT_SWAY({9,9},{1,1},)", "top_count", "left out"],
    ['=WEIR.WEIGHT_SWAY({9,""},{1,1},1)', "values", "the 1st row has 1 blank cell of 2"],
    ["=WEIR.WEIGHT_SWAY({9,9},{1,1},1,1)", "spread", "1"],
    ["=WEIR.WEIGHT_SWAY({9,9},{1,1},1,,0)", "runs", "0"],
    ["=WEIR.WEIGHT_SWAY({9,9},{1,1},1,,2.5)", "runs", "2.5"],
    ["=WEIR.WEIGHT_SWAY({9,9},{1,1},1,,,-3)", "seed", "-3"],
    ['=WEIR.WEIGHT_SWAY({9,9},{1,1},1,,,"x")', "seed", '"x"'],
  ])("%s", (formula, argument, came) => {
    const outcome = call(formula) as { error: string; message: string };
    expect(outcome.error).toBe("#VALUE!");
    expect(outcome.message.startsWith(argument)).toBe(true);
    expect(outcome.message).toContain(came);
  });

  test("an error cell inside a range is refused with its place", () => {
    const outcome = callFunction("PANEL_SCORE", [
      [
        [5, 6],
        [{ code: "#N/A" }, 7],
      ],
    ] as Argument[]);
    expect(outcome).toMatchObject({
      error: "#VALUE!",
      message: expect.stringContaining("the 3rd cell holds an error cell (#N/A)"),
    });
  });
});

describe("every blank policy gives the same where no blanks are in play", () => {
  test.each(["null", "empty", "zero"] as const)("%s", (policy) => {
    expect(callFunction("WEIGHTED_SCORE", [[[80, 6, 70]], [[5, 2, 3]]], policy)).toEqual({ value: 62.2 });
    expect(
      callFunction(
        "PANEL_SCORE",
        [
          [
            [60, 50],
            [80, 70],
          ],
        ],
        policy,
      ),
    ).toEqual({ value: column(55, 75) });
    expect(
      callFunction(
        "COMPOSITE_SPREAD",
        [
          [[1, 1]],
          [[3, 4]],
          [
            [1, 0],
            [0, 1],
          ],
        ],
        policy,
      ),
    ).toEqual({ value: 2.5 });
  });
});
