import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { findRoot } from "../../../src/core/numeric/findRoot";

describe("findRoot", () => {
  test("by hand: x² = 2 between 0 and 2 is √2 to the last digit but one", () => {
    expect(Math.abs(findRoot((x) => x * x - 2, 0, 2) - Math.SQRT2)).toBeLessThanOrEqual(2 ** -52);
  });

  test("law: a simple root is found in few rounds, whichever way round the bracket and the function", () => {
    const decimal = fc.double({ min: -50, max: 50, noNaN: true });
    fc.assert(
      fc.property(decimal, fc.double({ min: 0.1, max: 60, noNaN: true }), fc.boolean(), (root, width, falling) => {
        let asked = 0;
        const f = (x: number) => {
          asked++;
          return (falling ? -1 : 1) * (Math.expm1((x - root) / 10) + (x - root) ** 3);
        };
        for (const [low, high] of [
          [root - width, root + 2 * width],
          [root + width, root - width],
        ]) {
          asked = 0;
          expect(Math.abs(findRoot(f, low, high) - root)).toBeLessThanOrEqual(2 ** -50 * Math.abs(root) + 1e-15);
          expect(asked).toBeLessThan(60);
        }
      }),
      { numRuns: 200 },
    );
  });

  test("a root many decades below the ends of the bracket is found to its last digits", () => {
    for (const root of [1e-300, 1e-200, 3e-20, 1e-3]) {
      let asked = 0;
      const found = findRoot((x) => (asked++, Math.log(x / root)), 1e-308, 1e300);
      expect(Math.abs(found / root - 1)).toBeLessThan(1e-13);
      expect(asked).toBeLessThan(120);
    }
  });

  test("infinite values only tell the side, and an end that is the root is returned", () => {
    expect(findRoot((x) => Math.log(x), 0, 5)).toBeCloseTo(1, 15);
    expect(findRoot((x) => x - 3, 3, 7)).toBe(3);
    expect(findRoot((x) => x - 7, 3, 7)).toBe(7);
    expect(findRoot((x) => x, -1, 2)).toBeCloseTo(0, 300);
  });

  test("a jump across 0 is found as well as a root", () => {
    expect(findRoot((x) => (x < Math.PI ? -1 : 1), 0, 10)).toBeCloseTo(Math.PI, 14);
  });

  test("a wider tolerance asks less", () => {
    let asked = 0;
    const f = (x: number) => (asked++, Math.exp(x) - 5);
    findRoot(f, 0, 10);
    const all = asked;
    asked = 0;
    expect(findRoot(f, 0, 10, 1e-3)).toBeCloseTo(Math.log(5), 2);
    expect(asked).toBeLessThan(all);
  });

  test("without a change of sign, or with NaN, it says so instead of guessing", () => {
    for (const f of [(x: number) => x * x + 1, () => NaN, (x: number) => (x === 1 || x === 4 ? x - 2 : NaN)])
      expect(() => findRoot(f, 1, 4)).toThrow(expect.objectContaining({ name: "UnsettledError" }));
  });
});
