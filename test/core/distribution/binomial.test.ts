import fc from "fast-check";
import jstat from "jstat";
import { describe, expect, test } from "vitest";
import { binomialCdf } from "../../../src/core/distribution/binomialCdf";
import { binomialPmf } from "../../../src/core/distribution/binomialPmf";
import { binomialUpperTail } from "../../../src/core/distribution/binomialUpperTail";
import { randomRows } from "../../support/randomRows";
import { relativeError } from "../../support/relativeError";
import { testRefusals } from "../../support/refusals";
import { readVectors, worstRow } from "../../support/vectors";

const { jStat } = jstat;

/** C(n, k) by whole numbers. */
function choose(n: number, k: number): bigint {
  let result = 1n;
  for (let i = 1; i <= k; i++) result = (result * BigInt(n - i + 1)) / BigInt(i);
  return result;
}

describe("the binomial distribution", () => {
  test("agrees with mpmath on vectors/binom_cdf.json", () => {
    const worst = worstRow(readVectors("vectors/binom_cdf.json"), binomialCdf);
    expect(worst.error, JSON.stringify(worst)).toBeLessThan(1e-13);
  });

  test.each([binomialPmf, binomialCdf, binomialUpperTail])("$name agrees with mpmath at random points", (f) => {
    const worst = worstRow(randomRows(f.name), f);
    expect(worst.error, JSON.stringify(worst)).toBeLessThan(1e-13);
  });

  test("by hand: 2 or more heads in 3 tosses are 4 of the 8 outcomes, exactly 1 are 3 of them", () => {
    expect(binomialUpperTail(2, 3, 0.5)).toBeCloseTo(4 / 8, 15);
    expect(binomialPmf(1, 3, 0.5)).toBeCloseTo(3 / 8, 15);
    expect(binomialCdf(0, 3, 0.5)).toBeCloseTo(1 / 8, 15);
  });

  test("for fair coins it agrees with exact whole numbers, 1 to 60 tosses", () => {
    for (let n = 1; n <= 60; n++) {
      let sum = 0n;
      for (let k = 0; k <= n; k++) {
        sum += choose(n, k);
        expect(relativeError(binomialPmf(k, n, 0.5), Number(choose(n, k)) / 2 ** n)).toBeLessThan(1e-14);
        expect(relativeError(binomialCdf(k, n, 0.5), Number(sum) / 2 ** n)).toBeLessThan(1e-14);
      }
    }
  });

  test("law: P(X ≤ k) + P(X ≥ k + 1) = 1, and the tails differ by the chance of k", () => {
    const n = fc.double({ min: 0, max: 9, noNaN: true }).map((log) => Math.round(10 ** log));
    fc.assert(
      fc.property(
        n,
        fc.double({ min: 1e-6, max: 0.999999, noNaN: true }),
        fc.double({ min: -8, max: 8, noNaN: true }),
        (trials, p, z) => {
          const k = Math.min(trials, Math.max(0, Math.round(trials * p + z * Math.sqrt(trials * p * (1 - p)))));
          expect(Math.abs(binomialCdf(k, trials, p) + binomialUpperTail(k + 1, trials, p) - 1)).toBeLessThan(1e-15);
          const difference = binomialCdf(k, trials, p) - binomialCdf(k - 1, trials, p);
          expect(Math.abs(difference - binomialPmf(k, trials, p))).toBeLessThan(1e-15);
        },
      ),
    );
  });

  test("law: successes at p are failures at 1 − p", () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 5000 }),
        fc.integer({ min: 1, max: 1023 }),
        fc.double({ min: 0, max: 1, noNaN: true }),
        (n, m, share) => {
          const k = Math.round(share * n);
          const [here, there] = [binomialUpperTail(k, n, m / 1024), binomialCdf(n - k, n, 1 - m / 1024)];
          if (here > 1e-290) expect(relativeError(here, there)).toBeLessThan(2e-13);
        },
      ),
    );
  });

  test("the ends: k outside 0 … n, p of 0 and 1, no trials", () => {
    expect([binomialCdf(-1, 5, 0.3), binomialCdf(5, 5, 0.3), binomialCdf(9, 5, 0.3)]).toEqual([0, 1, 1]);
    expect([binomialUpperTail(-1, 5, 0.3), binomialUpperTail(0, 5, 0.3), binomialUpperTail(6, 5, 0.3)]).toEqual([
      1, 1, 0,
    ]);
    expect([binomialPmf(-1, 5, 0.3), binomialPmf(6, 5, 0.3)]).toEqual([0, 0]);
    expect([binomialPmf(0, 5, 0), binomialPmf(5, 5, 1), binomialPmf(1, 5, 0), binomialPmf(4, 5, 1)]).toEqual([
      1, 1, 0, 0,
    ]);
    expect([
      binomialCdf(0, 5, 0),
      binomialCdf(4, 5, 1),
      binomialUpperTail(1, 5, 0),
      binomialUpperTail(5, 5, 1),
    ]).toEqual([1, 0, 0, 1]);
    expect([binomialPmf(0, 0, 0.4), binomialCdf(0, 0, 0.4), binomialUpperTail(1, 0, 0.4)]).toEqual([1, 1, 0]);
  });

  test("jstat 1.9.6, a different program, agrees within its own error", () => {
    for (const [k, n, p] of [
      [3, 10, 0.2],
      [40, 100, 0.45],
      [520, 1000, 0.5],
      [4900, 10000, 0.5],
    ])
      expect(Math.abs(binomialCdf(k, n, p) - jStat.binomial.cdf(k, n, p))).toBeLessThan(1e-9);
  });

  for (const f of [binomialPmf, binomialCdf, binomialUpperTail])
    testRefusals(f, [
      ["k", 1.5, 5, 0.5],
      ["k", NaN, 5, 0.5],
      ["k", Infinity, 5, 0.5],
      ["n", 1, -1, 0.5],
      ["n", 1, 2.5, 0.5],
      ["n", 1, NaN, 0.5],
      ["p", 1, 5, -0.1],
      ["p", 1, 5, 1.1],
      ["p", 1, 5, NaN],
    ]);
});
