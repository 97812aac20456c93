import { describe, expect, test } from "vitest";
import { moments } from "../../../src/core/sample/moments";
import { Sample } from "../../../src/core/sample/sample";

const of = (values: readonly number[]) => moments(new Sample(Float64Array.from(values)));

describe("moments", () => {
  test("by hand: 1, 2, 6 has G1 = (3/(2·1)) Σz³ with z = (−2, −1, 3)/√7, that is 1.5 · 18/7^1.5", () => {
    expect(of([1, 2, 6]).skewness).toBeCloseTo((1.5 * 18) / 7 ** 1.5, 14);
  });

  test("by hand: 1, 2, 3, 4 has G2 = (4·5/(3·2·1)) Σz⁴ − 3·9/(2·1) with s² = 5/3, that is −1.2", () => {
    const fourths = (2 * 1.5 ** 4 + 2 * 0.5 ** 4) / (5 / 3) ** 2;
    expect(of([1, 2, 3, 4]).excessKurtosis).toBeCloseTo((20 / 6) * fourths - 13.5, 13);
    expect(of([1, 2, 3, 4]).excessKurtosis).toBeCloseTo(-1.2, 13);
  });

  test("too few scores have none", () => {
    expect(of([1, 2])).toEqual({ skewness: undefined, excessKurtosis: undefined });
    expect(of([1, 2, 4]).excessKurtosis).toBeUndefined();
  });

  test("law: unit and origin are immaterial, the mirror image turns the skewness, far from zero too", () => {
    const values = [3.5, 4.25, 4.5, 6.75, 12.5, 5.25];
    const plain = of(values);
    const far = of(values.map((x) => 1e9 + x * 4));
    const mirror = of(values.map((x) => -x));
    expect(far.skewness).toBeCloseTo(plain.skewness!, 11);
    expect(far.excessKurtosis).toBeCloseTo(plain.excessKurtosis!, 11);
    expect(mirror.skewness).toBeCloseTo(-plain.skewness!, 13);
    expect(mirror.excessKurtosis).toBeCloseTo(plain.excessKurtosis!, 13);
  });

  // mpmath, 40 digits. Deviations from the rounded mean gave 0.9352192954604259 for the first.
  test.each([
    ["1e9 + 1, 2, 4", 1e9, [1, 2, 4], 0.93521952958282449, undefined],
    ["1e12 + 1, 2, 4, 8, 9", 1e12, [1, 2, 4, 8, 9], 0.27176875823526217, -2.6802653605307211],
    ["1e15 + 1, 2, 4, 8, 9, 11, 12, 40", 1e15, [1, 2, 4, 8, 9, 11, 12, 40], 2.2400087239714582, 5.6283785467836652],
  ])("%s: no digit is lost where the last digit of the mean is a part of the spread", (_, origin, parts, g1, g2) => {
    const { skewness, excessKurtosis } = of(parts.map((part) => origin + part));
    expect(skewness).toBeCloseTo(g1, 13);
    if (g2 === undefined) expect(excessKurtosis).toBeUndefined();
    else expect(excessKurtosis).toBeCloseTo(g2, 13);
  });
});
