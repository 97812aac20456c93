import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { compositeSpread } from "../../../src/core/method/compositeSpread";
import { weightedScores } from "../../../src/core/method/weightedScores";
import { Sample } from "../../../src/core/sample/sample";

const of = (...numbers: number[]) => Float64Array.from(numbers);

describe("compositeSpread", () => {
  test("by hand: 3 and 4 without correlation, weighted alike, spread by 5/2; fully correlated by 7/2; fully opposed by 1/2", () => {
    for (const [r, spread] of [
      [0, 2.5],
      [1, 3.5],
      [-1, 0.5],
    ])
      expect(compositeSpread(of(1, 1), of(3, 4), of(1, r, r, 1)).spread).toBeCloseTo(spread, 12);
  });

  test("opposed criteria of equal spread cancel out: 0, not a root of a negative rest", () => {
    expect(compositeSpread(of(1, 1), of(0.1, 0.1), of(1, -1, -1, 1)).spread).toBe(0);
    expect(compositeSpread(of(7), of(3), of(1)).spread).toBe(3);
  });

  test("law: from the deviations and correlations of a sample it gives the deviation of the sample's weighted scores", () => {
    const score = fc.double({ min: -100, max: 100, noNaN: true });
    const row = fc.tuple(score, score, score);
    const weight = fc.double({ min: 0.01, max: 100, noNaN: true });
    fc.assert(
      fc.property(fc.array(row, { minLength: 6, maxLength: 20 }), fc.tuple(weight, weight, weight), (rows, weights) => {
        const columns = [0, 1, 2].map((j) => new Sample(Float64Array.from(rows, (one) => one[j])));
        if (columns.some((column) => !(column.sd > 1e-3))) return;
        const correlation = (a: Sample, b: Sample) =>
          a.values.reduce((sum, x, i) => sum + (x - a.mean) * (b.values[i] - b.mean), 0) /
          Math.sqrt(a.sumOfSquares * b.sumOfSquares);
        const table = of(...columns.flatMap((a) => columns.map((b) => correlation(a, b))));
        const { spread } = compositeSpread(of(...weights), of(...columns.map(({ sd }) => sd)), table);
        const combined = new Sample(weightedScores(of(...rows.flat()), of(...weights)).scores);
        expect(Math.abs(spread - combined.sd)).toBeLessThan(1e-6 * (1 + spread));
      }),
    );
  });

  test("a table whose smallest eigenvalue is just above −1e-10 passes, just below it is refused", () => {
    // Three criteria, all correlated by r: eigenvalues 1 − r twice and 1 + 2r.
    const alike = (r: number) => of(1, r, r, r, 1, r, r, r, 1);
    const spread = (r: number) => compositeSpread(of(1, 1, 1), of(1, 1, 1), alike(r)).spread;
    expect(spread(-0.5 - 0.9e-10 / 2)).toBe(0);
    expect(() => spread(-0.5 - 1.1e-10 / 2)).toThrow(
      "correlations must be such that they can all hold at once (no eigenvalue below 0); those of the 3rd criterion contradict those before it.",
    );
    expect(() => spread(-0.9)).toThrow(expect.objectContaining({ name: "DomainError", argument: "correlations" }));
  });

  test.each<[string, number[], number[], number[], string]>([
    ["weights", [1, -1], [3, 4], [1, 0, 0, 1], "the 2nd of them is -1"],
    ["weights", [0, 0], [3, 4], [1, 0, 0, 1], "all of them are 0"],
    ["weights", [1, NaN], [3, 4], [1, 0, 0, 1], "NaN"],
    ["weights", [1, Infinity], [3, 4], [1, 0, 0, 1], "Infinity"],
    ["sds", [1, 1], [3, 0], [1, 0, 0, 1], "0 was given"],
    ["sds", [1, 1], [3, -4], [1, 0, 0, 1], "-4"],
    ["sds", [1, 1], [3, NaN], [1, 0, 0, 1], "NaN"],
    ["correlations", [1, 1], [3, 4], [1, 0.5, 0.4, 1], "the 2nd criterion with the 1st has 0.4 and 0.5"],
    ["correlations", [1, 1], [3, 4], [1, 0, 0, 0.9], "the 2nd on the diagonal is 0.9"],
    ["correlations", [1, 1], [3, 4], [1, 1.3, 1.3, 1], "1.3"],
    ["correlations", [1, 1], [3, 4], [1, NaN, NaN, 1], "NaN"],
  ])("refuses bad %s (%j, %j, %j)", (argument, weights, sds, correlations, came) => {
    const call = () => compositeSpread(of(...weights), of(...sds), of(...correlations));
    expect(call).toThrow(expect.objectContaining({ name: "DomainError", argument }));
    expect(call).toThrow(came);
  });
});
