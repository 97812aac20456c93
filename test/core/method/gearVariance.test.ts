import { describe, expect, test } from "vitest";
import { chiSquareQuantile } from "../../../src/core/distribution/chiSquareQuantile";
import { chiSquareUpperTailQuantile } from "../../../src/core/distribution/chiSquareUpperTailQuantile";
import { sdPrecision } from "../../../src/core/method/sdPrecision";
import { spreadCoverage } from "../../../src/core/method/spreadCoverage";
import { Sample } from "../../../src/core/sample/sample";
import handbook from "../../reference/published/nist_handbook.json";

/*
 * NIST/SEMATECH e-Handbook of Statistical Methods 1.3.5.8, chi-square test for the variance, data GEAR (100 gear diameters), and the 95 %
 * interval for sigma from the same data in the Boost.Math manual (chi-square intervals).
 */
const { diameter } = (handbook.data as unknown as { GEAR: { diameter: number[] } }).GEAR;
const item = (id: string) => handbook.items.find((one) => one.id === id) as unknown as { printed: any; tolerance: any };
const gear = new Sample(Float64Array.from(diameter));

describe("the spread of the GEAR diameters", () => {
  test("has the chi-square statistic against sigma 0.1 and the limits that NIST prints", () => {
    const { printed, tolerance } = item("nist-1358-chisq");
    expect(Math.abs(gear.sumOfSquares / 0.1 ** 2 - printed.statistic)).toBeLessThanOrEqual(tolerance.statistic);
    expect(Math.abs(chiSquareQuantile(0.025, 99) - printed.lower)).toBeLessThanOrEqual(tolerance.lower);
    expect(Math.abs(chiSquareUpperTailQuantile(0.025, 99) - printed.upper)).toBeLessThanOrEqual(tolerance.upper);
  });

  test("gives the printed 95 % interval for sigma", () => {
    const { printed, tolerance } = item("nist-1358-ci");
    const low = Math.sqrt(gear.sumOfSquares / chiSquareUpperTailQuantile(0.025, 99));
    const high = Math.sqrt(gear.sumOfSquares / chiSquareQuantile(0.025, 99));
    expect(Math.abs(low - printed[0])).toBeLessThanOrEqual(tolerance.abs);
    expect(Math.abs(high - printed[1])).toBeLessThanOrEqual(tolerance.abs);
  });

  test("is known about as precisely from 100 scores as that interval is wide", () => {
    // The coverage of the interval's own ratios is 95 % by construction: the two roads to one chi-square law must meet.
    const [low, high] = [chiSquareQuantile(0.025, 99) / 99, chiSquareUpperTailQuantile(0.025, 99) / 99];
    expect(spreadCoverage(100, low, high).covered).toBeCloseTo(0.95, 14);
    const { precision } = sdPrecision(100, 0.95);
    // One width either way, where the equal-tailed interval reaches less far above than below: it lies between the two.
    expect(precision).toBeGreaterThan(Math.sqrt(high) - 1);
    expect(precision).toBeLessThan(1 - Math.sqrt(low));
  });
});
