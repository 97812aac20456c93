import { describe, expect, test } from "vitest";
import { cumulativeSums } from "../../../src/core/method/cumulativeSums";
import handbook from "../../reference/published/nist_handbook.json";

const item = handbook.items.find(({ id }) => id === "nist-6323-cusum")!;
const printed = item.printed as unknown as { upper: number[]; lower: number[]; first_signal: number };
const { target, k, h } = item.inputs as unknown as { target: number; k: number; h: number };
const SD = 0.635;

describe("cumulativeSums", () => {
  test("both sides and the first signal of the NIST example (e-Handbook 6.3.2.3; its misprints are left out)", () => {
    const { high, low, flags } = cumulativeSums(Float64Array.from(handbook.data.cusum20), target, SD, k / SD, h / SD);
    const tolerance = (item.tolerance as { abs: number }).abs;
    printed.upper.forEach((sum, i) => expect(Math.abs(high[i] * SD - sum)).toBeLessThanOrEqual(tolerance));
    printed.lower.forEach((sum, i) => expect(Math.abs(low[i] * SD - sum)).toBeLessThanOrEqual(tolerance));
    expect(flags.indexOf(true) + 1).toBe(printed.first_signal);
  });

  test("by hand: scores 2 and then 0 deviations above the mean leave 1.5 and then 1 on the high side", () => {
    const { high, low } = cumulativeSums(Float64Array.of(76, 60), 60, 8);
    expect([...high]).toEqual([1.5, 1]);
    expect([...low]).toEqual([0, 0]);
  });

  test("a sum on the limit by its digits is not flagged, one beyond it is; there is no reset", () => {
    // 0.1 + k is no whole number of binary places: ten times 1 − 0.5 must still be 5.
    for (const [mean, sd] of [
      [60, 8],
      [0.1, 0.7],
    ]) {
      const scores = Float64Array.from({ length: 12 }, () => mean + sd);
      expect(cumulativeSums(scores, mean, sd).flags.indexOf(true)).toBe(10);
      expect(cumulativeSums(scores, mean, sd).flags.slice(10)).toEqual([true, true]);
    }
  });

  test("law: mirrored scores exchange the sides", () => {
    const scores = Float64Array.of(61, 75, 48, 52, 80, 33, 59);
    const there = cumulativeSums(scores, 60, 8);
    const back = cumulativeSums(
      scores.map((x) => 120 - x),
      60,
      8,
    );
    expect(back.low).toEqual(there.high);
    expect(back.high).toEqual(there.low);
  });

  test.each<[string, number, number, number]>([
    ["mean", NaN, 8, 60],
    ["sd", 60, 0, 60],
    ["sd", 60, Infinity, 60],
    ["recent", 60, 8, NaN],
  ])("refuses a bad %s (mean %d, sd %d, score %d)", (argument, mean, sd, score) => {
    expect(() => cumulativeSums(Float64Array.of(score), mean, sd)).toThrow(
      expect.objectContaining({ name: "DomainError", argument }),
    );
  });
});
