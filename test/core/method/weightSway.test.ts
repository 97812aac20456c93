import { describe, expect, test } from "vitest";
import { weightSway } from "../../../src/core/method/weightSway";

const of = (...numbers: number[]) => Float64Array.from(numbers);
const near = (share: number, expected: number, runs: number) =>
  expect(Math.abs(share - expected)).toBeLessThan(4.5 * Math.sqrt((expected * (1 - expected)) / runs));

describe("weightSway", () => {
  test("two entries, each best on one of two equal weights, win half the runs each", () => {
    const [first, second] = weightSway(of(1, 0, 0, 1), of(3, 3), 1, 0.25, 40_000);
    near(first, 0.5, 40_000);
    expect(first + second).toBeCloseTo(1, 12);
  });

  test("by hand: weights 5 and 4 swaying by a quarter exchange their order in 5 of 32 runs", () => {
    // Over the draws u, v in (0.75, 1.25) the second entry wins where 4v > 5u: v > 1.25u, u from 0.75 to 1. The area of that triangle is
    // ½·0.25·(1.25 − 0.9375) = 0.0390625, of a square of 0.25.
    const [, second] = weightSway(of(1, 0, 0, 1), of(5, 4), 1, 0.25, 100_000);
    near(second, 0.0390625 / 0.25, 100_000);
  });

  test("entries that tie for the places left share them: two for one, three for two", () => {
    expect([...weightSway(of(9, 9, 5, 5, 5, 5, 1, 1), of(2, 3), 2, 0.25, 50)]).toEqual([1, 0.5, 0.5, 0]);
    const shares = weightSway(of(5, 5, 5, 5, 5, 5, 1, 1), of(2, 3), 2, 0.25, 50);
    [2 / 3, 2 / 3, 2 / 3, 0].forEach((share, i) => expect(shares[i]).toBeCloseTo(share, 12));
  });

  test("law: shares sum to top_count; all places give everybody 1; the order of the rows is immaterial", () => {
    const values = of(86.8, 4.1, 64.2, 62.9, 6.5, 76, 61.4, 2.1, 62.9, 73.1, 6.6, 93.2);
    const turned = of(...[9, 10, 11, 6, 7, 8, 3, 4, 5, 0, 1, 2].map((i) => values[i]));
    for (let top = 1; top <= 4; top++) {
      const shares = weightSway(values, of(5, 2, 3), top, 0.5, 2000, 7);
      expect(shares.reduce((sum, share) => sum + share, 0)).toBeCloseTo(top, 9);
      expect([...weightSway(turned, of(5, 2, 3), top, 0.5, 2000, 7)].reverse()).toEqual([...shares]);
    }
    expect([...weightSway(values, of(5, 2, 3), 4, 0.5, 200)]).toEqual([1, 1, 1, 1]);
  });

  test("law: same seed, same bits; weights or values scaled by a power of two, same bits; another seed, other runs", () => {
    const values = of(5, 1, 1, 5, 4, 3);
    const shares = weightSway(values, of(3, 2), 1, 0.4, 3000, 5);
    expect(weightSway(values, of(3, 2), 1, 0.4, 3000, 5)).toEqual(shares);
    const scaled = values.map((value) => value * 2 ** 900);
    expect(weightSway(scaled, of(3 * 2 ** 900, 2 ** 901), 1, 0.4, 3000, 5)).toEqual(shares);
    expect(weightSway(values, of(3, 2), 1, 0.4, 3000, 6)).not.toEqual(shares);
  });

  test("is refused one term beyond 20 million, with the number of runs that fits", () => {
    const values = new Float64Array(2000).map((_, i) => i);
    expect(() => weightSway(values, of(1, 1), 1, 0.25, 10_001)).toThrow(
      "runs must be at most 10000 for 1000 entries and 2 criteria; 10001 was given.",
    );
  });

  test.each<[string, Parameters<typeof weightSway>]>([
    ["top_count", [of(1, 2), of(1, 1), 0]],
    ["top_count", [of(1, 2), of(1, 1), 2]],
    ["top_count", [of(1, 2), of(1, 1), NaN]],
    ["weights", [of(1, 2), of(0, 0), 1]],
    ["spread", [of(1, 2), of(1, 1), 1, 0]],
    ["spread", [of(1, 2), of(1, 1), 1, 1]],
    ["spread", [of(1, 2), of(1, 1), 1, NaN]],
    ["runs", [of(1, 2), of(1, 1), 1, 0.25, 0]],
    ["runs", [of(1, 2), of(1, 1), 1, 0.25, Infinity]],
    ["seed", [of(1, 2), of(1, 1), 1, 0.25, 10, -1]],
    ["seed", [of(1, 2), of(1, 1), 1, 0.25, 10, 1.5]],
  ])("refuses a bad %s and names it", (argument, args) => {
    expect(() => weightSway(...args)).toThrow(expect.objectContaining({ name: "DomainError", argument }));
  });
});
