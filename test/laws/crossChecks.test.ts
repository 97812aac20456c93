import { describe, expect, test } from "vitest";
import { callFunction } from "../../src/functions/call";
import type { Cell } from "../../src/sheet/cell";
import type { Argument } from "../../src/sheet/invoke";
import { relativeError } from "../support/relativeError";

/*
 * Checks between functions: what one gives in a limiting case another gives outright, and what is played out comes near what is exact.
 */
function value(name: string, ...given: Argument[]): Cell | Cell[][] {
  const outcome = callFunction(name, given)!;
  if ("error" in outcome) throw new Error(`${name}: ${outcome.message}`);
  return outcome.value;
}

const number = (name: string, ...given: Argument[]): number => value(name, ...given) as number;
const rows = (name: string, ...given: Argument[]) => (value(name, ...given) as Cell[][]).slice(1);
/** A table of label and value as a record. */
const table = (name: string, ...given: Argument[]) =>
  Object.fromEntries(value(name, ...given) as [string, number][]) as Record<string, number>;

describe("a schedule of one look is the plain case", () => {
  test.each(["high", "low"])(
    "RESERVE_SCHEDULE, better %s: the mean less the look, or the fallback and its tail",
    (better) => {
      const [mean, sd, cost] = [62, 8.5, 0.75];
      const sign = better === "high" ? 1 : -1;
      expect(rows("RESERVE_SCHEDULE", mean, sd, 1, cost, null, better)).toEqual([[1, "", mean - sign * cost, 1]]);
      for (const beyond of [-1.5, 0, 0.4]) {
        const fallback = mean + sign * beyond * sd;
        const [[left, mark, expected, chance]] = rows(
          "RESERVE_SCHEDULE",
          mean,
          sd,
          1,
          cost,
          fallback,
          better,
        ) as number[][];
        const tail = number("TAIL_FRACTION", fallback, mean, sd, better);
        expect([left, mark]).toEqual([1, fallback]);
        expect(relativeError(chance, tail)).toBeLessThanOrEqual(1e-14);
        // E[max(X, f)] = f·P(X < f) + P(X ≥ f)·(mean + sd·E[Z | Z ≥ z]), the last by WORTH_AMONG_PASSED.
        const passed = mean + sign * sd * number("WORTH_AMONG_PASSED", tail, 1);
        const looked = fallback * (1 - tail) + tail * passed - sign * cost;
        expect(expected).toBeCloseTo(sign * Math.max(sign * looked, sign * fallback), 11);
      }
    },
  );

  test("BEST_PICK and RANK_ONLY: the only one is the best, taken for certain", () => {
    expect(number("BEST_PICK_CHANCE", 1)).toBe(1);
    expect(rows("BEST_PICK_SCHEDULE", 1)).toEqual([[1, 0, 0]]);
    expect(table("RANK_ONLY_PLAN", 1)).toEqual({ "pass over first": 0, "chance of taking the best": 1 });
    expect(number("RANK_ONLY_PLAN", 1, "rank", "expected rank")).toBe(1);
    expect(rows("RANK_ONLY_SCHEDULE", 1)).toEqual([[1, 1]]);
  });

  test("search: one trial hits with the fraction, one stage at 1 a look costs the looks", () => {
    expect(number("HIT_CHANCE", 0.05, 1)).toBe(0.05);
    expect(number("POOL_HIT_CHANCE", 40, 2, 1)).toBeCloseTo(0.05, 15);
    expect(number("SEARCH_BUDGET", 0.05, 1, 1, 0.95)).toBe(number("TRIALS_FOR_HIT_CHANCE", 0.05, 0.95));
    expect(rows("STAGE_LOAD", 1, 1, 0.05)[0]![2]).toBe(number("EXPECTED_TRIALS_TO_HIT", 0.05));
  });

  test("the mark of the next score passes one look with the fraction: NEXT_SCORE_CUTOFF through CURVE_HIT_CHANCE", () => {
    const scores = [54, 52.3, 60.4, 43.4, 50.5, 61.2, 57.7];
    const curve = table(
      "SCORE_SUMMARY",
      scores.map((score) => [score]),
    );
    const mark = number(
      "NEXT_SCORE_CUTOFF",
      scores.map((score) => [score]),
      0.1,
    );
    const chance = number("CURVE_HIT_CHANCE", 7, curve["mean"]!, curve["standard deviation"]!, mark, 1);
    expect(relativeError(chance, 0.1)).toBeLessThanOrEqual(1e-12);
    expect(table("CUTOFF_ERROR_RATES", 7, 0.1, "next")["average passing fraction"]).toBeCloseTo(0.1, 13);
  });
});

