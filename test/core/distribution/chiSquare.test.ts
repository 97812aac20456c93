import fc from "fast-check";
import jstat from "jstat";
import { describe, expect, test } from "vitest";
import { chiSquareCdf } from "../../../src/core/distribution/chiSquareCdf";
import { chiSquareQuantile } from "../../../src/core/distribution/chiSquareQuantile";
import { chiSquareUpperTail } from "../../../src/core/distribution/chiSquareUpperTail";
import { chiSquareUpperTailQuantile } from "../../../src/core/distribution/chiSquareUpperTailQuantile";
import published from "../../reference/published/distribution_tables.json";
import { randomRows } from "../../support/randomRows";
import { testRefusals } from "../../support/refusals";
import { readVectors, worstRow } from "../../support/vectors";

const { jStat } = jstat;

describe("the chi-square distribution", () => {
  test.each([
    ["chisq_cdf", chiSquareCdf],
    ["chisq_sf", chiSquareUpperTail],
    ["chisq_quantile", chiSquareQuantile],
  ])("agrees with mpmath on vectors/%s.json", (file, f) => {
    const worst = worstRow(readVectors(`vectors/${file}.json`), f);
    expect(worst.error, JSON.stringify(worst)).toBeLessThan(1e-13);
  });

  test.each([chiSquareCdf, chiSquareUpperTail])("$name agrees with mpmath at random points", (f) => {
    const worst = worstRow(randomRows(f.name), f);
    expect(worst.error, JSON.stringify(worst)).toBeLessThan(1e-13);
  });

  test("the table of Abramowitz & Stegun in published/distribution_tables.json (df, x, cdf)", () => {
    for (const [df, x, value] of published.data.chi2) expect(Math.abs(chiSquareCdf(x, df) - value)).toBeLessThan(1e-12);
  });

  test("the upper critical values of the NIST/SEMATECH e-Handbook, 1.3.6.7.4", () => {
    const item = published.items.find(({ id }) => id === "nist-chi2-upper")!;
    const tails = (item.inputs as { upper_tail: number[] }).upper_tail;
    const printed = Object.entries(item.printed as unknown as Record<string, number[]>);
    expect(printed.length).toBeGreaterThan(5);
    for (const [df, row] of printed)
      row.forEach((value, i) => {
        expect(Math.abs(chiSquareUpperTailQuantile(tails[i], Number(df)) - value)).toBeLessThan(6e-4);
      });
  });

  test("by hand: with 2 degrees of freedom the upper tail is e^(−x/2)", () => {
    for (const x of [0.1, 1, 5, 50, 400])
      expect(Math.abs(chiSquareUpperTail(x, 2) / Math.exp(-x / 2) - 1)).toBeLessThan(1e-13);
    expect(chiSquareUpperTailQuantile(0.05, 2)).toBeCloseTo(-2 * Math.log(0.05), 14);
  });

  test("law: quantiles of both tails take them back, and mirror one another", () => {
    const df = fc.double({ min: -0.3, max: 6, noNaN: true }).map((log) => 10 ** log);
    fc.assert(
      fc.property(df, fc.integer({ min: 1, max: 1023 }), (v, k) => {
        const p = k / 1024; // 1 − p is exact
        const x = chiSquareQuantile(p, v);
        expect(Math.abs(chiSquareCdf(x, v) / p - 1)).toBeLessThan(1e-13 * Math.max(1, Math.sqrt(v)));
        expect(Math.abs(chiSquareUpperTailQuantile(1 - p, v) / x - 1)).toBeLessThan(1e-14);
      }),
    );
  });

  test("the ends", () => {
    expect([chiSquareCdf(-1, 3), chiSquareCdf(0, 3), chiSquareCdf(Infinity, 3)]).toEqual([0, 0, 1]);
    expect([chiSquareUpperTail(-1, 3), chiSquareUpperTail(0, 3), chiSquareUpperTail(Infinity, 3)]).toEqual([1, 1, 0]);
    expect([chiSquareQuantile(0, 3), chiSquareQuantile(1, 3)]).toEqual([0, Infinity]);
    expect([chiSquareUpperTailQuantile(0, 3), chiSquareUpperTailQuantile(1, 3)]).toEqual([Infinity, 0]);
  });

  test("jstat 1.9.6, a different program, agrees within its own error", () => {
    for (const df of [0.5, 1, 7, 100, 1e4])
      for (const p of [1e-5, 0.05, 0.5, 0.95, 0.9999]) {
        const theirs = jStat.chisquare.inv(p, df);
        expect(Math.abs(chiSquareQuantile(p, df) / theirs - 1)).toBeLessThan(1e-10);
        expect(Math.abs(chiSquareCdf(theirs, df) / jStat.chisquare.cdf(theirs, df) - 1)).toBeLessThan(1e-9);
      }
  });

  testRefusals(chiSquareCdf, [
    ["x", NaN, 1],
    ["df", 1, 0],
    ["df", 1, NaN],
    ["df", 1, Infinity],
  ]);
  testRefusals(chiSquareUpperTail, [
    ["x", NaN, 1],
    ["df", 1, -2],
    ["df", 1, NaN],
  ]);
  testRefusals(chiSquareQuantile, [
    ["p", 1.5, 5],
    ["p", NaN, 5],
    ["df", 0.5, 0],
    ["df", 0.5, NaN],
  ]);
  testRefusals(chiSquareUpperTailQuantile, [
    ["p", -1, 5],
    ["p", NaN, 5],
    ["df", 0.5, 0],
    ["df", 0.5, -Infinity],
  ]);
});
