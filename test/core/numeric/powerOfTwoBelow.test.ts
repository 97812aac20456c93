import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { powerOfTwoBelow } from "../../../src/core/numeric/powerOfTwoBelow";

describe("powerOfTwoBelow", () => {
  test.each([
    [1, 1],
    [1.999, 1],
    [2, 2],
    [-3, 2],
    [0.3, 0.25],
    [5e-324, 5e-324],
    [Number.MAX_VALUE, 2 ** 1023],
    [0, 1],
    [NaN, 1],
    [Infinity, 1],
  ])("of %d it is %d", (x, power) => expect(powerOfTwoBelow(x)).toBe(power));

  test("law: dividing by it leaves a number from 1 up to but not 2, and multiplying gives the number back", () => {
    fc.assert(
      fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), (x) => {
        const power = powerOfTwoBelow(x);
        if (x !== 0) expect(Math.abs(x / power) >= 1 && Math.abs(x / power) < 2).toBe(true);
        expect((x / power) * power).toBe(x);
      }),
    );
  });
});
