import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { searchBudget } from "../../../src/core/method/searchBudget";
import { trialsForHitChance } from "../../../src/core/method/trialsForHitChance";
import reference from "../../reference/cutoff/cutoff.json";
import { testRefusals } from "../../support/refusals";

type Row = [number, number[], number[], number, number, number];

describe("the budget of a search", () => {
  test.each(reference.budgets.cases as Row[])(
    "fraction %d, reach %j, costs %j, chance %d, %d hits: %d by playing look after look in whole fractions",
    (fraction, reach, costs, chance, hits, budget) =>
      expect(searchBudget(fraction, reach, costs, chance, hits).budget).toBe(budget),
  );

  test("law: one stage that costs 1 a look takes as much as there are looks", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.01, max: 0.95, noNaN: true }),
        fc.double({ min: 0.05, max: 0.999, noNaN: true }),
        fc.integer({ min: 1, max: 20 }),
        (fraction, chance, hits) => {
          const { trials } = trialsForHitChance(fraction, chance, hits);
          expect(searchBudget(fraction, [1], [1], chance, hits).budget).toBe(trials);
        },
      ),
    );
  });

  test("laws: dearer looks, a wider reach, a higher chance and more hits never take less; another currency only scales", () => {
    const budget = (factor = 1, second = 0.4, chance = 0.9, hits = 1) =>
      searchBudget(0.1, [1, second], [2 * factor, 6 * factor], chance, hits).budget;
    expect(budget(5)).toBe(5 * budget());
    expect(budget(1, 0.6)).toBeGreaterThanOrEqual(budget());
    expect(budget(1, 0.4, 0.95)).toBeGreaterThanOrEqual(budget());
    expect(budget(1, 0.4, 0.9, 2)).toBeGreaterThan(budget());
  });

  test("what costs nothing takes nothing; costs in cents are taken as cents", () => {
    expect(searchBudget(0.1, [1, 0.5], [0, 0], 0.9, 3).budget).toBe(0);
    const { unit, budget } = searchBudget(0.3, [1, 0.3], [0.1, 0.2], 0.999, 4);
    expect(unit).toBe(0.1);
    expect(Math.round(budget * 10)).toBe(47);
  });

  testRefusals(searchBudget, [
    ["fraction", 5, [1], [1], 0.9, 1],
    ["fraction", 0.5, [1, 0.2], [1, 2], 0.9, 1],
    ["reach", 0.1, [0.9, 0.5], [1, 2], 0.9, 1],
    ["reach", 0.1, [1, 0.4, 0.5], [1, 2, 3], 0.9, 1],
    ["reach", 0.1, [], [], 0.9, 1],
    ["reach", 0.1, [1, NaN], [1, 2], 0.9, 1],
    ["costs", 0.1, [1, 0.5], [1], 0.9, 1],
    ["costs", 0.1, [1, 0.5], [1, -2], 0.9, 1],
    ["costs", 0.1, [1, 0.5], [1, Infinity], 0.9, 1],
    ["costs", 0.1, [1, 0.5], [1, Math.PI], 0.9, 1],
    ["chance", 0.1, [1], [1], 1, 1],
    ["hits", 0.1, [1], [1], 0.9, 0],
  ]);
});
