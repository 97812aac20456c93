import { describe, expect, test } from "vitest";
import { searchDuration } from "../../../src/core/method/searchDuration";
import { poissonUpperTail } from "../../support/poisson";
import { relativeError } from "../../support/relativeError";
import { testRefusals } from "../../support/refusals";

describe("the duration of a search", () => {
  test("by hand: the first hit comes within −ln(1 − chance)/(arrivals × fraction)", () => {
    for (const chance of [0.1, 0.5, 0.9, 0.999])
      expect(relativeError(searchDuration(0.05, 8, chance, 1).periods, -Math.log1p(-chance) / 0.4)).toBeLessThan(2e-15);
  });

  test("law: within that time the Poisson number of hits reaches theirs with just the chance", () => {
    for (const [fraction, arrivals, chance, hits] of [
      [0.05, 8, 0.9, 1],
      [0.2, 0.5, 0.5, 3],
      [0.01, 100, 0.95, 12],
      [0.5, 3, 0.05, 40],
    ] as const) {
      const { periods } = searchDuration(fraction, arrivals, chance, hits);
      expect(relativeError(poissonUpperTail(hits, periods * arrivals * fraction), chance)).toBeLessThan(1e-13);
    }
  });

  test("law: twice the arrivals halve it to the bit; more hits and a higher chance take longer", () => {
    const { periods } = searchDuration(0.05, 8, 0.9, 3);
    expect(searchDuration(0.05, 16, 0.9, 3).periods).toBe(periods / 2);
    expect(searchDuration(0.05, 8, 0.9, 4).periods).toBeGreaterThan(periods);
    expect(searchDuration(0.05, 8, 0.95, 3).periods).toBeGreaterThan(periods);
  });

  testRefusals(searchDuration, [
    ["fraction", 0, 8, 0.9, 1],
    ["fraction", NaN, 8, 0.9, 1],
    ["arrivals_per_period", 0.05, 0, 0.9, 1],
    ["arrivals_per_period", 0.05, Infinity, 0.9, 1],
    ["chance", 0.05, 8, 1, 1],
    ["hits", 0.05, 8, 0.9, 0],
    ["hits", 0.05, 8, 0.9, 2.5],
  ]);
});
