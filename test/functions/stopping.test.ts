import { describe, expect, test } from "vitest";
import { callFunction } from "../../src/functions/call";
import { testCases } from "../support/cases";
import { processorTime } from "../support/processorTime";

describe("stopping: the worked values of the independent program", () => {
  testCases("stopping.json");
  testCases("stopping-new.json");
});

describe.each(["empty", "zero"] as const)("stopping: the same where the host hands a blank over as %s", (blanks) => {
  testCases("stopping.json", undefined, blanks);
  testCases("stopping-new.json", undefined, blanks);
});

type Given = Parameters<typeof callFunction>[1];
const call = (name: string, ...given: unknown[]) => callFunction(name, given as Given)!;
const table = (name: string, ...given: unknown[]) => (call(name, ...given) as { value: unknown[][] }).value;

describe("stopping: optional arguments", () => {
  test.each([null, "", "  "])(
    "a blank (%j) discount, look_cost, fallback, goal, item or better is the default",
    (blank) => {
      expect(call("RESERVE_SCORE", 50, 10, 1, blank, blank)).toEqual(call("RESERVE_SCORE", 50, 10, 1));
      expect(call("RESERVE_SCHEDULE", 50, 10, 3, blank, blank, blank)).toEqual(call("RESERVE_SCHEDULE", 50, 10, 3));
      expect(call("RANK_ONLY_PLAN", 9, blank, blank)).toEqual(call("RANK_ONLY_PLAN", 9));
    },
  );

  test("words and labels are read in any case, trimmed", () => {
    expect(call("RESERVE_SCORE", 50, 10, 1, 1, " LOW ")).toEqual(call("RESERVE_SCORE", 50, 10, 1, 1, "low"));
    expect(call("RANK_ONLY_PLAN", 4, "Rank", " EXPECTED RANK")).toEqual({ value: 1.875 });
  });

  test("a fallback of 0 is a fallback, not one left out", () => {
    expect(table("RESERVE_SCHEDULE", 50, 10, 1, 0, 0)[1]![1]).toBe(0);
    expect(table("RESERVE_SCHEDULE", 50, 10, 1, 0)[1]![1]).toBe("");
  });

  test("the heading says highest with better low", () => {
    expect(table("RESERVE_SCHEDULE", 50, 10, 1, 0, null, "low")[0]![1]).toBe("highest score to accept");
  });

  test("a mark held at the fallback is the fallback to the bit", () => {
    for (const row of table("RESERVE_SCHEDULE", 50.1, 10.3, 6, 60, 48.7).slice(1))
      expect(row.slice(1, 3)).toEqual([48.7, 48.7]);
  });
});

describe("stopping: refusals name the argument and show what came", () => {
  test.each<[string, unknown[], string, string]>([
    ["RESERVE_SCORE", ["ten", 8, 1], "mean", "ten"],
    ["RESERVE_SCORE", [NaN, 8, 1], "mean", "NaN"],
    ["RESERVE_SCORE", [62, 0, 1], "sd", "0"],
    ["RESERVE_SCORE", [62, Infinity, 1], "sd", "Infinity"],
    ["RESERVE_SCORE", [62, 8, -1], "look_cost", "-1"],
    ["RESERVE_SCORE", [62, 8, 0, 1], "look_cost", "0"],
    ["RESERVE_SCORE", [62, 8, null], "look_cost", "nothing"],
    ["RESERVE_SCORE", [62, 8, 1, 0], "discount", "0"],
    ["RESERVE_SCORE", [62, 8, 1, -0.5], "discount", "-0.5"],
    ["RESERVE_SCORE", [62, 8, 1, 98], "discount", "98"],
    ["RESERVE_SCORE", [62, 8, 1, 1, true], "better", "TRUE"],
    ["RESERVE_SCORE", [1e300, 1e-300, 1, 0.5], "sd", "1e-300"],
    ["RESERVE_SCHEDULE", [{ code: "#N/A" }, 8, 3], "mean", "#N/A"],
    ["RESERVE_SCHEDULE", [62, -1, 3], "sd", "-1"],
    ["RESERVE_SCHEDULE", [62, 8, 0], "looks", "0"],
    ["RESERVE_SCHEDULE", [62, 8, 10001], "looks", "10001"],
    ["RESERVE_SCHEDULE", [62, 8, 3, -1], "look_cost", "-1"],
    ["RESERVE_SCHEDULE", [62, 8, 3, 1, false], "fallback", "FALSE"],
    ["RESERVE_SCHEDULE", [62, 8, 3, 1, Infinity], "fallback", "Infinity"],
    ["RESERVE_SCHEDULE", [62, 8, 3, 1, 60, "lower"], "better", "lower"],
    ["RESERVE_SCHEDULE", [-1e308, 1, 3, 1e308], "look_cost", "1e+308"],
    ["RESERVE_SCHEDULE", [0, 1e-300, 3, 0, 1e10], "fallback", "10000000000"],
    ["BEST_PICK_SCHEDULE", [1.5], "looks", "1.5"],
    ["BEST_PICK_SCHEDULE", [NaN], "looks", "NaN"],
    ["BEST_PICK_SCHEDULE", [10001], "looks", "10001"],
    ["BEST_PICK_CHANCE", [0], "looks", "0"],
    ["BEST_PICK_CHANCE", [1e6], "looks", "1000000"],
    ["BEST_PICK_CHANCE", [true], "looks", "TRUE"],
    ["RANK_ONLY_PLAN", [-Infinity], "looks", "-Infinity"],
    ["RANK_ONLY_PLAN", [10001, "rank"], "looks", "10001"],
    ["RANK_ONLY_PLAN", [10, 1], "goal", "1"],
    ["RANK_ONLY_PLAN", [10, "rank", "pass over first"], "item", "pass over first"],
    ["RANK_ONLY_PLAN", [10, "best", "expected rank"], "item", "expected rank"],
    ["RANK_ONLY_PLAN", [10, "best", 5], "item", "5"],
    ["RANK_ONLY_SCHEDULE", [10001], "looks", "10001"],
    ["RANK_ONLY_SCHEDULE", [[[5, 6]]], "looks", "2 columns"],
  ])("%s%j is refused, naming %s", (name, given, argument, came) => {
    const outcome = call(name, ...given) as { error: string; message: string };
    expect(outcome.error).toBe("#VALUE!");
    expect(outcome.message).toContain(argument);
    expect(outcome.message).toContain(came);
    expect(outcome.message).not.toContain("fault");
  });
});

describe("stopping: 10,000 looks", () => {
  test.each([
    ["RESERVE_SCHEDULE", [62, 8.5, 10000, 0.01, 60]],
    ["BEST_PICK_SCHEDULE", [10000]],
    ["BEST_PICK_CHANCE", [10000]],
    ["RANK_ONLY_PLAN", [10000, "rank"]],
    ["RANK_ONLY_PLAN", [10000]],
    ["RANK_ONLY_SCHEDULE", [10000]],
  ])("%s answers within 250 ms", (name, given) => {
    call(name, ...given);
    expect(processorTime(() => expect(call(name, ...given)).toHaveProperty("value"))).toBeLessThan(250);
  });
});
