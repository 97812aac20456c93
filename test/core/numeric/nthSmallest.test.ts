import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { nthSmallest } from "../../../src/core/numeric/nthSmallest";

describe("nthSmallest", () => {
  test("law: it is what stands there after sorting, also with ties, and no value is lost", () => {
    const numbers = fc.array(fc.oneof(fc.integer({ min: -5, max: 5 }), fc.double({ noNaN: true })), {
      minLength: 1,
      maxLength: 60,
    });
    fc.assert(
      fc.property(numbers, fc.nat(), (values, at) => {
        const n = at % values.length;
        const sorted = Float64Array.from(values).sort();
        const reordered = Float64Array.from(values);
        expect(nthSmallest(reordered, n) === sorted[n]).toBe(true);
        expect(reordered.subarray(0, n).every((value) => value <= sorted[n])).toBe(true);
        expect(reordered.subarray(n).every((value) => value >= sorted[n])).toBe(true);
        expect(reordered.sort().every((value, i) => value === sorted[i])).toBe(true);
      }),
      { numRuns: 300 },
    );
  });

  test("is not slowed down by values that are sorted, reversed, or all alike", () => {
    const size = 200_000;
    for (const value of [(i: number) => i, (i: number) => -i, () => 1]) {
      const values = Float64Array.from({ length: size }, (_, i) => value(i));
      const expected = values.slice().sort()[size >> 1];
      expect(nthSmallest(values, size >> 1)).toBe(expected);
    }
  });
});
