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

describe("the public cases", () => {
  testCases("watch.json");
});

describe("DRIFT_FLAGS", () => {
  test("one score is enough, blanks are skipped and not numbered, scores all alike are fine", () => {
    const { value } = call('=WEIR.DRIFT_FLAGS({"";60;" ";60},60,8)') as { value: unknown[][] };
    expect(value.map((row) => row[0])).toEqual(["score number", 1, 2]);
    expect(value[1].at(-1)).toBe(false);
    expect(call("=WEIR.DRIFT_FLAGS(60,60,8)")).toHaveProperty("value");
  });

  test("scores in several columns are read row by row; the method in any case, trimmed", () => {
    const { value } = call('=WEIR.DRIFT_FLAGS({68,52;60,60},60,8," Cusum ")') as { value: unknown[][] };
    expect(value.slice(1, 3)).toEqual([
      [1, 0.5, 0, false],
      [2, 0, 0.5, false],
    ]);
  });

  test("no score yet is #N/A; one more than fits below the heading is refused by name", () => {
    expect(call('=WEIR.DRIFT_FLAGS({"";""},60,8)')).toMatchObject({
      error: "#N/A",
      message: expect.stringContaining("recent"),
    });
    const full = Array.from({ length: 1_048_576 }, () => [60]);
    expect(callFunction("DRIFT_FLAGS", [full, 60, 8] as Argument[])).toMatchObject({
      error: "#VALUE!",
      message: expect.stringMatching(/^recent must be at most 1048575 scores.*1048576 were given/),
    });
  });
});

describe("DRIFT_COMPARISON", () => {
  test("says nothing of Brown-Forsythe where two scores a batch leave nothing to compare, and all the rest", () => {
    expect(call("=WEIR.DRIFT_COMPARISON({1;3},{2;9})")).toMatchObject({
      value: [
        ["mean shift", 3.5],
        ["Welch t", expect.any(Number)],
        ["Welch p-value", expect.any(Number)],
        ["ratio of variances", 12.25],
        ["Brown-Forsythe p-value", ""],
        ["Kolmogorov-Smirnov distance", 0.5],
        ["Kolmogorov-Smirnov p-value", 1],
      ],
    });
  });

  test("the label in any case, trimmed", () => {
    expect(call('=WEIR.DRIFT_COMPARISON({1;2;3},{2;4;6}," RATIO of variances ")')).toEqual({ value: 4 });
  });

  test("too few scores is #N/A, scores all alike are refused, each by the name of its batch", () => {
    for (const [formula, error, argument] of [
      ['=WEIR.DRIFT_COMPARISON({1;""},{1;2})', "#N/A", "baseline"],
      ["=WEIR.DRIFT_COMPARISON({1;2},{1})", "#N/A", "recent"],
      ["=WEIR.DRIFT_COMPARISON({5;5;5},{1;2})", "#VALUE!", "baseline"],
      ["=WEIR.DRIFT_COMPARISON({1;2},{5;5;5})", "#VALUE!", "recent"],
    ] as const)
      expect(call(formula)).toMatchObject({ error, message: expect.stringMatching(new RegExp(`^${argument}`)) });
  });
});

describe("refusals name the argument and show what came", () => {
  test.each([
    ['=WEIR.DRIFT_FLAGS({60;"late"},60,8)', "recent", '"late"'],
    ['=WEIR.DRIFT_FLAGS({"recent";60;61},60,8)', "recent", "looks like a heading"],
    ['=WEIR.DRIFT_FLAGS({60},"x",8)', "mean", '"x"'],
    ["=WEIR.DRIFT_FLAGS({60},,8)", "mean", "left out"],
    ["=WEIR.DRIFT_FLAGS({60},60,-8)", "sd", "-8"],
    ['=WEIR.DRIFT_FLAGS({60},60,8,"shewhart")', "method", '"shewhart"'],
    ["=WEIR.DRIFT_FLAGS({60},60,8,2)", "method", "2"],
    ["=WEIR.DRIFT_COMPARISON({1;TRUE},{1;2})", "baseline", "TRUE"],
    ['=WEIR.DRIFT_COMPARISON({1;2},{1;"x"})', "recent", '"x"'],
    ['=WEIR.DRIFT_COMPARISON({1;2},{1;3},"t")', "item", '"t"'],
    ["=WEIR.DRIFT_COMPARISON({1;2},{1;3},7)", "item", "7"],
  ])("%s", (formula, argument, came) => {
    const outcome = call(formula) as { error: string; message: string };
    expect(outcome.error).toBe("#VALUE!");
    expect(outcome.message.startsWith(argument)).toBe(true);
    expect(outcome.message).toContain(came);
  });
});

test.each(["null", "empty", "zero"] as const)(
  "blanks handed over as %s change nothing where there are none",
  (policy) => {
    const scores = [[68], [52]];
    expect(callFunction("DRIFT_FLAGS", [scores, 60, 8, "cusum"], policy)).toEqual(
      call('=WEIR.DRIFT_FLAGS({68;52},60,8,"cusum")'),
    );
    expect(callFunction("DRIFT_COMPARISON", [scores, [[60], [61]], "mean shift"], policy)).toEqual({ value: 0.5 });
  },
);
