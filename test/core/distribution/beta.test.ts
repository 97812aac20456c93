import fc from "fast-check";
import jstat from "jstat";
import { describe, expect, test } from "vitest";
import { betaCdf } from "../../../src/core/distribution/betaCdf";
import { betaQuantile } from "../../../src/core/distribution/betaQuantile";
import { betaUpperTail } from "../../../src/core/distribution/betaUpperTail";
import { randomRows } from "../../support/randomRows";
import { relativeError } from "../../support/relativeError";
import { testRefusals } from "../../support/refusals";
import { readVectors, worstRow } from "../../support/vectors";

const { jStat } = jstat;
const shapes = fc.double({ min: -1, max: 5.5, noNaN: true }).map((log) => 10 ** log);

describe("the beta distribution", () => {
  test.each([
    ["beta_cdf", betaCdf],
    ["beta_quantile", betaQuantile],
  ])("agrees with mpmath on vectors/%s.json", (file, f) => {
    const worst = worstRow(readVectors(`vectors/${file}.json`), f);
    expect(worst.error, JSON.stringify(worst)).toBeLessThan(1e-13);
  });

  test.each([betaCdf, betaUpperTail, betaQuantile])("$name agrees with mpmath at random points", (f) => {
    const worst = worstRow(randomRows(f.name), f);
    expect(worst.error, JSON.stringify(worst)).toBeLessThan(1e-13);
  });

  test("by hand: shapes (1, b) give 1 − (1 − x)^b, shapes (a, 1) give x^a", () => {
    for (const x of [1e-9, 0.1, 0.5, 0.9]) {
      expect(relativeError(betaCdf(x, 1, 7), -Math.expm1(7 * Math.log1p(-x)))).toBeLessThan(1e-14);
      expect(relativeError(betaUpperTail(x, 1, 7), (1 - x) ** 7)).toBeLessThan(1e-14);
      expect(relativeError(betaCdf(x, 3.5, 1), x ** 3.5)).toBeLessThan(5e-14);
    }
    expect(betaQuantile(0.5, 2, 2)).toBeCloseTo(0.5, 15);
  });

  test("two points on which a first version failed: 1e-11 off, and no answer at all", () => {
    // mpmath 1.3.0, 150 digits.
    expect(relativeError(betaCdf(0.999996, 96290, 0.48), 0.365666362522376456)).toBeLessThan(1e-13);
    expect(relativeError(betaQuantile(0.709, 0.94, 4707), 0.000245548778939097047)).toBeLessThan(1e-13);
  });

  test("law: both tails add up to 1, and exchanging the shapes exchanges them", () => {
    fc.assert(
      fc.property(shapes, shapes, fc.integer({ min: 1, max: 4095 }), (a, b, k) => {
        const x = k / 4096; // 1 − x is exact
        expect(Math.abs(betaCdf(x, a, b) + betaUpperTail(x, a, b) - 1)).toBeLessThan(2e-15);
        expect(betaUpperTail(1 - x, b, a)).toBe(betaCdf(x, a, b));
      }),
    );
  });

  test("law: the quantile takes the cdf back", () => {
    fc.assert(
      fc.property(shapes, shapes, fc.double({ min: 1e-12, max: 1 - 1e-12, noNaN: true }), (a, b, p) => {
        const x = betaQuantile(p, a, b);
        expect(x).toBeGreaterThanOrEqual(0);
        expect(x).toBeLessThanOrEqual(1);
        // Where x is next to 1, or next to nothing, a double no longer tells it apart from its neighbours.
        if (x < 0.5 && x > 1e-250)
          expect(relativeError(betaCdf(x, a, b), p)).toBeLessThan(5e-16 * (500 + Math.sqrt(a * b) + a));
      }),
      { numRuns: 300 },
    );
  });

  test("law: the cdf rises with x", () => {
    fc.assert(
      fc.property(shapes, shapes, fc.double({ min: 0, max: 0.99, noNaN: true }), (a, b, x) => {
        expect(betaCdf(x + 0.01, a, b)).toBeGreaterThanOrEqual(betaCdf(x, a, b) * (1 - 1e-13));
      }),
    );
  });

  test("the ends: x outside 0 … 1, chances 0 and 1", () => {
    expect([-1, 0, 1, 2, Infinity, -Infinity].map((x) => betaCdf(x, 2, 3))).toEqual([0, 0, 1, 1, 1, 0]);
    expect([-1, 0, 1, 2].map((x) => betaUpperTail(x, 2, 3))).toEqual([1, 1, 0, 0]);
    expect([betaQuantile(0, 2, 3), betaQuantile(1, 2, 3)]).toEqual([0, 1]);
  });

  test("jstat 1.9.6, a different program, agrees within its own error", () => {
    for (const [a, b] of [
      [1, 1],
      [2.5, 7],
      [100, 30],
      [1000, 5000],
    ])
      for (const p of [1e-5, 0.05, 0.5, 0.95]) {
        const theirs = jStat.beta.inv(p, a, b);
        expect(relativeError(betaQuantile(p, a, b), theirs)).toBeLessThan(1e-6);
        expect(Math.abs(betaCdf(theirs, a, b) - jStat.beta.cdf(theirs, a, b))).toBeLessThan(1e-6);
      }
  });

  testRefusals(betaCdf, [
    ["x", NaN, 1, 1],
    ["a", 0.5, 0, 1],
    ["a", 0.5, NaN, 1],
    ["b", 0.5, 1, -1],
    ["b", 0.5, 1, Infinity],
  ]);
  testRefusals(betaUpperTail, [
    ["x", NaN, 1, 1],
    ["a", 0.5, 0, 1],
    ["b", 0.5, 1, NaN],
  ]);
  testRefusals(betaQuantile, [
    ["p", NaN, 1, 1],
    ["p", 1.1, 1, 1],
    ["a", 0.5, 0, 1],
    ["b", 0.5, 1, 0],
    ["b", 0.5, 1, NaN],
  ]);
});
