import { describe, expect, test } from "vitest";
import { gatedCutoffLimits } from "../../../src/core/method/gatedCutoffLimits";
import { Sample } from "../../../src/core/sample/sample";
import reference from "../../reference/cutoff/cutoff.json";
import { relativeError } from "../../support/relativeError";
import { testRefusals } from "../../support/refusals";

const scores = reference.gated.scores;
const sample = new Sample(Float64Array.from(scores));

describe("the limits of a mark behind a gate", () => {
  test.each(reference.gated.cases as [number, number, number, number, string, string, string][])(
    "gate %d, %d below, fraction %d, confidence %d: 30 digits of mpmath, by derivatives taken numerically",
    (gate, below, fraction, confidence, lower, cutoff, upper) => {
      const found = gatedCutoffLimits(sample, gate, below, fraction, confidence);
      expect(relativeError(found.lowerLimit, Number(lower))).toBeLessThanOrEqual(1e-13);
      expect(relativeError(found.cutoff, Number(cutoff))).toBeLessThanOrEqual(1e-13);
      expect(relativeError(found.upperLimit, Number(upper))).toBeLessThanOrEqual(1e-13);
    },
  );

  test("by hand: with none below, the middle's limits are where n·ln(1 + (x̄ − μ)²/S²) is the χ² quantile", () => {
    const mean = scores.reduce((sum, x) => sum + x, 0) / scores.length;
    const variance = scores.reduce((sum, x) => sum + (x - mean) ** 2, 0) / scores.length;
    const { lowerLimit, cutoff, upperLimit, allowed } = gatedCutoffLimits(sample, 50, 0, 0.5, 0.95);
    // 1.959964² from the tables of the normal.
    expect(allowed).toBeCloseTo(3.841459, 5);
    const half = Math.sqrt(variance * Math.expm1(allowed / scores.length));
    expect(cutoff).toBeCloseTo(mean, 11);
    expect(lowerLimit).toBeCloseTo(mean - half, 9);
    expect(upperLimit).toBeCloseTo(mean + half, 9);
  });

  test("laws: the limits enclose the mark, nest in the confidence, and shift and scale with the scores", () => {
    const one = gatedCutoffLimits(sample, 60, 5, 0.05, 0.9);
    const wider = gatedCutoffLimits(sample, 60, 5, 0.05, 0.99);
    expect(wider.lowerLimit < one.lowerLimit && one.lowerLimit < one.cutoff).toBe(true);
    expect(one.cutoff < one.upperLimit && one.upperLimit < wider.upperLimit).toBe(true);
    const moved = new Sample(Float64Array.from(scores, (x) => 4 * x - 100));
    const other = gatedCutoffLimits(moved, 4 * 60 - 100, 5, 0.05, 0.9);
    expect(relativeError(other.upperLimit, 4 * one.upperLimit - 100)).toBeLessThan(1e-12);
    expect(relativeError(other.lowerLimit, 4 * one.lowerLimit - 100)).toBeLessThan(1e-12);
  });

  test("law: the more lie below the gate, the lower the middle of all", () => {
    let last = Infinity;
    for (const below of [0, 1, 5, 50, 500]) {
      const { cutoff } = gatedCutoffLimits(sample, 60, below, 0.5, 0.9);
      expect(cutoff).toBeLessThan(last);
      last = cutoff;
    }
  });

  testRefusals(gatedCutoffLimits, [
    ["gate", sample, 62, 5, 0.05, 0.95],
    ["gate", sample, NaN, 5, 0.05, 0.95],
    ["below_count", sample, 60, -1, 0.05, 0.95],
    ["below_count", sample, 60, Infinity, 0.05, 0.95],
    ["fraction", sample, 60, 5, 1, 0.95],
    ["confidence", sample, 60, 5, 0.05, NaN],
  ]);
});
