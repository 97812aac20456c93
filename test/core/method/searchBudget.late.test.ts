import { describe, expect, test } from "vitest";
import { binomialCdf } from "../../../src/core/distribution/binomialCdf";
import { negativeBinomialUpperTail } from "../../../src/core/distribution/negativeBinomialUpperTail";
import { chanceSlack } from "../../../src/core/method/reachesChance";
import { searchBudget } from "../../../src/core/method/searchBudget";
import { relativeError } from "../../support/relativeError";

/** With one stage every look pays the same: the smallest number of misses whose chance of more is small enough, by the negative binomial. */
function missesNeeded(fraction: number, chance: number, hits: number): number {
  const miss = 1 - chance + chanceSlack(chance);
  let misses = 0;
  while (negativeBinomialUpperTail(misses + 1, hits, fraction) > miss) misses++;
  return misses;
}

describe("the budget for a chance next to 1", () => {
  test.each([
    [0.5, 1 - 2 ** -53, 1],
    [0.5, 1 - 2 ** -53, 2],
    [0.5, 1 - 1e-11, 2],
    [0.3226105987560004, 1 - 2 ** -53, 124],
    [0.07, 1 - 1e-12, 3],
    [0.9, 1 - 1e-10, 40],
  ])("fraction %d, chance %d, %d hits: as many units as the negative binomial takes", (fraction, chance, hits) => {
    expect(searchBudget(fraction, [1], [1], chance, hits).budget).toBe(hits + missesNeeded(fraction, chance, hits));
  });

  test("by an independent sum: two kinds of miss, counted by how many of each", () => {
    const [fraction, second, hits, chance] = [0.2, 0.5, 3, 1 - 1e-12];
    const { budget } = searchBudget(fraction, [1, second], [1, 2], chance, hits);
    // A miss pays 1 with share 0.5 or 3 with share 0.3; hits pay 3 each.
    const beyond = (units: number) => {
      let within = 0;
      let lacking = 0;
      for (let misses = 0; misses < 600; misses++) {
        let weight = fraction ** hits * (1 - fraction) ** misses;
        for (let i = 1; i < hits; i++) weight *= (misses + i) / i;
        const dear = Math.floor((units - misses) / 2);
        const covered = dear < 0 ? 0 : binomialCdf(Math.min(dear, misses), misses, 0.375);
        within += weight * covered;
        lacking += weight * (1 - covered);
      }
      return { within, lacking };
    };
    const miss = 1 - chance + chanceSlack(chance);
    expect(beyond(budget - 3 * hits).lacking).toBeLessThanOrEqual(miss * (1 + 1e-3));
    expect(beyond(budget - 3 * hits - 1).lacking).toBeGreaterThan(miss * (1 - 1e-3));
  });

  test("misses that all pay a multiple of the same keep to it, and settle", () => {
    const { budget } = searchBudget(7e-12, [1, 1], [53, 27], 0.69, 1);
    expect(budget % 80).toBe(0);
    // A chance that is met but for 1e-12 counts as met.
    expect(relativeError(budget / 80, -Math.log1p(-0.69) / 7e-12)).toBeLessThan(1e-11);
  });

  test("a search in which next to nothing fails is one with a single look", () => {
    expect(searchBudget(1 - 1e-15, [1], [21.87], 0.003, 1).budget).toBe(21.87);
  });

  test("more different costs, or more stages, than units can hold are refused before the work", () => {
    const many = Array.from({ length: 30_000 }, (_, i) => i + 1);
    const reach = many.map((i) => 1 / i);
    expect(() => searchBudget(1e-6, reach, many, 0.5, 1)).toThrow(/reach must be falling.*it falls at 30000/);
    expect(() => searchBudget(1e-6, [...many.map(() => 1), 0.5], [...many, 7], 0.5, 1)).toThrow(
      /costs.*30000 different costs were given/,
    );
  });
});
