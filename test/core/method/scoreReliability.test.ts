import { describe, expect, test } from "vitest";
import { ratersNeeded } from "../../../src/core/method/ratersNeeded";
import { ratingMeanSquares } from "../../../src/core/method/ratingMeanSquares";
import { scoreErrorSd } from "../../../src/core/method/scoreErrorSd";
import { scoreReliability } from "../../../src/core/method/scoreReliability";
import memory from "../../reference/published/from-memory.json";
import published from "../../reference/published/rater_reliability.json";
import reference from "../../reference/risk/values.json";
import { relativeError } from "../../support/relativeError";

type Row = [number[][], number, [number, number, number][]];
const flat = (rows: readonly (readonly number[])[]) => Float64Array.from(rows.flat());
const example = published.data.shrout_fleiss;

describe("scoreReliability", () => {
  test.each(reference.reliability as unknown as Row[])(
    "table %# agrees with the textbook sums and McGraw & Wong's degrees of freedom in 40 digits",
    (ratings, confidence, rows) => {
      const { forms } = scoreReliability(flat(ratings), ratings[0]!.length, confidence);
      rows.forEach(([reliability, lower, upper], i) => {
        expect(relativeError(forms[i]!.reliability!, reliability)).toBeLessThanOrEqual(1e-13);
        expect(relativeError(forms[i]!.lower!, lower)).toBeLessThanOrEqual(1e-13);
        expect(relativeError(forms[i]!.upper!, upper)).toBeLessThanOrEqual(1e-13);
      });
    },
  );

  test("the six forms of Shrout & Fleiss 1979, as asserted in the tests of the R package psych", () => {
    const { printed, tolerance } = published.items[0]!;
    scoreReliability(flat(example), 4).forms.forEach(({ reliability }, i) =>
      expect(Math.abs(reliability! - printed[i]!)).toBeLessThanOrEqual(tolerance.abs),
    );
  });

  test("the mean squares of Shrout & Fleiss 1979, table 3 (from memory)", () => {
    const { betweenEntries, withinEntries, betweenRaters, residual } = ratingMeanSquares(flat(example), 4);
    const { printed } = memory.items.find(({ id }) => id === "sf-ms") as unknown as { printed: number[] };
    [betweenEntries, withinEntries, betweenRaters, residual].forEach((square, i) =>
      expect(Math.abs(square - printed[i]!)).toBeLessThanOrEqual(0.006),
    );
  });

  test("laws: the order of entries and raters, the origin and the unit of the ratings are immaterial; limits enclose", () => {
    const { forms } = scoreReliability(flat(example), 4, 0.9);
    for (const ratings of [
      [...example].reverse(),
      example.map((row) => [row[2]!, row[0]!, row[3]!, row[1]!]),
      example.map((row) => row.map((x) => 50 - 3 * x)),
    ])
      scoreReliability(flat(ratings), 4, 0.9).forms.forEach((form, i) => {
        for (const key of ["reliability", "lower", "upper"] as const)
          expect(relativeError(form[key]!, forms[i]![key]!)).toBeLessThanOrEqual(1e-12);
      });
    for (const { reliability, lower, upper } of forms) {
      expect(lower!).toBeLessThan(reliability!);
      expect(upper!).toBeGreaterThan(reliability!);
    }
  });

  test("law: the mean of k raters is one rater stepped up by Spearman and Brown, limits too", () => {
    const { forms } = scoreReliability(flat(example), 4);
    const steppedUp = (r: number) => (4 * r) / (1 + 3 * r);
    for (const kind of [0, 1, 2])
      for (const key of ["reliability", "lower", "upper"] as const)
        expect(relativeError(forms[kind + 3]![key]!, steppedUp(forms[kind]![key]!))).toBeLessThanOrEqual(1e-12);
  });

  test("without a residual there is no answer, also when rounding leaves a trace of one", () => {
    for (const ratings of [
      [
        [1, 2],
        [3, 4],
      ],
      [
        [0.1, 0.3, 0.4],
        [0.7, 0.9, 1],
        [1.1, 1.3, 1.4],
      ],
      [
        [45000.1, 45000.3],
        [45000.7, 45000.9],
      ],
      [
        [4, 4],
        [4, 4],
      ],
    ])
      expect(() => scoreReliability(flat(ratings), ratings[0]!.length)).toThrow(
        expect.objectContaining({ name: "NoAnswerError", argument: "ratings" }),
      );
  });

  test("ratings without any spread between entries or raters, and degrees of freedom next to none, still settle", () => {
    const latin = flat([
      [1, 2, 3],
      [2, 3, 1],
      [3, 1, 2],
    ]);
    // All mean squares between are 0: −1/(k − 1) for the first and third kind, by hand; the means of 3 don't exist.
    const { forms } = scoreReliability(latin, 3);
    expect([forms[0]!.reliability, forms[2]!.reliability]).toEqual([-0.5, -0.5]);
    expect([forms[3]!.reliability, forms[5]!.reliability]).toEqual([undefined, undefined]);
    const nearly = Float64Array.of(0.7530877664685249, 0, 2, 0, 0.8699023416265845, 2, 0, 2, 0.9597934540361166);
    for (const { form, lower, upper } of scoreReliability(nearly, 3, 1.4e-11).forms)
      for (const limit of [lower, upper]) expect(`${form} ${limit}`).not.toMatch(/NaN|Infinity/);
  });

  test.each<[string, Parameters<typeof scoreReliability>]>([
    ["confidence", [flat(example), 4, 1]],
    ["confidence", [flat(example), 4, NaN]],
    ["ratings", [Float64Array.of(1, 2, NaN, 5), 2]],
    ["ratings", [Float64Array.of(1, 2, Infinity, 5), 2]],
    ["ratings", [Float64Array.of(1e200, 2e200, 4e200, 1e200), 2]],
    ["ratings", [Float64Array.of(1e-200, 2e-200, 4e-200, 1e-200), 2]],
    ["raters", [Float64Array.of(1, 2, 3, 5), 1]],
    ["entries", [Float64Array.of(1, 2, 3, 5), 4]],
    ["entries", [Float64Array.of(1, 2, 3, 5, 6), 2]],
  ])("refuses a bad %s", (argument, args) => {
    expect(() => scoreReliability(...args)).toThrow(expect.objectContaining({ name: "DomainError", argument }));
  });
});

