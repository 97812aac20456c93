import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { smirnovTest } from "../../../src/core/method/smirnovTest";
import { smirnovUpperTail } from "../../../src/core/method/smirnovUpperTail";
import { Sample } from "../../../src/core/sample/sample";
import { relativeError } from "../../support/relativeError";

const sample = (...scores: number[]) => new Sample(Float64Array.from(scores));
const untied = (n: number, m: number) => new Uint8Array(n + m + 1).fill(1);

describe("smirnovUpperTail", () => {
  // Schröer (1991), Appendix C.2.3, as carried in the sources of the R package coin (R-Forge, pkg/smirnov/R/ks.test.R): printed to ten digits.
  test("P(D ≥ 1/2) for 3 and 4 scores is 0.6571428571 (Schröer 1991)", () => {
    expect(smirnovUpperTail(6, 3, 4, untied(3, 4))).toBeCloseTo(0.6571428571, 10);
  });

  test("P(D ≥ 3/7) for 5 and 7 scores is 0.5454545455 (Schröer 1991)", () => {
    expect(smirnovUpperTail(15, 5, 7, untied(5, 7))).toBeCloseTo(0.5454545455, 10);
  });

  test("P(D ≥ 3/7) for 1 2 2 3 3 and 1 2 3 3 4 5 6, ties and all, is 0.2424242424 (Schröer 1991)", () => {
    const ends = new Uint8Array(13);
    for (const end of [2, 5, 9, 10, 11, 12]) ends[end] = 1;
    expect(smirnovUpperTail(15, 5, 7, ends)).toBeCloseTo(0.2424242424, 10);
  });

  // Paths counted in whole numbers (Python), the ratio as a fraction.
  test.each([
    [6100, 100, 100, 1.1250455638865436e-17],
    [2000, 100, 100, 0.03638428787491731],
    [3000, 99, 101, 0.00017003811634117794],
    [5000, 97, 103, 6.004524705547398e-12],
    [100, 30, 16, 0.6731139373394225],
  ])("steps %d of %d × %d agree with paths counted in whole numbers", (steps, n, m, expected) => {
    expect(relativeError(smirnovUpperTail(steps, n, m, untied(n, m)), expected)).toBeLessThanOrEqual(1e-13);
  });
});

describe("smirnovTest", () => {
  test("seven scores against nine: distance and exact p of SciPy 1.17", () => {
    const a = sample(53.6, 49.4, 58.0, 63.4, 69.1, 60.9, 55.6);
    const b = sample(54.6, 73.0, 83.6, 67.3, 49.2, 52.5, 83.2, 66.4, 43.2);
    const { distance, pValue, exact } = smirnovTest(a, b);
    expect(exact).toBe(true);
    expect(relativeError(distance, 26 / 63)).toBeLessThanOrEqual(1e-15);
    expect(relativeError(pValue, 0.4302447552447553)).toBeLessThanOrEqual(1e-13);
  });

  test("law: with ties too, p is the share of all ways to deal the scores out that lie as far apart (all of them tried)", () => {
    const small = fc.array(fc.integer({ min: 0, max: 4 }), { minLength: 1, maxLength: 5 });
    fc.assert(
      fc.property(small, small, (first, second) => {
        const { distance, pValue } = smirnovTest(sample(...first), sample(...second));
        const all = [...first, ...second];
        let deals = 0;
        let asFar = 0;
        for (let chosen = 0; chosen < 1 << all.length; chosen++) {
          const dealt = all.filter((_, i) => chosen & (1 << i));
          if (dealt.length !== first.length) continue;
          deals++;
          const rest = all.filter((_, i) => !(chosen & (1 << i)));
          if (farthest(dealt, rest) >= distance - 1e-12) asFar++;
        }
        expect(farthest(first, second)).toBeCloseTo(distance, 12);
        expect(pValue).toBeCloseTo(asFar / deals, 12);
      }),
      { numRuns: 60 },
    );
  });

  test("law: exchanging the batches, or carrying both through a rising function, changes nothing", () => {
    const scores = fc.array(fc.integer({ min: -50, max: 50 }), { minLength: 1, maxLength: 30 });
    fc.assert(
      fc.property(scores, scores, (a, b) => {
        const test = smirnovTest(sample(...a), sample(...b));
        const swapped = smirnovTest(sample(...b), sample(...a));
        expect(swapped.distance).toBe(test.distance);
        expect(relativeError(swapped.pValue, test.pValue)).toBeLessThanOrEqual(1e-12);
        expect(smirnovTest(sample(...a.map((x) => x ** 3)), sample(...b.map((x) => x ** 3)))).toEqual(test);
      }),
      { numRuns: 60 },
    );
  });

  test("beyond 10,000 pairs p is Kolmogorov's limiting law: distance 0.2 of 120 against 150 has Q(0.2·√(18000/270))", () => {
    const a = sample(...Array.from({ length: 120 }, (_, i) => i / 120));
    const b = sample(...Array.from({ length: 150 }, (_, i) => 0.2 + i / 150));
    const { distance, exact, pValue } = smirnovTest(a, b);
    expect(exact).toBe(false);
    expect(distance).toBeGreaterThan(0.19);
    const x = distance * Math.sqrt((120 * 150) / 270);
    let series = 0;
    for (let j = 1; j < 20; j++) series += 2 * (j % 2 ? 1 : -1) * Math.exp(-2 * j * j * x * x);
    expect(relativeError(pValue, series)).toBeLessThanOrEqual(1e-12);
  });

  test("10,000 pairs are still exact, 10,100 are not", () => {
    const line = (n: number) => sample(...Array.from({ length: n }, (_, i) => i));
    expect(smirnovTest(line(100), line(100)).exact).toBe(true);
    expect(smirnovTest(line(100), line(101)).exact).toBe(false);
  });
});

function farthest(a: number[], b: number[]): number {
  const below = (scores: number[], x: number) => scores.filter((score) => score <= x).length / scores.length;
  return Math.max(...[...a, ...b].map((x) => Math.abs(below(a, x) - below(b, x))));
}
