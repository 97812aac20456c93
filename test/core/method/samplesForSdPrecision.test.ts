import { describe, expect, test } from "vitest";
import { samplesForSdPrecision, samplesForVariancePrecision } from "../../../src/core/method/samplesForSdPrecision";
import { samplesForVarianceStandardError } from "../../../src/core/method/samplesForVarianceStandardError";
import { sdPrecision } from "../../../src/core/method/sdPrecision";
import { spreadCoverage } from "../../../src/core/method/spreadCoverage";
import reference from "../../reference/plan/plan.json";
import { relativeError } from "../../support/relativeError";

describe("samplesForSdPrecision and samplesForVariancePrecision", () => {
  test("10 % at 95 % takes 193 scores; 192 fall just short (Greenwood & Sandomire 1950)", () => {
    expect(samplesForSdPrecision(0.1, 0.95)).toMatchObject({ count: 193, degrees: 192 });
    expect(spreadCoverage(192, 0.81, 1.21).covered).toBeLessThan(0.95);
    expect(spreadCoverage(193, 0.81, 1.21).covered).toBeGreaterThan(0.95);
  });

  test("law: the coverage rises with every further score, so the first count that meets the confidence is the smallest", () => {
    for (const precision of [0.02, 0.1, 0.3, 0.5, 0.7, 0.9, 0.999])
      for (const [low, high] of [
        [(1 - precision) ** 2, (1 + precision) ** 2],
        [1 - precision, 1 + precision],
      ] as const)
        for (let count = 2, last = 0; count < 600; count++) {
          const { covered } = spreadCoverage(count, low, high);
          expect(covered).toBeGreaterThanOrEqual(last - 1e-14);
          last = covered;
        }
  });

  test("law: it agrees with a walk through every count", () => {
    for (const precision of [0.07, 0.15, 0.4, 0.95])
      for (const confidence of [0.05, 0.5, 0.9, 0.99]) {
        let count = 2;
        while (spreadCoverage(count, (1 - precision) ** 2, (1 + precision) ** 2).covered < confidence) count++;
        expect(samplesForSdPrecision(precision, confidence).count).toBe(count);
        count = 2;
        while (spreadCoverage(count, 1 - precision, 1 + precision).covered < confidence) count++;
        expect(samplesForVariancePrecision(precision, confidence).count).toBe(count);
      }
  });

  test("law: a finer precision or a higher confidence never takes fewer; in the limit n is z²/(2p²), and 2z²/p² for the variance", () => {
    // z at 97.5 % squared: 3.841458820694124 (chi-square, 1 degree of freedom).
    expect(relativeError(samplesForSdPrecision(0.001, 0.95).count, 3.841458820694124 / 2e-6)).toBeLessThan(1e-5);
    expect(relativeError(samplesForVariancePrecision(0.001, 0.95).count, (2 * 3.841458820694124) / 1e-6)).toBeLessThan(
      1e-5,
    );
    expect(samplesForSdPrecision(0.1, 0.99).count).toBeGreaterThan(193);
    expect(samplesForSdPrecision(0.09, 0.95).count).toBeGreaterThan(193);
  });

  test("a confidence that a count meets on paper is met by it", () => {
    // The coverage of 40 scores, as it comes out, and a rounding above it.
    const { covered } = spreadCoverage(40, 0.64, 1.44);
    expect(samplesForSdPrecision(0.2, covered).count).toBe(40);
    expect(samplesForSdPrecision(0.2, covered * (1 + 5e-13)).count).toBe(40);
    expect(samplesForSdPrecision(0.2, covered * (1 + 1e-10)).count).toBe(41);
  });

  test("a chance of missing of 1e-15 is not decided by the rounding of 1 − 1e-15", () => {
    const { count } = samplesForSdPrecision(0.1, 1 - 1e-15);
    const { below, above } = spreadCoverage(count, 0.81, 1.21);
    expect(below + above).toBeLessThanOrEqual(1.2e-15);
  });

  test.each<[string, () => unknown, string]>([
    ["precision 0", () => samplesForSdPrecision(0, 0.95), "precision"],
    ["precision 10", () => samplesForSdPrecision(10, 0.95), "precision"],
    ["precision NaN", () => samplesForVariancePrecision(NaN, 0.95), "precision"],
    ["precision −∞", () => samplesForVariancePrecision(-Infinity, 0.95), "precision"],
    ["confidence 1", () => samplesForSdPrecision(0.1, 1), "confidence"],
    ["confidence NaN", () => samplesForVariancePrecision(0.1, NaN), "confidence"],
    ["an error of 1", () => samplesForVarianceStandardError(1), "relative_error"],
    ["an error of NaN", () => samplesForVarianceStandardError(NaN), "relative_error"],
    ["one score", () => sdPrecision(1, 0.95), "count"],
    ["∞ scores", () => sdPrecision(Infinity, 0.95), "count"],
    ["a confidence of ∞", () => sdPrecision(10, Infinity), "confidence"],
  ])("refuses %s and names the argument", (_, call, argument) => {
    expect(call).toThrow(expect.objectContaining({ name: "DomainError", argument }));
  });

  test("a precision for which no number can count the scores has no answer", () => {
    expect(() => samplesForSdPrecision(1e-9, 0.95)).toThrow(
      expect.objectContaining({ name: "NoAnswerError", argument: "precision" }),
    );
  });
});

