import { describe, expect, test } from "vitest";
import { gatedCurve } from "../../../src/core/sample/gatedCurve";
import { gatedEntries, gatedLogLikelihood, gatedProfile } from "../../../src/core/sample/gatedLikelihood";
import { Sample } from "../../../src/core/sample/sample";
import reference from "../../reference/sample/gated.json";
import { relativeError } from "../../support/relativeError";

const sampleOf = (values: readonly number[]) => new Sample(Float64Array.from(values));

describe("gatedCurve", () => {
  test.each(reference.cases)("$name: agrees with 40 digits of mpmath", (one) => {
    const curve = gatedCurve(sampleOf(one.scores), one.gate, one.below);
    for (const key of ["mean", "sd", "meanError", "sdError"] as const)
      expect(relativeError(curve[key], Number(one[key])), key).toBeLessThanOrEqual(1e-11);
    expect(
      relativeError(gatedLogLikelihood(curve.entries, curve.mean, curve.sd), Number(one.logLikelihood)),
    ).toBeLessThan(1e-12);
  });

  test("by hand: with none below the gate it is the plain maximum likelihood", () => {
    const curve = gatedCurve(sampleOf([1, 3]), -5, 0);
    expect(curve.mean).toBe(2);
    expect(curve.meanError).toBeCloseTo(Math.SQRT1_2, 15);
    expect(curve.sd).toBeCloseTo(1, 15);
    expect(curve.sdError).toBeCloseTo(0.5, 15);
  });

  test("a gate that nothing lies below changes no bit, wherever it stands", () => {
    const { mean, sd, meanError, sdError } = gatedCurve(sampleOf([1, 3, 4]), 1, 0);
    for (const gate of [0, -1e9, -1e154, -1e300, -Number.MAX_VALUE])
      expect(gatedCurve(sampleOf([1, 3, 4]), gate, 0)).toMatchObject({ mean, sd, meanError, sdError });
  });

  test("by hand: far below, the gate alone sets mean and deviation, and a millionth of it in a millionfold unit", () => {
    // The spread of the scores no longer counts: d = S/0, so that Y(Y − z) = 1 and both are multiples of the gate.
    const near = gatedCurve(sampleOf([1, 3]), -1e20, 5);
    const far = gatedCurve(sampleOf([1, 3]), -1e300, 5);
    expect(relativeError(far.mean / 1e300, near.mean / 1e20)).toBeLessThan(1e-13);
    expect(relativeError(far.sdError / 1e300, near.sdError / 1e20)).toBeLessThan(1e-13);
    expect(relativeError(far.pull * (far.pull - far.gateScore), 1)).toBeLessThan(1e-13);
  });

  test("law: no curve nearby is likelier, and the profile of any mark never exceeds it", () => {
    for (const { scores, gate, below } of reference.cases) {
      const { entries, mean, sd } = gatedCurve(sampleOf(scores), gate, below);
      const best = gatedLogLikelihood(entries, mean, sd);
      for (const [dm, ds] of [
        [1e-3, 0],
        [-1e-3, 0],
        [0, 1e-3],
        [0, -1e-3],
        [1e-3, 1e-3],
        [1e-3, -1e-3],
      ] as const)
        expect(gatedLogLikelihood(entries, mean + dm * sd, sd * (1 + ds))).toBeLessThan(best);
      for (const z of [-1, 0, 1.6448536]) {
        const top = gatedProfile(entries, mean + z * sd, z);
        expect(relativeError(top.sd, sd)).toBeLessThan(1e-6);
        expect(relativeError(top.logLikelihood, best)).toBeLessThan(1e-12);
        for (const away of [-2, -0.3, 0.4, 3]) {
          const { logLikelihood, sd: there } = gatedProfile(entries, mean + (z + away) * sd, z);
          expect(logLikelihood).toBeLessThan(best);
          for (const factor of [0.999, 1.001])
            expect(
              gatedLogLikelihood(entries, mean + (z + away) * sd - z * there * factor, there * factor),
            ).toBeLessThanOrEqual(logLikelihood + 1e-12 * Math.abs(logLikelihood));
        }
      }
    }
  });

  test("law: unit, origin and order of the scores are immaterial", () => {
    const { scores, gate, below } = reference.cases[1]!;
    const plain = gatedCurve(sampleOf(scores), gate, below);
    const other = gatedCurve(sampleOf([...scores].reverse().map((x) => 4 * x - 100)), 4 * gate - 100, below);
    expect(relativeError(other.mean, 4 * plain.mean - 100)).toBeLessThan(1e-12);
    for (const key of ["sd", "meanError", "sdError"] as const)
      expect(relativeError(other[key], 4 * plain[key])).toBeLessThan(1e-12);
  });

  test("law: the more entries lie below, the lower the mean and the wider the curve, up to millions for two scores", () => {
    let last = { mean: Infinity, sd: 0 };
    for (const below of [0, 1, 3, 30, 1000, 1e6, 1e12]) {
      const curve = gatedCurve(sampleOf([60.5, 63]), 60, below);
      expect(curve.mean).toBeLessThan(last.mean);
      expect(curve.sd).toBeGreaterThan(last.sd);
      for (const error of [curve.meanError, curve.sdError]) expect(error > 0 && error < Infinity).toBe(true);
      last = curve;
    }
  });

  test.each<[string, number, number, RegExp]>([
    ["gate", 61, 3, /gate must be at or below every score; 61 was given, and the lowest score is 60.5/],
    ["gate", NaN, 3, /gate/],
    ["gate", Infinity, 3, /gate/],
    ["gate", -1.7e308, 3, /gate must be of a size.*-1.7e\+308/],
    ["below_count", 60, 2.5, /below_count.*2.5/],
    ["below_count", 60, -1, /below_count.*-1/],
    ["below_count", 60, NaN, /below_count/],
    ["below_count", 60, Infinity, /below_count/],
  ])("refuses a bad %s: gate %d, below_count %d", (argument, gate, below, message) => {
    const fit = () => gatedCurve(sampleOf([60.5, 63]), gate, below);
    expect(fit).toThrow(expect.objectContaining({ name: "DomainError", argument }));
    expect(fit).toThrow(message);
  });

  test("refuses scores whose squares lose their digits, and names them", () => {
    const fit = () => gatedCurve(sampleOf([1e-160, 3e-160]), 0, 0);
    expect(fit).toThrow(expect.objectContaining({ name: "DomainError", argument: "scores" }));
  });

  test("refuses scores whose spread leaves the range of numbers, and names them", () => {
    const fit = () => gatedEntries(sampleOf([1e300, 1e302]), 0, 3);
    expect(fit).toThrow(expect.objectContaining({ name: "DomainError", argument: "scores" }));
  });
});
