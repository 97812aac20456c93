import { describe, expect, test } from "vitest";
import { curveLikelihood } from "../../../src/core/sample/curveLikelihood";
import { fitCurve } from "../../../src/core/sample/fitCurve";
import { Sample } from "../../../src/core/sample/sample";
import type { Shape } from "../../../src/core/sample/shape";
import { shapeRanking } from "../../../src/core/sample/shapeRanking";
import handbook from "../../reference/published/nist_handbook.json";
import { relativeError } from "../../support/relativeError";

const sampleOf = (values: readonly number[]) => new Sample(Float64Array.from(values));
const likelihood = (values: readonly number[], shape: Shape) => {
  const sample = sampleOf(values);
  return curveLikelihood(sample, fitCurve("scores", sample, shape));
};

describe("curveLikelihood", () => {
  test("Box-Cox profile of the 42 microwave doors at λ 0, .2, .3, .4, .5 (NIST/SEMATECH e-Handbook 6.5.2)", () => {
    // The handbook leaves out −n/2 (ln 2π + 1).
    const values = handbook.data.microwave42;
    const { printed } = handbook.items.find((item) => item.id === "nist-652-boxcox")!;
    const expected = (printed as unknown as { llf: number[] }).llf;
    [0, 0.2, 0.3, 0.4, 0.5].forEach((power, i) => {
      const { logLikelihood } = likelihood(values, { kind: "boxcox", power });
      expect(Math.abs(logLikelihood + 21 * (Math.log(2 * Math.PI) + 1) - expected[i]!)).toBeLessThanOrEqual(0.0002);
    });
  });

  test("by hand: 1 and 3 under a normal curve have variance 1 (divisor n), so ℓ = −(ln 2π + 1)", () => {
    const { logLikelihood, aicc } = likelihood([1, 3], { kind: "normal" });
    expect(logLikelihood).toBeCloseTo(-(Math.log(2 * Math.PI) + 1), 14);
    expect(aicc).toBeUndefined();
  });

  test("by hand: AICc of 4 scores with 2 parameters is 4 − 2ℓ + 12, of 5 with 3 it is 6 − 2ℓ + 24; with 4 and 3 there is none", () => {
    const four = likelihood([1, 2, 3, 5], { kind: "normal" });
    expect(four.aicc).toBeCloseTo(4 - 2 * four.logLikelihood + 12, 12);
    const five = likelihood([1, 2, 3, 5, 9], { kind: "boxcox" });
    expect(five.aicc).toBeCloseTo(6 - 2 * five.logLikelihood + 24, 12);
    expect(likelihood([1, 2, 3, 5], { kind: "boxcox" }).aicc).toBeUndefined();
  });

  test("law: boxcox(1) is the normal curve and boxcox(0) the lognormal; a given power counts 2 parameters", () => {
    const values = [12, 15, 19, 28, 31, 55];
    for (const [kind, power] of [
      ["normal", 1],
      ["lognormal", 0],
    ] as const) {
      const one = likelihood(values, { kind });
      const other = likelihood(values, { kind: "boxcox", power });
      expect(relativeError(other.logLikelihood, one.logLikelihood)).toBeLessThan(1e-13);
      expect(other.parameters).toBe(2);
    }
  });

  test("law: the fitted power is at least as likely as any other", () => {
    const values = [12, 15, 19, 28, 31, 55];
    const best = likelihood(values, { kind: "boxcox" }).logLikelihood;
    for (let power = -5; power <= 5; power += 0.25)
      expect(likelihood(values, { kind: "boxcox", power }).logLikelihood).toBeLessThanOrEqual(best);
  });

  test("law: in another unit every shape loses n ln(unit), so the ranking stays", () => {
    const values = [12, 15, 19, 28, 31, 55];
    for (const kind of ["normal", "lognormal", "boxcox"] as const) {
      const there = likelihood(
        values.map((x) => 100 * x),
        { kind },
      ).logLikelihood;
      expect(there).toBeCloseTo(likelihood(values, { kind }).logLikelihood - 6 * Math.log(100), 10);
    }
  });
});

describe("shapeRanking", () => {
  test("law: the best first with difference 0; a shape that cannot hold the scores is left out", () => {
    const ranked = shapeRanking("scores", sampleOf([2, 3, 5, 8, 13, 21, 34, 55]), { low: 0, high: 55 });
    expect(ranked.map(({ shape }) => shape.kind).sort()).toEqual(["boxcox", "lognormal", "normal"]);
    expect(ranked[0]!.difference).toBe(0);
    for (let i = 1; i < ranked.length; i++) expect(ranked[i]!.aicc).toBeGreaterThanOrEqual(ranked[i - 1]!.aicc);
    const withZero = shapeRanking("scores", sampleOf([0, 3, 5, 8, 13]), { low: -1, high: 55 });
    expect(withZero.map(({ shape }) => shape.kind).sort()).toEqual(["logit", "normal"]);
  });
});