describe("ratersNeeded", () => {
  const steppedUp = (r: number, k: number) => (k * r) / (1 + (k - 1) * r);

  test("Spearman–Brown (identity, from memory): .70 doubled is .82, so .70 and .8235 take two raters", () => {
    expect(steppedUp(0.7, 2)).toBeCloseTo(0.82, 2);
    expect(ratersNeeded(0.7, 1.4 / 1.7).raters).toBe(2);
    expect(ratersNeeded(0.7, 0.824).raters).toBe(3);
  });

  test("law: the smallest number whose mean reaches the target, wholes on paper included", () => {
    for (const single of [0.05, 0.1, 0.3, 0.5, 0.71, 0.9])
      for (const target of [0.2, 0.5, 0.8, 0.9, 0.95, 0.99]) {
        const { raters } = ratersNeeded(single, target);
        expect(steppedUp(single, raters)).toBeGreaterThanOrEqual(target * (1 - 1e-12));
        if (raters > 1) expect(steppedUp(single, raters - 1)).toBeLessThan(target * (1 - 1e-13));
      }
    expect([ratersNeeded(0.5, 0.9).raters, ratersNeeded(0.1, 0.5).raters, ratersNeeded(0.9, 0.9).raters]).toEqual([
      9, 9, 1,
    ]);
  });

  test("refuses what is no reliability, and has no answer beyond counting", () => {
    for (const bad of [0, 1, -0.2, NaN, Infinity]) {
      expect(() => ratersNeeded(bad, 0.5)).toThrow(expect.objectContaining({ argument: "single_reliability" }));
      expect(() => ratersNeeded(0.5, bad)).toThrow(expect.objectContaining({ argument: "target" }));
    }
    expect(() => ratersNeeded(1e-300, 0.99)).toThrow(expect.objectContaining({ name: "NoAnswerError" }));
  });
});

describe("scoreErrorSd", () => {
  test("by hand: reliability 0.75 leaves half the spread, 1 none, 0 all", () => {
    expect([0.75, 1, 0].map((reliability) => scoreErrorSd(8, reliability))).toEqual([4, 0, 8]);
  });

  test.each<[string, [number, number]]>([
    ["sd", [0, 0.5]],
    ["sd", [NaN, 0.5]],
    ["reliability", [8, 1.1]],
    ["reliability", [8, NaN]],
  ])("refuses a bad %s: %o", (argument, args) => {
    expect(() => scoreErrorSd(...args)).toThrow(expect.objectContaining({ name: "DomainError", argument }));
  });
});
