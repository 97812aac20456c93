import { describe, expect, test } from "vitest";
import { callFunction } from "../../src/functions/call";
import type { Argument } from "../../src/sheet/invoke";
import { expectOutcome, testCases } from "../support/cases";

describe("the public cases of the search functions", () => {
  testCases("search.json");
  testCases("search-new.json");
});

const call = (name: string, ...given: Argument[]) => callFunction(name, given)!;
const column = (...cells: unknown[]) => cells.map((cell) => [cell]) as Argument;
const reach = column(1, 0.4);
const costs = column(1, 6);

describe("refusals name the argument and show what came", () => {
  test.each<[string, Argument[], string, string]>([
    ["EXPECTED_TRIALS_TO_HIT", [5], "fraction", "5"],
    ["EXPECTED_TRIALS_TO_HIT", [null], "fraction", "nothing"],
    ["EXPECTED_TRIALS_TO_HIT", [0.05, 0], "hits", "0"],
    ["TRIALS_FOR_HIT_CHANCE", [0.05, 95], "chance", "95"],
    ["TRIALS_FOR_HIT_CHANCE", [0.05, "sure"], "chance", '"sure"'],
    ["TRIALS_FOR_HIT_CHANCE", [0.05, 0.95, 1.5], "hits", "1.5"],
    ["HIT_CHANCE", [1, 10], "fraction", "1"],
    ["HIT_CHANCE", [0.05, 12.5], "trials", "12.5"],
    ["HIT_CHANCE", [0.05, -1], "trials", "-1"],
    ["HIT_CHANCE", [0.05, 10, true], "hits", "TRUE"],
    ["POOL_EXPECTED_TRIALS", [0, 0], "pool", "0"],
    ["POOL_EXPECTED_TRIALS", [40, 41], "good", "41"],
    ["POOL_TRIALS_FOR_HIT_CHANCE", [40, 4, 1], "chance", "1"],
    ["POOL_TRIALS_FOR_HIT_CHANCE", [40, null, 0.9], "good", "nothing"],
    ["POOL_HIT_CHANCE", [40, 4, 41], "trials", "41"],
    ["POOL_HIT_CHANCE", [40.5, 4, 10], "pool", "40.5"],
    ["CURVE_HIT_CHANCE", [1, 64, 8, 80, 10], "count", "1"],
    ["CURVE_HIT_CHANCE", [20, null, 8, 80, 10], "mean", "nothing"],
    ["CURVE_HIT_CHANCE", [20, 64, 0, 80, 10], "sd", "0"],
    ["CURVE_HIT_CHANCE", [20, 64, 8, "x", 10], "cutoff", '"x"'],
    ["CURVE_HIT_CHANCE", [20, 64, 8, 80, 1.5], "trials", "1.5"],
    ["CURVE_HIT_CHANCE", [20, 64, 8, 80, 10, "up"], "better", '"up"'],
    ["SEARCH_DURATION", [0, 8, 0.9], "fraction", "0"],
    ["SEARCH_DURATION", [0.05, -8, 0.9], "arrivals_per_period", "-8"],
    ["SEARCH_DURATION", [0.05, 8, 0], "chance", "0"],
    ["SEARCH_DURATION", [0.05, 8, 0.9, 2.5], "hits", "2.5"],
    ["STAGE_LOAD", [column(0.9, 0.4), costs, 0.1], "reach", "0.9"],
    ["STAGE_LOAD", [column(1, "some"), costs, 0.1], "reach", "some"],
    ["STAGE_LOAD", [column(1, { code: "#REF!" }), costs, 0.1], "reach", "#REF!"],
    ["STAGE_LOAD", [reach, column(1, -6), 0.1], "costs", "-6"],
    ["STAGE_LOAD", [reach, column(1), 0.1], "costs", "1"],
    ["STAGE_LOAD", [reach, costs, 0.5], "fraction", "0.5"],
    ["STAGE_LOAD", [reach, costs, 0.1, 2.5], "learn_count", "2.5"],
    ["STAGE_LOAD", [reach, costs, 0.1, 0, 0], "hits", "0"],
    ["SEARCH_BUDGET", [5, reach, costs, 0.9], "fraction", "5"],
    ["SEARCH_BUDGET", [0.1, column(1, 1.2), costs, 0.9], "reach", "1.2"],
    ["SEARCH_BUDGET", [0.1, reach, column(1, "dear"), 0.9], "costs", "dear"],
    ["SEARCH_BUDGET", [0.1, reach, column(1, 20000.5), 0.9], "costs", "20000.5"],
    ["SEARCH_BUDGET", [0.1, reach, costs, 90], "chance", "90"],
    ["SEARCH_BUDGET", [0.1, reach, costs, 0.9, -1], "hits", "-1"],
  ])("%s: %#", (name, given, argument, shown) =>
    expectOutcome(call(name, ...given), { formula: name, error: "#VALUE!", mentions: [argument, shown] }),
  );

  test("more hits than good ones are no answer for the looks, and a chance of 0", () => {
    for (const [name, ...given] of [
      ["POOL_EXPECTED_TRIALS", 40, 4, 5],
      ["POOL_TRIALS_FOR_HIT_CHANCE", 40, 4, 0.9, 5],
    ] as [string, ...Argument[]][])
      expectOutcome(call(name, ...given), { formula: name, error: "#N/A", mentions: ["hits", "5"] });
    expect(call("POOL_HIT_CHANCE", 40, 4, 10, 5)).toEqual({ value: 0 });
  });
});

describe("what is left out", () => {
  test.each<[string, Argument[], Argument[]]>([
    ["EXPECTED_TRIALS_TO_HIT", [0.05], [1]],
    ["TRIALS_FOR_HIT_CHANCE", [0.05, 0.95], [1]],
    ["HIT_CHANCE", [0.05, 20], [1]],
    ["POOL_HIT_CHANCE", [40, 4, 10], [1]],
    ["CURVE_HIT_CHANCE", [20, 64, 8, 80, 10], ["high"]],
    ["SEARCH_DURATION", [0.05, 8, 0.9], [1]],
    ["STAGE_LOAD", [reach, costs, 0.1], [0, 1]],
    ["SEARCH_BUDGET", [0.1, reach, costs, 0.9], [1]],
  ])("%s: left out, blank or white space takes the default", (name, given, defaults) => {
    const expected = call(name, ...given, ...defaults);
    expect(expected).toHaveProperty("value");
    for (const none of [undefined, null, "", "  "])
      expect(call(name, ...given, ...defaults.map(() => none))).toEqual(expected);
  });
});
