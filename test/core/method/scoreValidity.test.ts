import { describe, expect, test } from "vitest";
import { scoreValidity } from "../../../src/core/method/scoreValidity";
import reference from "../../reference/risk/values.json";
import { relativeError } from "../../support/relativeError";

type Row = [number[], number[], number, number, [number, number, number, number]];
const of = (...values: number[]) => Float64Array.from(values);

describe("scoreValidity", () => {
  test.each(reference.validity as unknown as Row[])(
    "pairs %# agree with the definitions in 40 digits",
    (scores, outcomes, confidence, sd, [correlation, lower, upper, before]) => {
      const found = scoreValidity(of(...scores), of(...outcomes), confidence, sd);
      expect(relativeError(found.correlation, correlation)).toBeLessThanOrEqual(1e-13);
      expect(relativeError(found.lower, lower)).toBeLessThanOrEqual(1e-13);
      expect(relativeError(found.upper, upper)).toBeLessThanOrEqual(1e-13);
      expect(relativeError(found.beforeSelection!, before)).toBeLessThanOrEqual(1e-13);
    },
  );

  test("by hand: two neighbours changed in five ranks make 0.9; twice the spread makes 1.8/√(0.19 + 4·0.81)", () => {
    const found = scoreValidity(of(1, 2, 3, 4, 5), of(1, 2, 3, 5, 4), 0.95, 2 * Math.sqrt(2.5));
    expect(found.correlation).toBeCloseTo(0.9, 14);
    expect(found.beforeSelection).toBeCloseTo(1.8 / Math.sqrt(0.19 + 4 * 0.81), 14);
  });

  test("laws: the same with sides changed, units changed, order changed; signs turn; the spread as found corrects nothing", () => {
    const x = of(61.5, 70, 58, 66, 73.5, 64);
    const y = of(3.1, 3.9, 3, 3.3, 3.6, 3.7);
    const { correlation, lower, upper, scoreSd } = scoreValidity(x, y);
    expect(scoreValidity(y, x).correlation).toBeCloseTo(correlation, 15);
    expect(scoreValidity(x.slice().reverse(), y.slice().reverse()).correlation).toBeCloseTo(correlation, 15);
    const turned = scoreValidity(
      x.map((v) => 7 - v / 3),
      y.map((v) => v * 1e200),
    );
    expect(turned.correlation).toBeCloseTo(-correlation, 14);
    expect(turned.lower).toBeCloseTo(-upper, 13);
    expect(turned.upper).toBeCloseTo(-lower, 13);
    expect(scoreValidity(x, y, 0.95, scoreSd).beforeSelection).toBeCloseTo(correlation, 14);
    expect(scoreValidity(x, y, 0.95, 2 * scoreSd).beforeSelection).toBeGreaterThan(correlation);
  });

  test("scores next to the largest number there is keep their digits", () => {
    const huge = scoreValidity(of(0.9e308, -0.9e308, 0.5e308, 0.2e308), of(3, 1, 4, 2));
    const plain = scoreValidity(of(9, -9, 5, 2), of(3, 1, 4, 2));
    expect(huge.correlation).toBeCloseTo(plain.correlation, 14);
  });

  test("fewer than 4 pairs: no answer; no spread: refused by name", () => {
    expect(() => scoreValidity(of(1, 2, 3), of(1, 2, 4))).toThrow(expect.objectContaining({ name: "NoAnswerError" }));
    expect(() => scoreValidity(of(), of())).toThrow(expect.objectContaining({ name: "NoAnswerError" }));
    expect(() => scoreValidity(of(5, 5, 5, 5), of(1, 2, 4, 3))).toThrow(
      expect.objectContaining({ name: "DomainError", argument: "scores" }),
    );
    expect(() => scoreValidity(of(1, 2, 4, 3), of(5, 5, 5, 5))).toThrow(
      expect.objectContaining({ name: "DomainError", argument: "outcomes" }),
    );
  });

  test.each<[string, number, number | undefined]>([
    ["confidence", 0, undefined],
    ["confidence", NaN, undefined],
    ["unselected_sd", 0.95, 0],
    ["unselected_sd", 0.95, NaN],
    ["unselected_sd", 0.95, Infinity],
  ])("refuses a bad %s", (argument, confidence, sd) => {
    expect(() => scoreValidity(of(1, 2, 3, 4), of(1, 2, 4, 3), confidence, sd)).toThrow(
      expect.objectContaining({ name: "DomainError", argument }),
    );
  });
});
