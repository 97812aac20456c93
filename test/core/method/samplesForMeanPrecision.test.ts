import { describe, expect, test } from "vitest";
import { chiSquareCdf } from "../../../src/core/distribution/chiSquareCdf";
import { studentTUpperTailQuantile } from "../../../src/core/distribution/studentTUpperTailQuantile";
import { samplesForMeanPrecision } from "../../../src/core/method/samplesForMeanPrecision";

const count = (...given: Parameters<typeof samplesForMeanPrecision>) => samplesForMeanPrecision(...given).count;

describe("samplesForMeanPrecision", () => {
  test("by hand: with sd known, (1.959964 · 8/2)² = 61.46 → 62; with half the spread in half the width the same", () => {
    expect(count(2, 8, 0.95, true)).toBe(62);
    expect(count(1, 4, 0.95, true)).toBe(62);
    expect(count(100, 8, 0.95, true)).toBe(1);
  });

  test("law: with sd unknown it agrees with a walk through every count", () => {
    for (const confidence of [0.5, 0.9, 0.95, 0.999])
      for (const ratio of [20, 3, 1, 0.4, 0.1]) {
        let n = 2;
        while (studentTUpperTailQuantile((1 - confidence) / 2, n - 1) / Math.sqrt(n) > ratio) n++;
        expect(count(ratio, 1, confidence, false)).toBe(n);
      }
  });

  test("law: with an assurance it agrees with a walk through every count, low assurances included, where the chance first falls with n", () => {
    const assured = (n: number, ratio: number, confidence: number) => {
      const t = studentTUpperTailQuantile((1 - confidence) / 2, n - 1);
      return chiSquareCdf(((n - 1) * n * ratio * ratio) / (t * t), n - 1);
    };
    for (const confidence of [0.5, 0.9, 0.99])
      for (const ratio of [5, 1, 0.3, 0.1])
        for (const assurance of [0.0005, 0.02, 0.2, 0.5, 0.9, 0.99]) {
          let n = 2;
          while (assured(n, ratio, confidence) < assurance) n++;
          expect(count(ratio, 1, confidence, false, assurance), `${confidence} ${ratio} ${assurance}`).toBe(n);
        }
    // The chance at 2 scores exceeds that at 3: only "the smallest" keeps the answer at 2.
    expect(assured(2, 0.05, 0.95)).toBeGreaterThan(assured(3, 0.05, 0.95));
  });

  test("law: without an assurance the realised interval is wide enough about half the time: an assurance of 1/2 takes about as many", () => {
    const plain = count(2, 8, 0.95, false);
    const half = count(2, 8, 0.95, false, 0.5);
    expect(Math.abs(plain - half)).toBeLessThanOrEqual(1);
  });

  test("the record says what the count gives", () => {
    const { quantile, expectedHalfWidth, assured, count: n } = samplesForMeanPrecision(2, 8, 0.95, false, 0.9);
    expect(n).toBe(77);
    expect(expectedHalfWidth).toBeCloseTo((quantile * 8) / Math.sqrt(77), 14);
    expect(assured).toBeGreaterThanOrEqual(0.9);
    expect(samplesForMeanPrecision(2, 8, 0.95, false)).not.toHaveProperty("assured");
  });

  test.each<[string, Parameters<typeof samplesForMeanPrecision>]>([
    ["half_width", [0, 8, 0.95, false]],
    ["half_width", [NaN, 8, 0.95, false]],
    ["half_width", [Infinity, 8, 0.95, false]],
    ["sd", [2, -8, 0.95, false]],
    ["sd", [2, NaN, 0.95, true]],
    ["sd", [2, Infinity, 0.95, true]],
    ["confidence", [2, 8, 1, false]],
    ["confidence", [2, 8, NaN, false]],
    ["assurance", [2, 8, 0.95, false, 1]],
    ["assurance", [2, 8, 0.95, false, NaN]],
    ["assurance", [2, 8, 0.95, true, 0.9]],
  ])("refuses a bad %s: %o", (argument, given) => {
    expect(() => samplesForMeanPrecision(...given)).toThrow(expect.objectContaining({ name: "DomainError", argument }));
  });

  test("a width that no countable number of scores reaches has no answer", () => {
    for (const known of [true, false])
      expect(() => samplesForMeanPrecision(1e-9, 8, 0.95, known)).toThrow(
        expect.objectContaining({ name: "NoAnswerError", argument: "half_width" }),
      );
  });
});
