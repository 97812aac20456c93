import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { deviance } from "../../../src/core/special/deviance";
import { relativeError } from "../../support/relativeError";

/** Values by mpmath 1.3.0 with 50 digits. */
const REFERENCE: [n: number, expected: number, value: number][] = [
  [5, 3, 0.55412811882995342],
  [100, 101, 0.0049669146831917152],
  [1, 1000, 992.09224472101786],
  [1000, 1, 5908.7552789821371],
  [0.5, 0.25, 0.096573590279972655],
];

describe("deviance", () => {
  test.each(REFERENCE)("%d where %d were expected agrees with mpmath", (n, expected, value) => {
    expect(relativeError(deviance(n, expected, expected - n), value)).toBeLessThan(5e-16);
  });

  test("law: it is 0 at the expectation, above 0 elsewhere, and e where nothing was counted", () => {
    const positive = fc.double({ min: 1e-3, max: 1e6, noNaN: true });
    fc.assert(
      fc.property(positive, positive, (n, e) => {
        expect(Math.abs(deviance(n, n, 0))).toBe(0);
        expect(deviance(n, e, e - n)).toBeGreaterThan(n === e ? -1 : 0);
        expect(deviance(0, e, e)).toBe(e);
      }),
    );
  });

  test("law: a difference too small for n to show is d²/2n", () => {
    for (const d of [1e-9, -1e-9, 1e-12]) {
      expect(relativeError(deviance(1000, 1000, d), (d * d) / 2000)).toBeLessThan(1e-11);
    }
  });
});
