import { describe, expect, test } from "vitest";
import { normalCdf } from "../../../src/core/distribution/normalCdf";
import { kolmogorovUpperTail } from "../../../src/core/distribution/kolmogorovUpperTail";
import { normalDeviate } from "../../../src/core/numeric/normalDeviate";
import { SeededRandom } from "../../../src/core/numeric/seededRandom";
import { relativeError } from "../../support/relativeError";

/** By a program of its own in Python with mpmath (50 digits): xoshiro128++ seeded with 1 and the ziggurat as its papers describe it. */
const INDEPENDENT: readonly [place: number, deviate: number, how: string][] = [
  [0, -0.62309680227037617, "inside its layer"],
  [1, -0.93492943018716053, "inside its layer"],
  [2, -0.64928879418859569, "inside its layer"],
  [5, 1.9048800069466367, "inside its layer"],
  [140, -0.71927772656316004, "beside layer 134, kept"],
  [174, 0.13713816774507929, "beside layer 182"],
  [207, -0.42173755105526077, "in the topmost layers"],
  [1850, 3.6689199641909135, "in the tail"],
  [2999, 1.9500794975014636, "after fifty rare cases"],
];

describe("normalDeviate", () => {
  test.each(INDEPENDENT)("draw %d is %d (%s), as an independent program has it", (place, deviate) => {
    const random = new SeededRandom(1);
    for (let i = 0; i < place; i++) normalDeviate(random);
    expect(relativeError(normalDeviate(random), deviate)).toBeLessThanOrEqual(1e-14);
  });

  test("law: the first eight moments of a million draws are those of the normal, within five standard errors", () => {
    const draws = 1_000_000;
    const random = new SeededRandom(20);
    const sums = new Float64Array(9);
    for (let i = 0; i < draws; i++) {
      const x = normalDeviate(random);
      for (let k = 1, power = x; k <= 8; k++, power *= x) sums[k] += power;
    }
    const moment = (k: number): number => (k % 2 ? 0 : k < 2 ? 1 : (k - 1) * moment(k - 2));
    for (let k = 1; k <= 8; k++) {
      const standardError = Math.sqrt((moment(2 * k) - moment(k) ** 2) / draws);
      expect(Math.abs(sums[k] / draws - moment(k))).toBeLessThan(5 * standardError);
    }
  });

  test("law: 200,000 draws follow the cdf (Kolmogorov-Smirnov p above 1 in 1000)", () => {
    const random = new SeededRandom(7);
    const draws = Float64Array.from({ length: 200_000 }, () => normalDeviate(random)).sort();
    let distance = 0;
    draws.forEach((x, i) => {
      distance = Math.max(
        distance,
        Math.abs(normalCdf(x) - i / draws.length),
        Math.abs(normalCdf(x) - (i + 1) / draws.length),
      );
    });
    expect(kolmogorovUpperTail(distance * Math.sqrt(draws.length))).toBeGreaterThan(0.001);
  });

  test("law: the tail beyond 3.65 and beyond 4 is as heavy as it must be, on both sides", () => {
    const draws = 4_000_000;
    const random = new SeededRandom(3);
    const bounds = [-4, -3.7, 3.7, 4];
    const counts = bounds.map(() => 0);
    for (let i = 0; i < draws; i++) {
      const x = normalDeviate(random);
      if (Math.abs(x) > 3.6) bounds.forEach((bound, j) => (counts[j] += (bound < 0 ? x < bound : x > bound) ? 1 : 0));
    }
    bounds.forEach((bound, j) => {
      const expected = draws * normalCdf(-Math.abs(bound));
      expect(Math.abs(counts[j] - expected)).toBeLessThan(5 * Math.sqrt(expected));
    });
  });
});
