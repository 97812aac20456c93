import { expect, test } from "vitest";
import { summariseSearches } from "../../../src/core/method/summariseSearches";

test("summariseSearches, by hand: ten runs of 1 to 10 looks, eight finds of which two were not truly top", () => {
  const summary = summariseSearches(1.5, {
    looks: Float64Array.of(10, 1, 9, 2, 8, 3, 7, 4, 6, 5),
    passing: Float64Array.from({ length: 21 }, (_, i) => ((i * 8) % 21) / 100),
    found: 8,
    notTop: 2,
    looksPlayed: 55,
  });
  expect(summary).toEqual({
    factor: 1.5,
    runs: 10,
    looksPlayed: 55,
    averageLooks: 5.5,
    // Half of ten runs had ended by 5 looks, nine tenths by 9.
    medianLooks: 5,
    ninetiethLooks: 9,
    firstHitNotTop: 0.25,
    foundNothing: 0.2,
    // 0, 0.01 … 0.20: the places (21 − 1)·5 % = 1 and 19.
    lowestPassing: 0.01,
    highestPassing: 0.19,
  });
});

test("summariseSearches: percentiles between two runs are interpolated, a single run is all of them", () => {
  const outcomes = (passing: Float64Array) => ({
    looks: Float64Array.of(3),
    passing,
    found: 0,
    notTop: 0,
    looksPlayed: 3,
  });
  expect(summariseSearches(0, outcomes(Float64Array.of(0.4, 0.2))).lowestPassing).toBeCloseTo(0.21, 15);
  expect(summariseSearches(0, outcomes(Float64Array.of(0.4))).highestPassing).toBe(0.4);
  expect(summariseSearches(0, outcomes(Float64Array.of(0.4))).firstHitNotTop).toBeUndefined();
});
