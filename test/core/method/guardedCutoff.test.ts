import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { bivariateNormalCdf } from "../../../src/core/distribution/bivariateNormalCdf";
import { normalCdf } from "../../../src/core/distribution/normalCdf";
import { normalUpperTail } from "../../../src/core/distribution/normalUpperTail";
import { chanceTrueScoreClears } from "../../../src/core/method/chanceTrueScoreClears";
import { guardedCutoff } from "../../../src/core/method/guardedCutoff";
import { wrongPassRisk } from "../../../src/core/method/wrongPassRisk";
import decisions from "../../reference/published/decisions.json";
import memory from "../../reference/published/from-memory.json";
import reference from "../../reference/risk/values.json";
import { relativeError } from "../../support/relativeError";

type Row = [number, number, number, number, number, "high" | "low", number];

describe("chanceTrueScoreClears", () => {
  test("the Zener diode of JCGM 106:2012, 7.4 (from memory): 0.92 with nothing known before", () => {
    const { printed, tolerance } = memory.items.find(({ id }) => id === "zener") as unknown as {
      printed: number;
      tolerance: { abs: number };
    };
    expect(Math.abs(chanceTrueScoreClears(-5.47, -5.4, 0.05, 0, 1e6, "low").chance - printed)).toBeLessThanOrEqual(
      tolerance.abs,
    );
  });

  test("JCGM 106:2012, 8.3.2: beyond a guard band of 2u at most 0.023 are truly short", () => {
    const { printed, tolerance } = decisions.items.find(({ id }) => id === "jcgm-2u") as unknown as {
      printed: number;
      tolerance: { abs: number };
    };
    expect(Math.abs(1 - chanceTrueScoreClears(60 + 2 * 3, 60, 3, 55, 1e8).chance - printed)).toBeLessThanOrEqual(
      tolerance.abs,
    );
  });

  test("by hand: equal spreads draw a score half way to the mean, and leave 1/√2 of the spread", () => {
    const { reliability, expectedTrue, remainingSd, chance } = chanceTrueScoreClears(70, 60, 4, 50, 4);
    expect(reliability).toBeCloseTo(0.5, 15);
    expect(expectedTrue).toBeCloseTo(60, 13);
    expect(remainingSd).toBeCloseTo(4 / Math.SQRT2, 14);
    expect(chance).toBeCloseTo(0.5, 14);
  });

  test("laws: high and low add to 1 and mirror; without error the score decides; with all error the mean does", () => {
    const number = fc.double({ min: -100, max: 100, noNaN: true });
    const spread = fc.double({ min: 0.1, max: 30, noNaN: true });
    fc.assert(
      fc.property(number, number, spread, number, spread, (score, limit, error, mean, sd) => {
        const high = chanceTrueScoreClears(score, limit, error, mean, sd).chance;
        expect(high + chanceTrueScoreClears(score, limit, error, mean, sd, "low").chance).toBeCloseTo(1, 14);
        expect(chanceTrueScoreClears(-score, -limit, error, -mean, sd, "low").chance).toBe(high);
        expect(chanceTrueScoreClears(score + 1, limit, error, mean, sd).chance).toBeGreaterThanOrEqual(high);
      }),
      { numRuns: 100 },
    );
    expect(chanceTrueScoreClears(60.001, 60, 1e-6, 0, 5).chance).toBe(1);
    expect(chanceTrueScoreClears(90, 50, 1e9, 50, 5).chance).toBeCloseTo(0.5, 8);
  });

  test.each<[string, [number, number, number, number, number]]>([
    ["score", [NaN, 60, 3, 55, 8]],
    ["error_sd", [-1e6, -1e6, 5e-324, 1e150, 1e150]],
    ["limit", [64, Infinity, 3, 55, 8]],
    ["error_sd", [64, 60, 0, 55, 8]],
    ["mean", [64, 60, 3, NaN, 8]],
    ["true_sd", [64, 60, 3, 55, -1]],
  ])("refuses a bad %s: %o", (argument, args) => {
    expect(() => chanceTrueScoreClears(...args)).toThrow(expect.objectContaining({ name: "DomainError", argument }));
  });
});

