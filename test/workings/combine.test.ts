import { describe, expect, test } from "vitest";
import { columnLetters } from "../../src/sheet/address";
import { expectProven, nativeSheetOf } from "../support/provenWorkings";

/* What the public cases leave out: the first row blank, weights written downwards, raters without ratings, wide panels. Scores invented. */
const RATERS = 25;
/** Each rater sees five of eight entries, next to one another in a ring, so that all hang together. */
const rated = (entry: number, rater: number) => (rater + 8 - entry) % 8 < 5;
const columns = [
  { heading: "strength", cells: ["", 71, 64.5, 88] },
  { heading: "service", cells: [null, 6, 8, 5.5] },
  { heading: "weight", cells: [3, 1, "", 0] },
  { heading: "least", cells: [70, "", 60, 6] },
  { heading: "sd", cells: [8, 2.5] },
  ...Array.from({ length: RATERS }, (_, rater) => ({
    heading: `rater ${rater + 1}`,
    cells: Array.from({ length: 8 }, (_, entry) =>
      rated(entry, rater) ? 50 + 3 * entry + ((rater * 7) % 5) + ((entry * rater * 13) % 9) / 4 : "",
    ),
  })),
];
const panel = (raters: number, from = 2) => `F${from}:${columnLetters(4 + raters)}9`;
const sheet = nativeSheetOf(columns);
const prove = (formula: string) => expectProven(formula, columns, sheet);
const lastOf = (formula: string) => prove(formula).at(-1)!.slice(1, 4);

describe("the workings of the first entry that is filled in", () => {
  test.each([
    "=WEIR.WEIGHTED_SCORE(A2:B5,C2:C3)",
    "=WEIR.WEIGHTED_SCORE(A3:A5,3)",
    "=WEIR.WEIGHTED_SCORE({80,6;60,8},{5,2})",
    '=WEIR.WEIGHTED_SCORE({80,6;60,8},{5,2},{"",7})',
    "=WEIR.MINIMUMS_MET(A2:B5,D2:D3)",
    '=WEIR.MINIMUMS_MET(A2:B5,{72,""})',
    "=WEIR.PRICE_POINTS(A2:B5,40)",
    "=WEIR.PRICE_POINTS(A2:B5,40,5)",
    "=WEIR.COMPOSITE_SPREAD(C2:C3,{8,2.5},{1,0.3;0.3,1})",
    "=WEIR.COMPOSITE_SPREAD({3,1},E2:E3,{1,-1;-1,1})",
    "=WEIR.COMPOSITE_SPREAD(3,8,1)",
  ])("%s", (formula) => void prove(formula));

  test("an entry that misses a minimum has no score, and its formula gives none", () => {
    const [meaning, value, formula] = lastOf("=WEIR.WEIGHTED_SCORE(A2:B5,C2:C3,D4:D5)");
    expect([meaning, value]).toEqual(["score of the first entry", 71 * 0.75 + 6 * 0.25]);
    expect(formula).toContain("A3:B3");
    expect(lastOf("=WEIR.WEIGHTED_SCORE(A2:B5,C2:C3,{70,6.5})")[1]).toBe("");
  });

  test("rows all blank stay blank", () => {
    for (const formula of [
      "=WEIR.WEIGHTED_SCORE(A2:B2,C2:C3)",
      "=WEIR.MINIMUMS_MET(A2:B2,D2:D3)",
      "=WEIR.PANEL_SCORE(A2:B2)",
    ])
      expect(lastOf(formula).slice(1)).toEqual(["", ""]);
  });
});

describe("the workings of PANEL_SCORE", () => {
  test.each([
    `=WEIR.PANEL_SCORE(${panel(1)})`,
    `=WEIR.PANEL_SCORE(${panel(5)})`,
    `=WEIR.PANEL_SCORE(${panel(20)})`,
    `=WEIR.PANEL_SCORE(${panel(RATERS)})`,
    '=WEIR.PANEL_SCORE({60,"",50;80,"",70;"","",90})',
  ])("%s", (formula) => void prove(formula));

  test("severities are solved by the host up to 20 raters, and checked beyond", () => {
    const severities = (raters: number) => prove(`=WEIR.PANEL_SCORE(${panel(raters)})`).slice(1, -1);
    expect(severities(20).every(([, , , formula]) => formula.includes("MINVERSE"))).toBe(true);
    const [check] = severities(RATERS).slice(-1);
    expect(check!.slice(1, 3)).toEqual([
      "check: largest sum of what the fit leaves of one rater's ratings, must be 0",
      0,
    ]);
  });
});

describe("the workings of WEIGHT_SWAY", () => {
  test("tell what was played and how well the share is known", () => {
    const rows = prove("=WEIR.WEIGHT_SWAY(A2:B5,C2:C3,1,0.9,400)");
    const value = (meaning: string) => rows.find((row) => row[1] === meaning)![2];
    expect([value("entries ranked"), value("products added up"), value("seed")]).toEqual([3, 2400, 1]);
    expect(rows.at(-1)![3]).toBe("");
  });
});
