import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { ratioLimits } from "../../../src/core/method/ratioLimits";
import reference from "../../reference/risk/values.json";
import { relativeError } from "../../support/relativeError";

type Counts = [number, number, number, number];
const group = fc
  .integer({ min: 1, max: 60 })
  .chain((assessed) => fc.tuple(fc.integer({ min: 0, max: assessed }), fc.constant(assessed)));

describe("ratioLimits", () => {
  test.each(reference.ratioLimits as unknown as [...Counts, number, [number, number]][])(
    "%d of %d over %d of %d at %d agrees with Koopman's equation in 70 digits",
    (a, ofA, b, ofB, confidence, [lower, upper]) => {
      const limits = ratioLimits(a, ofA, b, ofB, confidence);
      expect(relativeError(limits.lower, lower)).toBeLessThanOrEqual(1e-13);
      expect(relativeError(limits.upper, upper)).toBeLessThanOrEqual(1e-13);
    },
  );

  test("the example of Koopman 1984: 36 of 40 over 16 of 80 has the limits 2.94 and 7.15 (from memory)", () => {
    const { lower, upper } = ratioLimits(36, 40, 16, 80, 0.95);
    expect(Math.abs(lower - 2.94)).toBeLessThanOrEqual(0.005);
    expect(Math.abs(upper - 7.15)).toBeLessThanOrEqual(0.005);
  });

  test("by hand: all passed on both sides: n/(n + z²) below and (n + z²)/n above", () => {
    const { lower, upper } = ratioLimits(20, 20, 30, 30, 0.95);
    const z2 = 3.841458820694124; // chi-square, 1 df, 0.95
    expect(relativeError(lower, 20 / (20 + z2))).toBeLessThanOrEqual(1e-13);
    expect(relativeError(upper, (30 + z2) / 30)).toBeLessThanOrEqual(1e-13);
  });

  test("laws: limits enclose the ratio, widen with confidence, and turn over with the sides", () => {
    fc.assert(
      fc.property(group, group, ([a, ofA], [b, ofB]) => {
        fc.pre(a > 0 && b > 0);
        const ratio = (a * ofB) / (ofA * b);
        const limits = ratioLimits(a, ofA, b, ofB, 0.95);
        expect(limits.lower).toBeLessThan(ratio);
        expect(limits.upper).toBeGreaterThan(ratio);
        const surer = ratioLimits(a, ofA, b, ofB, 0.99);
        expect(surer.lower).toBeLessThan(limits.lower);
        expect(surer.upper).toBeGreaterThan(limits.upper);
        const turned = ratioLimits(b, ofB, a, ofA, 0.95);
        expect(relativeError(1 / turned.upper, limits.lower)).toBeLessThanOrEqual(1e-12);
        expect(relativeError(1 / turned.lower, limits.upper)).toBeLessThanOrEqual(1e-12);
      }),
      { numRuns: 100 },
    );
  });

  test("a confidence that is 0 to the last digit leaves the ratio itself", () => {
    for (const limit of Object.values(ratioLimits(3, 10, 4, 10, 1e-300))) expect(limit).toBeCloseTo(0.75, 15);
    expect(ratioLimits(0, 10, 4, 10, 1e-300)).toEqual({ lower: 0, upper: 0 });
  });

  test("extremes settle: one against a million million, tiny and huge confidence", () => {
    for (const counts of [
      [0, 1, 1, 1e12],
      [1, 1e12, 1e12, 1e12],
      [1, 1, 1, 1],
      [1e12 - 1, 1e12, 1e12, 1e12],
    ] as Counts[])
      for (const confidence of [1e-9, 0.5, 1 - 1e-13]) {
        const { lower, upper } = ratioLimits(...counts, confidence);
        expect(lower).toBeGreaterThanOrEqual(0);
        expect(upper).toBeGreaterThanOrEqual(lower);
        expect(upper).toBeLessThan(Infinity);
      }
  });
});
