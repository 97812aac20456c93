import fc from "fast-check";
import jstat from "jstat";
import { describe, expect, test } from "vitest";
import { gammaCdf } from "../../../src/core/distribution/gammaCdf";
import { gammaQuantile } from "../../../src/core/distribution/gammaQuantile";
import { gammaUpperTail } from "../../../src/core/distribution/gammaUpperTail";
import { gammaUpperTailQuantile } from "../../../src/core/distribution/gammaUpperTailQuantile";
import { randomRows } from "../../support/randomRows";
import { testRefusals } from "../../support/refusals";
import { readVectors, worstRow } from "../../support/vectors";

const { jStat } = jstat;
const shapes = fc.double({ min: -1.5, max: 6, noNaN: true }).map((log) => 10 ** log);
const chance = fc.double({ min: 1e-12, max: 1 - 1e-12, noNaN: true });

describe("the gamma distribution", () => {
  test.each([
    ["gamma_cdf", gammaCdf],
    ["gamma_sf", gammaUpperTail],
    ["gamma_quantile", gammaQuantile],
  ])("agrees with mpmath on vectors/%s.json", (file, f) => {
    const worst = worstRow(readVectors(`vectors/${file}.json`), f);
    expect(worst.error, JSON.stringify(worst)).toBeLessThan(1e-13);
  });

  test.each([gammaCdf, gammaUpperTail, gammaQuantile, gammaUpperTailQuantile])(
    "$name agrees with mpmath at random points",
    (f) => {
      const worst = worstRow(randomRows(f.name), f);
      expect(worst.error, JSON.stringify(worst)).toBeLessThan(1e-13);
    },
  );

  test("by hand: shape 1 is the exponential, shape 2 has the upper tail (1 + x)e^(−x)", () => {
    for (const x of [1e-10, 0.3, 1, 2, 10, 100]) {
      expect(Math.abs(gammaUpperTail(x, 1) / Math.exp(-x) - 1)).toBeLessThan(5e-14);
      expect(Math.abs(gammaCdf(x, 1) / -Math.expm1(-x) - 1)).toBeLessThan(1e-14);
      expect(Math.abs(gammaUpperTail(x, 2) / ((1 + x) * Math.exp(-x)) - 1)).toBeLessThan(5e-14);
    }
    expect(gammaQuantile(0.5, 1)).toBeCloseTo(Math.LN2, 15);
  });

  test("law: both tails add up to 1", () => {
    fc.assert(
      fc.property(shapes, fc.double({ min: -12, max: 12, noNaN: true }), (shape, z) => {
        const x = Math.max(shape * Math.exp(z / Math.sqrt(shape + 1)), 0);
        expect(Math.abs(gammaCdf(x, shape) + gammaUpperTail(x, shape) - 1)).toBeLessThan(1e-15);
      }),
    );
  });

  test("law: the quantiles take the tails back", () => {
    fc.assert(
      fc.property(shapes, chance, (shape, p) => {
        const low = gammaQuantile(p, shape);
        // Below 1e-300 the answer itself has no digits left.
        if (low > 1e-300)
          expect(Math.abs(gammaCdf(low, shape) / p - 1)).toBeLessThan(2e-13 * Math.max(1, Math.sqrt(shape)));
        const high = gammaUpperTailQuantile(p, shape);
        if (high > 1e-300)
          expect(Math.abs(gammaUpperTail(high, shape) / p - 1)).toBeLessThan(2e-13 * Math.max(1, Math.sqrt(shape)));
      }),
    );
  });

  test("law: more of x gives more of the lower tail, more shape gives less", () => {
    fc.assert(
      fc.property(shapes, chance, fc.double({ min: 1e-3, max: 1, noNaN: true }), (shape, p, more) => {
        const x = gammaQuantile(p, shape);
        expect(gammaCdf(x * (1 + more), shape)).toBeGreaterThanOrEqual(gammaCdf(x, shape));
        expect(gammaCdf(x, shape * (1 + more))).toBeLessThanOrEqual(gammaCdf(x, shape) * (1 + 1e-13));
      }),
    );
  });

  test("law: no seam where one method takes over from another", () => {
    for (const shape of [0.3, 0.999999, 5, 20, 20.000001, 300, 1e5])
      for (const edge of [0.4 * shape, 2 * shape, shape + 1, 1.5, shape])
        for (const f of [gammaCdf, gammaUpperTail]) {
          const [left, right] = [f(edge * (1 - 1e-15), shape), f(edge * (1 + 1e-15), shape)];
          const change = Math.abs(f(edge * (1 + 1e-8), shape) - f(edge * (1 - 1e-8), shape)) * 1e-7;
          expect(Math.abs(left - right)).toBeLessThanOrEqual(change * 1.1 + 4e-14 * right);
        }
  });

  test("law: P(k, x) − P(k + 1, x) is the Poisson chance of k", () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 20 }), fc.double({ min: 0.01, max: 30, noNaN: true }), (k, x) => {
        let poisson = Math.exp(-x);
        for (let i = 1; i <= k; i++) poisson *= x / i;
        expect(Math.abs(gammaCdf(x, k) - gammaCdf(x, k + 1) - poisson)).toBeLessThan(3e-15);
      }),
    );
  });

  test("the ends: x at or below 0, ∞, chances 0 and 1", () => {
    expect([gammaCdf(-1, 2), gammaCdf(0, 2), gammaCdf(Infinity, 2), gammaCdf(-Infinity, 2)]).toEqual([0, 0, 1, 0]);
    expect([gammaUpperTail(-1, 2), gammaUpperTail(0, 2), gammaUpperTail(Infinity, 2)]).toEqual([1, 1, 0]);
    expect([gammaQuantile(0, 2), gammaQuantile(1, 2)]).toEqual([0, Infinity]);
    expect([gammaUpperTailQuantile(0, 2), gammaUpperTailQuantile(1, 2)]).toEqual([Infinity, 0]);
  });

  test("an answer below the smallest number is 0, not a hang", () => {
    expect(gammaQuantile(1e-12, 0.005)).toBe(0);
  });

  test("jstat 1.9.6, a different program, agrees within its own error", () => {
    for (const shape of [0.5, 1, 3.3, 40, 1000])
      for (const p of [1e-5, 0.01, 0.3, 0.5, 0.9, 0.9999]) {
        const theirs = jStat.gamma.inv(p, shape, 1);
        expect(Math.abs(gammaQuantile(p, shape) / theirs - 1)).toBeLessThan(1e-10);
        expect(Math.abs(gammaCdf(theirs, shape) / jStat.gamma.cdf(theirs, shape, 1) - 1)).toBeLessThan(1e-9);
      }
  });

  testRefusals(gammaCdf, [
    ["x", NaN, 1],
    ["shape", 1, 0],
    ["shape", 1, -1],
    ["shape", 1, NaN],
    ["shape", 1, Infinity],
  ]);
  testRefusals(gammaUpperTail, [
    ["x", NaN, 1],
    ["shape", 1, 0],
    ["shape", 1, NaN],
    ["shape", 1, Infinity],
  ]);
  testRefusals(gammaQuantile, [
    ["p", NaN, 1],
    ["p", -0.1, 1],
    ["p", 2, 1],
    ["shape", 0.5, 0],
    ["shape", 0.5, NaN],
  ]);
  testRefusals(gammaUpperTailQuantile, [
    ["p", NaN, 1],
    ["p", 1.5, 1],
    ["shape", 0.5, -1],
    ["shape", 0.5, Infinity],
  ]);
});
