import { describe, expect, test } from "vitest";
import { normalUpperTailQuantile } from "../../../src/core/distribution/normalUpperTailQuantile";
import { markAbove, markBelow, passingFractionLimits } from "../../../src/core/method/passingFractionLimits";
import { samplesForCutoffPrecision } from "../../../src/core/method/samplesForCutoffPrecision";

const attained = (count: number, fraction: number, low: number, high: number) => {
  const z = normalUpperTailQuantile(fraction);
  return 1 - markAbove(count, z, normalUpperTailQuantile(low)) - markBelow(count, z, normalUpperTailQuantile(high));
};

describe("samplesForCutoffPrecision", () => {
  test("law: it agrees with a walk through every count, even bounds and very uneven ones", () => {
    for (const [fraction, low, high] of [
      [0.05, 0.02, 0.1],
      [0.1, 0.08, 0.9],
      [0.1, 0.095, 0.3],
      [0.3, 0.001, 0.31],
      [0.5, 0.4, 0.55],
      [0.9, 0.6, 0.92],
      [0.01, 0.009, 0.5],
    ] as const) {
      const walk: number[] = [];
      for (let count = 2; count <= 1500; count++) walk[count] = attained(count, fraction, low, high);
      for (const confidence of [0.3, 0.45, 0.5, 0.52, 0.55, 0.6, 0.65, 0.7, 0.9]) {
        const first = walk.findIndex((chance) => chance >= confidence);
        if (first < 0) continue;
        const { count } = samplesForCutoffPrecision(fraction, low, high, confidence);
        expect(count, `${fraction} ${low} ${high} ${confidence}`).toBe(first);
      }
    }
  });

  test("law: just under a peak of the coverage the first count on its slope is found, just above it one far beyond the dip", () => {
    // Between 8 and 13 % with a mark meant for 8.0005 %: coverage peaks at 266 scores, falls up to 12,176 and then rises for good.
    const [fraction, low, high] = [0.080005, 0.08, 0.13];
    const walk: number[] = [];
    for (let count = 2; count <= 2000; count++) walk[count] = attained(count, fraction, low, high);
    const peak = walk.reduce((best, chance, count) => (chance > walk[best]! ? count : best), 2);
    expect(walk[peak + 1000]).toBeLessThan(walk[peak]!);
    for (const short of [1e-9, 1e-7, 1e-5]) {
      const confidence = walk[peak]! - short;
      expect(samplesForCutoffPrecision(fraction, low, high, confidence).count).toBe(
        walk.findIndex((chance) => chance >= confidence),
      );
    }
    expect(samplesForCutoffPrecision(fraction, low, high, walk[peak]! + 1e-6).count).toBeGreaterThan(12_176);
  });

  test("law: bounds at the central limits of a count are met by that count", () => {
    for (const count of [5, 60, 700]) {
      const { lowest, highest } = passingFractionLimits(count, 0.05, 0.9);
      expect(samplesForCutoffPrecision(0.05, lowest, highest, 0.9 - 1e-10).count).toBeLessThanOrEqual(count);
    }
  });

  test("the record adds up", () => {
    const { count, tooFew, tooMany, attained: chance } = samplesForCutoffPrecision(0.05, 0.02, 0.1, 0.9);
    expect(count).toBe(44);
    expect(tooFew + tooMany + chance).toBeCloseTo(1, 14);
    expect(chance).toBeGreaterThanOrEqual(0.9);
  });

  test.each<[string, [number, number, number, number]]>([
    ["fraction", [5, 0.02, 0.1, 0.9]],
    ["fraction", [NaN, 0.02, 0.1, 0.9]],
    ["low_fraction", [0.05, 0.05, 0.1, 0.9]],
    ["low_fraction", [0.05, NaN, 0.1, 0.9]],
    ["low_fraction", [0.05, 0, 0.1, 0.9]],
    ["high_fraction", [0.05, 0.02, 0.05, 0.9]],
    ["high_fraction", [0.05, 0.02, Infinity, 0.9]],
    ["confidence", [0.05, 0.02, 0.1, 1]],
    ["confidence", [0.05, 0.02, 0.1, NaN]],
  ])("refuses a bad %s: %o", (argument, given) => {
    expect(() => samplesForCutoffPrecision(...given)).toThrow(
      expect.objectContaining({ name: "DomainError", argument }),
    );
  });

  test("bounds that no countable number of scores meets have no answer, and say so at once", () => {
    const started = performance.now();
    expect(() => samplesForCutoffPrecision(0.05, 0.05 - 1e-11, 0.05 + 1e-11, 0.9)).toThrow(
      expect.objectContaining({ name: "NoAnswerError" }),
    );
    expect(performance.now() - started).toBeLessThan(250);
  });
});
