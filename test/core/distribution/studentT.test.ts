import fc from "fast-check";
import jstat from "jstat";
import { describe, expect, test } from "vitest";
import { normalPdf } from "../../../src/core/distribution/normalPdf";
import { normalQuantile } from "../../../src/core/distribution/normalQuantile";
import { normalUpperTail } from "../../../src/core/distribution/normalUpperTail";
import { studentTCdf } from "../../../src/core/distribution/studentTCdf";
import { studentTPdf } from "../../../src/core/distribution/studentTPdf";
import { studentTQuantile } from "../../../src/core/distribution/studentTQuantile";
import { studentTUpperTail } from "../../../src/core/distribution/studentTUpperTail";
import { studentTUpperTailQuantile } from "../../../src/core/distribution/studentTUpperTailQuantile";
import published from "../../reference/published/distribution_tables.json";
import { randomRows } from "../../support/randomRows";
import { relativeError } from "../../support/relativeError";
import { testRefusals } from "../../support/refusals";
import { readVectors, worstRow } from "../../support/vectors";

const { jStat } = jstat;
const degrees = fc.double({ min: -0.3, max: 7, noNaN: true }).map((log) => 10 ** log);

describe("Student's t distribution", () => {
  test.each([
    ["t_cdf", studentTCdf],
    ["t_quantile", studentTQuantile],
  ])("agrees with mpmath on vectors/%s.json", (file, f) => {
    const worst = worstRow(readVectors(`vectors/${file}.json`), f);
    expect(worst.error, JSON.stringify(worst)).toBeLessThan(1e-13);
  });

  test.each([studentTPdf, studentTCdf, studentTUpperTail, studentTQuantile, studentTUpperTailQuantile])(
    "$name agrees with mpmath at random points",
    (f) => {
      const worst = worstRow(randomRows(f.name), f);
      expect(worst.error, JSON.stringify(worst)).toBeLessThan(1e-13);
    },
  );

  test("the upper critical values of the NIST/SEMATECH e-Handbook, 1.3.6.7.2", () => {
    const item = published.items.find(({ id }) => id === "nist-t")!;
    const tails = (item.inputs as { upper_tail: number[] }).upper_tail;
    const printed = Object.entries(item.printed as unknown as Record<string, (number | null)[]>);
    expect(printed.length).toBeGreaterThan(3);
    for (const [df, row] of printed)
      row.forEach((value, i) => {
        if (value === null) return; // left out where the print is wrong
        expect(Math.abs(studentTUpperTailQuantile(tails[i], Number(df)) - value)).toBeLessThan(6e-4);
      });
  });

  test("by hand: with 1 degree of freedom it is the Cauchy law, with 2 it is algebraic", () => {
    for (const x of [1e-8, 0.5, 1, 3, 1e5, 1e20]) {
      expect(relativeError(studentTUpperTail(x, 1), Math.atan2(1, x) / Math.PI)).toBeLessThan(1e-14);
      expect(relativeError(studentTPdf(x, 1), 1 / (Math.PI * (1 + x * x)))).toBeLessThan(1e-14);
      const root = Math.sqrt(2 + x * x);
      expect(relativeError(studentTUpperTail(x, 2), 1 / (root * (root + x)))).toBeLessThan(2e-14);
    }
    expect(studentTQuantile(0.75, 1)).toBeCloseTo(1, 14);
    expect(relativeError(studentTUpperTailQuantile(1e-300, 1), 1e300 / Math.PI)).toBeLessThan(1e-13);
  });

  test("law: lower and upper tail mirror one another and add up to 1", () => {
    fc.assert(
      fc.property(degrees, fc.double({ min: -60, max: 60, noNaN: true }), (df, x) => {
        expect(studentTCdf(x, df)).toBe(studentTUpperTail(-x, df));
        expect(Math.abs(studentTCdf(x, df) + studentTUpperTail(x, df) - 1)).toBeLessThan(1e-15);
        expect(studentTPdf(x, df)).toBe(studentTPdf(-x, df));
      }),
    );
  });

  test("law: the quantile takes the upper tail back, far out too", () => {
    fc.assert(
      fc.property(degrees, fc.double({ min: -100, max: -0.31, noNaN: true }), (df, log) => {
        const p = 10 ** log;
        const x = studentTUpperTailQuantile(p, df);
        if (x < 1e150) expect(relativeError(studentTUpperTail(x, df), p)).toBeLessThan(2e-13);
        expect(studentTQuantile(p, df)).toBe(-x);
      }),
    );
  });

  test("law: next to the middle the quantile is (p − ½)/density, to all digits", () => {
    for (const df of [1, 5, 1000, 1e6])
      for (const step of [2 ** -40, 2 ** -30])
        expect(relativeError(studentTQuantile(0.5 + step, df), step / studentTPdf(0, df))).toBeLessThan(1e-13);
  });

  test("law: the density is the slope of the cdf", () => {
    fc.assert(
      fc.property(degrees, fc.double({ min: 0.1, max: 8, noNaN: true }), (df, x) => {
        const h = 1e-4;
        const slope = (studentTUpperTail(x - h, df) - studentTUpperTail(x + h, df)) / (2 * h);
        expect(relativeError(slope, studentTPdf(x, df))).toBeLessThan(3e-6);
      }),
    );
  });

  test("law: with ever more degrees of freedom it becomes the normal, and is the normal at ∞", () => {
    for (const x of [-3, 0.5, 2, 8]) {
      expect(studentTUpperTail(x, Infinity)).toBe(normalUpperTail(x));
      expect(studentTPdf(x, Infinity)).toBe(normalPdf(x));
      expect(relativeError(studentTUpperTail(x, 1e10), normalUpperTail(x))).toBeLessThan(2e-6);
    }
    expect(studentTQuantile(0.9, Infinity)).toBe(normalQuantile(0.9));
  });

  test("the ends", () => {
    expect([studentTCdf(-Infinity, 3), studentTCdf(0, 3), studentTCdf(Infinity, 3)]).toEqual([0, 0.5, 1]);
    expect([studentTUpperTail(-Infinity, 3), studentTUpperTail(Infinity, 3)]).toEqual([1, 0]);
    expect([studentTPdf(-Infinity, 3), studentTPdf(Infinity, 3)]).toEqual([0, 0]);
    expect([studentTQuantile(0, 3), studentTQuantile(0.5, 3), studentTQuantile(1, 3)]).toEqual([
      -Infinity,
      0,
      Infinity,
    ]);
    expect([studentTUpperTailQuantile(0, 3), studentTUpperTailQuantile(1, 3)]).toEqual([Infinity, -Infinity]);
  });

  test("jstat 1.9.6, a different program, agrees within its own error", () => {
    for (const df of [1, 4, 30, 1000])
      for (const p of [1e-5, 0.05, 0.3, 0.95]) {
        const theirs = jStat.studentt.inv(p, df);
        expect(relativeError(studentTQuantile(p, df), theirs)).toBeLessThan(1e-6);
        expect(Math.abs(studentTCdf(theirs, df) - jStat.studentt.cdf(theirs, df))).toBeLessThan(1e-7);
      }
  });

  testRefusals(studentTPdf, [
    ["x", NaN, 1],
    ["df", 1, 0],
    ["df", 1, NaN],
    ["df", 1, -Infinity],
  ]);
  testRefusals(studentTCdf, [
    ["x", NaN, 1],
    ["df", 1, 0],
    ["df", 1, NaN],
  ]);
  testRefusals(studentTUpperTail, [
    ["x", NaN, 1],
    ["df", 1, -1],
    ["df", 1, NaN],
  ]);
  testRefusals(studentTQuantile, [
    ["p", NaN, 1],
    ["p", 1.1, 1],
    ["df", 0.2, 0],
    ["df", 0.5, NaN],
  ]);
  testRefusals(studentTUpperTailQuantile, [
    ["p", NaN, 1],
    ["p", -0.1, 1],
    ["df", 0.2, 0],
    ["df", 0.5, NaN],
  ]);
});
