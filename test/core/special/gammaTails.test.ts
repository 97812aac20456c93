import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { gammaP } from "../../../src/core/special/gammaP";
import { gammaQ } from "../../../src/core/special/gammaQ";
import { gammaFactor, gammaTails } from "../../../src/core/special/gammaTails";
import { relativeError } from "../../support/relativeError";

const shapes = fc.double({ min: -2, max: 5, noNaN: true }).map((log) => 10 ** log);

describe("gammaTails", () => {
  test("law: P(a, x) − P(a + 1, x) = x^a e^(−x)/Γ(a + 1), whichever of the methods the two shapes call for", () => {
    fc.assert(
      fc.property(shapes, fc.double({ min: -5, max: 5, noNaN: true }), (a, z) => {
        const x = Math.max(1e-3, a + z * Math.sqrt(a));
        const [here, next] = [gammaTails(x, a), gammaTails(x, a + 1)];
        const step = gammaFactor(x, a);
        expect(Math.abs(here.lower - next.lower - step)).toBeLessThan(1e-15 + 1e-14 * step);
        // In the smaller tail the law holds to its own digits, but for what the difference itself cancels.
        const [small, large] = x > a ? [here.upper, next.upper - step] : [next.lower, here.lower - step];
        expect(Math.abs(small - large)).toBeLessThan(2e-14 * (small + step));
      }),
      { numRuns: 300 },
    );
  });

  test("law: the ends of Temme's region join on to the series and the fraction", () => {
    for (const a of [20, 25, 60, 400, 3000])
      for (const edge of [0.4 * a, 2 * a]) {
        const [inside, outside] = edge < a ? [1 + 1e-9, 1 - 1e-9] : [1 - 1e-9, 1 + 1e-9];
        const tail = (x: number) => (edge < a ? gammaTails(x, a).lower : gammaTails(x, a).upper);
        // ln of the tail moves by its slope, a·factor/tail, to first order.
        const slope = ((edge < a ? 1 : -1) * a * gammaFactor(edge, a)) / tail(edge);
        const change = Math.log(tail(edge * inside) / tail(edge * outside));
        if (tail(edge) > 1e-290) expect(Math.abs(change - slope * (inside - outside))).toBeLessThan(4e-13);
      }
  });

  test("gammaP and gammaQ are its two halves; outside the domain NaN", () => {
    expect(gammaP(2, 3) + gammaQ(2, 3)).toBe(1);
    for (const [x, a] of [
      [-1, 1],
      [NaN, 1],
      [1, 0],
      [1, NaN],
      [1, Infinity],
    ]) {
      expect(gammaP(x, a)).toBeNaN();
      expect(gammaQ(x, a)).toBeNaN();
    }
    expect([gammaP(0, 1), gammaQ(0, 1), gammaP(Infinity, 1), gammaQ(Infinity, 1)]).toEqual([0, 1, 1, 0]);
  });

  test("law: for a shape next to 0 the upper tail is that of the exponential integral, a·E₁(x)", () => {
    // E₁(1) = 0.21938393439552027 (Abramowitz & Stegun, table 5.1).
    expect(relativeError(gammaQ(1, 1e-9), 1e-9 * 0.21938393439552027)).toBeLessThan(1e-8);
  });
});
