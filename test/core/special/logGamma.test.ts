import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { logGamma } from "../../../src/core/special/logGamma";
import { readVectors, worstRow } from "../../support/vectors";

describe("logGamma", () => {
  test("agrees with mpmath on vectors/lgamma.json, next to its zeros at 1 and 2 too", () => {
    const worst = worstRow(readVectors("vectors/lgamma.json"), logGamma);
    expect(worst.error, JSON.stringify(worst)).toBeLessThan(1e-15);
  });

  test("by hand: Γ(1) = Γ(2) = 1, Γ(5) = 24, Γ(1/2) = √π", () => {
    expect([logGamma(1), logGamma(2)]).toEqual([0, 0]);
    expect(logGamma(5)).toBeCloseTo(Math.log(24), 15);
    expect(logGamma(0.5)).toBeCloseTo(Math.log(Math.PI) / 2, 15);
  });

  test("law: next to 1 it is −γ·(x − 1), to all digits", () => {
    for (const step of [1e-15, -1e-15, 1e-12, -1e-12]) {
      const x = 1 + step;
      const expected = (x - 1) * (-0.5772156649015329 + ((x - 1) * Math.PI ** 2) / 12);
      expect(Math.abs(logGamma(x) / expected - 1)).toBeLessThan(1e-14);
    }
  });

  test("law: Γ(x + 1) = x·Γ(x)", () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-6, max: 1e4, noNaN: true }), (x) => {
        const [left, right] = [logGamma(x + 1), logGamma(x) + Math.log(x)];
        expect(Math.abs(left - right)).toBeLessThan(2e-15 * Math.max(1, Math.abs(left), Math.abs(Math.log(x))) + 1e-15);
      }),
    );
  });

  test("law: Γ(x)·Γ(1 − x) = π/sin(πx)", () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-3, max: 0.999, noNaN: true }), (x) => {
        expect(logGamma(x) + logGamma(1 - x)).toBeCloseTo(Math.log(Math.PI / Math.sin(Math.PI * x)), 12);
      }),
    );
  });

  test("the ends: Infinity at 0 and ∞, NaN below and for NaN", () => {
    expect([0, Infinity, -1, NaN].map(logGamma)).toEqual([Infinity, Infinity, NaN, NaN]);
  });
});
