import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { weightedScores } from "../../../src/core/method/weightedScores";
import { relativeError } from "../../support/relativeError";

const of = (...numbers: number[]) => Float64Array.from(numbers);

describe("weightedScores", () => {
  test("by hand: 80, 6 and 70 weighted 5, 2 and 3 make 62.2", () => {
    const { scores, weightTotal } = weightedScores(of(80, 6, 70), of(5, 2, 3));
    expect(scores[0]).toBe(62.2);
    expect(weightTotal).toBe(10);
  });

  test("an entry without values has no score, and the next one keeps its own", () => {
    expect([...weightedScores(of(NaN, NaN, 4, 6), of(1, 1)).scores]).toEqual([NaN, 5]);
  });

  test("law: weights count only relative to one another, also next to the ends of the range of numbers", () => {
    const weight = fc.double({ min: 0.01, max: 100, noNaN: true });
    const value = fc.double({ min: 1, max: 1e6, noNaN: true });
    fc.assert(
      fc.property(fc.tuple(weight, weight), fc.tuple(value, value), ([a, b], values) => {
        const plain = weightedScores(of(...values), of(a, b)).scores[0];
        for (const factor of [2 ** 1000, 2 ** -1000, 3])
          expect(
            relativeError(weightedScores(of(...values), of(a * factor, b * factor)).scores[0], plain),
          ).toBeLessThan(1e-14);
      }),
    );
    expect(weightedScores(of(1, 2), of(1.7e308, 1.7e308)).scores[0]).toBeCloseTo(1.5, 14);
  });

  test.each<[string, number[], number[], string]>([
    ["weights", [1, 2], [1, -1], "the 2nd of them is -1"],
    ["weights", [1, 2], [0, 0], "all of them are 0"],
    ["weights", [1, 2], [NaN, 1], "the 1st of them is NaN"],
    ["weights", [1, 2], [1, Infinity], "the 2nd of them is Infinity"],
    ["values", [1, 2, 1.7e308, 1.7e308], [1, 1], "those of the 2nd row are not"],
  ])("refuses bad %s: %j with %j", (argument, values, weights, came) => {
    const call = () => weightedScores(of(...values), of(...weights));
    expect(call).toThrow(expect.objectContaining({ name: "DomainError", argument }));
    expect(call).toThrow(came);
  });
});
