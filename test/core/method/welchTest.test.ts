import { describe, expect, test } from "vitest";
import { welchTest } from "../../../src/core/method/welchTest";
import { relativeError } from "../../support/relativeError";

describe("welchTest", () => {
  // NIST/SEMATECH e-Handbook 1.3.5.3, data AUTO83B.DAT: counts, means and deviations as printed; the test without pooling as worked in
  // the Boost.Math manual, two_sample_students_t: T = −12.94627 (first less second), 136.87499 degrees of freedom, p 1.571e-25.
  const unitedStates = { count: 249, mean: 20.14458, variance: 6.4147 ** 2 };
  const japan = { count: 79, mean: 30.48101, variance: 6.10771 ** 2 };

  test("miles per gallon of American and Japanese cars: t 12.94627 with 136.87499 degrees of freedom, p 1.571e-25", () => {
    const { t, degrees, pValue } = welchTest(unitedStates, japan);
    expect(t).toBeCloseTo(12.94627, 5);
    expect(degrees).toBeCloseTo(136.87499, 4);
    expect(relativeError(pValue, 1.571e-25)).toBeLessThan(5e-4);
    // SciPy 1.17, ttest_ind_from_stats on the same numbers.
    expect(relativeError(pValue, 1.5709046154648375e-25)).toBeLessThan(1e-11);
  });

  test("by hand: two scores a batch, variance 2 each, means 3 apart: t = 3/√2 with 2 degrees of freedom", () => {
    const { t, degrees } = welchTest({ count: 2, mean: 0, variance: 2 }, { count: 2, mean: 3, variance: 2 });
    expect(t).toBeCloseTo(3 / Math.SQRT2, 14);
    expect(degrees).toBeCloseTo(2, 14);
  });

  test("law: exchanging the batches turns t around and leaves p", () => {
    const there = welchTest(unitedStates, japan);
    const back = welchTest(japan, unitedStates);
    expect(back.t).toBe(-there.t);
    expect(relativeError(back.pValue, there.pValue)).toBeLessThan(1e-12);
  });
});
