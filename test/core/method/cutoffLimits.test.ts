import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { normalUpperTail } from "../../../src/core/distribution/normalUpperTail";
import { studentTUpperTailQuantile } from "../../../src/core/distribution/studentTUpperTailQuantile";
import { cutoffLimits } from "../../../src/core/method/cutoffLimits";
import { knownCurve } from "../../../src/core/method/markCurve";
import { nextScoreCutoff } from "../../../src/core/method/nextScoreCutoff";
import { plainCutoff } from "../../../src/core/method/plainCutoff";
import { safeCutoff } from "../../../src/core/method/safeCutoff";
import { fitCurve } from "../../../src/core/sample/fitCurve";
import { Sample } from "../../../src/core/sample/sample";
import { relativeError } from "../../support/relativeError";
import { testRefusals } from "../../support/refusals";

const curves = fc.record({
  count: fc.integer({ min: 2, max: 5000 }),
  mean: fc.double({ min: -1e6, max: 1e6, noNaN: true }),
  sd: fc.double({ min: 1e-3, max: 1e6, noNaN: true }),
});
const fractions = fc.double({ min: 1e-6, max: 0.999, noNaN: true });
const unit = knownCurve(20, 0, 1);

describe("the plain mark", () => {
  test("law: the curve's tail beyond it is the fraction", () => {
    fc.assert(
      fc.property(curves, fractions, ({ count, mean, sd }, fraction) => {
        const { z, point } = plainCutoff(knownCurve(count, mean, sd), fraction, "high");
        expect(relativeError(normalUpperTail(z), fraction)).toBeLessThan(1e-13);
        expect(point).toBe(mean + z * sd);
      }),
    );
  });

  testRefusals(plainCutoff, [
    ["fraction", unit, 5, "high"],
    ["fraction", unit, NaN, "high"],
    ["mean", { ...unit, mean: Infinity }, 0.05, "high"],
    ["sd", { ...unit, sd: 0 }, 0.05, "high"],
    ["sd", { ...unit, sd: NaN }, 0.05, "high"],
  ]);
});

describe("the limits of the mark", () => {
  test("by another road: for half of the entries they are the Student t limits of the mean", () => {
    for (const [count, confidence] of [
      [5, 0.9],
      [20, 0.95],
      [300, 0.99],
    ] as const) {
      const { lowerLimit, cutoff, upperLimit } = cutoffLimits(knownCurve(count, 64, 10), 0.5, confidence, "high");
      const half = (studentTUpperTailQuantile((1 - confidence) / 2, count - 1) * 10) / Math.sqrt(count);
      expect(cutoff).toBe(64);
      expect(lowerLimit).toBeCloseTo(64 - half, 11);
      expect(upperLimit).toBeCloseTo(64 + half, 11);
    }
  });

  test("laws: they enclose the mark, nest in the confidence, close in with the count, and mirror to the bit", () => {
    fc.assert(
      fc.property(
        curves,
        fractions,
        fc.double({ min: 0.5, max: 0.99, noNaN: true }),
        ({ count, mean, sd }, fraction, confidence) => {
          const at = (n: number, c: number) => cutoffLimits(knownCurve(n, mean, sd), fraction, c, "high");
          const [one, wider, more] = [
            at(count, confidence),
            at(count, (1 + confidence) / 2),
            at(10 * count, confidence),
          ];
          expect(one.lowerLimit).toBeLessThanOrEqual(one.cutoff);
          expect(one.upperLimit).toBeGreaterThanOrEqual(one.cutoff);
          expect(wider.nearFactor).toBeLessThan(one.nearFactor);
          expect(wider.farFactor).toBeGreaterThan(one.farFactor);
          expect(more.farFactor - more.nearFactor).toBeLessThan(one.farFactor - one.nearFactor);
          const mirror = cutoffLimits(knownCurve(count, -mean, sd), fraction, confidence, "low");
          expect([-mirror.upperLimit, -mirror.cutoff, -mirror.lowerLimit]).toEqual([
            one.lowerLimit,
            one.cutoff,
            one.upperLimit,
          ]);
        },
      ),
      { numRuns: 60 },
    );
  });

  test("law: the upper limit is the safe mark at the confidence of one side", () => {
    const curve = knownCurve(33, 64, 10);
    const { upperLimit } = cutoffLimits(curve, 0.05, 0.9, "high");
    expect(upperLimit).toBeCloseTo(safeCutoff(curve, 0.05, 0.95, "high").cutoff, 11);
  });

  testRefusals(cutoffLimits, [
    ["fraction", unit, 0, 0.95, "high"],
    ["confidence", unit, 0.05, 95, "high"],
    ["confidence", unit, 0.05, NaN, "high"],
    ["count", { ...unit, count: 1 }, 0.05, 0.95, "high"],
  ]);
});

describe("the mark for the next score", () => {
  test("law: it lies between the plain and the safe mark, t·√(1 + 1/n) deviations out", () => {
    const scores = new Sample(Float64Array.from([54, 52.3, 60.4, 43.4, 50.5]));
    const curve = fitCurve("scores", scores, { kind: "normal" });
    const next = nextScoreCutoff(curve, 0.05, "high");
    expect(next.factor).toBe(next.t * Math.sqrt(1.2));
    expect(next.cutoff).toBeGreaterThan(plainCutoff(curve, 0.05, "high").cutoff);
    expect(next.cutoff).toBeLessThan(safeCutoff(curve, 0.05, 0.95, "high").cutoff);
  });

  test("t tables: with 4 degrees of freedom 5 % lie beyond 2.132, with 9 1 % beyond 2.821 (NIST e-Handbook 1.3.6.7.2)", () => {
    expect(nextScoreCutoff(knownCurve(5, 0, 1), 0.05, "high").t).toBeCloseTo(2.132, 3);
    expect(nextScoreCutoff(knownCurve(10, 0, 1), 0.01, "high").t).toBeCloseTo(2.821, 3);
  });

  testRefusals(nextScoreCutoff, [
    ["fraction", unit, 1, "high"],
    ["fraction", unit, Infinity, "high"],
    ["count", { ...unit, count: 1 }, 0.05, "high"],
  ]);
});
