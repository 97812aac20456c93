import fc from "fast-check";
import jstat from "jstat";
import { describe, expect, test } from "vitest";
import { fCdf } from "../../../src/core/distribution/fCdf";
import { fQuantile } from "../../../src/core/distribution/fQuantile";
import { fUpperTail } from "../../../src/core/distribution/fUpperTail";
import { studentTUpperTail } from "../../../src/core/distribution/studentTUpperTail";
import { randomRows } from "../../support/randomRows";
import { relativeError } from "../../support/relativeError";
import { testRefusals } from "../../support/refusals";
import { worstRow } from "../../support/vectors";

const { jStat } = jstat;
const degrees = fc.double({ min: 0, max: 6, noNaN: true }).map((log) => 10 ** log);

describe("the F distribution", () => {
  test.each([fCdf, fUpperTail, fQuantile])("$name agrees with mpmath at random points", (f) => {
    const worst = worstRow(randomRows(f.name), f);
    expect(worst.error, JSON.stringify(worst)).toBeLessThan(1e-13);
  });

  test("by hand: with 2 and 2 degrees of freedom it is x/(1 + x)", () => {
    for (const x of [1e-9, 0.2, 1, 7, 1e6]) {
      expect(relativeError(fCdf(x, 2, 2), x / (1 + x))).toBeLessThan(1e-14);
      expect(relativeError(fUpperTail(x, 2, 2), 1 / (1 + x))).toBeLessThan(1e-14);
    }
    expect(fQuantile(0.75, 2, 2)).toBeCloseTo(3, 13);
  });

  test("law: with 1 degree of freedom above it is the square of Student's t", () => {
    fc.assert(
      fc.property(degrees, fc.double({ min: 0.01, max: 20, noNaN: true }), (df, t) => {
        // The rounding of t² moves the tail by up to t²·1e-16.
        expect(relativeError(fUpperTail(t * t, 1, df), 2 * studentTUpperTail(t, df))).toBeLessThan(
          1e-14 + 4e-16 * t * t,
        );
      }),
    );
  });

  test("law: exchanging the degrees of freedom turns x into 1/x and the tails around", () => {
    fc.assert(
      fc.property(degrees, degrees, fc.integer({ min: -20, max: 20 }), (df1, df2, power) => {
        const x = 2 ** (power / 2 + (power % 2) / 2); // 1/x is exact
        expect(Math.abs(fCdf(x, df1, df2) - fUpperTail(1 / x, df2, df1))).toBeLessThan(1e-14);
        expect(Math.abs(fCdf(x, df1, df2) + fUpperTail(x, df1, df2) - 1)).toBeLessThan(1e-15);
      }),
    );
  });

  test("law: the quantile takes the cdf back", () => {
    fc.assert(
      fc.property(degrees, degrees, fc.double({ min: 1e-12, max: 1 - 1e-12, noNaN: true }), (df1, df2, p) => {
        const x = fQuantile(p, df1, df2);
        expect(relativeError(fCdf(x, df1, df2), p)).toBeLessThan(1e-12);
      }),
    );
  });

  test("the ends", () => {
    expect([-1, 0, Infinity].map((x) => fCdf(x, 3, 4))).toEqual([0, 0, 1]);
    expect([-1, 0, Infinity].map((x) => fUpperTail(x, 3, 4))).toEqual([1, 1, 0]);
    expect([fQuantile(0, 3, 4), fQuantile(1, 3, 4)]).toEqual([0, Infinity]);
  });

  test("jstat 1.9.6, a different program, agrees within its own error", () => {
    for (const [df1, df2] of [
      [1, 5],
      [4, 12],
      [30, 100],
    ])
      for (const x of [0.2, 1, 3])
        expect(Math.abs(fCdf(x, df1, df2) - jStat.centralF.cdf(x, df1, df2))).toBeLessThan(1e-6);
  });

  testRefusals(fCdf, [
    ["x", NaN, 1, 1],
    ["df1", 1, 0, 1],
    ["df1", 1, NaN, 1],
    ["df2", 1, 1, -1],
    ["df2", 1, 1, Infinity],
  ]);
  testRefusals(fUpperTail, [
    ["x", NaN, 1, 1],
    ["df1", 1, 0, 1],
    ["df2", 1, 1, NaN],
  ]);
  testRefusals(fQuantile, [
    ["p", NaN, 1, 1],
    ["p", 2, 1, 1],
    ["df1", 0.5, 0, 1],
    ["df2", 0.5, 1, NaN],
  ]);
});
