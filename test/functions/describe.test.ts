import { describe, expect, test } from "vitest";
import { callFunction } from "../../src/functions/call";
import type { Argument } from "../../src/sheet/invoke";
import { expectOutcome, testCases } from "../support/cases";

describe("describe: the worked values of the independent program", () => {
  testCases("describe.json");
  testCases("describe-new.json");
});

describe("describe: the same where the host hands a blank over as an empty text", () => {
  testCases("describe.json", undefined, "empty");
  testCases("describe-new.json", undefined, "empty");
});

describe("describe: the same where the host hands a blank over as 0, in ranges without blanks", () => {
  testCases("describe.json", ["GATED_CURVE", "COMBINED_CURVE"], "zero");
});

const call = (name: string, ...given: Argument[]) => callFunction(name, given)!;
const column = (...scores: unknown[]) => scores.map((score) => [score]) as Argument;
const ten = column(9, 10, 10, 10, 11, 11, 11, 12, 12, 60);

describe("describe: refusals name the argument and show what came", () => {
  test.each<[string, Argument[], string, string]>([
    ["SCORE_SUMMARY", [column(1, "two", 3)], "scores", '"two"'],
    ["SCORE_SUMMARY", [column("price", 2, 3)], "scores", "looks like a heading"],
    ["SCORE_SUMMARY", [column(1, true, 3)], "scores", "the 2nd cell holds TRUE"],
    ["SCORE_SUMMARY", [column(4, 4, 4)], "scores", "all 3 are 4"],
    ["SCORE_SUMMARY", [column(1e300, 3e300)], "scores", "spread"],
    ["SCORE_SUMMARY", [column(1, 2, 3), "average"], "item", '"average"'],
    ["SCORE_SUMMARY", [column(1, 2, 3), 5], "item", "5"],
    ["SCORE_CURVE", [column(1, 2, 3), "log normal 2"], "shape", "log normal 2"],
    ["SCORE_CURVE", [column(1, 2, 3), "logit(100,0)"], "shape", "logit(100,0)"],
    ["SCORE_CURVE", [column(1, 2, 3), 5], "shape", "5"],
    ["SCORE_CURVE", [column(1, 2, 3), "boxcox(x)"], "shape", "boxcox(x)"],
    ["SCORE_CURVE", [column(-1, 2, 0), "lognormal"], "scores", "2 of 3 are not, the first is -1"],
    ["SCORE_CURVE", [column(1, 2, 100), "logit(0,100)"], "scores", "the first is 100"],
    ["SHAPE_RANKING", [column(1, 2, 3, 4, 5), 7, 7], "low", "7"],
    ["SHAPE_RANKING", [column(1, 2, 3, 4, 5), "a", 7], "low", '"a"'],
    ["SHAPE_RANKING", [column(1, 2, 3, 4, 5), 0, true], "high", "TRUE"],
    ["NORMALITY_CHECK", [column(1, 2, 3), "ks"], "test", '"ks"'],
    ["NORMALITY_CHECK", [column(1, 2, 3), null, "p"], "item", '"p"'],
    ["NORMALITY_CHECK", [column(...Array.from({ length: 5001 }, (_, i) => i))], "scores", "5001"],
    ["OUTLIER_FLAGS", [ten, 9], "most", "9"],
    ["OUTLIER_FLAGS", [ten, 0], "most", "0"],
    ["OUTLIER_FLAGS", [ten, null, 1], "alpha", "1"],
    ["OUTLIER_FLAGS", [ten, null, null, "boxy"], "shape", "boxy"],
    ["OUTLIER_FLAGS", [column(0, 1, 2, 3, 4, 5, 6, 7, 8, 9), null, null, "lognormal"], "scores", "the first is 0"],
    ["GATED_CURVE", [column(61, 63), null, 3], "gate", "nothing"],
    ["GATED_CURVE", [column(61, 63), 62, 3], "gate", "the lowest score is 61"],
    ["GATED_CURVE", [column(61, 63), 60, "three"], "below_count", '"three"'],
    ["GATED_CURVE", [column(61, 63), 60, 3, "median"], "item", '"median"'],
    ["COMBINED_CURVE", [1, 70, 8, 25, 66, 9.5], "count_1", "1"],
    ["COMBINED_CURVE", [40, 70, 8, 25.5, 66, 9.5], "count_2", "25.5"],
    ["COMBINED_CURVE", [40, null, 8, 25, 66, 9.5], "mean_1", "nothing"],
    ["COMBINED_CURVE", [40, 70, 8, 25, 66, -0.1], "sd_2", "-0.1"],
    ["COMBINED_CURVE", [40, 70, 8, 25, 66, 9.5, "sd"], "item", '"sd"'],
    ["TAIL_FRACTION", [column(83, "x"), 70, 8], "cutoff", "the 2nd cell"],
    ["TAIL_FRACTION", [83, "x", 8], "mean", '"x"'],
    ["TAIL_FRACTION", [83, 70, -8], "sd", "-8"],
    ["TAIL_FRACTION", [83, 70, 8, "up"], "better", '"up"'],
  ])("%s: %#", (name, given, argument, shown) => {
    expectOutcome(call(name, ...given), { formula: name, error: "#VALUE!", mentions: [argument, shown] });
  });

  test.each<[string, Argument[]]>([
    ["SCORE_SUMMARY", [column(4, null)]],
    ["SCORE_CURVE", [column(null, "", "  ")]],
    ["SHAPE_RANKING", [column(1, 2, 3, 4)]],
    ["NORMALITY_CHECK", [column(1, 2)]],
    ["NORMALITY_CHECK", [column(1, 2, 3, 4, 5, 6, 7), "anderson-darling"]],
    ["OUTLIER_FLAGS", [column(1, 2, 3, 4, 5, 6, 7, 8, 9)]],
    ["GATED_CURVE", [column(61), 60, 3]],
  ])("%s: too few scores so far are no answer yet, not bad input", (name, given) => {
    expectOutcome(call(name, ...given), { formula: name, error: "#N/A", mentions: ["scores"] });
  });
});

