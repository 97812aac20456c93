import { describe, expect, test } from "vitest";
import { expectProven, nativeSheetOf } from "../support/provenWorkings";

/* What the public cases leave out: two scores, tiny fractions, far powers, samples too small for a limit, blanks in front. Scores invented. */
const zigzag = Array.from({ length: 30 }, (_, i) => 50 + ((i * 17) % 23) - ((i * 7) % 11));
const columns = [
  { heading: "zigzag", cells: zigzag },
  { heading: "prices", cells: zigzag.map((x) => Number((1e5 / x).toFixed(2))) },
  { heading: "below 0", cells: zigzag.map((x) => -x) },
  { heading: "grid 1", cells: [null, 61.2, 58.4, "", 66, 71.5, 49.9, 60.3] },
  { heading: "grid 2", cells: [52, "", 58.4, 63.7, 44.4, " ", 57.1, 55.5] },
  { heading: "asked", cells: [0.1, 0.9, 57.5, 70, 61] },
  { heading: "blank", cells: ["", null] },
  { heading: "high ends", cells: [10, 9.99, 9.98, 9.97, 9.98, 9.96, 9.95, 9.9, 9.7, 8.1] },
];
const sheet = nativeSheetOf(columns);
const prove = (formula: string) => expectProven(formula, columns, sheet);
const step = (formula: string, meaning: string) => prove(formula).find((row) => row[1].includes(meaning))!;
/** Meanings of the steps that are numbers without a formula or a check of their own. */
const bare = (formula: string) =>
  prove(formula)
    .filter(([, , , native]) => native === "")
    .map(([, meaning]) => meaning);

describe.each(["TOP_FRACTION_CUTOFF", "NEXT_SCORE_CUTOFF"])("the workings of %s", (name) => {
  test.each([
    "{70;64.5}|50%",
    "D2:E9|F2",
    "A2:A31|0.0000000001%",
    'A2:A31|99%|"normal"|"low"',
    'B2:B31|5%|"boxcox(-3)"',
    'B2:B31|30%|"boxcox(0)"|"low"',
    'D2:E9|5%|"logit(-20,100.5)"|"low"',
    "C2:C31|5%",
  ])("on %s leaves no step without a formula", (text) => {
    expect(bare(`=WEIR.${name}(${text.replaceAll("|", ",")})`)).toEqual([]);
  });

  test("states a fitted power, with its check in front", () => {
    const rows = prove(`=WEIR.${name}(B2:B31,5%,"boxcox")`);
    expect(rows[0]![1]).toContain("slope of the log-likelihood in the power");
    expect(rows[1]![1]).toBe("power of the shape");
    expect(prove(`=WEIR.${name}(H2:H11,99%,"boxcox")`)[0]![1]).toContain("still rises at this end");
  });
});

describe("the workings of SAFE_CUTOFF", () => {
  test.each([
    "=WEIR.SAFE_CUTOFF({70;64.5},5%)",
    "=WEIR.SAFE_CUTOFF(A2:A31,60%,20%)",
    '=WEIR.SAFE_CUTOFF(D2:E9,F2,F3,"lognormal","low")',
    '=WEIR.SAFE_CUTOFF(B2:B31,5%,,"boxcox(-3)","low")',
    "=WEIR.SAFE_CUTOFF(A2:A31,0.001%,99.9%)",
  ])("%s leaves only the factor to its check", (formula) => {
    expect(bare(formula)).toEqual(["factor, in standard deviations from the mean"]);
  });
});

describe("the workings of the limits", () => {
  test.each([
    "=WEIR.CUTOFF_LIMITS({70;64.5},5%)",
    '=WEIR.CUTOFF_LIMITS(D2:E9,40%,50%,,"low")',
    '=WEIR.CUTOFF_LIMITS(D2:E9,F2,F3,"logit(0,100)","low","lower limit")',
    '=WEIR.CUTOFF_LIMITS(B2:B31,5%,,"boxcox(-3)")',
    "=WEIR.CUTOFF_LIMITS(C2:C31,0.1%)",
    "=WEIR.CURVE_CUTOFF_LIMITS(100000,-70,8,50%)",
    '=WEIR.CURVE_CUTOFF_LIMITS(3,F4,8,F2,F3,"low")',
  ])("%s", (formula) => {
    expect(bare(formula)).toEqual([
      "factor of the near limit, in standard deviations from the mean",
      "factor of the far limit, in standard deviations from the mean",
    ]);
  });

  test("item leaves the other labels out", () => {
    const meanings = prove('=WEIR.CUTOFF_LIMITS(A2:A31,5%,,,,"Upper Limit")').map((row) => row[1]);
    expect(meanings.at(-1)).toBe("upper limit");
    expect(meanings).not.toContain("lower limit");
  });
});

describe("the workings of GATED_CUTOFF_LIMITS", () => {
  test.each([
    "=WEIR.GATED_CUTOFF_LIMITS({1;3},0,0,50%)",
    "=WEIR.GATED_CUTOFF_LIMITS(D2:E9,44.4,150,1%,99%)",
    "=WEIR.GATED_CUTOFF_LIMITS(D2:E9,40,2,F2,F3)",
    "=WEIR.GATED_CUTOFF_LIMITS(C2:C31,-80,5,80%)",
    "=WEIR.GATED_CUTOFF_LIMITS(A2:A31,-1000,0,5%)",
  ])("%s leaves curve and limits to their checks", (formula) => {
    expect(bare(formula)).toHaveLength(6);
  });

  test("a gate where the host's normal curve has run out has no formula for its likelihood", () => {
    expect(bare("=WEIR.GATED_CUTOFF_LIMITS({100;100.1;100.2;99.9},1,1,5%)").length).toBeGreaterThanOrEqual(6);
  });
});

