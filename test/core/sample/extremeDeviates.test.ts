import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { criticalDeviate, extremeDeviates } from "../../../src/core/sample/extremeDeviates";
import { Sample } from "../../../src/core/sample/sample";
import handbook from "../../reference/published/nist_handbook.json";
import tables from "../../reference/published/tolerance_factors.json";

const sampleOf = (values: readonly number[]) => new Sample(Float64Array.from(values));

/** The test as its definition has it: work out mean and deviation anew, take the furthest away, as often as asked. */
function byDefinition(scores: readonly number[], most: number, alpha: number) {
  const left = [...scores];
  const deviates: number[] = [];
  let outliers = 0;
  for (let i = 1; i <= most; i++) {
    const { mean, sd } = sampleOf(left);
    const far = left.reduce((best, x, at) => (Math.abs(x - mean) > Math.abs(left[best]! - mean) ? at : best), 0);
    deviates.push(sd > 0 ? Math.abs(left[far]! - mean) / sd : 0);
    if (deviates[i - 1]! > criticalDeviate(left.length, alpha)) outliers = i;
    left.splice(far, 1);
  }
  return { outliers, deviates };
}

describe("extremeDeviates", () => {
  const { printed } = handbook.items.find((item) => item.id === "nist-135173-esd")!;
  const { R, lambda } = printed as unknown as { R: number[]; lambda: number[] };

  test("Rosner's 54 values have 3 outliers; deviates and critical values agree with the printed ones (NIST/SEMATECH e-Handbook 1.3.5.17.3)", () => {
    const { outliers, deviates, lowest, highest } = extremeDeviates(sampleOf(handbook.data.rosner54), 10, 0.05);
    expect(outliers).toBe(3);
    expect([lowest, highest]).toEqual([-Infinity, 5.34]);
    // The print is truncated, not rounded.
    R.forEach((value, i) => expect(Math.abs(deviates[i]! - value)).toBeLessThanOrEqual(0.001));
    lambda.forEach((value, i) => expect(Math.abs(criticalDeviate(54 - i, 0.05) - value)).toBeLessThanOrEqual(0.001));
  });

  test("the first critical value is that of Grubbs, two-sided 5 %, n = 3 … 200 (CMH-17-1G, Table 8.5.7)", () => {
    for (const [n, critical] of tables.data.mnr as [number, number][])
      expect(Math.abs(criticalDeviate(n, 0.05) - critical)).toBeLessThanOrEqual(0.0011);
  });

  test.each<[keyof typeof handbook.data, number, number]>([
    ["ZARR13", 2.918673, 3.597898],
    ["RANDN", 3.368068, 3.863087],
    ["SOULEN", 2.729201, 3.950619],
  ])(
    "%s: the first deviate is %d, its two-sided critical value %d (NIST/SEMATECH e-Handbook 1.4.2)",
    (name, g, critical) => {
      const values = handbook.data[name] as number[];
      expect(Math.abs(extremeDeviates(sampleOf(values), 1, 0.05).deviates[0]! - g)).toBeLessThanOrEqual(1e-4);
      expect(Math.abs(criticalDeviate(values.length, 0.05) - critical)).toBeLessThanOrEqual(1e-4);
    },
  );

  test("law: the quick way agrees with the definition, whatever the scores", () => {
    // No two ends equally far out, where the definition leaves the choice open; no differences whose squares vanish.
    const score = fc.oneof(
      { weight: 8, arbitrary: fc.integer({ min: -1e9, max: 1e9 }).map((x) => x / 1e8) },
      { weight: 2, arbitrary: fc.constantFrom(1.2345, -2.718281, 0.577215) },
      { weight: 1, arbitrary: fc.constantFrom(-1e6, 1e3, 1.1e6, 40) },
    );
    fc.assert(
      fc.property(
        fc.array(score, { minLength: 10, maxLength: 40 }),
        fc.integer({ min: 1, max: 38 }),
        (scores, some) => {
          fc.pre(new Set(scores).size > 1);
          const most = Math.min(some, scores.length - 2);
          const quick = extremeDeviates(sampleOf(scores), most, 0.05);
          const slow = byDefinition(scores, most, 0.05);
          quick.deviates.forEach((deviate, i) => expect(Math.abs(deviate - slow.deviates[i]!)).toBeLessThan(1e-7));
          expect(quick.outliers).toBe(slow.outliers);
        },
      ),
      { numRuns: 300, seed: 7 },
    );
  });

  test("an outlier of 1e15 does not hide one of 30 among scores of 1", () => {
    const scores = [...Array.from({ length: 40 }, (_, i) => Math.sin(7 * i)), 30, 1e15];
    expect(extremeDeviates(sampleOf(scores), 4, 0.05)).toMatchObject({ outliers: 2, lowest: -Infinity, highest: 30 });
  });

  test("law: the order of the rows is immaterial, and the mirror image has its outliers on the other side", () => {
    const scores = handbook.data.rosner54;
    expect(extremeDeviates(sampleOf([...scores].reverse()), 10, 0.05)).toEqual(
      extremeDeviates(sampleOf(scores), 10, 0.05),
    );
    const mirror = extremeDeviates(sampleOf(scores.map((x) => -x)), 10, 0.05);
    expect(mirror).toMatchObject({ outliers: 3, lowest: -5.34, highest: Infinity });
  });

  test("100,000 removals from a million scores come within two seconds", () => {
    const sample = sampleOf(Array.from({ length: 1_000_000 }, (_, i) => Math.sin(i) + Math.sin(i * i)));
    expect(sample.sorted.length).toBe(1_000_000);
    const started = performance.now();
    const { deviates } = extremeDeviates(sample, 100_000, 0.05);
    expect(performance.now() - started).toBeLessThan(2000);
    expect(deviates.every((deviate) => deviate > 0 && deviate < 10)).toBe(true);
  });

  test.each<[string, number, number]>([
    ["most", 0, 0.05],
    ["most", 9, 0.05],
    ["most", 2.5, 0.05],
    ["most", NaN, 0.05],
    ["alpha", 2, 0],
    ["alpha", 2, 1],
    ["alpha", 2, NaN],
  ])("refuses a bad %s: most %d, alpha %d", (argument, most, alpha) => {
    const sample = sampleOf([1, 2, 3, 4, 5, 6, 7, 8, 9, 12]);
    expect(() => extremeDeviates(sample, most, alpha)).toThrow(
      expect.objectContaining({ name: "DomainError", argument }),
    );
  });
});
