import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { logGamma } from "../../../src/core/special/logGamma";
import { logGammaStep } from "../../../src/core/special/logGammaStep";
import { relativeError } from "../../support/relativeError";

describe("logGammaStep", () => {
  test("law: a whole step is ln b", () => {
    for (const b of [0.01, 0.5, 3, 8, 1000, 1e12])
      expect(Math.abs(logGammaStep(b, 1) - Math.log(b))).toBeLessThan(1e-14);
  });

  test("law: it is the difference of the two logarithms", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.01, max: 100, noNaN: true }),
        fc.double({ min: 0.01, max: 1, noNaN: true }),
        (b, a) => {
          const [high, low] = [logGamma(b + a), logGamma(b)];
          expect(Math.abs(logGammaStep(b, a) - (high - low))).toBeLessThan(
            4e-15 * (1 + Math.abs(high) + Math.abs(low)),
          );
        },
      ),
    );
  });

  test("law: a small step from 1 follows Taylor's series: −γa + Σ (−1)ⁿ ζ(n)aⁿ/n", () => {
    const zeta = [1.6449340668482264, 1.2020569031595942, 1.0823232337111382, 1.0369277551433699, 1.0173430619844491];
    for (const a of [0.0005, 0.001, 0.002]) {
      let series = -0.5772156649015329 * a;
      zeta.forEach((z, i) => (series += ((-1) ** (i + 2) * z * a ** (i + 2)) / (i + 2)));
      expect(relativeError(logGammaStep(1, a), series)).toBeLessThan(2e-14);
    }
  });
});
