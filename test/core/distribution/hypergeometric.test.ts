import fc from "fast-check";
import jstat from "jstat";
import { describe, expect, test } from "vitest";
import { hypergeometricCdf } from "../../../src/core/distribution/hypergeometricCdf";
import { hypergeometricPmf } from "../../../src/core/distribution/hypergeometricPmf";
import { hypergeometricUpperTail } from "../../../src/core/distribution/hypergeometricUpperTail";
import { randomRows } from "../../support/randomRows";
import { relativeError } from "../../support/relativeError";
import { testRefusals } from "../../support/refusals";
import { readVectors, worstRow } from "../../support/vectors";

const { jStat } = jstat;

/** Pool, good, drawn and a possible k. */
const draws = fc
  .tuple(
    fc.integer({ min: 1, max: 100_000 }),
    fc.double({ min: 0, max: 1, noNaN: true }),
    fc.double({ min: 0, max: 1, noNaN: true }),
    fc.double({ min: -6, max: 6, noNaN: true }),
  )
  .map(([pool, a, b, z]) => {
    const [good, drawn] = [Math.round(a * pool), Math.round(b * pool)];
    const mean = (good * drawn) / pool;
    const sd = Math.sqrt((mean * (1 - good / pool) * (pool - drawn)) / pool);
    const k = Math.min(good, drawn, Math.max(0, good + drawn - pool, Math.round(mean + z * sd)));
    return { k, pool, good, drawn };
  });

describe("the hypergeometric distribution", () => {
  test("agrees with whole-number arithmetic on vectors/hyper_cdf.json", () => {
    const worst = worstRow(readVectors("vectors/hyper_cdf.json"), hypergeometricCdf);
    expect(worst.error, JSON.stringify(worst)).toBeLessThan(1e-13);
  });

  test.each([hypergeometricPmf, hypergeometricCdf, hypergeometricUpperTail])(
    "$name agrees with mpmath at random points",
    (f) => {
      const worst = worstRow(randomRows(f.name), f);
      expect(worst.error, JSON.stringify(worst)).toBeLessThan(1e-13);
    },
  );

  test("by hand: 2 of 4 good, 2 drawn: none 1/6, one 4/6, both 1/6", () => {
    [1, 4, 1].forEach((ways, k) => expect(hypergeometricPmf(k, 4, 2, 2)).toBeCloseTo(ways / 6, 15));
    expect(hypergeometricCdf(1, 4, 2, 2)).toBeCloseTo(5 / 6, 15);
    expect(hypergeometricUpperTail(1, 4, 2, 2)).toBeCloseTo(5 / 6, 15);
  });

  test("law: P(X ≤ k) + P(X ≥ k + 1) = 1, and the tails differ by the chance of k", () => {
    fc.assert(
      fc.property(draws, ({ k, pool, good, drawn }) => {
        expect(
          Math.abs(hypergeometricCdf(k, pool, good, drawn) + hypergeometricUpperTail(k + 1, pool, good, drawn) - 1),
        ).toBeLessThan(1e-15);
        const difference = hypergeometricCdf(k, pool, good, drawn) - hypergeometricCdf(k - 1, pool, good, drawn);
        expect(Math.abs(difference - hypergeometricPmf(k, pool, good, drawn))).toBeLessThan(1e-14);
      }),
    );
  });

  test("law: good ones among the drawn are drawn ones among the good", () => {
    fc.assert(
      fc.property(draws, ({ k, pool, good, drawn }) => {
        const [here, there] = [hypergeometricPmf(k, pool, good, drawn), hypergeometricPmf(k, pool, drawn, good)];
        if (here > 1e-290) expect(relativeError(here, there)).toBeLessThan(1e-13);
        const [lower, mirrored] = [
          hypergeometricCdf(k, pool, good, drawn),
          hypergeometricUpperTail(drawn - k, pool, pool - good, drawn),
        ];
        if (lower > 1e-290) expect(relativeError(lower, mirrored)).toBeLessThan(1e-13);
      }),
    );
  });

  test("the ends: what cannot occur, everything drawn, nothing good, an empty pool", () => {
    expect([hypergeometricPmf(-1, 10, 4, 3), hypergeometricPmf(4, 10, 4, 3), hypergeometricPmf(0, 10, 8, 3)]).toEqual([
      0, 0, 0,
    ]);
    expect([hypergeometricCdf(-1, 10, 4, 3), hypergeometricCdf(3, 10, 4, 3), hypergeometricCdf(0, 10, 8, 3)]).toEqual([
      0, 1, 0,
    ]);
    expect([
      hypergeometricUpperTail(0, 10, 4, 3),
      hypergeometricUpperTail(4, 10, 4, 3),
      hypergeometricUpperTail(1, 10, 8, 3),
    ]).toEqual([1, 0, 1]);
    expect([
      hypergeometricPmf(4, 10, 4, 10),
      hypergeometricCdf(3, 10, 4, 10),
      hypergeometricUpperTail(4, 10, 4, 10),
    ]).toEqual([1, 0, 1]);
    expect([hypergeometricPmf(0, 10, 0, 3), hypergeometricPmf(0, 0, 0, 0), hypergeometricCdf(0, 0, 0, 0)]).toEqual([
      1, 1, 1,
    ]);
  });

  test("the largest pool allowed is answered at once, its tails add up to 1", () => {
    const [pool, half] = [1e9, 5e8];
    const k = half / 2 - 30_000;
    expect(hypergeometricCdf(k, pool, half, half) + hypergeometricUpperTail(k + 1, pool, half, half)).toBe(1);
    expect(hypergeometricCdf(half / 2, pool, half, half)).toBeGreaterThan(0.5);
  });

  test("jstat 1.9.6, a different program, agrees within its own error", () => {
    for (const [k, pool, good, drawn] of [
      [2, 50, 10, 12],
      [28, 1000, 100, 300],
      [480, 100000, 5000, 10000],
    ])
      expect(
        relativeError(hypergeometricCdf(k, pool, good, drawn), jStat.hypgeom.cdf(k, pool, good, drawn)),
      ).toBeLessThan(1e-9);
  });

  for (const f of [hypergeometricPmf, hypergeometricCdf, hypergeometricUpperTail])
    testRefusals(f, [
      ["k", 0.5, 10, 4, 3],
      ["k", NaN, 10, 4, 3],
      ["pool", 1, -1, 0, 0],
      ["pool", 1, NaN, 4, 3],
      ["pool", 1, Infinity, 4, 3],
      ["pool", 1, 2e12 + 1, 4, 3],
      ["good", 1, 10, 11, 3],
      ["good", 1, 10, -1, 3],
      ["good", 1, 10, NaN, 3],
      ["drawn", 1, 10, 4, 11],
      ["drawn", 1, 10, 4, 2.5],
      ["drawn", 1, 10, 4, NaN],
    ]);
});
