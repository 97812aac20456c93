import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { expectedPoolTrials } from "../../../src/core/method/expectedTrials";
import { poolHitChance } from "../../../src/core/method/poolHitChance";
import { poolTrialsForHitChance } from "../../../src/core/method/poolTrialsForHitChance";
import { trialsForHitChance } from "../../../src/core/method/trialsForHitChance";
import memory from "../../reference/published/from-memory.json";
import { relativeError } from "../../support/relativeError";
import { testRefusals } from "../../support/refusals";

/** The chance of at least so many hits as a fraction of whole numbers. */
function exactChance(pool: number, good: number, trials: number, hits: number): number {
  const choose = (n: number, k: number): bigint => {
    if (k < 0 || k > n) return 0n;
    let product = 1n;
    for (let i = 1; i <= k; i++) product = (product * BigInt(n - k + i)) / BigInt(i);
    return product;
  };
  let ways = 0n;
  for (let k = hits; k <= Math.min(good, trials); k++) ways += choose(good, k) * choose(pool - good, trials - k);
  return Number((ways * 10n ** 40n) / choose(pool, trials)) / 1e40;
}

const pools = fc
  .tuple(fc.integer({ min: 1, max: 60 }), fc.nat(), fc.nat(), fc.integer({ min: 1, max: 6 }))
  .map(([pool, a, b, hits]) => [pool, a % (pool + 1), b % (pool + 1), hits] as const);

describe("looking through a pool without return", () => {
  test("the first ace of 52 cards comes at 10.6 on average (Mosteller, from memory)", () => {
    const { inputs, printed } = memory.items.find(({ id }) => id === "first-ace") as unknown as {
      inputs: { N: number; K: number; r: number };
      printed: number;
    };
    expect(expectedPoolTrials(inputs.N, inputs.K, inputs.r)).toBeCloseTo(printed, 12);
  });

  test("the chance agrees with whole-number arithmetic to 1e-13", () => {
    fc.assert(
      fc.property(pools, ([pool, good, trials, hits]) => {
        const exact = exactChance(pool, good, trials, hits);
        expect(relativeError(poolHitChance(pool, good, trials, hits), exact)).toBeLessThanOrEqual(
          exact > 1e-20 ? 1e-13 : 1e-10,
        );
      }),
    );
  });

  test("the number of looks is the smallest that reaches the chance, tried one by one", () => {
    fc.assert(
      fc.property(pools, fc.double({ min: 0.01, max: 0.99, noNaN: true }), ([pool, good, , hits], asked) => {
        fc.pre(hits <= good);
        const { trials, chance, chanceBefore } = poolTrialsForHitChance(pool, good, asked, hits);
        let tried = hits;
        while (exactChance(pool, good, tried, hits) < asked * (1 - 1e-12)) tried++;
        expect(trials).toBe(tried);
        expect(chance).toBeGreaterThanOrEqual(asked * (1 - 1e-11));
        expect(chanceBefore).toBeLessThan(asked);
      }),
    );
  });

  test("law: the expected looks are what the chances of not being done add up to", () => {
    const [pool, good, hits] = [40, 4, 2];
    let sum = 0;
    for (let trials = 0; trials < pool; trials++) sum += 1 - poolHitChance(pool, good, trials, hits);
    expect(relativeError(expectedPoolTrials(pool, good, hits), sum)).toBeLessThan(1e-13);
  });

  test("law: a huge pool is like drawing with return, 59 and 93 looks at 5 % and 95 %", () => {
    for (const [hits, looks] of [
      [1, 59],
      [2, 93],
    ] as const) {
      expect(poolTrialsForHitChance(1e9, 5e7, 0.95, hits).trials).toBe(looks);
      expect(trialsForHitChance(0.05, 0.95, hits).trials).toBe(looks);
    }
  });

  test("all good ones are found when all but none are drawn, and a pool of a million is answered exactly", () => {
    expect(poolTrialsForHitChance(10, 10, 0.999, 4).trials).toBe(4);
    const { trials, chance, chanceBefore } = poolTrialsForHitChance(1_000_000, 3, 0.9, 3);
    // All three lie among the first m with chance m(m − 1)(m − 2)/(N(N − 1)(N − 2)).
    const all = (m: number) => (m / 1e6) * ((m - 1) / 999_999) * ((m - 2) / 999_998);
    expect(relativeError(chance, all(trials))).toBeLessThan(1e-13);
    expect(relativeError(chanceBefore, all(trials - 1))).toBeLessThan(1e-13);
    expect(all(trials) >= 0.9 && all(trials - 1) < 0.9).toBe(true);
  });

  test("more hits than good ones are no answer, and it says so", () => {
    for (const ask of [() => expectedPoolTrials(40, 4, 5), () => poolTrialsForHitChance(40, 4, 0.9, 5)])
      expect(ask).toThrow("hits is 5, but good is only 4: this pool never gives that many hits.");
    expect(poolHitChance(40, 4, 40, 5)).toBe(0);
  });

  testRefusals(poolHitChance, [
    ["pool", 0, 0, 0, 1],
    ["pool", 1.5, 1, 1, 1],
    ["pool", 2e9, 1, 1, 1],
    ["good", 40, 41, 10, 1],
    ["good", 40, NaN, 10, 1],
    ["trials", 40, 4, 41, 1],
    ["trials", 40, 4, -Infinity, 1],
    ["hits", 40, 4, 10, 0],
  ]);
  testRefusals(poolTrialsForHitChance, [
    ["chance", 40, 4, 1, 1],
    ["chance", 40, 4, 95, 1],
    ["hits", 40, 4, 0.9, 2.5],
  ]);
});