describe("describe: the rules for all functions", () => {
  test("words are read in any case with spaces around, shapes with spaces inside", () => {
    const scores = column(12, 15, 19, 28, 31, 55, 60, 71);
    const plain = call("SCORE_CURVE", scores, "logit(0,100)");
    expect(call("SCORE_CURVE", scores, "  LOGIT( 0 , 100 ) ")).toEqual(plain);
    expect(call("SCORE_CURVE", scores, "Logit(0,100)", " SHAPE ")).toEqual({ value: "logit(0,100)" });
    expect(call("NORMALITY_CHECK", scores, " Anderson-Darling", "P-VALUE")).toHaveProperty("value");
  });

  test("left out, blank and white space take the default", () => {
    const scores = column(12, 15, 19, 28, 31, 55, 60, 71);
    for (const blank of [undefined, null, "", " "]) {
      expect(call("SCORE_CURVE", scores, blank, blank)).toEqual(call("SCORE_CURVE", scores));
      expect(call("NORMALITY_CHECK", scores, blank, blank)).toEqual(call("NORMALITY_CHECK", scores));
      expect(call("OUTLIER_FLAGS", ten, blank, blank, blank)).toEqual(call("OUTLIER_FLAGS", ten));
      expect(call("SHAPE_RANKING", scores, blank, blank)).toEqual(call("SHAPE_RANKING", scores));
    }
  });

  test("a range of any shape is read row by row, and the order of the rows is immaterial", () => {
    const flat = call("SCORE_SUMMARY", column(3, 1, 4, 1.5, 9, 2.5));
    expect(
      call("SCORE_SUMMARY", [
        [3, 1, 4],
        [1.5, 9, 2.5],
      ]),
    ).toEqual(flat);
    expect(call("SCORE_SUMMARY", [[3, 1, 4, 1.5, 9, 2.5]])).toEqual(flat);
  });

  test("bounds of which one is left out offer no logit", () => {
    const { value } = call("SHAPE_RANKING", column(12, 15, 19, 28, 31), 0) as { value: unknown[][] };
    expect(value.map(([shape]) => shape)).not.toContain("logit(0,100)");
    expect(value).toHaveLength(4);
  });

  test("values without meaning are blank: AICc with few scores, the p-value below 8 scores, the power of a normal curve", () => {
    const { value } = call("SCORE_CURVE", column(1, 2, 4), "boxcox") as { value: unknown[][] };
    const table = Object.fromEntries(value as [string, unknown][]);
    expect(table).toMatchObject({ AICc: "", "Anderson-Darling p-value": "", "scores used": 3 });
    expect(call("SCORE_CURVE", column(1, 2, 4), "normal", "power")).toEqual({ value: "" });
  });

  test("a batch whose scores are all alike may be combined with another", () => {
    // By hand: 5, 5 and 1, 3: mean 3.5, squares 2.25 + 2.25 + 6.25 + 0.25 = 11, s = √(11/3).
    const { value } = call("COMBINED_CURVE", 2, 5, 0, 2, 2, Math.SQRT2, "standard deviation") as { value: number };
    expect(value).toBeCloseTo(Math.sqrt(11 / 3), 14);
  });

  test("flags keep the shape of the range, and blanks stay blank", () => {
    const { value } = call("OUTLIER_FLAGS", [
      [9, 10, null, 10],
      [10, 11, 11, 11],
      [12, " ", 12, 60],
    ]) as { value: unknown[][] };
    expect(value).toEqual([
      [false, false, "", false],
      [false, false, false, false],
      [false, "", false, true],
    ]);
  });
});
