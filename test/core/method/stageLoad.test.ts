import { describe, expect, test } from "vitest";
import { stageLoad } from "../../../src/core/method/stageLoad";
import { testRefusals } from "../../support/refusals";

describe("the load of the stages", () => {
  test("by hand: 20 learnt from and one hit in ten, a visit for four in ten at 6 a piece", () => {
    const { looks, stages, all } = stageLoad([1, 0.4], [1, 6], 0.1, 20, 1);
    expect(looks).toBe(10);
    expect(stages).toEqual([
      { learning: 20, searching: 10, total: 30, cost: 30 },
      { learning: 8, searching: 4, total: 12, cost: 72 },
    ]);
    expect(all).toEqual({ learning: 28, searching: 14, total: 42, cost: 102 });
  });

  test("laws: hits scale the search alone, learning nothing leaves it alone, a free stage costs nothing", () => {
    const one = stageLoad([1, 0.5, 0.2], [1, 0, 3], 0.2, 0, 1);
    const three = stageLoad([1, 0.5, 0.2], [1, 0, 3], 0.2, 0, 3);
    expect(three.all.searching).toBeCloseTo(3 * one.all.searching, 12);
    expect(one.all.learning).toBe(0);
    expect(one.stages[1]!.cost).toBe(0);
  });

  test("a last reach short of the fraction by rounding alone is let pass: 0.7 × 0.1 for 0.07", () => {
    expect(stageLoad([1, 0.7 * 0.1], [1, 1], 0.07, 0, 1).stages[1]!.searching).toBeCloseTo(1, 12);
  });

  testRefusals(stageLoad, [
    ["fraction", [1], [1], 5, 20, 1],
    ["fraction", [1, 0.2], [1, 1], 0.3, 20, 1],
    ["reach", [0.5], [1], 0.1, 20, 1],
    ["reach", [1, 1.2], [1, 1], 0.1, 20, 1],
    ["reach", [1, 0], [1, 1], 0.1, 20, 1],
    ["costs", [1, 0.5], [1], 0.1, 20, 1],
    ["costs", [1], [-1], 0.1, 20, 1],
    ["costs", [1], [NaN], 0.1, 20, 1],
    ["learn_count", [1], [1], 0.1, -1, 1],
    ["learn_count", [1], [1], 0.1, Infinity, 1],
    ["hits", [1], [1], 0.1, 20, 0],
  ]);
});
