import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { stirlingError } from "../../../src/core/special/stirlingError";

/** Values by mpmath 1.3.0 with 50 digits. */
const REFERENCE: [x: number, value: number][] = [
  [1e-5, 4.8376435564606884],
  [1e-3, 2.5422704679670945],
  [0.3, 0.23606490074821559],
  [0.7, 0.11326370211474026],
  [1.5, 0.054814121051917654],
  [12.25, 0.0068012128650719786],
];

describe("stirlingError", () => {
  test.each(REFERENCE)("x = %d agrees with mpmath", (x, value) => {
    expect(Math.abs(stirlingError(x) - value)).toBeLessThan(3e-16 * Math.max(1, 2 * value));
  });

  test("by hand: at 1 it is 1 − ½ ln 2π, at 2 ln 2 − 2.5 ln 2 + 2 − ½ ln 2π", () => {
    const half = Math.log(2 * Math.PI) / 2;
    expect(stirlingError(1)).toBeCloseTo(1 - half, 15);
    expect(stirlingError(2)).toBeCloseTo(-1.5 * Math.LN2 + 2 - half, 15);
  });

  test("law: it lies between 1/(12x + 1) and 1/(12x) from 1 on (Robbins 1955)", () => {
    fc.assert(
      fc.property(fc.double({ min: 1, max: 1e8, noNaN: true }), (x) => {
        expect(stirlingError(x)).toBeGreaterThan((1 / (12 * x + 1)) * (1 - 1e-15));
        expect(stirlingError(x)).toBeLessThan((1 / (12 * x)) * (1 + 1e-15));
      }),
    );
  });

  test("the ends: Infinity at 0, 0 at ∞, NaN below and for NaN", () => {
    expect([0, Infinity, -1, NaN].map(stirlingError)).toEqual([Infinity, 0, NaN, NaN]);
  });
});
