import { describe, expect, test } from "vitest";
import { saddleSeries } from "../../../src/core/special/saddleSeries";
import { relativeError } from "../../support/relativeError";

describe("saddleSeries", () => {
  test("the gamma series begins 1, −1/3, 1/12, −2/135, 1/864, 1/2835, −139/777600 (Temme 1979)", () => {
    const f = saddleSeries(1, 0, 7, new Float64Array(7));
    const printed = [1, -1 / 3, 1 / 12, -2 / 135, 1 / 864, 1 / 2835, -139 / 777600];
    printed.forEach((value, m) => expect(relativeError(f[m], value)).toBeLessThan(1e-14));
  });

  test("law: a symmetric distribution has no odd terms", () => {
    const f = saddleSeries(0, 0.5, 20, new Float64Array(20));
    for (let m = 1; m < 20; m += 2) expect(Math.abs(f[m])).toBe(0);
  });

  test("law: with a = b it solves η² = −2 ln(1 − V²/2), so that the sum is η/V", () => {
    const f = saddleSeries(0, 0.5, 24, new Float64Array(24));
    for (const V of [0.1, 0.3, 0.5]) {
      const eta = Math.sqrt(-2 * Math.log1p((-V * V) / 2));
      let sum = 0;
      for (let m = 23; m >= 0; m--) sum = sum * eta + f[m];
      expect(sum).toBeCloseTo(eta / V, 13);
    }
  });
});
