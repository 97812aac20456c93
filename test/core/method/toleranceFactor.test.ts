import { describe, expect, test } from "vitest";
import { limitFactors, safeFactor, toleranceFactor } from "../../../src/core/method/toleranceFactor";
import { twoSidedFactor } from "../../../src/core/method/twoSidedFactor";
import memory from "../../reference/published/from-memory.json";
import wrong from "../../reference/published/known-wrong.json";
import handbook from "../../reference/published/nist_handbook.json";
import tables from "../../reference/published/tolerance_factors.json";
import { testRefusals } from "../../support/refusals";
import { readVectors, worstRow } from "../../support/vectors";

const oneSided = (...args: [number, number, number]) => toleranceFactor(...args).factor;
const twoSided = (...args: [number, number, number]) => twoSidedFactor(...args).factor;

describe("the one-sided tolerance factor", () => {
  test("agrees with 25 digits of mpmath to 1e-13 at 200 points", () => {
    const worst = worstRow(readVectors("vectors/tol_k1.json"), oneSided as never);
    expect(worst.error, JSON.stringify(worst)).toBeLessThanOrEqual(1e-13);
  });

  test("gives NIST's noncentrality, quantile and factor for 43 scores, 90 % and 99 % (e-Handbook 7.2.6.3)", () => {
    const { printed, tolerance } = handbook.items.find(({ id }) => id === "nist-7263-k1-nct") as never as Printed;
    const { noncentrality, quantile, factor } = toleranceFactor(43, 0.9, 0.99);
    expect(Math.abs(noncentrality - printed.delta)).toBeLessThanOrEqual(tolerance.delta);
    expect(Math.abs(quantile - printed.t)).toBeLessThanOrEqual(tolerance.t);
    expect(Math.abs(factor - printed.k1)).toBeLessThanOrEqual(tolerance.k1);
  });

  test.each(tables.data.kB as [number, number][])(
    "%d scores at 90 % and 95 %: %d in CMH-17-1G, table 8.5.10, whose approximation is good to .0025",
    (count, k) => expect(Math.abs(oneSided(count, 0.9, 0.95) - k)).toBeLessThanOrEqual(0.0025),
  );

  test("is the exact one where that table is known to err in the third decimal: 3 and 20 scores", () => {
    const { right } = wrong.items.find(({ where }) => where.includes("Table 8.5.10")) as never as Right;
    expect(oneSided(3, 0.9, 0.95)).toBeCloseTo(right.n3!, 13);
    expect(oneSided(20, 0.9, 0.95)).toBeCloseTo(right.n20!, 13);
  });

  test.each(memory.items.find(({ id }) => id === "natrella-k1")!.printed as [number, number, number, number][])(
    "%d scores, %d and %d: %d in NBS Handbook 91, table A-7 (Natrella 1963, from memory)",
    (count, coverage, confidence, k) =>
      expect(Math.abs(oneSided(count, coverage, confidence) - k)).toBeLessThanOrEqual(0.0006),
  );

  test("law: it rises with coverage and confidence, and comes down to z with the count", () => {
    const rising = (factors: number[]) => factors.every((k, i) => i === 0 || k > factors[i - 1]!);
    expect(rising([0.01, 0.2, 0.5, 0.9, 0.999999].map((coverage) => oneSided(12, coverage, 0.9)))).toBe(true);
    expect(rising([1e-9, 0.2, 0.5, 0.9, 1 - 1e-12].map((confidence) => oneSided(12, 0.9, confidence)))).toBe(true);
    expect(rising([1e12, 1e6, 1000, 30, 5, 2].map((count) => oneSided(count, 0.95, 0.95)))).toBe(true);
    expect(oneSided(1e12, 0.95, 0.95)).toBeCloseTo(1.6448536269514722, 5);
  });

  test("law: covering the lower 10 % with confidence 5 % is missing the upper 90 % with confidence 95 %, mirrored", () => {
    for (const count of [2, 7, 40, 1000])
      expect(oneSided(count, 0.1, 0.05)).toBeCloseTo(-oneSided(count, 0.9, 0.95), 12);
  });

  test("law: the limits at a confidence are the safe factors at α and 1 − α, and nest in the confidence", () => {
    let last = { near: Infinity, far: -Infinity };
    for (const confidence of [0.001, 0.5, 0.9, 0.95, 0.999, 1 - 1e-9]) {
      const { alpha, lower, upper } = limitFactors(15, 0.05, confidence);
      expect(lower.factor).toBeCloseTo(safeFactor(15, 0.05, alpha).factor, 13);
      if (confidence < 0.9999) expect(upper.factor).toBeCloseTo(safeFactor(15, 0.05, 1 - alpha).factor, 9);
      expect(lower.factor).toBeLessThan(last.near);
      expect(upper.factor).toBeGreaterThan(last.far);
      last = { near: lower.factor, far: upper.factor };
    }
  });

  testRefusals(toleranceFactor, [
    ["count", 1, 0.95, 0.95],
    ["count", 2.5, 0.95, 0.95],
    ["count", NaN, 0.95, 0.95],
    ["count", Infinity, 0.95, 0.95],
    ["coverage", 10, 1, 0.95],
    ["coverage", 10, 0, 0.95],
    ["coverage", 10, NaN, 0.95],
    ["confidence", 10, 0.95, 95],
    ["confidence", 10, 0.95, -Infinity],
    ["confidence", 10, 0.95, 1e-200],
  ]);
});

