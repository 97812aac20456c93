import { describe, expect, test } from "vitest";
import { andersonDarling } from "../../../src/core/sample/andersonDarling";
import { fitCurve } from "../../../src/core/sample/fitCurve";
import { Sample } from "../../../src/core/sample/sample";
import { readShape } from "../../../src/sheet/readShape";
import reference from "../../reference/sample/curves.json";
import handbook from "../../reference/published/nist_handbook.json";
import { relativeError } from "../../support/relativeError";

const sampleOf = (values: readonly number[]) => new Sample(Float64Array.from(values));
type Row = [name: keyof typeof reference.samples, shape: string, power: string, mean: string, sd: string, a2: string];

describe("andersonDarling", () => {
  test.each(reference.cases as unknown as Row[])(
    "%s, %s: A² agrees with 50 digits of mpmath",
    (name, shape, _power, _mean, _sd, a2) => {
      const { scaled } = fitCurve("scores", sampleOf(reference.samples[name]), readShape(shape));
      expect(relativeError(andersonDarling(scaled).statistic, Number(a2))).toBeLessThanOrEqual(1e-10);
    },
  );

  // NIST/SEMATECH e-Handbook 1.4.2: adjusted there means A²(1 + 4/n − 25/n²), Stephens 1974.
  const stephens = (values: readonly number[]) =>
    andersonDarling(sampleOf(values)).statistic * (1 + 4 / values.length - 25 / values.length ** 2);
  test("ZARR13: 0.129, RANDU: 5.765 and raw 5.719839, RANDN: raw 1.0612 (NIST/SEMATECH e-Handbook 1.4.2)", () => {
    expect(Math.abs(stephens(handbook.data.ZARR13) - 0.129)).toBeLessThan(0.0006);
    expect(Math.abs(stephens(handbook.data.RANDU) - 5.765)).toBeLessThan(0.0006);
    expect(Math.abs(andersonDarling(sampleOf(handbook.data.RANDU)).statistic - 5.719839)).toBeLessThan(1e-6);
    expect(Math.abs(andersonDarling(sampleOf(handbook.data.RANDN)).statistic - 1.0612)).toBeLessThan(6e-5);
  });

  test("0.752 is the 5 % point of the adjusted statistic (D'Agostino & Stephens 1986, NIST/SEMATECH e-Handbook 1.3.5.14)", () => {
    const { adjusted, pValue } = andersonDarling(sampleOf(handbook.data.rosner54));
    // The published branch at this statistic, by hand: exp(1.2937 − 5.709 · 0.752 + 0.0186 · 0.752²) = 0.0503.
    expect(Math.exp(1.2937 - 5.709 * 0.752 + 0.0186 * 0.752 ** 2)).toBeCloseTo(0.05, 3);
    expect(pValue! < 0.05).toBe(adjusted > 0.752);
  });

  test("below 8 scores there is a statistic and no p-value", () => {
    const result = andersonDarling(sampleOf([1, 2, 3, 4, 5, 6, 8]));
    expect(result.statistic).toBeGreaterThan(0);
    expect(result.pValue).toBeUndefined();
  });

  test("a score hundreds of deviations out leaves the statistic finite and the p-value at its floor", () => {
    const values = Array.from({ length: 200_000 }, (_, i) => Math.sin(i));
    values[7] = 1e9;
    const { statistic, pValue } = andersonDarling(sampleOf(values));
    expect(Number.isFinite(statistic)).toBe(true);
    expect(pValue).toBe(3.7e-24);
  });

  test("law: unit, origin, order and mirror image of the scores are immaterial", () => {
    const values = handbook.data.rosner54;
    const { statistic } = andersonDarling(sampleOf(values));
    for (const other of [values.map((x) => 3 * x - 7), values.map((x) => -x), [...values].reverse()])
      expect(relativeError(andersonDarling(sampleOf(other)).statistic, statistic)).toBeLessThan(1e-10);
  });

  // mpmath, 40 digits; 9.4e-9 off for the first where deviations are taken from the rounded mean.
  test.each([
    [1e9, [1, 2, 4], 0.22964543670862176],
    [1e12, [1, 2, 4, 8, 9], 0.298674807665492],
    [1e15, [1, 2, 4, 8, 9, 11, 12, 40], 0.95314212006673622],
  ])(
    "%d plus %o: no digit is lost where the last digit of the mean is a part of the spread",
    (origin, parts, expected) => {
      const { statistic } = andersonDarling(sampleOf(parts.map((part) => origin + part)));
      expect(relativeError(statistic, expected)).toBeLessThan(1e-12);
    },
  );
});