describe("samplesForVarianceStandardError", () => {
  test("by hand: 2/(n − 1) = e² is met at n = 1 + 2/e²: e = 1/5 → 51, 1/10 → 201, 1/1000 → 2,000,001, 1e-6 → 2e12 + 1", () => {
    const errors: [number, number][] = [
      [0.2, 51],
      [0.1, 201],
      [0.5, 9],
      [0.05, 801],
      [0.01, 20_001],
      [0.001, 2_000_001],
      [1e-6, 2e12 + 1],
    ];
    for (const [error, count] of errors) expect(samplesForVarianceStandardError(error).count).toBe(count);
  });

  test("law: every error √(2/k) is met by exactly k + 1 scores, and a hair less takes one more", () => {
    for (let k = 3; k < 3000; k++) {
      expect(samplesForVarianceStandardError(Math.sqrt(2 / k)).count).toBe(k + 1);
      expect(samplesForVarianceStandardError(Math.sqrt(2 / k) * (1 - 1e-12)).count).toBe(k + 2);
    }
  });
});

describe("sdPrecision", () => {
  test.each(reference.precision.cases as [number, number, string][])(
    "count %d, confidence %d agrees with 30 digits of mpmath",
    (count, confidence, expected) => {
      expect(relativeError(sdPrecision(count, confidence).precision, Number(expected))).toBeLessThanOrEqual(1e-12);
    },
  );

  test("law: it undoes samplesForSdPrecision", () => {
    for (const precision of [0.02, 0.1, 0.35, 0.8]) {
      const { count } = samplesForSdPrecision(precision, 0.9);
      expect(sdPrecision(count, 0.9).precision).toBeLessThanOrEqual(precision);
      expect(sdPrecision(count - 1, 0.9).precision).toBeGreaterThan(precision);
    }
  });

  test("law: it falls with the count and rises with the confidence, across 1 and up to 1e15 scores", () => {
    const counts = [2, 3, 4, 5, 10, 100, 1e4, 1e6, 1e9, 1e12, 1e15];
    const precisions = counts.map((count) => sdPrecision(count, 0.99).precision);
    for (let i = 1; i < counts.length; i++) expect(precisions[i]).toBeLessThan(precisions[i - 1]!);
    const confidences = [1e-6, 0.1, 0.5, 0.9, 0.99, 0.999999, 1 - 1e-13].map(
      (confidence) => sdPrecision(3, confidence).precision,
    );
    for (let i = 1; i < confidences.length; i++) expect(confidences[i]).toBeGreaterThan(confidences[i - 1]!);
  });
});