describe("the two-sided tolerance factor", () => {
  test("agrees with 25 digits of mpmath to 1e-13 at 92 points", () => {
    const worst = worstRow(readVectors("vectors/tol_k2.json"), twoSided as never);
    expect(worst.error, JSON.stringify(worst)).toBeLessThanOrEqual(1e-13);
  });

  test("is the exact one where NIST's page exchanges content and confidence (e-Handbook 7.2.6.3, R output)", () => {
    const { right } = wrong.items.find(({ where }) => where.includes('"exact" two-sided factor'))!;
    expect(twoSided(43, 0.9, 0.99)).toBeCloseTo(right as number, 9);
  });

  test("is the exact one where the classical table holds an approximation (NBS Handbook 91, A-6)", () => {
    const { right } = wrong.items.find(({ where }) => where.includes("Table A-6")) as never as Right;
    for (const [key, k] of Object.entries(right)) {
      const [, coverage, confidence, count] = /^(\d+)\/(\d+) n=(\d+)$/.exec(key)!.map(Number);
      expect(twoSided(count!, coverage! / 100, confidence! / 100)).toBeCloseTo(k, 7);
    }
  });

  test("law: it lies above the one-sided factor at half the rest and comes down to it with the count", () => {
    let last = Infinity;
    for (const count of [2, 5, 20, 100, 1e4, 1e8]) {
      const k = twoSided(count, 0.9, 0.95);
      expect(k).toBeLessThan(last);
      last = k;
    }
    expect(last).toBeCloseTo(1.6448536269514722, 3);
  });

  test("law: a tiny coverage takes a factor in proportion to it, which the difference of two tails would not show", () => {
    const unit = twoSided(6, 1e-12, 0.9) / 1e-12;
    for (const coverage of [1e-300, 1e-100, 1e-9, 1e-7])
      expect(twoSided(6, coverage, 0.9) / coverage / unit).toBeCloseTo(1, 12);
  });

  testRefusals(twoSidedFactor, [
    ["count", 1, 0.95, 0.95],
    ["coverage", 10, 95, 0.95],
    ["coverage", 10, Infinity, 0.95],
    ["confidence", 10, 0.95, NaN],
    ["confidence", 10, 0.95, 1],
  ]);
});

interface Printed {
  printed: { delta: number; t: number; k1: number };
  tolerance: { delta: number; t: number; k1: number };
}
interface Right {
  right: Record<string, number>;
}
