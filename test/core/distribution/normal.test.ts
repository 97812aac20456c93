import fc from "fast-check";
import jstat from "jstat";
import { describe, expect, test } from "vitest";
import { normalCdf } from "../../../src/core/distribution/normalCdf";
import { normalPdf } from "../../../src/core/distribution/normalPdf";
import { normalQuantile } from "../../../src/core/distribution/normalQuantile";
import { normalUpperTail } from "../../../src/core/distribution/normalUpperTail";
import { normalUpperTailQuantile } from "../../../src/core/distribution/normalUpperTailQuantile";
import published from "../../reference/published/distribution_tables.json";
import { randomRows } from "../../support/randomRows";
import { testRefusals } from "../../support/refusals";
import { readVectors, worstRow } from "../../support/vectors";

const { jStat } = jstat;

describe("the normal distribution", () => {
  test.each([
    ["norm_cdf", normalCdf],
    ["norm_quantile", normalQuantile],
  ])("agrees with mpmath on vectors/%s.json", (file, f) => {
    const worst = worstRow(readVectors(`vectors/${file}.json`), f);
    expect(worst.error, JSON.stringify(worst)).toBeLessThan(2e-15);
  });

  test.each([normalPdf, normalCdf, normalUpperTail, normalQuantile, normalUpperTailQuantile])(
    "$name agrees with mpmath at random points",
    (f) => {
      const worst = worstRow(randomRows(f.name), f);
      expect(worst.error, JSON.stringify(worst)).toBeLessThan(2e-15);
    },
  );

  test("the table of Abramowitz & Stegun in published/distribution_tables.json (x, cdf)", () => {
    for (const [x, value] of published.data.norm) expect(Math.abs(normalCdf(x) - value)).toBeLessThan(1e-14);
  });

  test("by hand: half lies below 0, and 97.5 % below 1.959963984540054", () => {
    expect(normalCdf(0)).toBe(0.5);
    expect(normalQuantile(0.5)).toBe(0);
    expect(normalCdf(1.959963984540054)).toBeCloseTo(0.975, 15);
  });

  test("law: the lower tail at x is the upper tail at −x, and both add up to 1", () => {
    fc.assert(
      fc.property(fc.double({ min: -45, max: 45, noNaN: true }), (x) => {
        expect(normalCdf(x)).toBe(normalUpperTail(-x));
        expect(Math.abs(normalCdf(x) + normalUpperTail(x) - 1)).toBeLessThan(3e-16);
      }),
    );
  });

  test("law: the quantile takes the cdf back, far out too, and its mirror is exact", () => {
    fc.assert(
      fc.property(fc.double({ min: -37, max: 8, noNaN: true }), (x) => {
        const p = normalCdf(x);
        // The rounding of p moves x by 1.1e-16·p/φ(x).
        const slack = (2e-16 * p) / normalPdf(x) + 2e-15 * Math.abs(x);
        expect(Math.abs(normalQuantile(p) - x)).toBeLessThanOrEqual(slack);
        expect(normalUpperTailQuantile(p)).toBe(0 - normalQuantile(p));
      }),
    );
  });

  test("law: the cdf rises with x", () => {
    fc.assert(
      fc.property(
        fc.double({ min: -38, max: 8, noNaN: true }),
        fc.double({ min: 1e-6, max: 1, noNaN: true }),
        (x, step) => {
          expect(normalCdf(x + step)).toBeGreaterThanOrEqual(normalCdf(x));
        },
      ),
    );
  });

  test("the ends: ±∞, and chances of 0 and 1", () => {
    expect([normalPdf(-Infinity), normalPdf(Infinity), normalPdf(50)]).toEqual([0, 0, 0]);
    expect([normalCdf(-Infinity), normalCdf(Infinity)]).toEqual([0, 1]);
    expect([normalUpperTail(-Infinity), normalUpperTail(Infinity)]).toEqual([1, 0]);
    expect([normalQuantile(0), normalQuantile(1)]).toEqual([-Infinity, Infinity]);
    expect([normalUpperTailQuantile(0), normalUpperTailQuantile(1)]).toEqual([Infinity, -Infinity]);
  });

  test("jstat 1.9.6, a different program, agrees within its own error", () => {
    for (let x = -5; x <= 6; x += 0.25) {
      const theirs = jStat.normal.cdf(x, 0, 1);
      expect(Math.abs(normalCdf(x) - theirs)).toBeLessThan(1e-10 * theirs);
    }
    for (const p of [1e-6, 0.001, 0.05, 0.3, 0.5, 0.9, 0.999, 1 - 1e-6])
      expect(Math.abs(normalQuantile(p) - jStat.normal.inv(p, 0, 1))).toBeLessThan(1e-11);
  });

  testRefusals(normalPdf, [["x", NaN]]);
  testRefusals(normalCdf, [["x", NaN]]);
  testRefusals(normalUpperTail, [["x", NaN]]);
  testRefusals(normalQuantile, [
    ["p", NaN],
    ["p", -0.1],
    ["p", 1.1],
    ["p", Infinity],
  ]);
  testRefusals(normalUpperTailQuantile, [
    ["p", NaN],
    ["p", -0.1],
    ["p", 1.1],
    ["p", -Infinity],
  ]);
});
