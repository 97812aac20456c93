import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { log1pMinus } from "../../../src/core/special/log1pMinus";
import { relativeError } from "../../support/relativeError";

/** Values by mpmath 1.3.0 with 50 digits. */
const REFERENCE: [x: number, value: number][] = [
  [-0.99, -3.6151701859880905],
  [-0.5, -0.19314718055994531],
  [-1e-8, -5.0000000333333338e-17],
  [1e-12, -4.9999999999966665e-25],
  [0.3, -0.037635735532508945],
  [0.86, -0.23942351227489012],
  [1, -0.30685281944005469],
  [50, -46.068174367275674],
];

describe("log1pMinus", () => {
  test.each(REFERENCE)("x = %d agrees with mpmath", (x, value) => {
    expect(relativeError(log1pMinus(x), value)).toBeLessThan(5e-16);
  });

  test("law: ln((1 + x)(1 + y)) = ln(1 + x) + ln(1 + y)", () => {
    const eighths = fc.integer({ min: -100, max: 4000 }).map((n) => n / 128);
    fc.assert(
      fc.property(eighths, eighths, (x, y) => {
        // (1 + x)(1 + y) − 1 is exact in these fractions; then f(x + y + xy) = f(x) + f(y) − xy.
        const product = x + y + x * y;
        const parts = Math.abs(log1pMinus(x)) + Math.abs(log1pMinus(y)) + Math.abs(x * y);
        expect(Math.abs(log1pMinus(product) - (log1pMinus(x) + log1pMinus(y) - x * y))).toBeLessThanOrEqual(
          1e-15 * parts,
        );
      }),
    );
  });

  test("the ends: 0 at 0, −Infinity at −1 and ∞, NaN below −1 and for NaN", () => {
    expect(Math.abs(log1pMinus(0))).toBe(0);
    expect([-1, Infinity, -1.5, -2, NaN].map(log1pMinus)).toEqual([-Infinity, -Infinity, NaN, NaN, NaN]);
  });
});
