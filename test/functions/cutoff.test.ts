import { describe, expect, test } from "vitest";
import { callFunction } from "../../src/functions/call";
import type { Argument } from "../../src/sheet/invoke";
import { expectOutcome, testCases } from "../support/cases";

describe("the public cases of the cutoff functions", () => testCases("cutoff.json"));

const call = (name: string, ...given: Argument[]) => callFunction(name, given)!;
const column = (...scores: unknown[]) => scores.map((score) => [score]) as Argument;
const five = column(54, 52.3, 60.4, 43.4, 50.5);

/** Each function of a score column with arguments that are right, to exchange one of them. */
const ofScores: [string, (scores: Argument) => Argument[]][] = [
  ["TOP_FRACTION_CUTOFF", (scores) => [scores, 0.05]],
  ["CUTOFF_LIMITS", (scores) => [scores, 0.05]],
  ["GATED_CUTOFF_LIMITS", (scores) => [scores, 40, 3, 0.05]],
  ["SAFE_CUTOFF", (scores) => [scores, 0.05]],
  ["NEXT_SCORE_CUTOFF", (scores) => [scores, 0.05]],
  ["RANK_CUTOFF", (scores) => [scores, 0.05]],
  ["CLEARANCE_CONFIDENCE", (scores) => [60, scores, 0.05]],
  ["CUTOFF_REPORT", (scores) => [scores, 0.05]],
];

describe.each(ofScores)("%s of a score column", (name, given) => {
  test.each<[string, Argument, string]>([
    ["a text", column(50, "two", 60, 70), "the 2nd cell"],
    ["a heading", column("price", 50, 60, 70), "looks like a heading"],
    ["TRUE", column(50, 60, true, 70), "the 3rd cell holds TRUE"],
    ["an error", column(50, 60, 70, { code: "#DIV/0!" }), "#DIV/0!"],
    ["no spread", column(50, 50, 50), "50"],
  ])("refuses %s by name", (_, scores, shown) =>
    expectOutcome(call(name, ...given(scores)), { formula: name, error: "#VALUE!", mentions: ["scores", shown] }),
  );

  test("one score so far is no answer yet", () =>
    expectOutcome(call(name, ...given(column(null, 50, " "))), {
      formula: name,
      error: "#N/A",
      mentions: ["scores"],
    }));

  test("blanks of any kind between, and any shape of the range, change nothing in the marks", () => {
    const marks = (scores: Argument) => {
      const outcome = call(name, ...given(scores));
      expect(outcome).toHaveProperty("value");
      const { value } = outcome as { value: unknown };
      return Array.isArray(value) ? (value as unknown[][]).filter(([label]) => label !== "blanks skipped") : value;
    };
    const plain = marks(five);
    expect(marks(column(null, 54, 52.3, "", 60.4, 43.4, "  ", 50.5))).toEqual(plain);
    expect(marks([[54, 52.3, 60.4, 43.4, 50.5]])).toEqual(plain);
  });
});

