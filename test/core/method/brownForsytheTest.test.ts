import { describe, expect, test } from "vitest";
import { fQuantile } from "../../../src/core/distribution/fQuantile";
import { brownForsytheTest } from "../../../src/core/method/brownForsytheTest";
import { Sample } from "../../../src/core/sample/sample";
import handbook from "../../reference/published/nist_handbook.json";
import { relativeError } from "../../support/relativeError";

const sample = (...scores: number[]) => new Sample(Float64Array.from(scores));

describe("brownForsytheTest", () => {
  test("ten batches of gear diameters: W 1.70591, 5 % point 1.9855 (NIST/SEMATECH e-Handbook 1.3.5.10)", () => {
    const { diameter, batch } = handbook.data.GEAR;
    const batches = Array.from({ length: 10 }, (_, b) => sample(...diameter.filter((_, i) => batch[i] === b + 1)));
    const { statistic, degreesBetween, degreesWithin, pValue } = brownForsytheTest(batches);
    expect(Math.abs(statistic! - 1.70591)).toBeLessThanOrEqual(2e-5);
    expect([degreesBetween, degreesWithin]).toEqual([9, 90]);
    expect(Math.abs(fQuantile(0.95, degreesBetween, degreesWithin) - 1.9855)).toBeLessThanOrEqual(1e-4);
    expect(pValue).toBeGreaterThan(0.05);
  });

  test("two batches: statistic and p of SciPy 1.17 (levene, center median)", () => {
    const { statistic, pValue } = brownForsytheTest([
      sample(53.6, 49.4, 58.0, 63.4, 69.1, 60.9, 55.6),
      sample(54.6, 73.0, 83.6, 67.3, 49.2, 52.5, 83.2, 66.4, 43.2),
    ]);
    expect(relativeError(statistic!, 4.5619504250100436)).toBeLessThanOrEqual(1e-12);
    expect(relativeError(pValue!, 0.05083604099725226)).toBeLessThanOrEqual(1e-12);
  });

  test("two scores a batch lie equally far from their median, so there is nothing to test", () => {
    expect(brownForsytheTest([sample(60.1, 60.3), sample(51.7, 80.9)]).pValue).toBeUndefined();
    expect(brownForsytheTest([sample(60.1, 60.3), sample(51.7, 80.9, 71)]).pValue).toBeDefined();
  });

  test("law: shifting either batch changes nothing beyond rounding; equal spreads give p 1", () => {
    const a = [53.5, 49, 58, 63.5, 69];
    const b = [54.5, 73, 83.5, 67, 49];
    const there = brownForsytheTest([sample(...a), sample(...b)]);
    const moved = brownForsytheTest([sample(...a.map((x) => x + 1024)), sample(...b.map((x) => x - 512))]);
    expect(relativeError(moved.pValue!, there.pValue!)).toBeLessThan(1e-11);
    expect(brownForsytheTest([sample(...a), sample(...a.map((x) => x + 8))]).pValue).toBe(1);
  });
});
