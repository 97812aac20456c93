import { describe, expect, test } from "vitest";
import { noncentralTCdf } from "../../../src/core/distribution/noncentralTCdf";
import { normalUpperTailQuantile } from "../../../src/core/distribution/normalUpperTailQuantile";
import { curveHitChance } from "../../../src/core/method/curveHitChance";
import { cutoffErrorRates } from "../../../src/core/method/cutoffErrorRates";
import { markFactor, MARK_METHODS } from "../../../src/core/method/markFactor";
import { requireCellWork, type SearchPlan } from "../../../src/core/method/searchPlan";
import { playSearches, simulateSearch } from "../../../src/core/method/simulateSearch";

const PLAN: SearchPlan = { fraction: 0.1, learnCount: 30, method: "plain", runs: 20_000, seed: 1, mostLooks: 10_000 };
/** Within four and a half standard errors of a share: by chance once in 150,000 times. */
const near = (share: number, expected: number, runs: number) =>
  expect(Math.abs(share - expected)).toBeLessThan(4.5 * Math.sqrt((expected * (1 - expected)) / runs));

describe("simulateSearch against exact laws", () => {
  test.each(MARK_METHODS)(
    "a single look passes, and passes without being truly top, as often as the exact error rates of the %s mark say",
    (method) => {
      for (const [learnCount, fraction] of [
        [5, 0.1],
        [40, 0.05],
        [12, 0.4],
      ]) {
        const plan = { ...PLAN, method, learnCount, fraction, mostLooks: 1, runs: 60_000 };
        const exact = cutoffErrorRates(learnCount, fraction, method);
        const { foundNothing, firstHitNotTop, averageLooks } = playSearches(plan);
        near(foundNothing, 1 - exact.passingFraction, plan.runs);
        near(firstHitNotTop!, exact.passedNotTop, plan.runs * exact.passingFraction);
        expect(averageLooks).toBe(1);
      }
    },
  );

  // One by one up to 3/fraction = 30 looks, in one go beyond: both ways of playing are held against the same law.
  test.each([10, 30, 31, 200])(
    "%d looks find nothing, and take on average as many looks, as the exact law of an estimated mark says",
    (mostLooks) => {
      const plan = { ...PLAN, mostLooks, runs: 60_000 };
      const factor = markFactor(plan.learnCount, plan.fraction, plan.method);
      const foundBy = (looks: number) => curveHitChance(plan.learnCount, 0, 1, factor, looks, "high").chance;
      let mean = 0;
      let meanSquare = 0;
      for (let look = 0; look < mostLooks; look++) {
        const still = 1 - foundBy(look);
        mean += still;
        meanSquare += (2 * look + 1) * still;
      }
      const { foundNothing, averageLooks } = playSearches(plan);
      near(foundNothing, 1 - foundBy(mostLooks), plan.runs);
      expect(Math.abs(averageLooks - mean)).toBeLessThan(4.5 * Math.sqrt((meanSquare - mean * mean) / plan.runs));
    },
  );

  test("the 5th and 95th percentiles of the passing fraction are those of the noncentral t", () => {
    for (const method of MARK_METHODS) {
      const plan = { ...PLAN, method, runs: 40_000, mostLooks: 1 };
      const root = Math.sqrt(plan.learnCount);
      const factor = markFactor(plan.learnCount, plan.fraction, method);
      const atMost = (passing: number) =>
        noncentralTCdf(factor * root, plan.learnCount - 1, normalUpperTailQuantile(passing) * root);
      const { lowestPassing, highestPassing } = playSearches(plan);
      near(0.05, atMost(lowestPassing), plan.runs);
      near(0.95, atMost(highestPassing), plan.runs);
    }
  });

  test("with a mark learnt from 20,000 scores the looks are geometric: median 7 and 90th percentile 22 at 10 %", () => {
    const { medianLooks, ninetiethLooks, averageLooks } = playSearches({
      ...PLAN,
      learnCount: 20_000,
      runs: 900,
      seed: 5,
    });
    expect(Math.abs(medianLooks - 7)).toBeLessThanOrEqual(1);
    expect(Math.abs(ninetiethLooks - 22)).toBeLessThanOrEqual(4);
    expect(Math.abs(averageLooks - 10)).toBeLessThan(4.5 * Math.sqrt(90 / 900));
  });
});

