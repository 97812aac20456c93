import { describe, expect, test } from "vitest";
import { Sample } from "../../../src/core/sample/sample";
import { scoreSummary } from "../../../src/core/sample/scoreSummary";

const of = (...values: number[]) => scoreSummary("scores", new Sample(Float64Array.from(values)));

describe("scoreSummary", () => {
  test("by hand: 2, 4, 4, 10 have mean 5, squares 36, variance 12, standard error √3, quartiles at places 0.75, 1.5 and 2.25", () => {
    const summary = of(10, 4, 2, 4);
    expect(summary).toMatchObject({ count: 4, mean: 5, sumOfSquares: 36, minimum: 2, median: 4, maximum: 10 });
    expect(summary.sd).toBeCloseTo(Math.sqrt(12), 15);
    expect(summary.meanError).toBeCloseTo(Math.sqrt(3), 15);
    expect([summary.lowerQuartile, summary.upperQuartile]).toEqual([3.5, 5.5]);
    // G1 = 4/(3·2) Σz³, Σz³ = (125 − 27 − 1 − 1)/12^1.5; G2 = 20/6 Σz⁴ − 27/2, Σz⁴ = (625 + 81 + 1 + 1)/144.
    expect(summary.skewness).toBeCloseTo(((2 / 3) * 96) / 12 ** 1.5, 14);
    expect(summary.excessKurtosis).toBeCloseTo((20 / 6) * (708 / 144) - 13.5, 13);
  });

  test("two scores have neither skewness nor kurtosis, three no kurtosis", () => {
    expect([of(1, 2).skewness, of(1, 2).excessKurtosis]).toEqual([undefined, undefined]);
    expect(of(1, 2, 4).skewness).toBeGreaterThan(0);
    expect(of(1, 2, 4).excessKurtosis).toBeUndefined();
  });

  test("refuses scores without a spread and names the argument", () => {
    expect(() => of(3, 3, 3)).toThrow(expect.objectContaining({ name: "DomainError", argument: "scores" }));
  });
});
