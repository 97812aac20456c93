import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { reserveSchedule } from "../../../src/core/method/reserveSchedule";
import { reserveScore } from "../../../src/core/method/reserveScore";
import { unitNormalLoss } from "../../../src/core/method/unitNormalLoss";
import reference from "../../reference/stopping/values.json";
import { relativeError } from "../../support/relativeError";

type Row = [number, number, number, number, "high" | "low", number];

describe("reserveScore", () => {
  test.each(reference.reserveScore as Row[])(
    "mean %d, sd %d, look_cost %d, discount %d, better %s agrees with halving in 60 digits",
    (mean, sd, cost, discount, better, expected) => {
      const { score } = reserveScore(mean, sd, cost, discount, better);
      expect(relativeError((score - mean) / sd, (expected - mean) / sd)).toBeLessThanOrEqual(1e-13);
    },
  );

  test("by hand: a look that costs sd·φ(0) is worth it just up to the mean", () => {
    expect(reserveScore(50, 10, 10 * 0.3989422804014327).score).toBeCloseTo(50, 12);
  });

  test("laws: solves its equation, mirrors, falls with the cost, rises with the discount, moves with the scale", () => {
    const inputs = [
      fc.double({ min: -200, max: 200, noNaN: true }),
      fc.double({ min: 0.1, max: 50, noNaN: true }),
      fc.double({ min: 0.001, max: 100, noNaN: true }),
      fc.double({ min: 0.05, max: 1, noNaN: true }),
    ] as const;
    fc.assert(
      fc.property(...inputs, (mean, sd, cost, discount) => {
        const { score, standardReserve } = reserveScore(mean, sd, cost, discount);
        const goingOn = discount * (score + sd * unitNormalLoss(standardReserve) - cost);
        expect(Math.abs(score - goingOn)).toBeLessThanOrEqual(1e-10 * (1 + Math.abs(mean) + sd + cost));
        expect(reserveScore(-mean, sd, cost, discount, "low").score).toBe(-score);
        expect(reserveScore(mean, sd, cost * 1.5, discount).score).toBeLessThan(score);
        expect(reserveScore(mean, sd, cost).score).toBeCloseTo(mean + sd * reserveScore(0, 1, cost / sd).score, 8);
      }),
      { numRuns: 100 },
    );
  });

  test("law: a long schedule with the same cost comes to the reserve", () => {
    const long = reserveSchedule(62, 8.5, 2000, 0.4)[0]!.mark!;
    expect(long).toBeCloseTo(reserveScore(62, 8.5, 0.4).score, 10);
  });

  test.each<[string, [number, number, number, number?]]>([
    ["mean", [NaN, 1, 1]],
    ["mean", [Infinity, 1, 1]],
    ["sd", [0, 0, 1]],
    ["sd", [0, NaN, 1]],
    ["look_cost", [0, 1, -1]],
    ["look_cost", [0, 1, NaN]],
    ["look_cost", [0, 1, 0]],
    ["discount", [0, 1, 1, 0]],
    ["discount", [0, 1, 1, 1.01]],
    ["discount", [0, 1, 1, NaN]],
  ])("refuses a bad %s: %o", (argument, args) => {
    expect(() => reserveScore(...args)).toThrow(expect.objectContaining({ name: "DomainError", argument }));
  });
});
