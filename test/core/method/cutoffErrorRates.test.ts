import { describe, expect, test } from "vitest";
import { cutoffErrorRates } from "../../../src/core/method/cutoffErrorRates";
import type { MarkMethod } from "../../../src/core/method/markFactor";
import reference from "../../reference/risk/values.json";
import { relativeError } from "../../support/relativeError";

type Row = [number, number, MarkMethod, number, [number, number, number]];

describe("cutoffErrorRates", () => {
  test.each(reference.errorRates as unknown as Row[])(
    "count %d, fraction %d, %s: the definition, E[(Φ̄(T) − p)⁺] and E[(p − Φ̄(T))⁺], over mean and spread of the sample in 25 digits",
    (count, fraction, method, confidence, [passing, passedNotTop, topMissed]) => {
      const rates = cutoffErrorRates(count, fraction, method, confidence);
      expect(relativeError(rates.passingFraction, passing)).toBeLessThanOrEqual(1e-12);
      expect(relativeError(rates.passedNotTop, passedNotTop)).toBeLessThanOrEqual(1e-12);
      expect(relativeError(rates.topMissed, topMissed)).toBeLessThanOrEqual(1e-12);
    },
  );

  test("by hand: half of a curve, from 2 scores: T is Z/√2, and T < X < 0 is a wedge between the axis and Z = √2·X", () => {
    const wedge = (Math.PI / 2 - Math.atan(Math.SQRT2)) / (2 * Math.PI);
    expect(relativeError(cutoffErrorRates(2, 0.5).wronglyPassed, wedge)).toBeLessThanOrEqual(1e-12);
  });

  test.each<MarkMethod>(["plain", "safe", "next"])(
    "law: what passes is what is truly top, less what is missed, plus what is wrongly passed (%s)",
    (method) => {
      for (const [count, fraction] of [
        [2, 0.3],
        [7, 1e-4],
        [40, 0.05],
        [3000, 0.6],
        [1e6, 1e-6],
        [1e6, 0.5],
      ] as const) {
        const { passingFraction, wronglyPassed, wronglyMissed } = cutoffErrorRates(count, fraction, method, 0.9);
        expect(relativeError(fraction - wronglyMissed + wronglyPassed, passingFraction)).toBeLessThanOrEqual(1e-11);
      }
    },
  );

  test("law: the next-score mark passes exactly the fraction on average, so both errors weigh the same", () => {
    for (const count of [2, 5, 60, 1000]) {
      const rates = cutoffErrorRates(count, 0.02, "next");
      expect(relativeError(rates.passingFraction, 0.02)).toBeLessThanOrEqual(1e-12);
      expect(relativeError(rates.passedNotTop, rates.topMissed)).toBeLessThanOrEqual(1e-11);
    }
  });

  test("law: errors fall as scores are added, like 1/√count in the end, for the safe mark too", () => {
    for (const method of ["plain", "next", "safe"] as const) {
      let before = { passedNotTop: 1, topMissed: 1 };
      for (const count of [2, 4, 10, 30, 100, 1000, 10_000]) {
        const rates = cutoffErrorRates(count, 0.1, method);
        expect(rates.topMissed).toBeLessThan(before.topMissed);
        if (method !== "safe") expect(rates.passedNotTop).toBeLessThan(before.passedNotTop);
        before = rates;
      }
      const [some, many] = [1e4, 1e6].map((count) => cutoffErrorRates(count, 0.1, method));
      expect(some!.topMissed / many!.topMissed).toBeGreaterThan(9.5);
      expect(some!.topMissed / many!.topMissed).toBeLessThan(10.5);
      expect(many!.topMissed).toBeLessThan(0.005);
    }
  });

  test("law: a surer mark passes fewer wrong ones and misses more right ones", () => {
    let before = cutoffErrorRates(30, 0.05, "plain");
    for (const confidence of [0.6, 0.8, 0.95, 0.999, 1 - 1e-9]) {
      const rates = cutoffErrorRates(30, 0.05, "safe", confidence);
      expect(rates.passedNotTop).toBeLessThan(before.passedNotTop);
      expect(rates.topMissed).toBeGreaterThan(before.topMissed);
      before = rates;
    }
  });

  test("the ends of the domain settle, and no share leaves 0 … 1", () => {
    for (const count of [2, 3, 10, 1000])
      for (const fraction of [1e-100, 1e-30, 1 - 1e-15])
        for (const [method, confidence] of [
          ["plain", 0.95],
          ["next", 0.95],
          ["safe", 1e-100],
          ["safe", 1 - 1e-15],
        ] as const) {
          const { passedNotTop, topMissed } = cutoffErrorRates(count, fraction, method, confidence);
          for (const share of [passedNotTop, topMissed]) {
            expect(share).toBeGreaterThanOrEqual(0);
            expect(share).toBeLessThanOrEqual(1);
          }
        }
  });

  test.each<[string, Parameters<typeof cutoffErrorRates>]>([
    ["count", [1, 0.1]],
    ["count", [2.5, 0.1]],
    ["count", [NaN, 0.1]],
    ["count", [Infinity, 0.1]],
    ["fraction", [10, 0]],
    ["fraction", [10, NaN]],
    ["fraction", [10, 1e-101]],
    ["confidence", [10, 0.1, "safe", 1e-101]],
    ["confidence", [10, 0.1, "safe", 1]],
    ["confidence", [10, 0.1, "plain", NaN]],
  ])("refuses a bad %s: %o", (argument, args) => {
    expect(() => cutoffErrorRates(...args)).toThrow(expect.objectContaining({ name: "DomainError", argument }));
  });
});
