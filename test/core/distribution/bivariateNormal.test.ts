import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { bivariateNormalCdf } from "../../../src/core/distribution/bivariateNormalCdf";
import { bivariateNormalUpperTail } from "../../../src/core/distribution/bivariateNormalUpperTail";
import { normalCdf } from "../../../src/core/distribution/normalCdf";
import { normalUpperTail } from "../../../src/core/distribution/normalUpperTail";
import published from "../../reference/published/distribution_tables.json";
import { randomRows } from "../../support/randomRows";
import { relativeError } from "../../support/relativeError";
import { testRefusals } from "../../support/refusals";
import { readVectors, worstRow } from "../../support/vectors";

const score = fc.double({ min: -9, max: 9, noNaN: true });
const correlation = fc.double({ min: -1, max: 1, noNaN: true });

describe("the bivariate normal distribution", () => {
  test("agrees with mpmath on vectors/bvn_cdf.json, to 1e-12 below 1e-100", () => {
    const rows = readVectors("vectors/bvn_cdf.json");
    const near = worstRow(
      rows.filter(({ value }) => Number(value) >= 1e-100),
      bivariateNormalCdf,
    );
    expect(near.error, JSON.stringify(near)).toBeLessThan(1e-13);
    const far = worstRow(
      rows.filter(({ value }) => Number(value) < 1e-100),
      bivariateNormalCdf,
    );
    expect(far.error, JSON.stringify(far)).toBeLessThan(1e-12);
  });

  test.each([bivariateNormalCdf, bivariateNormalUpperTail])("$name agrees with mpmath at random points", (f) => {
    const worst = worstRow(randomRows(f.name), f);
    expect(worst.error, JSON.stringify(worst)).toBeLessThan(1e-13);
  });

  test("the table of NBS AMS 50 (1959) in published/distribution_tables.json (h, k, rho, cdf)", () => {
    for (const [h, k, rho, value] of published.data.bvn)
      expect(Math.abs(bivariateNormalCdf(h, k, rho) - value)).toBeLessThan(1e-9);
  });

  test("Owen's T of published/distribution_tables.json: T(h, a) = Φ(h)/2 − P(X ≤ h, Y ≤ 0; −a/√(1 + a²))", () => {
    for (const [h, a, value] of published.data.owen) {
      const t = normalCdf(h) / 2 - bivariateNormalCdf(h, 0, -a / Math.sqrt(1 + a * a));
      expect(Math.abs(t - value)).toBeLessThan(1e-13);
    }
  });

  test("by hand: the quadrant below both means holds 1/4 + arcsin(ρ)/2π (Sheppard 1899)", () => {
    for (const rho of [-1, -0.999999, -0.5, 0, 0.3, 0.9, 0.999999999, 1])
      expect(Math.abs(bivariateNormalCdf(0, 0, rho) - (0.25 + Math.asin(rho) / (2 * Math.PI)))).toBeLessThan(1e-15);
  });

  test("law: without correlation it is the product", () => {
    fc.assert(
      fc.property(score, score, (h, k) => {
        expect(relativeError(bivariateNormalCdf(h, k, 0), normalCdf(h) * normalCdf(k))).toBeLessThan(3e-14);
      }),
    );
  });

  test("law: it is symmetric, and ρ with −k takes the rest of Φ(h)", () => {
    fc.assert(
      fc.property(score, score, correlation, (h, k, rho) => {
        expect(relativeError(bivariateNormalCdf(h, k, rho), bivariateNormalCdf(k, h, rho))).toBeLessThan(1e-14);
        const sum = bivariateNormalCdf(h, k, rho) + bivariateNormalCdf(h, -k, -rho);
        expect(Math.abs(sum - normalCdf(h))).toBeLessThan(4e-15);
      }),
    );
  });

  test("law: the upper tail is the lower one of the mirror image, and both fit the marginals", () => {
    fc.assert(
      fc.property(score, score, correlation, (h, k, rho) => {
        expect(bivariateNormalUpperTail(h, k, rho)).toBe(bivariateNormalCdf(-h, -k, rho));
        const sum = 1 - normalCdf(h) - normalCdf(k) + bivariateNormalCdf(h, k, rho);
        expect(Math.abs(bivariateNormalUpperTail(h, k, rho) - sum)).toBeLessThan(2e-15);
      }),
    );
  });

  test("law: it grows with the correlation and stays between its bounds", () => {
    fc.assert(
      fc.property(score, score, correlation, correlation, (h, k, one, other) => {
        const [low, high] = [Math.min(one, other), Math.max(one, other)];
        const [below, above] = [bivariateNormalCdf(h, k, low), bivariateNormalCdf(h, k, high)];
        expect(below).toBeLessThanOrEqual(above * (1 + 1e-13));
        expect(above).toBeLessThanOrEqual(normalCdf(Math.min(h, k)) * (1 + 1e-13));
      }),
    );
  });

  test("the ends: perfect correlation and infinite limits", () => {
    expect(bivariateNormalCdf(1, 0.3, 1)).toBe(normalCdf(0.3));
    expect(bivariateNormalCdf(1, -2, -1)).toBe(0);
    expect(relativeError(bivariateNormalCdf(1, 0.3, -1), normalCdf(1) - normalCdf(-0.3))).toBeLessThan(1e-15);
    expect([bivariateNormalCdf(-Infinity, 1, 0.5), bivariateNormalCdf(1, -Infinity, -0.5)]).toEqual([0, 0]);
    expect([bivariateNormalCdf(Infinity, 0.7, 0.5), bivariateNormalCdf(0.7, Infinity, -1)]).toEqual([
      normalCdf(0.7),
      normalCdf(0.7),
    ]);
    expect([bivariateNormalCdf(Infinity, Infinity, 0.1), bivariateNormalCdf(Infinity, -Infinity, -1)]).toEqual([1, 0]);
    expect([bivariateNormalUpperTail(Infinity, 0, 0.5), bivariateNormalUpperTail(-Infinity, 2, 0.5)]).toEqual([
      0,
      normalUpperTail(2),
    ]);
    expect(bivariateNormalCdf(-60, -60, -0.9)).toBe(0);
  });

  testRefusals(bivariateNormalCdf, [
    ["h", NaN, 0, 0],
    ["k", 0, NaN, 0],
    ["rho", 0, 0, 1.01],
    ["rho", 0, 0, -1.01],
    ["rho", 0, 0, NaN],
  ]);
  testRefusals(bivariateNormalUpperTail, [
    ["h", NaN, 0, 0],
    ["k", 0, NaN, 0],
    ["rho", 0, 0, Infinity],
    ["rho", 0, 0, NaN],
  ]);
});
