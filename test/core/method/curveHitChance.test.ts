import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { normalUpperTailQuantile } from "../../../src/core/distribution/normalUpperTailQuantile";
import { studentTUpperTail } from "../../../src/core/distribution/studentTUpperTail";
import { curveHitChance } from "../../../src/core/method/curveHitChance";
import { looksForHitChance } from "../../../src/core/method/looksForHitChance";
import { markDensity } from "../../../src/core/method/markDensity";
import reference from "../../reference/cutoff/cutoff.json";
import { relativeError } from "../../support/relativeError";
import { testRefusals } from "../../support/refusals";

const chance = (count: number, k: number, trials: number) => curveHitChance(count, 0, 1, k, trials, "high").chance;

describe("the hit chance beyond an estimated mark", () => {
  test.each(reference.hits.cases as [number, number, number, number][])(
    "%d scores, %d deviations out, %d trials agrees with a double integral in numpy",
    (count, k, trials, expected) =>
      expect(relativeError(chance(count, k, trials), expected)).toBeLessThanOrEqual(2e-13),
  );

  test("law: one trial is a Student t tail, to 2e-13 down to 1e-50 and 2e-12 beyond", () => {
    for (const count of [2, 3, 5, 19, 20, 21, 22, 99, 100, 1e3, 1e4, 1e5])
      for (const k of [-40, -3, -0.2, 0, 0.4, 1.5, 5, 12, 30]) {
        const expected = studentTUpperTail(k / Math.sqrt(1 + 1 / count), count - 1);
        const error = relativeError(chance(count, k, 1), expected);
        expect(error, `${count} ${k}`).toBeLessThanOrEqual(expected > 1e-50 ? 2e-13 : 2e-12);
      }
  });

  test("law: two trials by inclusion and exclusion: less than twice one, more than one", () => {
    fc.assert(
      fc.property(fc.integer({ min: 2, max: 5000 }), fc.double({ min: -6, max: 12, noNaN: true }), (count, k) => {
        const [one, two, many] = [1, 2, 1000].map((trials) => chance(count, k, trials));
        expect(two).toBeGreaterThanOrEqual(one! * (1 - 1e-13));
        expect(two).toBeLessThanOrEqual(2 * one!);
        expect(many).toBeGreaterThanOrEqual(two! * (1 - 1e-13));
        expect(many).toBeLessThanOrEqual(1);
      }),
      { numRuns: 60 },
    );
  });

  test("law: with a huge sample it is 1 − Φ(k)^trials: 1 − 0.95^59 = 0.9515…", () => {
    expect(chance(1e12, 1.6448536269514722, 59)).toBeCloseTo(1 - 0.95 ** 59, 9);
  });

  test("law: low mirrors high to the bit, and shift and scale don't matter", () => {
    const high = curveHitChance(20, 70, 8, 83, 50, "high").chance;
    expect(curveHitChance(20, -70, 8, -83, 50, "low").chance).toBe(high);
    expect(curveHitChance(20, 0, 4, 6.5, 50, "high").chance).toBe(high);
    expect(curveHitChance(20, 70, 8, 57, 50, "low").chance).toBe(high);
  });

  test("no trials give 0; what is near certain stays at or below 1", () => {
    expect(chance(20, 1, 0)).toBe(0);
    for (const k of [-1e300, -1e6, -30, 0]) expect(chance(2, k, 1e12)).toBeLessThanOrEqual(1);
    expect(chance(9007199254740991, 1e8, 9007199254740991)).toBe(0);
  });

  test("the density integrates to 1", () => {
    for (const [count, k] of [
      [2, 1.6],
      [9, -2],
      [60, 1.645],
      [1e5, 3],
    ] as const) {
      const spread = Math.sqrt(1 / count + (k * k) / (2 * (count - 1)));
      const step = Math.min(0.5 / Math.sqrt(count), spread / 4);
      let sum = 0;
      for (let t = k - 20 * spread; t < k + 30 * spread; t += step) sum += step * markDensity(count, k, t);
      expect(sum).toBeCloseTo(1, 12);
    }
  });

  testRefusals(curveHitChance, [
    ["count", 1, 70, 8, 83, 50, "high"],
    ["count", NaN, 70, 8, 83, 50, "high"],
    ["mean", 20, Infinity, 8, 83, 50, "high"],
    ["sd", 20, 70, 0, 83, 50, "high"],
    ["sd", 20, 70, NaN, 83, 50, "high"],
    ["cutoff", 20, 70, 8, -Infinity, 50, "high"],
    ["cutoff", 20, 0, 1e-300, 1e300, 50, "high"],
    ["trials", 20, 70, 8, 83, 1.5, "high"],
    ["trials", 20, 70, 8, 83, -1, "high"],
  ]);
});

describe("the looks for a hit chance", () => {
  test.each([
    [57, 0.05],
    [5, 0.2],
    [2, 0.05],
    [2, 0.001],
    [40, 0.9],
    [1e5, 1e-6],
    [3, 1e-4],
  ])("are the smallest at %d scores and fraction %d: one fewer falls short", (count, fraction) => {
    for (const asked of [0.1, 0.5, 0.9, 0.99]) {
      const looks = looksForHitChance(count, fraction, asked);
      if (looks === Infinity) continue;
      const z = normalUpperTailQuantile(fraction);
      expect(chance(count, z, looks)).toBeGreaterThanOrEqual(asked * (1 - 2e-12));
      if (looks > 1) expect(chance(count, z, looks - 1)).toBeLessThan(asked);
    }
  });

  test("law: more scores take fewer looks, and no fewer than a known curve: 14 and 45 at 5 %", () => {
    const looks = [2, 3, 5, 10, 30, 100, 1e4, 1e9].map((count) => looksForHitChance(count, 0.05, 0.9));
    expect([...looks].sort((a, b) => b - a)).toEqual(looks);
    expect(looks[7]).toBe(Math.ceil(Math.log(0.1) / Math.log(0.95)));
    expect(looksForHitChance(1e9, 0.05, 0.5)).toBe(Math.ceil(Math.log(0.5) / Math.log(0.95)));
  });

  test("what is past all counting is Infinity, and quickly so", () => {
    expect(looksForHitChance(2, 1e-9, 0.9)).toBe(Infinity);
    expect(looksForHitChance(4, 1e-300, 0.5)).toBe(Infinity);
  });

  testRefusals(looksForHitChance, [
    ["count", 1, 0.05, 0.9],
    ["fraction", 20, 0, 0.9],
    ["chance", 20, 0.05, 1],
    ["chance", 20, 0.05, NaN],
  ]);
});