describe("simulateSearch as a game in steps", () => {
  test("law: how it is cut into steps changes nothing, and each step tells how far it has come", () => {
    const plan = { ...PLAN, runs: 500 };
    const whole = playSearches(plan);
    for (const drawsPerStep of [1, 997, 1e9]) {
      const steps = simulateSearch(plan, drawsPerStep);
      let before = 0;
      let step = steps.next();
      for (; !step.done; step = steps.next()) {
        expect(step.value.runsPlayed).toBeGreaterThan(before);
        before = step.value.runsPlayed;
      }
      expect(before).toBe(plan.runs);
      expect(step.value).toEqual(whole);
    }
  });

  test("law: same seed, same bits; another seed, other runs", () => {
    expect(playSearches(PLAN)).toEqual(playSearches({ ...PLAN }));
    expect(playSearches({ ...PLAN, seed: 2 }).averageLooks).not.toBe(playSearches(PLAN).averageLooks);
  });

  test("where no run finds anything there is no share of finds, and looks are all most_looks", () => {
    const plan: SearchPlan = { ...PLAN, fraction: 1e-12, learnCount: 1000, method: "safe", runs: 50, mostLooks: 100 };
    expect(playSearches(plan)).toMatchObject({
      firstHitNotTop: undefined,
      foundNothing: 1,
      averageLooks: 100,
      medianLooks: 100,
    });
  });

  test("no mark, however badly it came out, makes a run long: two learning scores, a million looks, and still quick", () => {
    const plan: SearchPlan = { ...PLAN, learnCount: 2, fraction: 0.01, runs: 20_000, mostLooks: 1e15 };
    const started = performance.now();
    const { looksPlayed, averageLooks } = playSearches(plan);
    expect(performance.now() - started).toBeLessThan(2000);
    expect(looksPlayed).toBeLessThanOrEqual(plan.runs * 300);
    expect(averageLooks).toBeGreaterThan(1e6);
  });

  test.each<[string, Partial<SearchPlan>]>([
    ["fraction", { fraction: 0 }],
    ["fraction", { fraction: NaN }],
    ["learn_count", { learnCount: 1 }],
    ["runs", { runs: 0 }],
    ["runs", { runs: 10_000_001 }],
    ["seed", { seed: -1 }],
    ["seed", { seed: 0.5 }],
    ["most_looks", { mostLooks: 0 }],
    ["most_looks", { mostLooks: Infinity }],
  ])("refuses a bad %s before the first run: %o", (argument, change) => {
    expect(() => simulateSearch({ ...PLAN, ...change }).next()).toThrow(
      expect.objectContaining({ name: "DomainError", argument }),
    );
  });
});

describe("requireCellWork", () => {
  const fits = (change: Partial<SearchPlan>) => () => requireCellWork({ ...PLAN, ...change });

  test("20 million draws pass, one run more does not, and the message tells how many fit", () => {
    // 20 learning scores and 3/0.1 = 30 looks a run.
    expect(fits({ learnCount: 20, runs: 400_000 })).not.toThrow();
    expect(fits({ learnCount: 20, runs: 400_001 })).toThrow("runs must be at most 400000 with these arguments");
    expect(fits({ learnCount: 20, runs: 400_001 })).toThrow("400001 was given");
    expect(fits({ learnCount: 20, runs: 800_000, mostLooks: 5 })).not.toThrow();
  });

  test("where one run is too long already, learn_count is named", () => {
    expect(fits({ learnCount: 20_000_000, runs: 1 })).toThrow(expect.objectContaining({ argument: "learn_count" }));
  });
});
