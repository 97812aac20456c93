import { describe, expect, test } from "vitest";
import { callFunction } from "../../src/functions/call";
import { expectOutcome, testCases } from "../support/cases";
import published from "../reference/published/sd_precision.json";

describe("plan: the worked values of the independent program", () => {
  testCases("plan.json");
  testCases("plan-new.json");
});

describe.each(["empty", "zero"] as const)("plan: the same where the host hands a blank over as %s", (blanks) => {
  testCases("plan.json", undefined, blanks);
});

const call = (name: string, ...given: Parameters<typeof callFunction>[1][number][]) => callFunction(name, given)!;

describe("plan: published and known counts", () => {
  test("10 % of the standard deviation at 95 % takes 193 scores, a standard error of 20 % of the variance 51", () => {
    // 193: Greenwood & Sandomire 1950, by the chi-square equation; 51: 2/(n − 1) = 0.04 by hand. The "about 52" of the trade: common practice, no source.
    expect(call("SAMPLES_FOR_SD_PRECISION", 0.1)).toEqual({ value: 193 });
    expect(call("SAMPLES_FOR_VARIANCE_STANDARD_ERROR", 0.2)).toEqual({ value: 51 });
    expect(call("SAMPLES_FOR_VARIANCE_STANDARD_ERROR", 0.1)).toEqual({ value: 201 });
  });

  test("the limits of sigma that a table of multipliers prints hold at least the precision interval (sd_precision.json)", () => {
    // A 95 % interval s·lower … s·upper is the equal-tailed one, so the symmetrical precision lies between its two sides.
    for (const [n, lower, upper] of published.items[0]!.printed as [number, number, number][]) {
      const { value } = call("SD_PRECISION", n) as { value: number };
      const [below, above] = [1 - 1 / upper, 1 / lower - 1];
      expect(value).toBeGreaterThanOrEqual(Math.min(below, above) - 1e-4);
      expect(value).toBeLessThanOrEqual(Math.max(below, above) + 1e-4);
    }
  });
});

describe("plan: refusals name the argument and show what came", () => {
  test.each<[string, unknown[], string, string]>([
    ["SAMPLES_FOR_SD_PRECISION", [10], "precision", "10"],
    ["SAMPLES_FOR_SD_PRECISION", ["10%"], "precision", '"10%"'],
    ["SAMPLES_FOR_SD_PRECISION", [null], "precision", "nothing"],
    ["SAMPLES_FOR_SD_PRECISION", [NaN], "precision", "NaN"],
    ["SAMPLES_FOR_SD_PRECISION", [0.1, Infinity], "confidence", "Infinity"],
    ["SAMPLES_FOR_SD_PRECISION", [0.1, true], "confidence", "TRUE"],
    ["SAMPLES_FOR_SD_PRECISION", [{ code: "#DIV/0!" }], "precision", "#DIV/0!"],
    ["SAMPLES_FOR_VARIANCE_PRECISION", [1], "precision", "1"],
    ["SAMPLES_FOR_VARIANCE_STANDARD_ERROR", [1], "relative_error", "1"],
    ["SAMPLES_FOR_VARIANCE_STANDARD_ERROR", [NaN], "relative_error", "NaN"],
    ["SAMPLES_FOR_MEAN_PRECISION", [-1, 8], "half_width", "-1"],
    ["SAMPLES_FOR_MEAN_PRECISION", [2, 0], "sd", "0"],
    ["SAMPLES_FOR_MEAN_PRECISION", [2, 8, 95], "confidence", "95"],
    ["SAMPLES_FOR_MEAN_PRECISION", [2, 8, 0.95, "yes"], "sd_known", "yes"],
    ["SAMPLES_FOR_MEAN_PRECISION", [2, 8, 0.95, false, 0], "assurance", "0"],
    ["SAMPLES_FOR_MEAN_PRECISION", [2, 8, 0.95, true, 0.9], "assurance", "0.9"],
    ["SAMPLES_FOR_CUTOFF_PRECISION", [0.05, 0.05, 0.1], "low_fraction", "0.05"],
    ["SAMPLES_FOR_CUTOFF_PRECISION", [0.05, 0.02, 0.05], "high_fraction", "0.05"],
    ["SAMPLES_FOR_CUTOFF_PRECISION", [0.05, 0.02, 1], "high_fraction", "1"],
    ["SAMPLES_FOR_CUTOFF_PRECISION", [0.05, 0.02, 0.1, 90], "confidence", "90"],
    ["SD_PRECISION", [1], "count", "1"],
    ["SD_PRECISION", [-3], "count", "-3"],
    ["SD_PRECISION", [30, 0], "confidence", "0"],
    ["CUTOFF_PRECISION", [1, 0.05], "count", "1"],
    ["CUTOFF_PRECISION", [60, 1.05], "fraction", "1.05"],
    ["CUTOFF_PRECISION", [60, 0.05, -0.1], "confidence", "-0.1"],
    ["CUTOFF_PRECISION", [60, 0.05, 0.9, 1], "item", "1"],
  ])("%s%o", (name, given, argument, shown) => {
    expectOutcome(call(name, ...(given as never[])), { formula: name, error: "#VALUE!", mentions: [argument, shown] });
  });

  test("a precision that no countable number of scores buys has no answer", () => {
    for (const [name, ...given] of [
      ["SAMPLES_FOR_SD_PRECISION", 1e-9],
      ["SAMPLES_FOR_VARIANCE_PRECISION", 1e-9],
      ["SAMPLES_FOR_VARIANCE_STANDARD_ERROR", 1e-9],
      ["SAMPLES_FOR_MEAN_PRECISION", 1e-300, 1e300],
      ["SAMPLES_FOR_CUTOFF_PRECISION", 0.05, 0.05 - 1e-12, 0.05 + 1e-12],
    ] as const)
      expect(call(name, ...given)).toMatchObject({ error: "#N/A" });
  });
});

describe("plan: the rules for optional arguments", () => {
  test("left out, blank, white space and null take the default", () => {
    for (const blank of [undefined, null, "", "  "])
      expect(call("SAMPLES_FOR_MEAN_PRECISION", 2, 8, blank, blank, blank)).toEqual({ value: 64 });
  });

  test("item is read in any case, trimmed", () => {
    expect(call("CUTOFF_PRECISION", 60, 0.05, null, "  Highest PASSING fraction ")).toEqual(
      call("CUTOFF_PRECISION", 60, 0.05, 0.9, "highest passing fraction"),
    );
  });
});

test("plan: sample sizes in the millions come at once", () => {
  const started = performance.now();
  expect(call("SAMPLES_FOR_SD_PRECISION", 0.001)).toHaveProperty("value");
  expect(call("SAMPLES_FOR_VARIANCE_PRECISION", 0.001)).toHaveProperty("value");
  expect(call("SAMPLES_FOR_MEAN_PRECISION", 0.001, 8, 0.95, false, 0.9)).toHaveProperty("value");
  expect(call("SAMPLES_FOR_CUTOFF_PRECISION", 0.05, 0.0499, 0.0501)).toHaveProperty("value");
  expect(performance.now() - started).toBeLessThan(4 * 250);
});
