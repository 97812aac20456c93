import { describe, expect, test } from "vitest";
import { bestPickChance } from "../../../src/core/method/bestPickChance";
import { bestPickSchedule } from "../../../src/core/method/bestPickSchedule";
import memory from "../../reference/published/from-memory.json";
import published from "../../reference/published/optimal_stopping.json";
import reference from "../../reference/stopping/values.json";
import { relativeError } from "../../support/relativeError";

const recalled = (id: string) => memory.items.find((item) => item.id === id)!;

describe("bestPickSchedule", () => {
  const long = bestPickSchedule(10_000);

  test.each(reference.percentile)(
    "%d looks left: the percentile is the root of the sum itself in 50 digits",
    (left, expected) => {
      const step = long[10_000 - left! - 1]!;
      expect(step.looksLeft).toBe(left);
      expect(relativeError(step.percentile, expected!)).toBeLessThanOrEqual(1e-15);
      // 1 − d has its own digits, which a comparison of d near 1 would not show.
      expect(relativeError(-Math.expm1(-step.exponent / left!), 1 - expected!)).toBeLessThanOrEqual(
        1e-15 / (1 - expected!),
      );
    },
  );

  test("the indifference numbers of Gilbert & Mosteller 1966, table 7 (from memory)", () => {
    const { printed, tolerance } = recalled("full-info-b") as unknown as {
      printed: number[];
      tolerance: { abs: number };
    };
    printed.forEach((d, index) =>
      expect(Math.abs(long[10_000 - index - 2]!.percentile - d)).toBeLessThanOrEqual(tolerance.abs),
    );
  });

  test("by hand: with one look left one half, with two left (1 + √6)/5 (the root of 1/d + 1/(2d²) = 5/2)", () => {
    const [two, one, none] = bestPickSchedule(3);
    expect(one!.percentile).toBe(0.5);
    expect(two!.percentile).toBeCloseTo((1 + Math.sqrt(6)) / 5, 15);
    expect(none!.percentile).toBe(0);
  });

  test("law: percentiles fall as looks run out and don't depend on how many looks there were before", () => {
    for (let i = 1; i < long.length; i++) expect(long[i]!.percentile).toBeLessThan(long[i - 1]!.percentile);
    expect(bestPickSchedule(40).map(({ percentile }) => percentile)).toEqual(
      long.slice(-40).map(({ percentile }) => percentile),
    );
  });

  test.each([0, -1, 2.5, 10_001, NaN, Infinity])("refuses %d looks", (looks) => {
    for (const method of [bestPickSchedule, bestPickChance])
      expect(() => method(looks)).toThrow(expect.objectContaining({ name: "DomainError", argument: "looks" }));
  });
});

describe("bestPickChance", () => {
  test.each(reference.bestPickChance)(
    "%d looks: the double sum before simplifying, in 50 digits",
    (looks, expected) => {
      expect(relativeError(bestPickChance(looks!), expected!)).toBeLessThanOrEqual(1e-14);
    },
  );

  test.each(reference.bestPickChanceInDoubles)("%d looks: the same double sum in doubles", (looks, expected) => {
    expect(relativeError(bestPickChance(looks!), expected!)).toBeLessThanOrEqual(1e-12);
  });

  test("the chances of Gilbert & Mosteller 1966, table 8 (from memory)", () => {
    const { inputs, printed } = recalled("full-info-P") as unknown as { inputs: { n: number[] }; printed: number[] };
    inputs.n.forEach((n, index) => expect(Math.abs(bestPickChance(n) - printed[index]!)).toBeLessThanOrEqual(2e-6));
  });

  test("its limit is 0.580164 (Gilbert & Mosteller 1966; Gnedin & Miretskiy, arXiv:math/0510568)", () => {
    const limit = published.items.find(({ id }) => id === "full-info-limit")!.printed as number;
    // The distance falls like 1/n: extrapolated from 5,000 and 10,000 looks.
    expect(Math.abs(2 * bestPickChance(10_000) - bestPickChance(5_000) - limit)).toBeLessThanOrEqual(6e-7);
  });

  test("by hand: 1 look is certain, 2 looks are 3/4", () => {
    expect([bestPickChance(1), bestPickChance(2)]).toEqual([1, 0.75]);
  });

  test("law: falls with every look more", () => {
    for (let n = 2; n <= 120; n++) expect(bestPickChance(n)).toBeLessThan(bestPickChance(n - 1));
  });
});