describe("refusals name the argument and show what came", () => {
  test.each<[string, Argument[], string, string]>([
    ["TOP_FRACTION_CUTOFF", [five, 5], "fraction", "5"],
    ["TOP_FRACTION_CUTOFF", [five, null], "fraction", "nothing"],
    ["TOP_FRACTION_CUTOFF", [five, "5 of 100"], "fraction", '"5 of 100"'],
    ["TOP_FRACTION_CUTOFF", [five, true], "fraction", "TRUE"],
    ["TOP_FRACTION_CUTOFF", [five, 0.05, "gamma"], "shape", "gamma"],
    ["TOP_FRACTION_CUTOFF", [column(-1, 2, 3), 0.05, "lognormal"], "scores", "-1"],
    ["TOP_FRACTION_CUTOFF", [five, 0.05, null, "lower"], "better", '"lower"'],
    ["CURVE_CUTOFF", [null, 8, 0.05], "mean", "nothing"],
    ["CURVE_CUTOFF", [64, 0, 0.05], "sd", "0"],
    ["CURVE_CUTOFF", [64, 8, 1], "fraction", "1"],
    ["CURVE_CUTOFF", [64, 8, 0.05, 1], "better", "1"],
    ["CUTOFF_LIMITS", [five, 0.05, 95], "confidence", "95"],
    ["CUTOFF_LIMITS", [five, 0.05, null, null, null, "limit"], "item", '"limit"'],
    ["CURVE_CUTOFF_LIMITS", [1, 64, 8, 0.05], "count", "1"],
    ["CURVE_CUTOFF_LIMITS", [12.5, 64, 8, 0.05], "count", "12.5"],
    ["CURVE_CUTOFF_LIMITS", [20, "x", 8, 0.05], "mean", '"x"'],
    ["CURVE_CUTOFF_LIMITS", [20, 64, -8, 0.05], "sd", "-8"],
    ["CURVE_CUTOFF_LIMITS", [20, 64, 8, 0.05, 0], "confidence", "0"],
    ["CURVE_CUTOFF_LIMITS", [20, 64, 8, 0.05, null, null, "mark"], "item", '"mark"'],
    ["GATED_CUTOFF_LIMITS", [five, 44, 3, 0.05], "gate", "43.4"],
    ["GATED_CUTOFF_LIMITS", [five, 40, -1, 0.05], "below_count", "-1"],
    ["GATED_CUTOFF_LIMITS", [five, 40, 3, 0], "fraction", "0"],
    ["GATED_CUTOFF_LIMITS", [five, 40, 3, 0.05, 1], "confidence", "1"],
    ["SAFE_CUTOFF", [five, 0.05, "sure"], "confidence", '"sure"'],
    ["NEXT_SCORE_CUTOFF", [five, -0.05], "fraction", "-0.05"],
    ["RANK_CUTOFF", [five, 0.05, 1], "confidence", "1"],
    ["RANK_CUTOFF", [five, 0.05, null, "up"], "better", '"up"'],
    ["RANK_CUTOFF", [five, 0.05, null, null, "confidence"], "item", '"confidence"'],
    ["TOLERANCE_FACTOR", [1, 0.95], "count", "1"],
    ["TOLERANCE_FACTOR", [10, 95], "coverage", "95"],
    ["TOLERANCE_FACTOR", [10, 0.95, 0], "confidence", "0"],
    ["TOLERANCE_FACTOR", [10, 0.95, 0.95, 3], "sides", "3"],
    ["CLEARANCE_CONFIDENCE", [column(60, "x"), five, 0.05], "score", "the 2nd cell"],
    ["CLEARANCE_CONFIDENCE", [60, five, 5], "fraction", "5"],
    ["CUTOFF_VERDICT", [column(60, "x"), 50, 55], "score", "the 2nd cell"],
    ["CUTOFF_VERDICT", [60, 55, 50], "lower_limit", "55"],
    ["CUTOFF_VERDICT", [60, null, 55], "lower_limit", "nothing"],
    ["CUTOFF_VERDICT", [60, 50, "some"], "upper_limit", '"some"'],
    ["CUTOFF_REPORT", [five, 0.05, 95], "confidence", "95"],
    ["CUTOFF_REPORT", [five, 0.05, null, "bell"], "shape", "bell"],
    ["CUTOFF_REPORT", [five, 0.05, null, null, null, "mark"], "item", '"mark"'],
  ])("%s: %#", (name, given, argument, shown) =>
    expectOutcome(call(name, ...given), { formula: name, error: "#VALUE!", mentions: [argument, shown] }),
  );
});

describe("the verdict column", () => {
  test("by hand, with a blank left blank and 'none' as no limit on its side", () => {
    expect(call("CUTOFF_VERDICT", column(40, null, 52, 55), 50, 55)).toEqual({
      value: [["falls short"], [""], ["too close to call"], ["clears"]],
    });
    expect(call("CUTOFF_VERDICT", column(40, 1e9), 50, " None ")).toEqual({
      value: [["falls short"], ["too close to call"]],
    });
  });
});
