import { describe, expect, test } from "vitest";
import { rankOnlyBest } from "../../../src/core/method/rankOnlyBest";
import { rankOnlySchedule } from "../../../src/core/method/rankOnlySchedule";
import memory from "../../reference/published/from-memory.json";
import published from "../../reference/published/optimal_stopping.json";
import reference from "../../reference/stopping/values.json";
import { relativeError } from "../../support/relativeError";

describe("rankOnlyBest", () => {
  test.each(reference.rankOnlyBest)("%d looks: the best of all plans in exact fractions", (looks, passOver, chance) => {
    const plan = rankOnlyBest(looks!);
    expect(plan.passOver).toBe(passOver);
    expect(relativeError(plan.chance, chance!)).toBeLessThanOrEqual(1e-14);
  });

  test("printed plans for 10, 100 and 1000 looks (net.math postings of 1983, Usenet archive)", () => {
    const { inputs, printed, tolerance } = published.items.find(({ id }) => id === "rank-best") as unknown as {
      inputs: { n: number[] };
      printed: { skip: number[]; probability: number[] };
      tolerance: { probability: number[] };
    };
    inputs.n.forEach((n, index) => {
      const plan = rankOnlyBest(n);
      expect(plan.passOver).toBe(printed.skip[index]);
      expect(Math.abs(plan.chance - printed.probability[index]!)).toBeLessThanOrEqual(tolerance.probability[index]!);
    });
  });

  test("the table of Gilbert & Mosteller 1966, table 2 (from memory)", () => {
    const rows = memory.items.find(({ id }) => id === "rank-best-table")!.printed as unknown as Record<
      string,
      [number, number]
    >;
    for (const [n, [first, chance]] of Object.entries(rows)) {
      const plan = rankOnlyBest(Number(n));
      expect(plan.passOver + 1).toBe(first);
      expect(Math.abs(plan.chance - chance)).toBeLessThanOrEqual(6e-4);
    }
  });

  test("law: tends to pass over n/e and a chance of 1/e", () => {
    const { passOver, chance } = rankOnlyBest(10_000);
    expect(passOver).toBe(Math.round(10_000 / Math.E));
    expect(Math.abs(chance - 1 / Math.E)).toBeLessThan(5e-5);
  });
});

describe("rankOnlySchedule", () => {
  test.each(reference.rankOnlySchedule as [number, number[], number][])(
    "%d looks: rank by rank in exact fractions, ties taken",
    (looks, acceptRank, expectedRank) => {
      const schedule = rankOnlySchedule(looks);
      expect(schedule.acceptRank).toEqual(acceptRank);
      expect(relativeError(schedule.expectedRank, expectedRank)).toBeLessThanOrEqual(1e-14);
    },
  );

  test("3 looks: 5/3, 4 looks: 15/8 by hand; 10 looks: 2.5579 (from memory)", () => {
    expect(rankOnlySchedule(3).expectedRank).toBeCloseTo(5 / 3, 15);
    expect(rankOnlySchedule(4).expectedRank).toBeCloseTo(15 / 8, 15);
    expect(rankOnlySchedule(10).expectedRank).toBeCloseTo(2.5579, 4);
  });

  test("100 looks: 3.60323, 1000: 3.83238, in the limit 3.8695 (Chow, Moriguti, Robbins & Samuels 1964, from memory)", () => {
    expect(rankOnlySchedule(100).expectedRank).toBeCloseTo(3.60323, 5);
    expect(rankOnlySchedule(1000).expectedRank).toBeCloseTo(3.83238, 5);
    const longest = rankOnlySchedule(10_000).expectedRank;
    expect(longest).toBeGreaterThan(rankOnlySchedule(5_000).expectedRank);
    expect(3.8695 - longest).toBeLessThan(0.006);
    expect(longest).toBeLessThan(3.8696);
  });

  test("law: every even number of looks has a tie at the look before the last, and it is taken", () => {
    for (let n = 2; n <= 10_000; n += 62) expect(rankOnlySchedule(n).acceptRank[n - 2]).toBe(n / 2);
  });

  test("law: the rank to accept never falls from look to look, and the last look is always taken", () => {
    const { acceptRank } = rankOnlySchedule(10_000);
    for (let i = 1; i < acceptRank.length; i++) expect(acceptRank[i]!).toBeGreaterThanOrEqual(acceptRank[i - 1]!);
    expect(acceptRank[9_999]).toBe(10_000);
  });

  test.each([0, -1, 2.5, 10_001, NaN, Infinity])("refuses %d looks", (looks) => {
    for (const method of [rankOnlyBest, rankOnlySchedule])
      expect(() => method(looks)).toThrow(expect.objectContaining({ name: "DomainError", argument: "looks" }));
  });
});