describe("schedules within one another", () => {
  test("the chance of every look of RESERVE_SCHEDULE is the tail beyond its mark", () => {
    for (const [, mark, , chance] of rows("RESERVE_SCHEDULE", 62, 8.5, 40, 0.2) as number[][])
      if (typeof mark === "number")
        expect(relativeError(chance!, number("TAIL_FRACTION", mark, 62, 8.5))).toBeLessThanOrEqual(1e-13);
  });

  test("the tail of a longer schedule is the shorter one", () => {
    expect(rows("RESERVE_SCHEDULE", 62, 8.5, 30, 0.2).slice(-12)).toEqual(rows("RESERVE_SCHEDULE", 62, 8.5, 12, 0.2));
    const percentiles = (looks: number) => rows("BEST_PICK_SCHEDULE", looks).map((row) => row[2]);
    expect(percentiles(30).slice(-12)).toEqual(percentiles(12));
  });

  test("knowing the curve takes the best more often than ranks alone", () => {
    for (const looks of [2, 3, 10, 200])
      expect(number("BEST_PICK_CHANCE", looks)).toBeGreaterThan(
        number("RANK_ONLY_PLAN", looks, "best", "chance of taking the best"),
      );
  });
});

describe("a score without error, and one without worth", () => {
  test.each([
    [0.1, 0.3],
    [0.3, 0.1],
    [0.8, 0.7],
  ])("truly top %d, passed %d: validity 1, 0 and −1", (top, pass) => {
    const share = (validity: number) => number("TRUE_TOP_AMONG_PASSED", top, pass, validity);
    expect(share(1)).toBeCloseTo(Math.min(1, top / pass), 15);
    expect(share(0)).toBeCloseTo(top, 15);
    expect(share(-1)).toBeCloseTo(Math.max(0, (top + pass - 1) / pass), 15);
    expect(number("WORTH_AMONG_PASSED", pass, 0)).toBe(0);
    expect(number("WORTH_AMONG_PASSED", pass, -1)).toBe(-number("WORTH_AMONG_PASSED", pass, 1));
  });

  test("reliability 1 leaves no error, 0 leaves the whole spread; scores equal to outcomes have validity 1 before and after", () => {
    expect(number("SCORE_ERROR_SD", 8.5, 1)).toBe(0);
    expect(number("SCORE_ERROR_SD", 8.5, 0)).toBe(8.5);
    const scores = [54, 52.3, 60.4, 43.4, 50.5].map((score) => [score]);
    const validity = table("SCORE_VALIDITY", scores, scores, 0.95, 20);
    expect(validity["correlation"]).toBe(1);
    expect(validity["correlation before selection"]).toBe(1);
  });

  test("at GUARDED_CUTOFF the share truly top is one less max_wrong, by TRUE_TOP_AMONG_PASSED at the root of the reliability", () => {
    const [limit, errorSd, mean, trueSd] = [66, 4, 60, 7];
    const scoreSd = Math.hypot(errorSd, trueSd);
    for (const maxWrong of [0.3, 0.05, 0.001]) {
      const mark = number("GUARDED_CUTOFF", limit, errorSd, mean, trueSd, maxWrong);
      const top = number("TAIL_FRACTION", limit, mean, trueSd);
      const pass = number("TAIL_FRACTION", mark, mean, scoreSd);
      expect(number("TRUE_TOP_AMONG_PASSED", top, pass, trueSd / scoreSd)).toBeCloseTo(1 - maxWrong, 11);
    }
  });
});

describe("what is played out comes near what is exact", () => {
  test.each(["plain", "safe", "next"])(
    "SIMULATED_SEARCH of one look against CUTOFF_ERROR_RATES, method %s",
    (method) => {
      const runs = 100_000;
      for (const [count, fraction] of [
        [12, 0.2],
        [60, 0.05],
      ] as const) {
        const exact = table("CUTOFF_ERROR_RATES", count, fraction, method);
        const played = table("SIMULATED_SEARCH", 62, 8.5, fraction, count, method, runs, 11, 1);
        const passing = exact["average passing fraction"]!;
        const wrong = exact["passed but not truly top"]!;
        // Four and a half standard errors: by chance once in 150,000 times.
        const within = (share: number, of: number) => 4.5 * Math.sqrt((share * (1 - share)) / of);
        expect(Math.abs(1 - played["found nothing"]! - passing)).toBeLessThan(within(passing, runs));
        expect(Math.abs(played["first hit not truly top"]! - wrong)).toBeLessThan(within(wrong, runs * passing));
      }
    },
  );

  test("SIMULATED_SEARCH finds by look m as often as the looks of CUTOFF_REPORT's rule say: 1 − E[Φ(T)^m]", () => {
    const [count, fraction, runs] = [20, 0.1, 60_000];
    const z = number("CURVE_CUTOFF", 0, 1, fraction);
    for (const looks of [3, 15, 60]) {
      const exact = number("CURVE_HIT_CHANCE", count, 0, 1, z, looks);
      const found = 1 - table("SIMULATED_SEARCH", 0, 1, fraction, count, "plain", runs, 4, looks)["found nothing"]!;
      expect(Math.abs(found - exact)).toBeLessThan(4.5 * Math.sqrt((exact * (1 - exact)) / runs));
    }
  });
});
