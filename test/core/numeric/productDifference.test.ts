import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { productDifference, productError } from "../../../src/core/numeric/productDifference";

describe("productDifference", () => {
  test("by hand: (2²⁷ + 1)² − 2⁵⁴ − 2²⁸ leaves the 1 that the plain formula loses", () => {
    const a = 2 ** 27 + 1;
    const b = 2 ** 54 + 2 ** 28;
    expect(a * a - b * 1).toBe(0);
    expect(productDifference(a, a, b, 1)).toBe(1);
  });

  test("law: for whole numbers it is the exact integer, rounded once or twice", () => {
    const whole = fc.integer({ min: -(2 ** 31), max: 2 ** 31 }).map((n) => n * 4097);
    fc.assert(
      fc.property(whole, whole, whole, whole, (a, b, c, d) => {
        const exact = Number(BigInt(a) * BigInt(b) - BigInt(c) * BigInt(d));
        expect(Math.abs(productDifference(a, b, c, d) - exact)).toBeLessThanOrEqual(2 ** -52 * Math.abs(exact));
      }),
      { numRuns: 300 },
    );
  });

  test("law: product and error add up to the exact product", () => {
    const whole = fc.integer({ min: -(2 ** 31), max: 2 ** 31 }).map((n) => n * 1048577);
    fc.assert(
      fc.property(whole, whole, (a, b) => {
        expect(BigInt(a * b) + BigInt(productError(a, b, a * b))).toBe(BigInt(a) * BigInt(b));
      }),
      { numRuns: 300 },
    );
  });
});
