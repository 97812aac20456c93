import { describe, expect, test } from "vitest";
import { callFunction } from "../../src/functions/call";
import { testCases } from "../support/cases";
import { processorTime } from "../support/processorTime";

describe("risk: the worked values of the independent program", () => {
  testCases("risk.json");
  testCases("risk-new.json");
});

describe("risk: the same where the host hands a blank over as empty text", () => {
  testCases("risk.json", undefined, "empty");
  testCases("risk-new.json", undefined, "empty");
});

describe("risk: the same where the host hands a blank over as 0, where no blanks are in play", () => {
  const names = [
    "CUTOFF_ERROR_RATES",
    "TRUE_TOP_AMONG_PASSED",
    "WORTH_AMONG_PASSED",
    "GUARDED_CUTOFF",
    "RATERS_NEEDED",
  ];
  testCases("risk.json", [...names, "PASS_RATE_RATIO", "GROUP_PASS_RATES"], "zero");
  testCases("risk-new.json", ["SCORE_ERROR_SD", "PASS_RATE_RATIO"], "zero");
});

type Given = Parameters<typeof callFunction>[1];
const call = (name: string, ...given: unknown[]) => callFunction(name, given as Given)!;
const table = (name: string, ...given: unknown[]) => (call(name, ...given) as { value: unknown[][] }).value;
const column = (...cells: unknown[]) => cells.map((cell) => [cell]);

describe("CUTOFF_ERROR_RATES", () => {
  test("blank method, confidence and item are left out; words in any case", () => {
    expect(call("CUTOFF_ERROR_RATES", 30, 0.05, "", null, " ")).toEqual(call("CUTOFF_ERROR_RATES", 30, 0.05));
    expect(call("CUTOFF_ERROR_RATES", 30, 0.05, " Safe", null, "TRULY TOP BUT MISSED")).toEqual({
      value: table("CUTOFF_ERROR_RATES", 30, 0.05, "safe")[2]![1],
    });
  });
});

describe("CHANCE_TRUE_SCORE_CLEARS", () => {
  test("refuses text in any one cell, names its place, and checks the other arguments also for a blank range", () => {
    expect(call("CHANCE_TRUE_SCORE_CLEARS", column(60, "x"), 60, 3, 55, 8)).toMatchObject({
      error: "#VALUE!",
      message: expect.stringMatching(/score .*2nd cell holds "x"/) as string,
    });
    expect(call("CHANCE_TRUE_SCORE_CLEARS", column(null), 60, 0, 55, 8)).toMatchObject({ error: "#VALUE!" });
  });

  test("a full column answers within 2 s", () => {
    const scores = Array.from({ length: 1_048_576 }, (_, i) => [i % 100]);
    const work = () => expect(call("CHANCE_TRUE_SCORE_CLEARS", scores, 60, 3, 55, 8)).toHaveProperty("value");
    expect(processorTime(work)).toBeLessThan(2000);
  });
});

