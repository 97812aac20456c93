import { describe, expect, test } from "vitest";
import { callFunction } from "../../src/functions/call";
import { processorTime } from "../support/processorTime";

type Given = Parameters<typeof callFunction>[1];
const call = (name: string, ...given: unknown[]) => callFunction(name, given as Given)!;
const table = (name: string, ...given: unknown[]) => (call(name, ...given) as { value: unknown[][] }).value;
const column = (...cells: unknown[]) => cells.map((cell) => [cell]);

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
