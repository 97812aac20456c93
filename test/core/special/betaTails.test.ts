import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { betaFactor, betaLambda } from "../../../src/core/special/betaFactor";
import { betaFraction } from "../../../src/core/special/betaFraction";
import { betaI } from "../../../src/core/special/betaI";
import { betaTails } from "../../../src/core/special/betaTails";
import { relativeError } from "../../support/relativeError";

const shapes = fc.double({ min: -1.5, max: 5, noNaN: true }).map((log) => 10 ** log);
const tailsAt = (x: number, a: number, b: number) => betaTails(a, b, x, 1 - x, betaLambda(a, b, x));

describe("betaTails", () => {
  test("law: I_x(a, b) − I_x(a + 1, b) = x^a y^b/(a·B(a, b)), whichever of the methods the two shapes call for", () => {
    fc.assert(
      fc.property(shapes, shapes, fc.double({ min: -5, max: 5, noNaN: true }), (a, b, z) => {
        const mean = a / (a + b);
        const wanted = mean + z * Math.sqrt((mean * (1 - mean)) / (a + b + 1));
        // In 2⁻⁴⁰ths, so that 1 − x is exact.
        const x = Math.round(Math.min(Math.max(wanted, mean / 10), 1 - (1 - mean) / 10) * 2 ** 40) / 2 ** 40;
        fc.pre(x > 0 && x < 1);
        const [here, next] = [tailsAt(x, a, b), tailsAt(x, a + 1, b)];
        const step = betaFactor(a, b, x, 1 - x, betaLambda(a, b, x)) / a;
        expect(Math.abs(here.lower - next.lower - step)).toBeLessThan(2e-15 + 1e-14 * step);
        const [small, large] = x > mean ? [here.upper, next.upper - step] : [next.lower, here.lower - step];
        expect(Math.abs(small - large)).toBeLessThan(2e-14 * (small + step));
      }),
      { numRuns: 300 },
    );
  });

  test("law: Temme's expansion and the continued fraction agree where the first is used", () => {
    for (const [a, b] of [
      [61, 61],
      [61, 500],
      [80, 1e6],
      [1000, 1000],
      [3000, 70],
    ])
      for (const z of [-4, -1.5, -0.2, 0.2, 1.5, 4]) {
        const mean = a / (a + b);
        const x = Math.round((mean + z * Math.sqrt((mean * (1 - mean)) / (a + b))) * 2 ** 45) / 2 ** 45;
        const y = 1 - x;
        const lambda = betaLambda(a, b, x);
        const factor = betaFactor(a, b, x, y, lambda);
        const tails = tailsAt(x, a, b);
        if (lambda > 0)
          expect(relativeError(tails.lower, factor * betaFraction(a, b, x, y, lambda))).toBeLessThan(2e-14);
        else expect(relativeError(tails.upper, factor * betaFraction(b, a, y, x, -lambda))).toBeLessThan(2e-14);
      }
  });

  test("by hand: a·y − b·x at .1 for 3 and 27 is the rounding of .1, thirtyfold", () => {
    // The double next to .1 is .1 + 5.551115123125783e-18.
    expect(betaLambda(3, 27, 0.1)).toBeCloseTo(-30 * 5.551115123125783e-18, 30);
  });

  test("law: a 1 − x handed in carries the digits that x next to 1 has lost", () => {
    const y = 1e-20;
    expect(relativeError(1 - betaI(1 - 1e-10, 3, 0.5, 1e-10), 1.875e-5 * 1)).toBeLessThan(1e-5);
    expect(betaI(1, 3, 0.5, y)).toBeLessThan(1);
  });

  test("outside the domain NaN, at the ends 0 and 1", () => {
    for (const args of [
      [-0.1, 1, 1],
      [1.1, 1, 1],
      [NaN, 1, 1],
      [0.5, 0, 1],
      [0.5, 1, NaN],
      [0.5, Infinity, 1],
    ] as [number, number, number][])
      expect(betaI(...args)).toBeNaN();
    expect([betaI(0, 2, 3), betaI(1, 2, 3)]).toEqual([0, 1]);
  });
});
