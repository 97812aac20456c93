import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { binomialPmf } from "../../../src/core/distribution/binomialPmf";
import { groupPassRates } from "../../../src/core/method/groupPassRates";
import { holmAdjusted } from "../../../src/core/method/holmAdjusted";
import { passRateRatio } from "../../../src/core/method/passRateRatio";
import decisions from "../../reference/published/decisions.json";
import { relativeError } from "../../support/relativeError";

const group = fc
  .integer({ min: 1, max: 60 })
  .chain((assessed) => fc.tuple(fc.integer({ min: 0, max: assessed }), fc.constant(assessed)));

describe("passRateRatio", () => {
  test("the Uniform Guidelines' examples (Questions and Answers 1979): 45, 48, 51 against 60 percent", () => {
    const { inputs, printed } = decisions.items.find(({ id }) => id === "ugesp-qa") as unknown as {
      inputs: { rates: number[] };
      printed: { ratios: number[]; impact: number[] };
    };
    inputs.rates.slice(1).forEach((rate, i) => {
      const { ratio, belowFourFifths } = passRateRatio(rate, 100, inputs.rates[0]!, 100);
      expect(100 * ratio!).toBeCloseTo(printed.ratios[i]!, 9);
      expect(belowFourFifths).toBe(printed.impact[i] === 1);
    });
  });

  test("48 of 80 and 12 of 40: 60, 30 and 50 percent (Questions and Answers 12, from memory)", () => {
    const { rateA, rateB, ratio, belowFourFifths } = passRateRatio(48, 80, 12, 40);
    expect([rateA, rateB, ratio, belowFourFifths]).toEqual([0.6, 0.3, 0.5, true]);
  });

  test("law: 29 CFR 1607.4 D: below four fifths just where five times the lower is less than four times the higher, in whole numbers", () => {
    expect(decisions.items.find(({ id }) => id === "ugesp-4d")!.printed).toBe("4/5");
    fc.assert(
      fc.property(group, group, ([a, ofA], [b, ofB]) => {
        const [first, second] = [BigInt(a) * BigInt(ofB), BigInt(b) * BigInt(ofA)];
        const [low, high] = first < second ? [first, second] : [second, first];
        const { ratio, belowFourFifths } = passRateRatio(a, ofA, b, ofB);
        expect(belowFourFifths).toBe(5n * low < 4n * high);
        if (high > 0n) expect(relativeError(ratio!, Number(low) / Number(high))).toBeLessThanOrEqual(1e-15);
        expect(passRateRatio(b, ofB, a, ofA).ratio).toBe(ratio);
      }),
      { numRuns: 200 },
    );
  });

  test("the warning: two truly equal groups of 20, half passing, fall below four fifths 46 % of the time (exact binomial sum)", () => {
    let below = 0;
    for (let a = 0; a <= 20; a++)
      for (let b = 0; b <= 20; b++)
        if (passRateRatio(a, 20, b, 20).belowFourFifths) below += binomialPmf(a, 20, 0.5) * binomialPmf(b, 20, 0.5);
    expect(below).toBeCloseTo(0.46, 2);
  });

  test("nobody passed on either side: no ratio, no limits, not below, p-value 1", () => {
    expect(passRateRatio(0, 5, 0, 9)).toEqual({
      rateA: 0,
      rateB: 0,
      ratio: undefined,
      belowFourFifths: false,
      pValue: 1,
      limits: undefined,
    });
  });

  test.each<[string, [number, number, number, number, number?]]>([
    ["passed_a", [-1, 5, 1, 5]],
    ["passed_a", [6, 5, 1, 5]],
    ["passed_a", [NaN, 5, 1, 5]],
    ["assessed_a", [0, 0, 1, 5]],
    ["assessed_a", [0, 2e12, 1, 5]],
    ["passed_b", [1, 5, 1.5, 5]],
    ["assessed_b", [1, 5, 1, Infinity]],
    ["confidence", [1, 5, 1, 5, 1]],
    ["confidence", [1, 5, 1, 5, NaN]],
  ])("refuses a bad %s: %o", (argument, args) => {
    expect(() => passRateRatio(...args)).toThrow(expect.objectContaining({ name: "DomainError", argument }));
  });
});

describe("holmAdjusted", () => {
  test("by hand: 0.01, 0.04, 0.03 become 0.03, 0.06, 0.06", () => {
    holmAdjusted([0.01, 0.04, 0.03]).forEach((p, i) => expect(p).toBeCloseTo([0.03, 0.06, 0.06][i]!, 15));
    expect(holmAdjusted([])).toEqual([]);
    expect(holmAdjusted([0.7, 0.9])).toEqual([1, 1]);
  });

  test("laws: never below the p-value, never above m times it or 1, in the same order", () => {
    fc.assert(
      fc.property(fc.array(fc.double({ min: 0, max: 1, noNaN: true }), { minLength: 1, maxLength: 12 }), (p) => {
        const adjusted = holmAdjusted(p);
        p.forEach((one, i) => {
          expect(adjusted[i]!).toBeGreaterThanOrEqual(one);
          expect(adjusted[i]!).toBeLessThanOrEqual(Math.min(1, p.length * one + 1e-15));
          p.forEach((other, j) => {
            if (one <= other) expect(adjusted[i]!).toBeLessThanOrEqual(adjusted[j]!);
          });
        });
      }),
    );
  });
});

describe("groupPassRates", () => {
  test("law: each group is held against the highest as passRateRatio does it, and adjusted among the others", () => {
    fc.assert(
      fc.property(fc.array(group, { minLength: 1, maxLength: 6 }), (counts) => {
        const groups = counts.map(([passed, assessed]) => ({ passed, assessed }));
        const rates = groupPassRates(groups);
        const best = Math.max(...groups.map(({ passed, assessed }) => passed / assessed));
        const top = groups.findIndex(({ passed, assessed }) => passed / assessed === best);
        const others = rates.filter((_, i) => i !== top);
        expect([rates[top]!.pValue, rates[top]!.adjustedPValue, rates[top]!.belowFourFifths]).toEqual([1, 1, false]);
        expect(others.map(({ adjustedPValue }) => adjustedPValue)).toEqual(
          holmAdjusted(others.map(({ pValue }) => pValue)),
        );
        rates.forEach((one, i) => {
          if (i === top) return;
          const pair = passRateRatio(one.passed, one.assessed, groups[top]!.passed, groups[top]!.assessed);
          expect([one.ratioToHighest, one.belowFourFifths, one.pValue]).toEqual([
            pair.ratio,
            pair.belowFourFifths,
            pair.pValue,
          ]);
        });
      }),
      { numRuns: 100 },
    );
  });
});
