import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { compensatedSum } from "../../../src/core/numeric/compensatedSum";

describe("compensatedSum", () => {
  test("by hand: 1 + 1e100 + 1 − 1e100 is 2, of which a plain sum keeps nothing", () => {
    expect(compensatedSum([1, 1e100, 1, -1e100])).toBe(2);
  });

  test("ten tenths are 1, which a plain sum misses", () => {
    expect(compensatedSum(new Array<number>(10).fill(0.1))).toBe(1);
  });

  test("no values add up to 0", () => {
    expect(compensatedSum([])).toBe(0);
  });

  test("an infinite value gives its own infinity, both of them NaN", () => {
    expect(compensatedSum([1, Infinity, 2])).toBe(Infinity);
    expect(compensatedSum([1, -Infinity])).toBe(-Infinity);
    expect(compensatedSum([Infinity, -Infinity])).toBeNaN();
    expect(compensatedSum([1, NaN])).toBeNaN();
  });

  test("law: whole numbers in eighths are added exactly, in any order", () => {
    fc.assert(
      fc.property(fc.array(fc.integer({ min: -(2 ** 30), max: 2 ** 30 }), { maxLength: 60 }), (whole) => {
        const exact = whole.reduce((a, b) => a + b, 0) / 8;
        const eighths = Float64Array.from(whole, (n) => n / 8);
        expect(compensatedSum(eighths)).toBe(exact + 0);
        expect(compensatedSum(eighths.reverse())).toBe(exact + 0);
      }),
      { numRuns: 100 },
    );
  });
});
