import { describe, expect, test } from "vitest";
import { fitCurve } from "../../../src/core/sample/fitCurve";
import { fitPower } from "../../../src/core/sample/fitPower";
import { Sample } from "../../../src/core/sample/sample";
import type { Shape } from "../../../src/core/sample/shape";
import { readShape } from "../../../src/sheet/readShape";
import reference from "../../reference/sample/curves.json";
import handbook from "../../reference/published/nist_handbook.json";
import { relativeError } from "../../support/relativeError";

const sampleOf = (values: readonly number[]) => new Sample(Float64Array.from(values));
type Row = [name: keyof typeof reference.samples, shape: string, power: string | null, mean: string, sd: string];

describe("fitCurve", () => {
  test.each(reference.cases as unknown as Row[])(
    "%s, %s: agrees with 50 digits of mpmath",
    (name, text, power, mean, sd) => {
      const curve = fitCurve("scores", sampleOf(reference.samples[name]), readShape(text));
      const fitted = text === "boxcox";
      if (text.startsWith("boxcox"))
        expect(Math.abs(curve.power! - Number(power))).toBeLessThanOrEqual(fitted ? 1e-9 : 0);
      // A power off by 1e-11 moves x^λ of a score of a million by 1e-10.
      const allowed = fitted ? 1e-8 : 1e-12;
      expect(relativeError(curve.shownMean, Number(mean))).toBeLessThanOrEqual(allowed);
      expect(relativeError(curve.shownSd, Number(sd))).toBeLessThanOrEqual(allowed);
      expect(curve.powerFitted).toBe(fitted);
    },
  );

  test("the best power for the radiation of 42 closed microwave doors is .276 (NIST/SEMATECH e-Handbook 6.5.2, printed .28)", () => {
    const curve = fitCurve("scores", sampleOf(handbook.data.microwave42), { kind: "boxcox" });
    expect(Math.abs(curve.power! - 0.28)).toBeLessThan(0.006);
    expect(Math.abs(curve.power! - 0.27594)).toBeLessThan(1e-5);
  });

  test("law: where the likelihood still rises at an end of −5 … 5, the end is the answer", () => {
    const narrow = (sign: number) => Float64Array.from([0, 1, 2, 3, 9], (x) => sign * 1e-6 * x);
    expect(fitPower(narrow(1))).toBe(-5);
    expect(fitPower(narrow(-1))).toBe(5);
  });

  test("law: mirroring the logarithms turns the sign of the power; any unit of the scores gives the same power", () => {
    const logs = Float64Array.from([-1.1, -0.4, -0.3, 0.1, 0.2, 0.9, 2.4]);
    expect(fitPower(logs.map((x) => -x))).toBeCloseTo(-fitPower(logs), 12);
    expect(fitPower(logs.map((x) => x + 3))).toBeCloseTo(fitPower(logs), 12);
  });

  test("law: a symmetrical pair of logarithms has the power 0, the logarithm itself", () => {
    expect(fitPower(Float64Array.from([-2, 2]))).toBeCloseTo(0, 12);
  });

  test("scores over 600 decades are fitted without overflow", () => {
    const power = fitPower(Float64Array.from([-700, -650, -20, 0, 3, 400, 700]));
    expect(Math.abs(power)).toBeLessThan(0.01);
  });

  test.each(["normal", "lognormal", "logit(0,100)", "boxcox", "boxcox(-4.5)", "boxcox(12)", "boxcox(1e-12)"])(
    "%s: going to the scale and back gives the score",
    (text) => {
      const values = [12, 20.5, 33, 47, 58.25, 71, 90];
      const curve = fitCurve("scores", sampleOf(values), readShape(text));
      for (const x of values) expect(relativeError(curve.fromScale(curve.toScale(x)), x)).toBeLessThan(1e-12);
    },
  );

  test("a point that the power carries off the scale is no number", () => {
    const curve = fitCurve("scores", sampleOf([90, 100, 110]), { kind: "boxcox", power: 2 });
    expect(curve.fromScale(-0.5)).toBeNaN();
    expect(curve.fromScale(-0.49)).toBeGreaterThan(0);
    expect(fitCurve("scores", sampleOf([1, 2]), { kind: "lognormal" }).fromScale(1e4)).toBeNaN();
  });

  test("a curve is fitted once and remembered with its sample", () => {
    const sample = sampleOf([1, 2, 4, 9]);
    expect(fitCurve("scores", sample, { kind: "boxcox" })).toBe(fitCurve("scores", sample, { kind: "boxcox" }));
    expect(fitCurve("scores", sample, { kind: "boxcox" })).not.toBe(fitCurve("scores", sample, { kind: "lognormal" }));
  });

  test.each<[string, Shape, number[], RegExp]>([
    [
      "a zero under lognormal",
      { kind: "lognormal" },
      [5, 0, 3],
      /scores must be numbers above 0.*lognormal.*1 of 3 is not.*first is 0/,
    ],
    ["two below zero under boxcox", { kind: "boxcox" }, [-5, 2, -3], /above 0.*boxcox.*2 of 3 are not.*first is -5/],
    [
      "a bound under logit",
      { kind: "logit", low: 0, high: 100 },
      [5, 100, 3],
      /strictly between 0 and 100.*first is 100/,
    ],
    ["a power that leaves the range of numbers", { kind: "boxcox", power: 900 }, [5, 100, 3], /boxcox\(900\)/],
    ["a spread that leaves the range of numbers", { kind: "normal" }, [1e300, 2e300], /spread/],
  ])("refuses %s and names the scores", (_, shape, values, message) => {
    const fit = () => fitCurve("scores", sampleOf(values), shape);
    expect(fit).toThrow(expect.objectContaining({ name: "DomainError", argument: "scores" }));
    expect(fit).toThrow(message);
  });
});
