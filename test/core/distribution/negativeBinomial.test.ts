import fc from "fast-check";
import jstat from "jstat";
import { describe, expect, test } from "vitest";
import { binomialUpperTail } from "../../../src/core/distribution/binomialUpperTail";
import { negativeBinomialCdf } from "../../../src/core/distribution/negativeBinomialCdf";
import { negativeBinomialUpperTail } from "../../../src/core/distribution/negativeBinomialUpperTail";
import { randomRows } from "../../support/randomRows";
import { relativeError } from "../../support/relativeError";
import { testRefusals } from "../../support/refusals";
import { readVectors, worstRow } from "../../support/vectors";

const { jStat } = jstat;

describe("the negative binomial distribution", () => {
  test("agrees with mpmath on vectors/nbinom_cdf.json", () => {
    const worst = worstRow(readVectors("vectors/nbinom_cdf.json"), negativeBinomialCdf);
    expect(worst.error, JSON.stringify(worst)).toBeLessThan(1e-13);
  });

  test.each([negativeBinomialCdf, negativeBinomialUpperTail])("$name agrees with mpmath at random points", (f) => {
    const worst = worstRow(randomRows(f.name), f);
    expect(worst.error, JSON.stringify(worst)).toBeLessThan(1e-13);
  });

  test("by hand: the first success after at most k failures has the chance 1 − (1 − p)^(k + 1)", () => {
    for (const p of [0.01, 0.25, 0.9])
      for (const k of [0, 1, 5, 40]) {
        expect(relativeError(negativeBinomialCdf(k, 1, p), -Math.expm1((k + 1) * Math.log1p(-p)))).toBeLessThan(1e-14);
        expect(relativeError(negativeBinomialUpperTail(k + 1, 1, p), (1 - p) ** (k + 1))).toBeLessThan(1e-13);
      }
  });

  test("law: at most k failures before the r-th success means r successes in r + k trials", () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 300 }),
        fc.integer({ min: 0, max: 3000 }),
        fc.double({ min: 0.01, max: 0.99, noNaN: true }),
        (r, k, p) => {
          const [here, there] = [negativeBinomialCdf(k, r, p), binomialUpperTail(r, r + k, p)];
          if (there > 1e-290) expect(relativeError(here, there)).toBeLessThan(1e-14);
        },
      ),
    );
  });

  test("law: P(X ≤ k) + P(X ≥ k + 1) = 1", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.1, max: 1e4, noNaN: true }),
        fc.integer({ min: 0, max: 1e5 }),
        fc.double({ min: 0.001, max: 1, noNaN: true }),
        (r, k, p) => {
          expect(Math.abs(negativeBinomialCdf(k, r, p) + negativeBinomialUpperTail(k + 1, r, p) - 1)).toBeLessThan(
            1e-15,
          );
        },
      ),
    );
  });

  test("the ends: k below 0, p of 0 and 1", () => {
    expect([
      negativeBinomialCdf(-1, 2, 0.5),
      negativeBinomialUpperTail(-1, 2, 0.5),
      negativeBinomialUpperTail(0, 2, 0.5),
    ]).toEqual([0, 1, 1]);
    expect([negativeBinomialCdf(9, 2, 0), negativeBinomialUpperTail(9, 2, 0)]).toEqual([0, 1]);
    expect([negativeBinomialCdf(0, 2, 1), negativeBinomialUpperTail(1, 2, 1)]).toEqual([1, 0]);
  });

  test("jstat 1.9.6, a different program, agrees within its own error", () => {
    for (const [k, r, p] of [
      [0, 1, 0.3],
      [12, 5, 0.3],
      [180, 20, 0.1],
    ])
      expect(relativeError(negativeBinomialCdf(k, r, p), jStat.negbin.cdf(k, r, p))).toBeLessThan(1e-9);
  });

  for (const f of [negativeBinomialCdf, negativeBinomialUpperTail])
    testRefusals(f, [
      ["k", 0.5, 2, 0.5],
      ["k", NaN, 2, 0.5],
      ["k", Infinity, 2, 0.5],
      ["r", 1, 0, 0.5],
      ["r", 1, NaN, 0.5],
      ["r", 1, Infinity, 0.5],
      ["p", 1, 2, -0.1],
      ["p", 1, 2, 1.1],
      ["p", 1, 2, NaN],
    ]);
});
