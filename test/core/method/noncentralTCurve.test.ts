import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { studentTCdf } from "../../../src/core/distribution/studentTCdf";
import { noncentralTCurve } from "../../../src/core/method/noncentralTCurve";
import { noncentralTTails } from "../../../src/core/special/noncentralTTails";
import { processorTime } from "../../support/processorTime";
import { relativeError } from "../../support/relativeError";

/** The curve as CLEARANCE_CONFIDENCE asks for it: z of a fraction, and the count. */
const curveOf = (count: number, z: number) => noncentralTCurve(count - 1, z * Math.sqrt(count));

/** Points near the centre, in the tails, about 0, and of any size. */
const places = fc.array(
  fc.oneof(
    fc.double({ min: -60, max: 60, noNaN: true }).map((x) => ({ near: x })),
    fc.double({ min: -10, max: 10, noNaN: true }).map((x) => ({ wide: x })),
    fc.double({ min: -38, max: 38, noNaN: true }).map((x) => ({ power: x })),
  ),
  { minLength: 30, maxLength: 30 },
);

describe("noncentralTCurve", () => {
  test.each([
    [6, 1e-12],
    [37, 1e-11],
  ])("law: with z within ±%d it agrees with the tail itself to %d", (most, allowed) => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.3, max: 5, noNaN: true }),
        fc.double({ min: -most, max: most, noNaN: true }),
        places,
        (power, z, points) => {
          const count = 1 + Math.round(10 ** power);
          const [df, ncp] = [count - 1, z * Math.sqrt(count)];
          const unit = Math.sqrt(2 * df);
          const cdf = curveOf(count, z);
          for (const point of points) {
            const t =
              "near" in point
                ? ncp + point.near
                : "wide" in point
                  ? point.wide * (Math.abs(ncp) + unit)
                  : Math.sign(point.power) * unit * 10 ** Math.abs(point.power);
            const { tail, isLower } = noncentralTTails(t, df, ncp);
            const expected = isLower ? tail : 1 - tail;
            if (expected < (most > 10 ? 1e-250 : 1e-30)) continue;
            expect(relativeError(cdf(t), expected), `df ${df}, ncp ${ncp}, t ${t}`).toBeLessThanOrEqual(allowed);
          }
        },
      ),
      { seed: 31, numRuns: 60 },
    );
  });

  test("without noncentrality it is Student's t, as far out as numbers reach", () => {
    for (const df of [1, 4, 9])
      for (const t of [-1e150, -1e30, -1e9, -77, -1, 0, 2, 1e20]) {
        const expected = studentTCdf(t, df);
        if (expected > 1e-270) expect(relativeError(noncentralTCurve(df, 0)(t), expected)).toBeLessThanOrEqual(2e-12);
      }
  });

  test("law: it never falls, across all the seams of its panels", () => {
    for (const [count, z] of [
      [2, 1.6],
      [5, 37],
      [5, -8],
      [60, 1.6],
      [5000, -3],
    ] as const) {
      const cdf = curveOf(count, z);
      let last = 0;
      for (let power = 40; power > -40; power -= 0.01) {
        const here = cdf(-(10 ** power));
        expect(here).toBeGreaterThanOrEqual(last * (1 - 1e-11));
        last = here;
      }
      for (let power = -40; power < 40; power += 0.01) {
        const here = cdf(10 ** power);
        expect(here).toBeGreaterThanOrEqual(last * (1 - 1e-11));
        last = here;
      }
    }
  });

  test("the same bits whatever was asked before", () => {
    // As many other curves as are kept push this one out.
    const asked = [-1e9, -40, -3, 0.01, 2, 7.5, 30, 1e3, 1e12];
    const alone = asked.map((t) => {
      for (let i = 0; i < 8; i++) noncentralTCurve(100 + i, 1)(0);
      return noncentralTCurve(7, 5)(t);
    });
    expect(asked.map((t) => noncentralTCurve(7, 5)(t))).toEqual(alone);
    expect([...asked].reverse().map((t) => noncentralTCurve(7, 5)(t))).toEqual([...alone].reverse());
  });

  test("scores of every size at an extreme fraction take a quarter of a second, where they took four", () => {
    const cdf = curveOf(5, 37);
    const time = processorTime(() => {
      for (let power = -300; power < 300; power += 0.01) {
        cdf(10 ** power);
        cdf(-(10 ** power));
      }
    });
    expect(time).toBeLessThan(1000);
  });
});
