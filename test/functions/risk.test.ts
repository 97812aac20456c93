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

describe("GROUP_PASS_RATES", () => {
  const rows = (groups: unknown[], passed: unknown[]) =>
    table("GROUP_PASS_RATES", column(...groups), column(...passed)).slice(1);

  test("labels are one in any case and trimmed, shown as they first appear; a number and its text are one", () => {
    const found = rows(["  Quay ", "quay", "QUAY", 7, "7", " 7", true, "TRUE"], [1, 0, 1, true, false, true, 0, 1]);
    expect(found.map((row) => row.slice(0, 3))).toEqual([
      ["Quay", 3, 2],
      [7, 3, 2],
      [true, 2, 1],
    ]);
  });

  test("rows blank in both are skipped, also white space; a blank label is never a group", () => {
    expect(rows(["a", null, "  ", "", "b"], [true, null, "", " ", false])).toHaveLength(2);
    expect(call("GROUP_PASS_RATES", column("a", null), column(1, 1))).toMatchObject({
      error: "#VALUE!",
      message: expect.stringMatching(/groups .*2nd cell holds nothing/) as string,
    });
    expect(call("GROUP_PASS_RATES", column("a", "b"), column("", 1))).toMatchObject({
      error: "#VALUE!",
      message: expect.stringMatching(/passed .*1st cell holds nothing/) as string,
    });
  });

  test("nothing filled in yet is no answer yet", () => {
    expect(call("GROUP_PASS_RATES", column(null, ""), column(null, null))).toMatchObject({ error: "#N/A" });
  });

  test("with nobody passed anywhere there is no ratio, nothing is below, and every p-value is 1", () => {
    expect(rows(["a", "b", "b"], [0, 0, 0])).toEqual([
      ["a", 1, 0, 0, "none", false, 1, 1],
      ["b", 2, 0, 0, "none", false, 1, 1],
    ]);
  });

  test("one group is its own highest", () => {
    expect(rows(["a", "a"], [1, 0])).toEqual([["a", 2, 1, 0.5, 1, false, 1, 1]]);
  });

  test("of several highest the first is held against the others, whose ratio is 1 and not below", () => {
    const found = rows(["a", "b", "c", "a", "b", "c"], [0, 1, 1, 0, 1, 1]);
    expect(found.map((row) => [row[0], row[4], row[5]])).toEqual([
      ["a", 0, true],
      ["b", 1, false],
      ["c", 1, false],
    ]);
    // 2 of 2 against 0 of 2: one of the 6 tables each way, so 2/6; adjusted over two comparisons 4/6, by hand.
    expect(found[0]![6]).toBeCloseTo(1 / 3, 14);
    expect(found[0]![7]).toBeCloseTo(2 / 3, 14);
  });

  test.each<[string, unknown, unknown, string[]]>([
    ["text among passed", column("a", "b"), column(1, "yes"), ["passed", "2nd", "yes"]],
    ["a heading taken along", column("berth", "a", "b"), column("passed", 1, 0), ["passed", "heading"]],
    ["a 2 among passed", column("a", "b"), column(1, 2), ["passed", "2"]],
    ["several bad cells", column("a", "b", "c"), column(1, "x", "y"), ["passed", "1 more"]],
    ["an error cell among passed", column("a", "b"), column(1, { code: "#REF!" }), ["passed", "#REF!"]],
    ["an error cell among groups", column("a", { code: "#N/A" }), column(1, 1), ["groups", "#N/A"]],
    ["unequal lengths", column("a", "b"), column(1), ["groups", "passed", "2", "1"]],
    [
      "a block",
      [
        ["a", "b"],
        ["c", "d"],
      ],
      column(1, 0, 1, 0),
      ["groups", "2 columns"],
    ],
  ])("%s is refused", (_, groups, passed, mentions) => {
    const outcome = call("GROUP_PASS_RATES", groups, passed) as { error: string; message: string };
    expect(outcome.error).toBe("#VALUE!");
    for (const mention of mentions) expect(outcome.message).toContain(mention);
  });

  test("100,000 cells and as many labels answer within 250 ms, a full column within 2 s", () => {
    const labels = (size: number) => Array.from({ length: size }, (_, i) => [`berth ${i % 40}`]);
    const marks = (size: number) => Array.from({ length: size }, (_, i) => [(i * 7919) % 13 < 5]);
    const time = (size: number, groups = labels(size)) => {
      const passed = marks(size);
      return processorTime(() => expect(call("GROUP_PASS_RATES", groups, passed)).toHaveProperty("value"));
    };
    time(50_000);
    expect(time(50_000)).toBeLessThan(250);
    expect(
      time(
        50_000,
        Array.from({ length: 50_000 }, (_, i) => [i]),
      ),
    ).toBeLessThan(250);
    expect(time(1_048_576)).toBeLessThan(2000);
  });
});