describe("risk: refusals name the argument and show what came", () => {
  test.each<[string, unknown[], string, string]>([
    ["CUTOFF_ERROR_RATES", [1, 0.05], "count", "1"],
    ["CUTOFF_ERROR_RATES", [NaN, 0.05], "count", "NaN"],
    ["CUTOFF_ERROR_RATES", [30, 0], "fraction", "0"],
    ["CUTOFF_ERROR_RATES", [30, NaN], "fraction", "NaN"],
    ["CUTOFF_ERROR_RATES", [30, 0.05, 1], "method", "1"],
    ["CUTOFF_ERROR_RATES", [30, 0.05, "plain", 95], "confidence", "95"],
    ["CUTOFF_ERROR_RATES", [30, 0.05, "plain", null, "missed"], "item", "missed"],
    ["TRUE_TOP_AMONG_PASSED", [0, 0.2, 0.5], "true_fraction", "0"],
    ["TRUE_TOP_AMONG_PASSED", [0.2, 1, 0.5], "pass_fraction", "1"],
    ["TRUE_TOP_AMONG_PASSED", [0.2, 0.5, -1.01], "validity", "-1.01"],
    ["TRUE_TOP_AMONG_PASSED", [0.2, 0.5, NaN], "validity", "NaN"],
    ["TRUE_TOP_AMONG_PASSED", [0.2, 0.5, null], "validity", "nothing"],
    ["WORTH_AMONG_PASSED", [1, 0.5], "pass_fraction", "1"],
    ["WORTH_AMONG_PASSED", [0.5, "high"], "validity", "high"],
    ["CHANCE_TRUE_SCORE_CLEARS", [64, 60, 0, 55, 8], "error_sd", "0"],
    ["CHANCE_TRUE_SCORE_CLEARS", [64, 60, 3, Infinity, 8], "mean", "Infinity"],
    ["CHANCE_TRUE_SCORE_CLEARS", [64, 60, 3, 55, 0], "true_sd", "0"],
    ["CHANCE_TRUE_SCORE_CLEARS", [64, 60, 3, 55, NaN], "true_sd", "NaN"],
    ["GUARDED_CUTOFF", ["x", 3, 55, 8], "limit", "x"],
    ["GUARDED_CUTOFF", [60, 0, 55, 8], "error_sd", "0"],
    ["GUARDED_CUTOFF", [60, 3, true, 8], "mean", "TRUE"],
    ["GUARDED_CUTOFF", [60, 3, 55, -8], "true_sd", "-8"],
    ["GUARDED_CUTOFF", [60, 3, 55, 8, 0], "max_wrong", "0"],
    ["GUARDED_CUTOFF", [60, 3, 55, 8, 0.05, "up"], "better", "up"],
    ["GUARDED_CUTOFF", [1e308, 3, -1e308, 8], "true_sd", "8"],
    ["SCORE_ERROR_SD", [0, 0.5], "sd", "0"],
    ["SCORE_ERROR_SD", [NaN, 0.5], "sd", "NaN"],
    ["SCORE_ERROR_SD", [8, -0.1], "reliability", "-0.1"],
    ["SCORE_ERROR_SD", [8, null], "reliability", "nothing"],
    [
      "SCORE_RELIABILITY",
      [
        [
          [1, 2],
          [2, 4],
        ],
        1,
      ],
      "confidence",
      "1",
    ],
    ["SCORE_VALIDITY", [column(1, 2, 3, 4), column(1, 2, 3, 5), 0], "confidence", "0"],
    ["SCORE_VALIDITY", [column(1, 2, 3, 4), column(1, 2, 3, 5), 0.9, -3], "unselected_sd", "-3"],
    ["SCORE_VALIDITY", [column(1, 2, 3, 4), column(1, 2, 3, 5), 0.9, 3, "r"], "item", "r"],
    ["SCORE_VALIDITY", [column(1, true, 3, 4), column(1, 2, 3, 5)], "scores", "TRUE"],
    ["SCORE_VALIDITY", [column(1, 2, 3, 4, 5), column(1, 2, 3, 5)], "outcomes", "5"],
    ["RATERS_NEEDED", [0, 0.9], "single_reliability", "0"],
    ["RATERS_NEEDED", [0.5, 1], "target", "1"],
    ["RATERS_NEEDED", [0.5, NaN], "target", "NaN"],
    ["PASS_RATE_RATIO", [-1, 80, 12, 40], "passed_a", "-1"],
    ["PASS_RATE_RATIO", [0, 0, 12, 40], "assessed_a", "0"],
    ["PASS_RATE_RATIO", [48, 80, 41, 40], "passed_b", "41"],
    ["PASS_RATE_RATIO", [48, 80, 12, "many"], "assessed_b", "many"],
    ["PASS_RATE_RATIO", [48, 80, 12, 1e13], "assessed_b", "10000000000000"],
    ["PASS_RATE_RATIO", [48, 80, 12, 40, 1.5], "confidence", "1.5"],
  ])("%s%j is refused, naming %s", (name, given, argument, came) => {
    const outcome = call(name, ...given) as { error: string; message: string };
    expect(outcome.error).toBe("#VALUE!");
    expect(outcome.message).toContain(argument);
    expect(outcome.message).toContain(came);
    expect(outcome.message).not.toContain("fault");
  });

  test("a risk that is met without a mark, and a panel beyond counting, have no answer", () => {
    expect(call("GUARDED_CUTOFF", 40, 3, 70, 8)).toMatchObject({
      error: "#N/A",
      message: expect.stringContaining("max_wrong") as string,
    });
    expect(call("RATERS_NEEDED", 1e-300, 0.9)).toMatchObject({
      error: "#N/A",
      message: expect.stringContaining("target") as string,
    });
  });
});
