import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { hitChance } from "../../../src/core/method/hitChance";
import { expectedTrials } from "../../../src/core/method/expectedTrials";
import { trialsForHitChance } from "../../../src/core/method/trialsForHitChance";
import reference from "../../reference/cutoff/cutoff.json";
import memory from "../../reference/published/from-memory.json";
import published from "../../reference/published/trials.json";
import { relativeError } from "../../support/relativeError";
import { testRefusals } from "../../support/refusals";

const item = (id: string) => published.items.find((one) => one.id === id) as unknown as Item;
const recalled = (id: string) => memory.items.find((one) => one.id === id)!.printed;
/** The rest of 1 as it stands on paper, not as the difference of two doubles. */
const rest = (share: number) => Number((1 - share).toFixed(12));

describe("the trials until the hits", () => {
  test.each(reference.trials.cases as [number, number, number, number][])(
    "fraction %d, chance %d, %d hits: %d by whole-number fractions",
    (fraction, chance, hits, trials) => expect(trialsForHitChance(fraction, chance, hits).trials).toBe(trials),
  );

  test.each(Object.entries(item("nb-trials").printed as Record<string, number[]>))(
    "more than %s failures: the table of the Boost.Math documentation (neg_binomial_sample_sizes)",
    (key, printed) => {
      const [failures, success] = key.split("|").map(Number) as [number, number];
      const { confidence } = item("nb-trials").inputs as { confidence: number[] };
      const found = confidence.map((chance) => trialsForHitChance(rest(success), chance, failures + 1).trials);
      expect(found).toEqual(printed);
    },
  );

  test.each(recalled("wilks-first") as [number, number, number][])(
    "content %d with confidence %d takes %d (Wilks 1941; NBS Handbook 91, from memory)",
    (content, confidence, count) => expect(trialsForHitChance(rest(content), confidence, 1).trials).toBe(count),
  );

  test("the first ten orders at 95 % and 95 % (Nutt & Wallis 2004, from memory): 59, 93, 124 …", () => {
    const orders = recalled("wilks-orders") as number[];
    expect(orders.map((_, i) => trialsForHitChance(0.05, 0.95, i + 1).trials)).toEqual(orders);
  });

  test("law: the chance is met at the answer and not one trial before, and both are told", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1e-6, max: 0.999, noNaN: true }),
        fc.double({ min: 1e-6, max: 0.999999, noNaN: true }),
        fc.integer({ min: 1, max: 400 }),
        (fraction, asked, hits) => {
          const { trials, chance, chanceBefore } = trialsForHitChance(fraction, asked, hits);
          expect(chance).toBe(hitChance(fraction, trials, hits));
          expect(chance).toBeGreaterThanOrEqual(asked * (1 - 1e-11));
          expect(chanceBefore).toBeLessThan(asked);
          expect(trials).toBeGreaterThanOrEqual(hits);
        },
      ),
    );
  });

  test("past all counting is said by name, not tried", () => {
    expect(() => trialsForHitChance(1e-300, 0.5, 1)).toThrow(/more than 9007199254740991 trials/);
  });

  testRefusals(trialsForHitChance, [
    ["fraction", 0, 0.95, 1],
    ["fraction", 5, 0.95, 1],
    ["fraction", NaN, 0.95, 1],
    ["chance", 0.05, 1, 1],
    ["chance", 0.05, -Infinity, 1],
    ["hits", 0.05, 0.95, 0],
    ["hits", 0.05, 0.95, 1.5],
    ["hits", 0.05, 0.95, Infinity],
  ]);
});

describe("the chance of hits within so many trials", () => {
  test("the fifth candy bar sold by house 5, 6 … 30 at 40 % (Boost.Math documentation, negative binomial example)", () => {
    const { printed, tolerance } = item("nb-candybars") as unknown as { printed: number[]; tolerance: { abs: number } };
    printed.forEach((chance, i) =>
      expect(Math.abs(hitChance(0.4, 5 + i, 5) - chance)).toBeLessThanOrEqual(tolerance.abs),
    );
  });

  test.each(published.data.nb as [number, number, number, number][])(
    "at most %d failures before %d successes at %d: %d (Powell 1982, in Burkardt's test_values)",
    (failures, successes, p, cdf) =>
      expect(Math.abs(hitChance(p, failures + successes, successes) - cdf)).toBeLessThanOrEqual(1e-10),
  );

  test.each(published.data.geom as [number, number, number][])(
    "at most %d failures before the first success at %d: %d (Burkardt's test_values)",
    (failures, p, cdf) => expect(Math.abs(hitChance(p, failures + 1, 1) - cdf)).toBeLessThanOrEqual(1e-10),
  );

  test("fewer trials than hits give 0", () => expect(hitChance(0.5, 3, 4)).toBe(0));

  testRefusals(hitChance, [
    ["fraction", 1, 10, 1],
    ["trials", 0.5, -1, 1],
    ["trials", 0.5, NaN, 1],
    ["hits", 0.5, 10, 0],
  ]);
});

describe("the expected trials", () => {
  test("law: they are what the chances of not being done add up to", () => {
    for (const [fraction, hits] of [
      [0.4, 5],
      [0.05, 1],
      [0.9, 3],
    ] as const) {
      let sum = 0;
      for (let trials = 0; trials < 5000; trials++) sum += 1 - hitChance(fraction, trials, hits);
      expect(relativeError(expectedTrials(fraction, hits), sum)).toBeLessThan(1e-12);
    }
  });

  testRefusals(expectedTrials, [
    ["fraction", 0, 1],
    ["fraction", NaN, 1],
    ["hits", 0.5, 0],
    ["hits", 0.5, Infinity],
  ]);
});

interface Item {
  inputs: unknown;
  printed: unknown;
}
