import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { findPositiveRoot } from "../../../src/core/numeric/findPositiveRoot";

describe("findPositiveRoot", () => {
  test("law: a power of x is a straight line in logarithms, so any start leads to the root", () => {
    const decade = fc.double({ min: -100, max: 100, noNaN: true });
    fc.assert(
      fc.property(
        decade,
        decade,
        fc.double({ min: 0.1, max: 20, noNaN: true }),
        fc.boolean(),
        (from, to, power, rising) => {
          const root = 10 ** to;
          const slope = rising ? power : -power;
          const found = findPositiveRoot(10 ** from, rising, (x) => ({
            value: slope * Math.log(x / root),
            slope,
            curvature: 0,
          }));
          expect(Math.abs(found / root - 1)).toBeLessThan(1e-13);
        },
      ),
      { numRuns: 200 },
    );
  });

  test("a start on the flat side, where the slope is 0, still leads home", () => {
    // ln of e^(−1/x): 0 slope far right, a wall on the left.
    for (const start of [1e-5, 1, 1e5, 1e200]) {
      const found = findPositiveRoot(start, true, (x) => {
        const value = -1 / x + 0.001;
        return { value, slope: x > 1e6 ? 0 : 1 / x, curvature: x > 1e6 ? 0 : -1 / x };
      });
      expect(Math.abs(found / 1000 - 1)).toBeLessThan(1e-12);
    }
  });

  test("where there is no root it gives up by name", () => {
    expect(() => findPositiveRoot(1, true, () => ({ value: 1, slope: 0, curvature: 0 }))).toThrow(
      expect.objectContaining({ name: "UnsettledError" }),
    );
  });
});