describe("guardedCutoff", () => {
  test.each(reference.guarded as unknown as Row[])(
    "limit %d, error %d, mean %d, true %d, max_wrong %d, %s agrees with halving in 25 digits",
    (limit, error, mean, sd, wrong, better, expected) => {
      const { cutoff } = guardedCutoff(limit, error, mean, sd, wrong, better);
      expect(relativeError(cutoff - mean, expected - mean)).toBeLessThanOrEqual(1e-12);
    },
  );

  test("law: at the mark the risk is just what is allowed, by the bivariate normal", () => {
    const inputs = [
      fc.double({ min: -2, max: 4, noNaN: true }),
      fc.double({ min: 0.05, max: 4, noNaN: true }),
      fc.double({ min: 0.001, max: 0.999, noNaN: true }),
    ] as const;
    fc.assert(
      fc.property(...inputs, (limit, error, share) => {
        const wrong = share * normalCdf(limit);
        const { standardMark, scoreSd, cutoff } = guardedCutoff(limit, error, 0, 1, wrong);
        const short = bivariateNormalCdf(limit, -standardMark, -1 / scoreSd) / normalUpperTail(standardMark);
        expect(relativeError(short, wrong)).toBeLessThanOrEqual(1e-10);
        expect(guardedCutoff(-limit, error, 0, 1, wrong, "low").cutoff).toBe(-cutoff);
        expect(guardedCutoff(limit, error, 0, 1, wrong / 2).cutoff).toBeGreaterThan(cutoff);
      }),
      { numRuns: 60 },
    );
  });

  test("law: with hardly any error the mark is where the truth itself would be cut, with much it lies far out and still exists", () => {
    // No error: P(true < limit | true ≥ A) = wrong, solved on the normal itself.
    const { standardMark } = guardedCutoff(0, 1e-9, 0, 1, 0.2);
    const below = normalUpperTail(standardMark);
    expect((below - 0.5) / below).toBeCloseTo(0.2, 7);
    expect(guardedCutoff(0.1, 100, 0, 1, 0.05).standardMark).toBeGreaterThan(100);
  });

  test("law: the conditional risk keeps its digits where both tails underflow", () => {
    // Far out X ≥ a is X = a plus an exponential of 1/a; with slope 1 and need = a the risk tends to E[Φ̄(t)] over it.
    const a = 2000;
    const risk = wrongPassRisk(a, 1, a);
    expect(risk).toBeGreaterThan(0.4997);
    expect(risk).toBeLessThan(0.4999);
  });

  test("by hand: half reliable scores, the limit at the mean: above the mean a quarter are short (Sheppard)", () => {
    expect(guardedCutoff(50, 8, 50, 8, 0.25).cutoff).toBeCloseTo(50, 12);
  });

  test("extremes settle: errors of nothing beside the true spread, and the other way round", () => {
    expect(guardedCutoff(1e12, 1, 0, 1e150, 1e-300, "low").cutoff).toBeLessThan(1e137);
    expect(guardedCutoff(0, 1e-200, 0, 1, 0.2).standardMark).toBeCloseTo(
      guardedCutoff(0, 1e-16, 0, 1, 0.2).standardMark,
      13,
    );
    expect(() => guardedCutoff(1e308, 1, 0, 1e-5, 0.5)).toThrow(expect.objectContaining({ name: "DomainError" }));
    expect(() => guardedCutoff(1e150, 1e150, 81, 5.5, 0.5)).toThrow(expect.objectContaining({ name: "DomainError" }));
  });

  test("where the risk is met without a mark, on paper too, there is no answer", () => {
    expect(() => guardedCutoff(40, 3, 70, 8, 0.05)).toThrow(
      expect.objectContaining({ name: "NoAnswerError", argument: "max_wrong" }),
    );
    expect(() => guardedCutoff(50, 3, 50, 8, 0.5)).toThrow(expect.objectContaining({ name: "NoAnswerError" }));
    expect(guardedCutoff(50, 3, 50, 8, 0.4999999).cutoff).toBeLessThan(20);
  });

  test.each<[string, Parameters<typeof guardedCutoff>]>([
    ["limit", [NaN, 3, 55, 8]],
    ["error_sd", [60, 0, 55, 8]],
    ["error_sd", [60, NaN, 55, 8]],
    ["mean", [60, 3, Infinity, 8]],
    ["true_sd", [60, 3, 55, 0]],
    ["max_wrong", [60, 3, 55, 8, 0]],
    ["max_wrong", [60, 3, 55, 8, NaN]],
  ])("refuses a bad %s: %o", (argument, args) => {
    expect(() => guardedCutoff(...args)).toThrow(expect.objectContaining({ name: "DomainError", argument }));
  });
});
