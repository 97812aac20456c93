import fc from "fast-check";
import jstat from "jstat";
import { describe, expect, test } from "vitest";
import { noncentralTCdf } from "../../../src/core/distribution/noncentralTCdf";
import { noncentralTQuantile } from "../../../src/core/distribution/noncentralTQuantile";
import { noncentralTUpperTail } from "../../../src/core/distribution/noncentralTUpperTail";
import { noncentralTUpperTailQuantile } from "../../../src/core/distribution/noncentralTUpperTailQuantile";
import { normalCdf } from "../../../src/core/distribution/normalCdf";
import { normalQuantile } from "../../../src/core/distribution/normalQuantile";
import { studentTCdf } from "../../../src/core/distribution/studentTCdf";
import { noncentralTTails } from "../../../src/core/special/noncentralTTails";
import published from "../../reference/published/distribution_tables.json";
import { randomRows } from "../../support/randomRows";
import { relativeError } from "../../support/relativeError";
import { testRefusals } from "../../support/refusals";
import { studentTUpperTailQuantile } from "../../../src/core/distribution/studentTUpperTailQuantile";
import { readVectors, worstRow } from "../../support/vectors";

const { jStat } = jstat;
/** df and ncp as they come up: ncp = z·√n. */
const use = fc
  .tuple(fc.double({ min: 0, max: 6, noNaN: true }), fc.double({ min: -5, max: 5, noNaN: true }))
  .map(([log, z]) => ({ df: 10 ** log, ncp: z * Math.sqrt(10 ** log + 1) }));

