import { describe, expect, test } from "vitest";
import { Sample } from "../../../src/core/sample/sample";
import { shapiroWilk, shapiroWilkWeights } from "../../../src/core/sample/shapiroWilk";
import published from "../../reference/published/normality.json";
import reference from "../../reference/sample/shapiroWilk.json";
import { relativeError } from "../../support/relativeError";

const of = (values: readonly number[]) => shapiroWilk(new Sample(Float64Array.from(values)));
const { weights11, sw_x1: mixed20 } = published.data;

describe("shapiroWilk", () => {
  test.each(reference.cases)("$name agrees with shapiro.test of R 4.2.2 (AS R94)", ({ scores, W, p }) => {
    const { statistic, pValue } = of(scores);
    expect(relativeError(statistic, Number(W))).toBeLessThanOrEqual(1e-8);
    expect(relativeError(pValue, Number(p))).toBeLessThanOrEqual(1e-6);
  });

  test("the weights of 11 men have W = 0.788815 and p = 0.006704 (Shapiro & Wilk 1965, as in the documentation of scipy.stats.shapiro)", () => {
    const { statistic, pValue } = of(weights11);
    expect(Math.abs(statistic - 0.788815)).toBeLessThanOrEqual(1e-6);
    expect(Math.abs(pValue - 0.006704)).toBeLessThanOrEqual(1e-6);
  });

  test("20 scores have W = 0.900473 and p = 0.042090 (scipy/stats/tests/test_morestats.py)", () => {
    const { statistic, pValue } = of(mixed20);
    expect(Math.abs(statistic - 0.9004729986190796)).toBeLessThanOrEqual(5e-7);
    expect(Math.abs(pValue - 0.04208974540233612)).toBeLessThanOrEqual(5e-7);
  });

  test("by hand: three scores 0, 1, 1 have W = 3/4, the smallest there is, and p = 0", () => {
    const { statistic, pValue } = of([0, 1, 1]);
    expect(statistic).toBeCloseTo(0.75, 14);
    expect(pValue).toBeCloseTo(0, 7);
  });

  test("by hand: three evenly spaced scores have W = 1 and p = 1", () => {
    expect(of([1, 2, 3]).statistic).toBe(1);
    expect(of([1, 2, 3]).pValue).toBeCloseTo(1, 14);
  });

  test("law: the weights are antisymmetric and of length 1", () => {
    for (const count of [3, 4, 5, 6, 7, 11, 12, 50, 1001, 5000]) {
      const weights = shapiroWilkWeights(count);
      expect(weights.reduce((sum, a) => sum + a * a, 0)).toBeCloseTo(1, 12);
      for (let i = 0; i < count; i++) expect(weights[i]! + weights[count - 1 - i]!).toBe(0);
    }
  });

  test("law: unit, origin, order and mirror image of the scores are immaterial", () => {
    const { pValue } = of(mixed20);
    for (const other of [mixed20.map((x) => 5 * x + 1e4), mixed20.map((x) => -x), [...mixed20].reverse()])
      expect(relativeError(of(other).pValue, pValue)).toBeLessThan(1e-9);
  });

  test("one score far out of many leaves no chance, but a number", () => {
    const { statistic, pValue } = of(Array.from({ length: 5000 }, (_, i) => (i === 9 ? 1e9 : Math.sin(i))));
    expect(statistic).toBeGreaterThan(0);
    expect(statistic).toBeLessThan(0.01);
    expect(pValue).toBeGreaterThanOrEqual(0);
    expect(pValue).toBeLessThan(1e-30);
    expect(of([0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 1]).pValue).toBeGreaterThan(0);
  });
});
