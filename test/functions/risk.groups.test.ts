import { describe, expect, test } from "vitest";
import { callFunction } from "../../src/functions/call";
import { processorTime } from "../support/processorTime";

type Given = Parameters<typeof callFunction>[1];
const call = (name: string, ...given: unknown[]) => callFunction(name, given as Given)!;
const table = (name: string, ...given: unknown[]) => (call(name, ...given) as { value: unknown[][] }).value;
const column = (...cells: unknown[]) => cells.map((cell) => [cell]);

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
    const time = (size: number, groups: unknown[][] = labels(size)) => {
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
