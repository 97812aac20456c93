import { describe, expect, test } from "vitest";
import { expectProven, nativeSheetOf } from "../support/provenWorkings";

/* What the public cases leave out: sure and impossible hits, small chances, costs with few or many kinds of miss, blanks between stages. Invented. */
const columns = [
  { heading: "reach", cells: [1, 0.5, "", 0.5, 0.2] },
  { heading: "costs", cells: [2, 0, "", 6, 15] },
  { heading: "flat reach", cells: [1, 1, 0.4] },
  { heading: "its costs", cells: [0, 0.3, 0.7] },
  { heading: "four gates", cells: [1, 0.8, 0.6, 0.4] },
  { heading: "their costs", cells: [10, 20, 30, 50] },
  { heading: "fraction", cells: [0.04] },
  { heading: "free", cells: [0, 0, 0] },
];
const sheet = nativeSheetOf(columns);
const prove = (formula: string) => expectProven(formula, columns, sheet);
/** The steps without a formula of the host's own. */
const bare = (formula: string) =>
  prove(formula)
    .filter(([, , , native]) => native === "")
    .map(([, meaning]) => meaning);

describe("the workings of the binomial search functions", () => {
  test.each([
    "=WEIR.EXPECTED_TRIALS_TO_HIT(G2,3)",
    "=WEIR.TRIALS_FOR_HIT_CHANCE(G2,99.9999%)",
    "=WEIR.TRIALS_FOR_HIT_CHANCE(G2,0.0001%,4)",
    "=WEIR.TRIALS_FOR_HIT_CHANCE(90%,0.5%,7)",
    "=WEIR.TRIALS_FOR_HIT_CHANCE(0.001%,95%)",
    "=WEIR.TRIALS_FOR_HIT_CHANCE(0.1%,50%,50)",
    "=WEIR.HIT_CHANCE(G2,3,3)",
    "=WEIR.HIT_CHANCE(0.0001%,20,2)",
    "=WEIR.HIT_CHANCE(0.00001%,20)",
    "=WEIR.SEARCH_DURATION(G2,0.7,0.1%,60)",
  ])("%s leaves no step without a formula", (formula) => void expect(bare(formula)).toEqual([]));

  test("a small chance keeps its digits in the host's own function too", () => {
    const [, , value, native] = prove("=WEIR.HIT_CHANCE(0.001%,12,4)")[0]!;
    expect(Math.abs((sheet.evaluate(native) as number) / (value as number) - 1)).toBeLessThan(1e-9);
  });

  test("more looks than the host's functions can tell apart are given without a formula", () => {
    expect(bare("=WEIR.TRIALS_FOR_HIT_CHANCE(0.0000001%,95%)")).toHaveLength(3);
    expect(bare("=WEIR.HIT_CHANCE(1%,2)")).toEqual([]);
    expect(bare("=WEIR.HIT_CHANCE(1%,0)")).toEqual([
      "chance of the hits within these looks: 0, there are fewer looks than hits",
    ]);
  });
});

describe("the workings of CURVE_HIT_CHANCE", () => {
  test.each([
    "=WEIR.CURVE_HIT_CHANCE(2,0,1,1,2)",
    "=WEIR.CURVE_HIT_CHANCE(3,0,1,-2,40)",
    '=WEIR.CURVE_HIT_CHANCE(12,30,6,15,1000,"low")',
    "=WEIR.CURVE_HIT_CHANCE(21,70,8,70,12)",
    "=WEIR.CURVE_HIT_CHANCE(60,70,8,95,100000)",
    "=WEIR.CURVE_HIT_CHANCE(5000,70,8,100,3)",
  ])("%s is computed by the host's own functions", (formula) => void expect(bare(formula)).toEqual([]));

  test("what would take too many nodes is given without a formula", () => {
    expect(bare("=WEIR.CURVE_HIT_CHANCE(2,0,1,3,1000000)")).toEqual(["chance of a hit within these looks"]);
    expect(bare("=WEIR.CURVE_HIT_CHANCE(20,70,8,83,0)")).toEqual(["chance of a hit: 0, there is no look"]);
  });
});

describe("the workings of the pool functions", () => {
  test.each([
    "=WEIR.POOL_TRIALS_FOR_HIT_CHANCE(10,10,95%,4)",
    "=WEIR.POOL_TRIALS_FOR_HIT_CHANCE(10,8,95%,4)",
    "=WEIR.POOL_TRIALS_FOR_HIT_CHANCE(40000,300,99.9%,2)",
    "=WEIR.POOL_HIT_CHANCE(10,8,6,4)",
    "=WEIR.POOL_HIT_CHANCE(10,8,5,4)",
    "=WEIR.POOL_HIT_CHANCE(2000,9,12,4)",
    "=WEIR.POOL_HIT_CHANCE(2000,9,12,9)",
  ])("%s leaves no step without a formula", (formula) => void expect(bare(formula)).toEqual([]));

  test("a large pool, and hits that can't come, are given without a formula", () => {
    expect(bare("=WEIR.POOL_HIT_CHANCE(1000000,50,20000)")).toHaveLength(1);
    expect(bare("=WEIR.POOL_HIT_CHANCE(100,3,50,4)")[0]).toContain("fewer good ones than hits");
    expect(bare("=WEIR.POOL_HIT_CHANCE(100,5,0)")[0]).toContain("fewer looks than hits");
  });
});

describe("the workings of STAGE_LOAD", () => {
  test.each([
    "=WEIR.STAGE_LOAD(A2:A6,B2:B6,G2,8,2)",
    "=WEIR.STAGE_LOAD({1,0.5},{2;10},25%)",
    "=WEIR.STAGE_LOAD(E2:E5,F2:F5,G2,12)",
  ])("%s", (formula) => void prove(formula));
});

describe("the workings of SEARCH_BUDGET", () => {
  test.each([
    "=WEIR.SEARCH_BUDGET(G2,A2:A6,B2:B6,80%)",
    "=WEIR.SEARCH_BUDGET(G2,C2:C4,D2:D4,90%,3)",
    "=WEIR.SEARCH_BUDGET(10%,E2:E5,F2:F5,50%)",
    "=WEIR.SEARCH_BUDGET(90%,{1},{7},50%,4)",
    "=WEIR.SEARCH_BUDGET(50%,{1},{7},87.5%)",
    "=WEIR.SEARCH_BUDGET(G2,C2:C4,H2:H4,90%)",
  ])("%s leaves no step without a formula", (formula) => void expect(bare(formula)).toEqual([]));

  test("where only free looks miss, the hits alone are paid", () => {
    expect(bare("=WEIR.SEARCH_BUDGET(40%,C2:C4,{0;0;0.7},90%,3)")).toEqual([
      "chance that all misses pay no more than 0 units",
      "smallest number of units that covers the misses",
    ]);
  });

  test("too many ways to miss are given without a formula", () => {
    expect(bare("=WEIR.SEARCH_BUDGET(0.1%,E2:E5,F2:F5,95%,5)")).toHaveLength(2);
  });
});
