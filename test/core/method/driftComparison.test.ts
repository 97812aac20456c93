import { describe, expect, test } from "vitest";
import { driftComparison } from "../../../src/core/method/driftComparison";
import { Sample } from "../../../src/core/sample/sample";
import { relativeError } from "../../support/relativeError";

const sample = (...scores: number[]) => new Sample(Float64Array.from(scores));
const BEFORE = [53.6, 49.4, 58.0, 63.4, 69.1, 60.9, 55.6];
const AFTER = [54.6, 73.0, 83.6, 67.3, 49.2, 52.5, 83.2, 66.4, 43.2];

describe("driftComparison", () => {
  test("seven scores and nine: Welch's t and p, and degrees of freedom, of SciPy 1.17", () => {
    const { welch } = driftComparison(sample(...BEFORE), sample(...AFTER));
    expect(relativeError(welch.t, 0.9295500225313598)).toBeLessThan(1e-12);
    expect(relativeError(welch.pValue, 0.37152627482998996)).toBeLessThan(1e-12);
    expect(relativeError(welch.degrees, 11.61126569954573)).toBeLessThan(1e-12);
  });

  test("by hand: 1 2 3 against 2 4 6 have variances 1 and 4, ratio 4, shift 2", () => {
    const { varianceRatio, welch, baseline, recent } = driftComparison(sample(1, 2, 3), sample(2, 4, 6));
    expect([varianceRatio, welch.shift, baseline.variance, recent.variance]).toEqual([4, 2, 1, 4]);
  });

  test("law: the order of the scores is immaterial", () => {
    const there = driftComparison(sample(...BEFORE), sample(...AFTER));
    const turned = driftComparison(sample(...[...BEFORE].reverse()), sample(...[...AFTER].sort()));
    expect(relativeError(turned.welch.pValue, there.welch.pValue)).toBeLessThan(1e-13);
    expect(relativeError(turned.brownForsythe.pValue!, there.brownForsythe.pValue!)).toBeLessThan(1e-13);
    expect(turned.smirnov).toEqual(there.smirnov);
  });

  test("law: a common offset and scale change no p-value beyond rounding", () => {
    const there = driftComparison(sample(...BEFORE), sample(...AFTER));
    const moved = (scores: number[]) => sample(...scores.map((x) => 4096 + 1.8 * x));
    const other = driftComparison(moved(BEFORE), moved(AFTER));
    expect(relativeError(other.welch.pValue, there.welch.pValue)).toBeLessThan(1e-10);
    expect(relativeError(other.brownForsythe.pValue!, there.brownForsythe.pValue!)).toBeLessThan(1e-10);
    expect(other.smirnov).toEqual(there.smirnov);
  });

  test("refuses scores whose spread is none or can't be squared, naming the batch", () => {
    const good = sample(1, 2, 3);
    for (const bad of [sample(5, 5, 5), sample(1e-200, 2e-200), sample(1e200, -1e200)]) {
      expect(() => driftComparison(bad, good)).toThrow(expect.objectContaining({ argument: "baseline" }));
      expect(() => driftComparison(good, bad)).toThrow(expect.objectContaining({ argument: "recent" }));
    }
  });
});