describe("the noncentral t distribution", () => {
  test.each([
    ["nct_cdf", noncentralTCdf],
    ["nct_quantile", noncentralTQuantile],
    [
      "tol_k1",
      (n: number, content: number, confidence: number) =>
        noncentralTQuantile(confidence, n - 1, normalQuantile(content) * Math.sqrt(n)) / Math.sqrt(n),
    ],
  ])("agrees with mpmath on vectors/%s.json", (file, f) => {
    const worst = worstRow(readVectors(`vectors/${file}.json`), f);
    expect(worst.error, JSON.stringify(worst)).toBeLessThan(1e-14);
  });

  test.each([noncentralTCdf, noncentralTUpperTail])("$name agrees with mpmath at random points", (f) => {
    const worst = worstRow(randomRows(f.name), f);
    expect(worst.error, JSON.stringify(worst)).toBeLessThan(1e-13);
  });

  test("law: without noncentrality it is Student's t, whose middle is 0", () => {
    for (const df of [1, 4, 30, 1e6])
      for (const p of [1e-9, 0.2, 0.5, 0.5 + 1e-12, 0.99]) {
        expect(noncentralTUpperTailQuantile(p, df, 0)).toBe(studentTUpperTailQuantile(p, df));
        expect(noncentralTQuantile(0.5, df, 0)).toBe(0);
      }
  });

  test("the printed table of published/distribution_tables.json, from Burkardt's collection (df, ncp, t, cdf)", () => {
    for (const [df, ncp, t, value] of published.data.nct)
      expect(Math.abs(noncentralTCdf(t, df, ncp) - value)).toBeLessThan(1e-9);
  });

  test("by hand: at 0 it is Φ(−ncp), whatever the degrees of freedom", () => {
    for (const ncp of [-3, 0, 0.5, 4, 12, 30])
      for (const df of [1, 7.5, 1e6])
        expect(relativeError(noncentralTCdf(0, df, ncp), normalCdf(-ncp))).toBeLessThan(1e-13);
  });

  test("law: without noncentrality it is Student's t", () => {
    fc.assert(
      fc.property(use, fc.double({ min: -30, max: 30, noNaN: true }), ({ df }, t) => {
        expect(relativeError(noncentralTCdf(t, df, 0), studentTCdf(t, df))).toBeLessThan(1e-13);
      }),
    );
  });

  test("law: both tails add up to 1, and −t with −ncp exchanges them", () => {
    fc.assert(
      fc.property(use, fc.double({ min: -6, max: 6, noNaN: true }), ({ df, ncp }, z) => {
        const t = ncp + z * Math.sqrt(1 + (ncp * ncp) / (2 * df));
        expect(Math.abs(noncentralTCdf(t, df, ncp) + noncentralTUpperTail(t, df, ncp) - 1)).toBeLessThan(2e-15);
        expect(noncentralTCdf(t, df, ncp)).toBe(noncentralTUpperTail(-t, df, -ncp));
      }),
      { numRuns: 60 },
    );
  });

  test("law: where the two ways of summing meet, at t = ncp, they agree", () => {
    fc.assert(
      fc.property(use, ({ df, ncp }) => {
        const t = Math.abs(ncp) + 0.01;
        const above = noncentralTTails(t, df, t * (1 - 2 ** -52));
        const below = noncentralTTails(t, df, t * (1 + 2 ** -52));
        expect(above.isLower).toBe(false);
        expect(below.isLower).toBe(true);
        expect(Math.abs(above.tail + below.tail - 1)).toBeLessThan(1e-15 * (1 + t));
      }),
      { numRuns: 60 },
    );
  });

  test("law: the quantiles take the tails back, far out and for large noncentralities too", () => {
    fc.assert(
      fc.property(use, fc.double({ min: -40, max: -0.01, noNaN: true }), ({ df, ncp }, log) => {
        const p = 10 ** log;
        const high = noncentralTUpperTailQuantile(p, df, ncp);
        // Half an ulp of t or of the noncentrality moves the tail by |ncp|·2⁻⁵³ times its hazard, some √(2 ln(1/p)).
        const slack = 1e-14 * (1 + Math.abs(log)) + 4 * 2 ** -53 * Math.abs(ncp) * (1 + Math.sqrt(4.6 * Math.abs(log)));
        expect(relativeError(noncentralTUpperTail(high, df, ncp), p)).toBeLessThan(slack);
        const low = noncentralTQuantile(p, df, ncp);
        expect(relativeError(noncentralTCdf(low, df, ncp), p)).toBeLessThan(slack);
      }),
      { numRuns: 60 },
    );
  });

  test("law: the derivatives are those of the tail, by t next to 0 and by ln |t| beyond", () => {
    for (const [t, df, ncp] of [
      [0.4, 3, 1],
      [0.6, 3, -1],
      [-0.3, 9, 0.5],
      [1.5, 3, 1],
      [3, 30, 1],
      [25, 40, 20],
      [-2, 9, 0.5],
      [1e6, 1, 2],
    ]) {
      const move = (step: number) => (Math.abs(t) > 1 ? t * Math.exp(step) : t + step);
      const h = 1e-4;
      const [here, less, more] = [t, move(-h), move(h)].map((x) => noncentralTTails(x, df, ncp));
      expect(relativeError(here.first, (more.tail - less.tail) / (2 * h))).toBeLessThan(1e-5);
      expect(relativeError(here.second, (more.first - less.first) / (2 * h))).toBeLessThan(1e-5);
    }
  });

  test("law: it falls as the noncentrality grows and rises with t", () => {
    fc.assert(
      fc.property(use, fc.double({ min: -3, max: 3, noNaN: true }), ({ df, ncp }, z) => {
        const t = ncp + z * Math.sqrt(1 + (ncp * ncp) / (2 * df));
        const here = noncentralTCdf(t, df, ncp);
        expect(noncentralTCdf(t, df, ncp + 0.1)).toBeLessThan(here);
        expect(noncentralTCdf(t + 0.1, df, ncp)).toBeGreaterThan(here);
      }),
      { numRuns: 60 },
    );
  });

  test("law: with n = 1e6 and ncp = 3000 it is the normal law of the estimated mark, to 1/√n", () => {
    const n = 1e6;
    const t = noncentralTQuantile(0.95, n - 1, 3 * Math.sqrt(n)) / Math.sqrt(n);
    const approximate = 3 + 1.6448536269514722 * Math.sqrt(1 / n + 9 / (2 * n));
    expect(relativeError(t, approximate)).toBeLessThan(1e-5);
  });

  test("law: infinitely many degrees of freedom make it the normal with mean ncp", () => {
    expect(noncentralTCdf(2.5, Infinity, 1)).toBe(normalCdf(1.5));
    expect(noncentralTQuantile(0.9, Infinity, 1)).toBeCloseTo(1 + normalQuantile(0.9), 15);
    expect(relativeError(noncentralTCdf(2.5, 1e9, 1), normalCdf(1.5))).toBeLessThan(1e-8);
  });

  test("the ends", () => {
    expect([noncentralTCdf(-Infinity, 3, 1), noncentralTCdf(Infinity, 3, 1)]).toEqual([0, 1]);
    expect([noncentralTUpperTail(-Infinity, 3, 1), noncentralTUpperTail(Infinity, 3, 1)]).toEqual([1, 0]);
    expect([noncentralTQuantile(0, 3, 1), noncentralTQuantile(1, 3, 1)]).toEqual([-Infinity, Infinity]);
    expect([noncentralTUpperTailQuantile(0, 3, 1), noncentralTUpperTailQuantile(1, 3, 1)]).toEqual([
      Infinity,
      -Infinity,
    ]);
    // A tail below the smallest number is 0, and asked for quickly.
    expect([noncentralTCdf(1, 100, 300), noncentralTUpperTail(1e5, 1e6, 3)]).toEqual([0, 0]);
  });

  test("jstat 1.9.6, a different program, agrees within its own error", () => {
    for (const [t, df, ncp] of [
      [1, 2, 0.5],
      [4, 10, 3],
      [18, 30, 15],
      [-1, 8, 1],
    ])
      expect(Math.abs(noncentralTCdf(t, df, ncp) - jStat.noncentralt.cdf(t, df, ncp))).toBeLessThan(1e-7);
  });

  testRefusals(noncentralTCdf, [
    ["x", NaN, 2, 1],
    ["df", 1, 0.5, 1],
    ["df", 1, NaN, 1],
    ["ncp", 1, 2, NaN],
    ["ncp", 1, 2, Infinity],
  ]);
  testRefusals(noncentralTUpperTail, [
    ["x", NaN, 2, 1],
    ["df", 1, 0, 1],
    ["ncp", 1, 2, NaN],
    ["ncp", 1, 2, -Infinity],
  ]);
  testRefusals(noncentralTQuantile, [
    ["p", NaN, 2, 1],
    ["p", 1.5, 2, 1],
    ["df", 0.5, 0.9, 1],
    ["ncp", 0.5, 2, NaN],
  ]);
  testRefusals(noncentralTUpperTailQuantile, [
    ["p", NaN, 2, 1],
    ["p", -1, 2, 1],
    ["df", 0.5, NaN, 1],
    ["ncp", 0.5, 2, Infinity],
  ]);
});
