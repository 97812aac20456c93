import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { missesBeforeHit } from "../../../src/core/method/missesBeforeHit";

describe("missesBeforeHit", () => {
  test("by hand: at chance 1/2 a draw below 1/8 but not below 1/16 has missed three times", () => {
    expect(missesBeforeHit(0.5, 100, 0.124)).toBe(3);
    expect(missesBeforeHit(0.5, 100, 0.0624)).toBe(4);
    expect(missesBeforeHit(0.5, 2, 0.0624)).toBe(2);
    expect(missesBeforeHit(0.5, 100, 0.5)).toBe(0);
  });

  test("edges: a sure hit misses nothing, no chance misses all, no looks miss nothing", () => {
    expect(missesBeforeHit(1, 50, 0)).toBe(0);
    expect(missesBeforeHit(0, 50, 0.999)).toBe(50);
    expect(missesBeforeHit(0.2, 0, 0.5)).toBe(0);
  });

  test("law: it is the geometric law inverted, n misses where (1 − chance)ⁿ⁺¹ ≤ u < (1 − chance)ⁿ", () => {
    const open = fc.double({ min: 1e-6, max: 1 - 1e-6, noNaN: true });
    fc.assert(
      fc.property(open, open, fc.integer({ min: 1, max: 1_000_000 }), (chance, uniform, most) => {
        const misses = missesBeforeHit(chance, most, uniform);
        const exact = Math.log(uniform) / Math.log1p(-chance);
        // Within rounding of a whole number either side may be right.
        if (Math.abs(exact - Math.round(exact)) < 1e-6 * exact) return;
        expect(misses).toBe(Math.min(most, Math.floor(exact)));
      }),
      { numRuns: 1000 },
    );
  });
});