describe("the workings of RANK_CUTOFF", () => {
  test.each([
    "=WEIR.RANK_CUTOFF({1;2;3;4;5},25%)",
    '=WEIR.RANK_CUTOFF({1;2;3;4;5},25%,,"low")',
    "=WEIR.RANK_CUTOFF(D2:E9,50%,50%)",
    "=WEIR.RANK_CUTOFF(D2:E9,50%,0.1%)",
    "=WEIR.RANK_CUTOFF({70;64.5},50%)",
    "=WEIR.RANK_CUTOFF({70;64.5},99%,50%)",
    "=WEIR.RANK_CUTOFF({70;64.5},1%,50%)",
    '=WEIR.RANK_CUTOFF(A2:A31,F2,F3,"low","actual confidence")',
    "=WEIR.RANK_CUTOFF({1;2;3;4},50%,87.5%)",
  ])("%s", (formula) => void prove(formula));

  test("a sample too small for a limit is shown to be so", () => {
    const [, , value, native] = step("=WEIR.RANK_CUTOFF({1;2;3;4;5},25%)", "rank of the far limit");
    expect([value, native]).toEqual([
      "none",
      '=IF((1-25%)^SUM(IF({1;2;3;4;5}<"",1,0))>(1-0.95)/2*(1+1E-12),"none","no")',
    ]);
  });
});

describe("the workings of TOLERANCE_FACTOR", () => {
  for (const count of [2, 3, 10, 200, 20000])
    for (const coverage of ["1%", "50%", "99.9%"])
      test(`two-sided, ${count} scores, ${coverage}: the chance of holding is the confidence`, () => {
        for (const confidence of ["10%", "99%"]) {
          const formula = `=WEIR.TOLERANCE_FACTOR(${count},${coverage},${confidence},2)`;
          expect(bare(formula)).toEqual(["factor k, two-sided"]);
        }
      });

  test.each(["=WEIR.TOLERANCE_FACTOR(2,99%,99%)", "=WEIR.TOLERANCE_FACTOR(50,F2,F3,1)"])("%s", (formula) => {
    expect(bare(formula)).toEqual(["noncentral t quantile at the confidence"]);
  });
});

describe("the workings of CLEARANCE_CONFIDENCE and CUTOFF_VERDICT", () => {
  test.each([
    "=WEIR.CLEARANCE_CONFIDENCE(D2:E9,A2:A31,5%)",
    '=WEIR.CLEARANCE_CONFIDENCE(F6,D2:E9,F2,"low")',
    "=WEIR.CLEARANCE_CONFIDENCE(90,{70;64.5},1%)",
    "=WEIR.CUTOFF_VERDICT(D2:E9,F4,F5)",
    '=WEIR.CUTOFF_VERDICT(F6,"none",70)',
    '=WEIR.CUTOFF_VERDICT(F6,50,"none")',
    '=WEIR.CUTOFF_VERDICT(F6,"none",60,"low")',
    '=WEIR.CUTOFF_VERDICT(F6,62,"none","low")',
    '=WEIR.CUTOFF_VERDICT(F6,"none","none")',
  ])("%s", (formula) => void prove(formula));

  test("the first score that is filled in is worked, and blanks alone leave nothing to judge", () => {
    expect(step("=WEIR.CUTOFF_VERDICT(D2:E9,57,62)", "first score")[3]).toBe("=E2");
    expect(prove("=WEIR.CUTOFF_VERDICT(G2:G3,57,62)")).toEqual([[1, "no score to judge", "", "", ""]]);
    expect(prove("=WEIR.CLEARANCE_CONFIDENCE(G2:G3,A2:A31,5%)")).toHaveLength(1);
  });
});

describe("the workings of CUTOFF_REPORT", () => {
  test.each([
    "=WEIR.CUTOFF_REPORT({54;52.3;60.4;43.4;50.5},20%)",
    "=WEIR.CUTOFF_REPORT({1;2;3},50%)",
    "=WEIR.CUTOFF_REPORT(D2:E9,F2,F3)",
    '=WEIR.CUTOFF_REPORT(D2:E9,1%,,"logit(0,100)","low")',
    '=WEIR.CUTOFF_REPORT(B2:B31,5%,,"boxcox(-3)")',
    '=WEIR.CUTOFF_REPORT(B2:B31,5%,90%,"boxcox","low")',
    "=WEIR.CUTOFF_REPORT(C2:C31,70%)",
    '=WEIR.CUTOFF_REPORT({70;64.5},5%,,,,"looks for a 50% chance")',
  ])("%s", (formula) => void prove(formula));

  test("looks past all counting have no formula", () => {
    const [, , value, native] = step('=WEIR.CUTOFF_REPORT(A2:A5,0.00000001%,,,,"looks for a 90% chance")', "looks");
    expect([value, native]).toEqual(["more than 9E+15", ""]);
  });
});
