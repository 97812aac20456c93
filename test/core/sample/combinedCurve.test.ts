import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { combinedCurve, type Batch } from "../../../src/core/sample/combinedCurve";
import { Sample } from "../../../src/core/sample/sample";
import { relativeError } from "../../support/relativeError";

const batchOf = (values: readonly number[]): Batch => {
  const { count, mean, sd } = new Sample(Float64Array.from(values));
  return { count, mean, sd };
};

describe("combinedCurve", () => {
  test("by hand: 9, 11 and 19, 21 together have the mean 15 and the squares 36 + 16 + 16 + 36 = 104, so s = √(104/3)", () => {
    const { count, mean, sd } = combinedCurve(batchOf([9, 11]), batchOf([19, 21]));
    expect([count, mean]).toEqual([4, 15]);
    expect(sd).toBeCloseTo(Math.sqrt(104 / 3), 14);
  });

  test("law: it is the curve of the two columns taken as one, in either order", () => {
    const scores = fc.array(fc.double({ min: -1e5, max: 1e5, noNaN: true }), { minLength: 2, maxLength: 20 });
    fc.assert(
      fc.property(scores, scores, (one, two) => {
        const whole = batchOf([...one, ...two]);
        for (const both of [combinedCurve(batchOf(one), batchOf(two)), combinedCurve(batchOf(two), batchOf(one))]) {
          expect(both.count).toBe(whole.count);
          expect(Math.abs(both.mean - whole.mean)).toBeLessThanOrEqual(1e-10);
          expect(relativeError(both.sd, whole.sd)).toBeLessThanOrEqual(1e-9);
        }
      }),
      { numRuns: 100, seed: 3 },
    );
  });

  test.each<[string, Partial<Batch>, Partial<Batch>]>([
    ["count_1", { count: 1 }, {}],
    ["count_2", {}, { count: 2.5 }],
    ["count_2", {}, { count: NaN }],
    ["mean_1", { mean: NaN }, {}],
    ["mean_2", {}, { mean: -Infinity }],
    ["sd_1", { sd: -1 }, {}],
    ["sd_2", {}, { sd: NaN }],
    ["sd_2", {}, { sd: Infinity }],
    ["mean_2", { mean: -1.5e308 }, { mean: 1.5e308 }],
  ])("refuses a bad %s", (argument, one, two) => {
    const good = { count: 3, mean: 1, sd: 1 };
    expect(() => combinedCurve({ ...good, ...one }, { ...good, ...two })).toThrow(
      expect.objectContaining({ name: "DomainError", argument }),
    );
  });
});
