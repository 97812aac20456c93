import { describe, expect, test } from "vitest";
import { expectProven, nativeSheetOf } from "../support/provenWorkings";

/*
 * What the public cases leave out: small samples, every branch of the approximations, fitted powers at either end, blanks in odd places.
 * Scores invented.
 */
const zigzag = Array.from({ length: 30 }, (_, i) => 50 + ((i * 17) % 23) - ((i * 7) % 11));
const columns = [
  { heading: "zigzag", cells: zigzag },
  { heading: "wild", cells: zigzag.map((x, i) => (i === 7 ? "" : i < 3 ? x * 40 : x)) },
  { heading: "pressed", cells: zigzag.map((x) => Number(Math.exp(x / 9).toFixed(3))) },
  { heading: "prices", cells: zigzag.map((x) => Number((1e5 / x).toFixed(2))) },
  { heading: "grid 1", cells: [null, 61.2, 58.4, "", 66, 71.5, 49.9, 60.3] },
  { heading: "grid 2", cells: [52, "", 58.4, 63.7, 44.4, " ", 57.1, 55.5] },
  { heading: "low ends", cells: [10, 10.01, 10.02, 10.03, 10.02, 10.04, 10.05, 10.1, 10.3, 11.9] },
  { heading: "even", cells: [1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12, 13, 14, 15] },
  { heading: "high ends", cells: [10, 9.99, 9.98, 9.97, 9.98, 9.96, 9.95, 9.9, 9.7, 8.1] },
];
const sheet = nativeSheetOf(columns);
const prove = (formula: string) => expectProven(formula, columns, sheet);
const meanings = (formula: string) => prove(formula).map(([, meaning]) => meaning);
const lastOf = (formula: string) => prove(formula).at(-1)!;

describe("the workings of SCORE_SUMMARY", () => {
  test.each(["=WEIR.SCORE_SUMMARY(E2:F9)", "=WEIR.SCORE_SUMMARY(E3:E4)", '=WEIR.SCORE_SUMMARY({61.5,"";58,70})'])(
    "%s",
    (formula) => void prove(formula),
  );
});

describe("the workings of SCORE_CURVE", () => {
  test.each([
    "=WEIR.SCORE_CURVE(E2:F9)",
    '=WEIR.SCORE_CURVE(E2:F9,"lognormal")',
    '=WEIR.SCORE_CURVE(E2:E9,"logit(-20,100.5)")',
    '=WEIR.SCORE_CURVE(C2:C31,"boxcox")',
    '=WEIR.SCORE_CURVE(D2:D31,"boxcox")',
    '=WEIR.SCORE_CURVE(D2:D31,"boxcox(-2)")',
    '=WEIR.SCORE_CURVE(D2:D31,"boxcox(0)")',
    '=WEIR.SCORE_CURVE(B2:B31,"lognormal")',
  ])("%s", (formula) => void prove(formula));

  test("a power at an end of its range is shown to be held there by the likelihood", () => {
    for (const range of ["G2:G11", "I2:I11"]) {
      const [first] = prove(`=WEIR.SCORE_CURVE(${range},"boxcox")`);
      expect(first![1]).toContain("still rises at this end");
      expect(first![2]).toBe(true);
    }
  });

  test("a fitted power has no p-value, a small sample neither p nor AICc", () => {
    expect(lastOf('=WEIR.SCORE_CURVE(C2:C31,"boxcox")').slice(1, 4)).toEqual(["Anderson-Darling p-value", "", ""]);
    expect(prove("=WEIR.SCORE_CURVE({1;2;4})").filter(([, meaning]) => meaning === "AICc")[0]![2]).toBe("");
  });
});

describe("the workings of SHAPE_RANKING", () => {
  test.each(["=WEIR.SHAPE_RANKING(C2:C31)", "=WEIR.SHAPE_RANKING(E2:F9,0,100)", "=WEIR.SHAPE_RANKING(B2:B31)"])(
    "%s",
    (formula) => void prove(formula),
  );
});

describe("the workings of NORMALITY_CHECK", () => {
  test.each([
    "=WEIR.NORMALITY_CHECK({3;1;2.5})",
    "=WEIR.NORMALITY_CHECK({3;1;2.5;9})",
    "=WEIR.NORMALITY_CHECK(E2:E8)",
    "=WEIR.NORMALITY_CHECK(G2:G11)",
    "=WEIR.NORMALITY_CHECK(E2:F9)",
    "=WEIR.NORMALITY_CHECK(B2:B31)",
    '=WEIR.NORMALITY_CHECK(H2:H16,"anderson-darling")',
    '=WEIR.NORMALITY_CHECK(A2:A31,"anderson-darling")',
    '=WEIR.NORMALITY_CHECK(E2:F9,"anderson-darling")',
    '=WEIR.NORMALITY_CHECK(D2:D31,"anderson-darling")',
    '=WEIR.NORMALITY_CHECK(B2:B31,"anderson-darling")',
  ])("%s", (formula) => void prove(formula));
});

describe("the workings of OUTLIER_FLAGS", () => {
  test.each([
    "=WEIR.OUTLIER_FLAGS(E2:F9,4)",
    "=WEIR.OUTLIER_FLAGS(B2:B31,5)",
    '=WEIR.OUTLIER_FLAGS(B2:B31,5,10%,"boxcox")',
    '=WEIR.OUTLIER_FLAGS(D2:D31,2,,"boxcox(-0.5)")',
    "=WEIR.OUTLIER_FLAGS(H2:H16)",
    "=WEIR.OUTLIER_FLAGS(A2:A31,28)",
  ])("%s", (formula) => void prove(formula));

  test("the first score that is filled in is flagged, after a blank too", () => {
    expect(lastOf("=WEIR.OUTLIER_FLAGS(B2:B31,5)").slice(1, 4)).toEqual([
      "flag of the first score",
      true,
      "=OR(B2>=LARGE(B2:B31,3))",
    ]);
    expect(lastOf("=WEIR.OUTLIER_FLAGS(E2:F9,4)")[2]).toBe(false);
  });

  test("of many removals twenty and the last that counts are laid out, and the others named", () => {
    expect(meanings("=WEIR.OUTLIER_FLAGS(A2:A31,28)").filter((one) => one.startsWith("removal"))).toHaveLength(64);
  });
});

describe("the workings of the curves", () => {
  test.each([
    "=WEIR.GATED_CURVE(E2:F9,44.4,0)",
    "=WEIR.GATED_CURVE(E2:F9,40,200)",
    '=WEIR.GATED_CURVE(E2:F9,-10,3,"standard error of the mean")',
    "=WEIR.COMBINED_CURVE(2,10,0,3,10,0)",
    "=WEIR.TAIL_FRACTION(E2:E9,60,7)",

    "=WEIR.TAIL_FRACTION(E5,61.5,7)",
  ])("%s", (formula) => void prove(formula));
});
