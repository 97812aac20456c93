import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { smallestInteger } from "../../../src/core/numeric/smallestInteger";

describe("smallestInteger", () => {
  test("law: it finds the threshold wherever it lies, and asks about 2·log₂ of the distance", () => {
    fc.assert(
      fc.property(fc.integer({ min: -50, max: 50 }), fc.integer({ min: 0, max: 1e9 }), (start, distance) => {
        let asked = 0;
        const holds = (n: number) => (asked++, n >= start + distance);
        expect(smallestInteger(holds, start)).toBe(start + distance);
        expect(asked).toBeLessThanOrEqual(2 * Math.log2(distance + 1) + 4);
      }),
      { numRuns: 200 },
    );
  });

  test("start itself is taken where the condition holds there", () => {
    expect(smallestInteger(() => true, 7)).toBe(7);
  });

  test("the most allowed is still asked, one beyond it is not", () => {
    expect(smallestInteger((n) => n >= 100, 1, 100)).toBe(100);
    expect(smallestInteger((n) => n >= 101, 1, 100)).toBe(Infinity);
    expect(smallestInteger((n) => n >= 1, 0, 1)).toBe(1);
  });

  test("Infinity where nothing holds, where start is beyond most, and for NaN", () => {
    expect(smallestInteger(() => false, 1)).toBe(Infinity);
    expect(smallestInteger(() => true, 5, 4)).toBe(Infinity);
    expect(smallestInteger(() => true, NaN)).toBe(Infinity);
    expect(smallestInteger((n) => n * NaN > 0, 1)).toBe(Infinity);
  });
});
