import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { normalBetween } from "../../../src/core/special/normalBetween";
import { normalTail } from "../../../src/core/special/normalTail";
import { relativeError } from "../../support/relativeError";

describe("normalBetween", () => {
  test("by hand: within one, two, three standard deviations 68.27 %, 95.45 %, 99.73 %", () => {
    [0.6826894921370859, 0.9544997361036416, 0.9973002039367398].forEach((value, i) =>
      expect(relativeError(normalBetween(-i - 1, i + 1), value)).toBeLessThan(1e-15),
    );
  });

  test("law: neighbouring gaps add up, narrow or wide, in the middle or far out", () => {
    const at = fc.double({ min: -30, max: 30, noNaN: true });
    const wide = fc.double({ min: -12, max: 1, noNaN: true }).map((log) => 10 ** log);
    fc.assert(
      fc.property(at, wide, wide, (low, one, two) => {
        const middle = low + one;
        const high = middle + two;
        const whole = normalBetween(low, high);
        if (whole > 1e-290)
          expect(relativeError(normalBetween(low, middle) + normalBetween(middle, high), whole)).toBeLessThan(2e-13);
      }),
    );
  });

  test("law: a very narrow gap is the density times its width", () => {
    for (const x of [0, 1, -4, 12]) {
      const high = x + 2 ** -30;
      expect(
        relativeError(normalBetween(x, high), (2 ** -30 * Math.exp((-x * x) / 2)) / Math.sqrt(2 * Math.PI)),
      ).toBeLessThan(2e-8);
    }
  });

  test("the ends: nothing between equal or crossed limits, a tail up to ∞", () => {
    expect([normalBetween(1, 1), normalBetween(2, 1), normalBetween(-Infinity, Infinity)]).toEqual([0, 0, 1]);
    expect(normalBetween(3, Infinity)).toBe(normalTail(3));
  });
});
