import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { symmetricSum } from "../../../src/core/numeric/symmetricSum";

const numbers = fc.array(fc.double({ noNaN: true, noDefaultInfinity: true, min: -1e300, max: 1e300 }), {
  maxLength: 60,
});

describe("symmetricSum", () => {
  test("by hand: what is lost of small terms beside large ones comes back", () => {
    expect(symmetricSum([1, 1e100, 1, -1e100])).toBe(2);
    expect(symmetricSum(new Float64Array(1_000_001).fill(0.1))).toBe(100000.1);
    expect(symmetricSum([1, 2, 3, 4], (x) => x * x)).toBe(30);
    expect(symmetricSum([])).toBe(0);
    expect(symmetricSum([7])).toBe(7);
  });

  test("against sums in whole numbers: half an ulp and no more", () => {
    fc.assert(
      fc.property(fc.array(fc.integer({ min: -(2 ** 30), max: 2 ** 30 }), { maxLength: 200 }), (whole) => {
        // 2^30 apart in size, so that plain addition would lose digits; exact in BigInt.
        const values = whole.map((x, i) => (i % 2 === 0 ? x : x * 2 ** 30));
        const exact = values.reduce((sum, x) => sum + BigInt(x), 0n);
        expect(symmetricSum(values)).toBe(Number(exact));
      }),
      { seed: 11 },
    );
  });

  test("law: turning the order round changes no bit, turning the signs the sign alone", () => {
    fc.assert(
      fc.property(numbers, (values) => {
        const sum = symmetricSum(values);
        expect(symmetricSum([...values].reverse())).toBe(sum);
        expect(symmetricSum(values.map((x) => -x)) + sum).toBe(0);
      }),
      { seed: 12 },
    );
  });

  test("what leaves the range of numbers is infinite, and NaN stays NaN", () => {
    expect(symmetricSum([1e308, 1e308, 1e308])).toBe(Infinity);
    expect(symmetricSum([-Infinity, 1])).toBe(-Infinity);
    expect(symmetricSum([1, NaN, 2])).toBeNaN();
    expect(symmetricSum([Infinity, 1, -Infinity])).toBeNaN();
  });
});
