import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { Sample } from "../../../src/core/sample/sample";
import { sampleQuantile } from "../../../src/core/sample/sampleQuantile";
import handbook from "../../reference/published/nist_handbook.json";

const sampleOf = (values: readonly number[]) => new Sample(Float64Array.from(values));

describe("sampleQuantile", () => {
  test("by hand: the quartiles of 1, 2, 3, 4 stand at places 0.75, 1.5 and 2.25 from the first: 1.75, 2.5, 3.25", () => {
    expect([0.25, 0.5, 0.75].map((p) => sampleQuantile(sampleOf([4, 1, 3, 2]), p))).toEqual([1.75, 2.5, 3.25]);
  });

  test("the median of 90 values is 559.5, and the quartiles lie inside those of definition 6, 429.75 and 742.25 (NIST/SEMATECH e-Handbook 7.1.6)", () => {
    // The handbook counts the place p(n + 1) from 1, definition 6: reached here by the p of the same place, (p(n + 1) − 1)/(n − 1).
    const sample = sampleOf(handbook.data.box90);
    const ofHandbook = (p: number) => sampleQuantile(sample, (p * 91 - 1) / 89);
    expect(sampleQuantile(sample, 0.5)).toBe(559.5);
    expect(ofHandbook(0.25)).toBeCloseTo(429.75, 10);
    expect(ofHandbook(0.75)).toBeCloseTo(742.25, 10);
    expect(sampleQuantile(sample, 0.25)).toBeGreaterThan(429.75);
    expect(sampleQuantile(sample, 0.75)).toBeLessThan(742.25);
  });

  test("law: it rises with p from the minimum to the maximum", () => {
    const values = fc.array(fc.double({ min: -1e6, max: 1e6, noNaN: true }), { minLength: 1, maxLength: 30 });
    const chance = fc.double({ min: 0, max: 1, noNaN: true });
    fc.assert(
      fc.property(values, chance, chance, (scores, p, q) => {
        const sample = sampleOf(scores);
        const [low, high] = [sampleQuantile(sample, Math.min(p, q)), sampleQuantile(sample, Math.max(p, q))];
        expect(low).toBeLessThanOrEqual(high + 1e-9);
        expect(sampleQuantile(sample, 0)).toBe(sample.minimum);
        expect(sampleQuantile(sample, 1)).toBe(sample.maximum);
      }),
      { numRuns: 100, seed: 1 },
    );
  });
});
