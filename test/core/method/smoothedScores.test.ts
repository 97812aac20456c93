import { describe, expect, test } from "vitest";
import { smoothedScores } from "../../../src/core/method/smoothedScores";

// NIST/SEMATECH e-Handbook of Statistical Methods, section 6.3.2.4, https://www.itl.nist.gov/div898/handbook/pmc/section3/pmc324.htm:
// target 50, s 2.0539, λ 0.3; the printed averages, to two decimals, and the limits 52.5884 and 47.4115 (from the factor 0.4201, cut off).
const SCORES = [
  52.0, 47.0, 53.0, 49.3, 50.1, 47.0, 51.0, 50.1, 51.2, 50.5, 49.6, 47.6, 49.9, 51.3, 47.8, 51.2, 52.6, 52.4, 53.6,
  52.1,
];
const PRINTED = [
  50.6, 49.52, 50.56, 50.18, 50.16, 49.21, 49.75, 49.85, 50.26, 50.33, 50.11, 49.36, 49.52, 50.05, 49.38, 49.92, 50.73,
  51.23, 51.94, 51.99,
];

describe("smoothedScores", () => {
  test("the averages of the NIST example, and its limits where time has run out of them", () => {
    const { smoothed, lower, upper, flags } = smoothedScores(Float64Array.from(SCORES), 50, 2.0539, 0.3, 3);
    PRINTED.forEach((average, i) => expect(Math.abs(smoothed[i] - average)).toBeLessThanOrEqual(0.00501));
    expect(Math.abs(upper[19] - 52.5884)).toBeLessThan(1e-3);
    expect(Math.abs(lower[19] - 47.4115)).toBeLessThan(1e-3);
    expect(flags.some((flag) => flag)).toBe(false);
  });

  test("by hand: after one score the limits are mean ± L·λ·sd, after two ± L·λ·sd·√(1 + (1 − λ)²)", () => {
    const { lower, upper } = smoothedScores(Float64Array.of(60, 60), 60, 8);
    expect(upper[0]).toBeCloseTo(60 + 3 * 0.2 * 8, 12);
    expect(lower[1]).toBeCloseTo(60 - 3 * 0.2 * 8 * Math.sqrt(1.64), 12);
  });

  test("a score on the limit by its digits is not flagged, one beyond it is", () => {
    for (const [mean, sd] of [
      [60, 8],
      [0.1, 0.7],
      [71.3, 5.9],
    ]) {
      // One score: smoothed = mean + 0.2·(score − mean), the limit is mean + 0.6·sd.
      expect(smoothedScores(Float64Array.of(mean + 3 * sd), mean, sd).flags).toEqual([false]);
      expect(smoothedScores(Float64Array.of(mean - 3 * sd), mean, sd).flags).toEqual([false]);
      expect(smoothedScores(Float64Array.of(mean + 3.000001 * sd), mean, sd).flags).toEqual([true]);
    }
  });

  test("law: mirrored scores mirror everything", () => {
    const there = smoothedScores(Float64Array.from(SCORES), 50, 1);
    const back = smoothedScores(
      Float64Array.from(SCORES, (x) => 100 - x),
      50,
      1,
    );
    there.smoothed.forEach((z, i) => expect(back.smoothed[i]).toBeCloseTo(100 - z, 11));
    expect(back.flags).toEqual(there.flags);
    expect(there.flags).toContain(true);
  });

  test.each<[string, number, number, number]>([
    ["mean", NaN, 8, 60],
    ["mean", Infinity, 8, 60],
    ["sd", 60, 0, 60],
    ["sd", 60, -1, 60],
    ["sd", 60, NaN, 60],
    ["recent", 60, 8, NaN],
    ["recent", 60, 8, Infinity],
    ["recent", 60, 1e-300, 1e10],
  ])("refuses a bad %s (mean %d, sd %d, score %d)", (argument, mean, sd, score) => {
    expect(() => smoothedScores(Float64Array.of(score), mean, sd)).toThrow(
      expect.objectContaining({ name: "DomainError", argument }),
    );
  });
});
