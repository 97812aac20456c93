import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { kolmogorovUpperTail } from "../../../src/core/distribution/kolmogorovUpperTail";
import { randomRows } from "../../support/randomRows";
import { relativeError } from "../../support/relativeError";
import { testRefusals } from "../../support/refusals";
import { worstRow } from "../../support/vectors";

describe("kolmogorovUpperTail", () => {
  test("agrees with mpmath at random points", () => {
    const worst = worstRow(randomRows("kolmogorovUpperTail"), kolmogorovUpperTail);
    expect(worst.error, JSON.stringify(worst)).toBeLessThan(1e-13);
  });

  test("the usual critical value: 1.3581 is passed with chance 5 % (value from memory, as in most textbooks)", () => {
    expect(kolmogorovUpperTail(1.3581)).toBeCloseTo(0.05, 5);
  });

  test("law: both series give the same where one takes over from the other", () => {
    expect(relativeError(kolmogorovUpperTail(1 - 2 ** -53), kolmogorovUpperTail(1))).toBeLessThan(4e-15);
  });

  test("law: it falls from 1 to 0", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 20, noNaN: true }),
        fc.double({ min: 0, max: 1, noNaN: true }),
        (x, step) => {
          expect(kolmogorovUpperTail(x + step)).toBeLessThanOrEqual(kolmogorovUpperTail(x) * (1 + 1e-15));
          expect(kolmogorovUpperTail(x)).toBeLessThanOrEqual(1);
        },
      ),
    );
  });

  test("the ends", () => {
    expect([-Infinity, -1, 0, 0.01, Infinity].map(kolmogorovUpperTail)).toEqual([1, 1, 1, 1, 0]);
  });

  testRefusals(kolmogorovUpperTail, [["x", NaN]]);
});
