import { describe, expect, test } from "vitest";
import { normalQuantile } from "../../../src/core/distribution/normalQuantile";
import { reserveSchedule } from "../../../src/core/method/reserveSchedule";
import memory from "../../reference/published/from-memory.json";
import reference from "../../reference/stopping/values.json";
import { relativeError } from "../../support/relativeError";

type Row = [number, number, number, number, number | null, "high" | "low", [number, number | null, number, number][]];

describe("reserveSchedule", () => {
  test.each(reference.reserveSchedule as unknown as Row[])(
    "mean %d, sd %d, looks %d, look_cost %d, fallback %s, better %s agrees with the recursion in 60 digits",
    (mean, sd, looks, cost, fallback, better, rows) => {
      const steps = reserveSchedule(mean, sd, looks, cost, fallback ?? undefined, better);
      const units = (score: number) => (score - mean) / sd;
      for (const [left, mark, expected, chance] of rows) {
        const step = steps[looks - left]!;
        expect(step.looksLeft).toBe(left);
        if (mark === null) expect(step.mark).toBeUndefined();
        else expect(relativeError(units(step.mark!), units(mark))).toBeLessThanOrEqual(1e-13);
        expect(relativeError(units(step.expectedResult), units(expected))).toBeLessThanOrEqual(1e-13);
        expect(relativeError(step.acceptChance, chance)).toBeLessThanOrEqual(1e-13);
      }
    },
  );

  test("the expected results of Guttman 1960 for 1 to 6 normal offers (values from memory)", () => {
    [0, 0.3989, 0.6297, 0.7904, 0.9127, 1.0108].forEach((printed, index) =>
      expect(Math.abs(reserveSchedule(0, 1, index + 1)[0]!.expectedResult - printed)).toBeLessThan(6e-5),
    );
  });

  test("by hand: two looks bring 1/√π·√½ = φ(0) standard deviations; three bring less than the best of three", () => {
    const worth = (looks: number) => reserveSchedule(0, 1, looks)[0]!.expectedResult;
    expect(worth(1)).toBe(0);
    expect(worth(2)).toBeCloseTo(1 / Math.sqrt(2 * Math.PI), 15);
    // The largest of 3 standard normal scores is 3/(2√π) on average; without recall one gets less.
    expect(worth(3)).toBeLessThan(3 / (2 * Math.sqrt(Math.PI)));
  });

  test("the marks of Moser's uniform recursion (from memory) are those of another curve: the normal marks stand on other percentiles", () => {
    // v → (1 + v²)/2 holds for uniform scores; its first value, the mean, is common to both.
    const uniform = memory.items.find(({ id }) => id === "moser-uniform")!.printed as number[];
    const normal = reserveSchedule(0, 1, 3).map(({ expectedResult }) => expectedResult);
    expect(normalQuantile(uniform[0]!)).toBeCloseTo(normal[2]!, 15);
    expect(normalQuantile(uniform[1]!)).toBeLessThan(normal[1]!);
  });

  test("laws: marks never rise as looks run out, a fallback never harms, low mirrors high", () => {
    const high = reserveSchedule(62, 8.5, 60, 0.4, 55);
    const low = reserveSchedule(-62, 8.5, 60, 0.4, -55, "low");
    const without = reserveSchedule(62, 8.5, 60, 0.4);
    high.forEach((step, i) => {
      if (i > 0) expect(step.mark!).toBeLessThanOrEqual(high[i - 1]!.mark!);
      expect(step.expectedResult).toBeGreaterThanOrEqual(without[i]!.expectedResult);
      expect(step.expectedResult).toBeGreaterThanOrEqual(55);
      expect(low[i]!.mark).toBe(-step.mark!);
      expect(low[i]!.acceptChance).toBe(step.acceptChance);
    });
  });

  test.each<[string, Parameters<typeof reserveSchedule>]>([
    ["mean", [NaN, 1, 3]],
    ["sd", [0, -1, 3]],
    ["looks", [0, 1, 2.5]],
    ["looks", [0, 1, 0]],
    ["looks", [0, 1, 10_001]],
    ["looks", [0, 1, NaN]],
    ["look_cost", [0, 1, 3, -0.1]],
    ["look_cost", [0, 1, 3, Infinity]],
    ["fallback", [0, 1, 3, 0, NaN]],
  ])("refuses a bad %s: %o", (argument, args) => {
    expect(() => reserveSchedule(...args)).toThrow(expect.objectContaining({ name: "DomainError", argument }));
  });
});
