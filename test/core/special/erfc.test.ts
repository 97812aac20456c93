import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { erfc } from "../../../src/core/special/erfc";
import { erfcx } from "../../../src/core/special/erfcx";
import { relativeError } from "../../support/relativeError";

/** Values by mpmath 1.3.0 with 50 digits. */
const REFERENCE: [x: number, erfc: number, erfcx: number][] = [
  [-3, 1.9999779095030014, 16205.988853999587],
  [-0.5, 1.5204998778130465, 1.9523604891825571],
  [0.25, 0.72367360983176307, 0.77034654773099674],
  [0.46875, 0.50738652678206201, 0.63206968924955608],
  [1, 0.15729920705028513, 0.427583576155807],
  [4, 1.5417257900280019e-8, 0.13699945762506139],
  [6.5, 3.8421483271206475e-20, 0.085805670104894602],
  [20, 5.3958656116079009e-176, 0.028174348741051319],
  [26, 5.6631924088561428e-296, 0.021683584850562907],
];

describe("erfc and erfcx", () => {
  test.each(REFERENCE)("x = %d agrees with mpmath", (x, plain, scaled) => {
    expect(relativeError(erfc(x), plain)).toBeLessThan(1e-15);
    expect(relativeError(erfcx(x), scaled)).toBeLessThan(1e-15);
  });

  test("law: erfc(x) + erfc(−x) = 2", () => {
    fc.assert(
      fc.property(fc.double({ min: -30, max: 30, noNaN: true }), (x) => {
        expect(Math.abs(erfc(x) + erfc(-x) - 2)).toBeLessThan(5e-16);
      }),
    );
  });

  test("law: erfcx lies between the bounds 2/(x + √(x² + 2)) and 2/(x + √(x² + 4/π)) over √π", () => {
    // Abramowitz & Stegun 7.1.13.
    fc.assert(
      fc.property(fc.double({ min: 0, max: 1e6, noNaN: true }), (x) => {
        const root = Math.sqrt(Math.PI);
        expect(erfcx(x) * root).toBeGreaterThanOrEqual((2 / (x + Math.sqrt(x * x + 2))) * (1 - 1e-15));
        expect(erfcx(x) * root).toBeLessThanOrEqual((2 / (x + Math.sqrt(x * x + 4 / Math.PI))) * (1 + 1e-15));
      }),
    );
  });

  test("no seam at 0.46875 and 4, where one approximation takes over from another", () => {
    // One step of x at 6 moves e^(x²) by 2·6·6 steps.
    for (const seam of [-0.46875, 0.46875, 4, -6]) {
      const [left, right] = [seam * (1 - 2 ** -52), seam * (1 + 2 ** -52)];
      expect(relativeError(erfc(left), erfc(right))).toBeLessThan(5e-14);
      expect(relativeError(erfcx(left), erfcx(right))).toBeLessThan(5e-14);
    }
  });

  test("the ends: 2 and 0 far out, NaN for NaN", () => {
    expect([erfc(-Infinity), erfc(-40), erfc(0), erfc(30), erfc(Infinity), erfc(NaN)]).toEqual([2, 2, 1, 0, 0, NaN]);
    expect([erfcx(-Infinity), erfcx(0), erfcx(Infinity), erfcx(NaN)]).toEqual([Infinity, 1, 0, NaN]);
  });
});
