import { describe, expect, test } from "vitest";
import { markAbove, markBelow, passingFractionLimits } from "../../../src/core/method/passingFractionLimits";
import reference from "../../reference/plan/plan.json";
import { relativeError } from "../../support/relativeError";

describe("passingFractionLimits", () => {
  test.each(reference.passing.cases as [number, number, number, string, string][])(
    "count %d, fraction %d, confidence %d agrees with 30 digits of mpmath, without a noncentral t",
    (count, fraction, confidence, lowest, highest) => {
      const limits = passingFractionLimits(count, fraction, confidence);
      expect(relativeError(limits.lowest, Number(lowest))).toBeLessThanOrEqual(1e-11);
      expect(relativeError(limits.highest, Number(highest))).toBeLessThanOrEqual(1e-11);
    },
  );

  test.each(reference.marks.cases as [number, number, number, string][])(
    "the mark of %d scores at z = %d stands at or below %d with the chance that mpmath integrates",
    (count, z, t, chance) => {
      expect(relativeError(markBelow(count, z, t), Number(chance))).toBeLessThanOrEqual(1e-12);
      expect(relativeError(markAbove(count, z, t), 1 - Number(chance))).toBeLessThanOrEqual(1e-12);
    },
  );

  test("law: the limits close in on the fraction as the count grows, and open with the confidence", () => {
    let last = { lowest: 0, highest: 1 };
    for (const count of [2, 3, 10, 100, 1e4, 1e6, 1e9, 1e12]) {
      const limits = passingFractionLimits(count, 0.05, 0.9);
      expect(limits.lowest).toBeGreaterThan(last.lowest);
      expect(limits.highest).toBeLessThan(last.highest);
      expect(limits.lowest < 0.05 && limits.highest > 0.05).toBe(true);
      last = limits;
    }
    expect(last.highest - last.lowest).toBeLessThan(1e-6);
    last = { lowest: 1, highest: 0 };
    for (const confidence of [1e-9, 0.1, 0.5, 0.9, 0.999, 1 - 1e-12]) {
      const limits = passingFractionLimits(40, 0.3, confidence);
      expect(limits.lowest).toBeLessThan(last.lowest);
      expect(limits.highest).toBeGreaterThan(last.highest);
      last = limits;
    }
  });

  test("law: the mirror image: the limits for 1 − fraction are 1 − the limits for fraction", () => {
    for (const count of [2, 7, 60]) {
      const one = passingFractionLimits(count, 0.2, 0.9);
      const other = passingFractionLimits(count, 0.8, 0.9);
      expect(relativeError(other.lowest, 1 - one.highest)).toBeLessThan(1e-11);
      expect(relativeError(other.highest, 1 - one.lowest)).toBeLessThan(1e-11);
    }
  });

  test.each<[string, number, number, number]>([
    ["count", 1, 0.05, 0.9],
    ["count", 10.5, 0.05, 0.9],
    ["count", NaN, 0.05, 0.9],
    ["fraction", 10, 0, 0.9],
    ["fraction", 10, NaN, 0.9],
    ["confidence", 10, 0.05, 1],
    ["confidence", 10, 0.05, -Infinity],
  ])("refuses a bad %s: %d, %d, %d", (argument, count, fraction, confidence) => {
    expect(() => passingFractionLimits(count, fraction, confidence)).toThrow(
      expect.objectContaining({ name: "DomainError", argument }),
    );
  });
});