describe("PASS_RATE_RATIO", () => {
  test("exactly four fifths is not below, whichever side it is on and however large the counts", () => {
    for (const [a, ofA, b, ofB] of [
      [12, 30, 20, 40],
      [20, 40, 12, 30],
      [4, 5, 1, 1],
      [8e9, 3e10, 1e10, 3e10],
    ]) {
      expect(call("PASS_RATE_RATIO", a, ofA, b, ofB, null, "below four fifths")).toEqual({ value: false });
      expect(call("PASS_RATE_RATIO", a, ofA, b, ofB, null, "ratio of lower to higher")).toEqual({ value: 0.8 });
    }
    expect(call("PASS_RATE_RATIO", 8e9 - 1, 3e10, 1e10, 3e10, null, "below four fifths")).toEqual({ value: true });
  });
});

describe("SCORE_VALIDITY", () => {
  test("pairs with a blank on either side are skipped", () => {
    const scores = column(1, null, 3, 4, 5, 2, "");
    const outcomes = column(1, 9, 3, 5, 4, 2, "");
    expect(call("SCORE_VALIDITY", scores, outcomes, null, null, "pairs used")).toEqual({ value: 5 });
    expect(call("SCORE_VALIDITY", scores, outcomes, null, null, "correlation")).toMatchObject({
      value: expect.closeTo(0.9, 14) as number,
    });
  });

  test("fewer than 4 pairs are no answer yet, no spread is bad input", () => {
    expect(call("SCORE_VALIDITY", column(1, 2, 3, null), column(1, 2, 3, 4))).toMatchObject({ error: "#N/A" });
    expect(call("SCORE_VALIDITY", column(2, 2, 2, 2), column(1, 2, 3, 4))).toMatchObject({
      error: "#VALUE!",
      message: expect.stringContaining("scores") as string,
    });
    expect(call("SCORE_VALIDITY", column(1, 2, 3, 4), column(7, 7, 7, 7))).toMatchObject({
      error: "#VALUE!",
      message: expect.stringContaining("outcomes") as string,
    });
  });

  test("a perfect correlation has both limits at it", () => {
    const values = table("SCORE_VALIDITY", column(1, 2, 3, 4), column(2, 4, 6, 8)).map((row) => row[1]);
    expect(values.slice(1, 4).every((value) => Math.abs((value as number) - 1) < 1e-7)).toBe(true);
  });
});

describe("SCORE_RELIABILITY", () => {
  test("ratings that leave no residual have no answer, also when the levels are decimals; too few rows neither", () => {
    for (const ratings of [
      [
        [1, 2],
        [3, 4],
        [5, 6],
      ],
      [
        [0.1, 0.3],
        [0.7, 0.9],
        [1.1, 1.3],
      ],
      [
        [5, 5],
        [5, 5],
      ],
      [[7, 8, 9]],
    ])
      expect(call("SCORE_RELIABILITY", ratings)).toMatchObject({
        error: "#N/A",
        message: expect.stringContaining("ratings") as string,
      });
  });

  test("one rater, a blank or a text is refused", () => {
    expect(call("SCORE_RELIABILITY", column(1, 2, 3))).toMatchObject({
      error: "#VALUE!",
      message: expect.stringContaining("ratings") as string,
    });
    expect(
      call("SCORE_RELIABILITY", [
        [1, 2],
        [null, 4],
      ]),
    ).toMatchObject({ error: "#VALUE!", message: expect.stringContaining("3rd cell") as string });
    expect(
      call("SCORE_RELIABILITY", [
        ["Ann", "Bo"],
        [1, 4],
      ]),
    ).toMatchObject({ error: "#VALUE!", message: expect.stringContaining("ratings") as string });
  });

  test("forms that do not exist without a spread between entries say none", () => {
    const forms = table("SCORE_RELIABILITY", [
      [1, 3],
      [3, 1],
      [2, 2],
    ]);
    expect(forms[1]!.slice(0, 2)).toEqual(["ICC(1,1)", -1]);
    expect(forms[4]!.slice(0, 2)).toEqual(["ICC(1,k)", "none"]);
  });

  test("100,000 ratings answer within 250 ms", () => {
    const ratings = Array.from({ length: 25_000 }, (_, i) => [i % 7, (i * 3) % 11, (i * 5) % 13, i % 5]);
    call("SCORE_RELIABILITY", ratings);
    expect(processorTime(() => expect(call("SCORE_RELIABILITY", ratings)).toHaveProperty("value"))).toBeLessThan(250);
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
