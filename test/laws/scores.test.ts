import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { callFunction } from "../../src/functions/call";
import type { Argument } from "../../src/sheet/invoke";
import type { Cell, Range } from "../../src/sheet/cell";

/*
 * Laws that hold between calls of the cell functions, whatever the scores: the order of the rows, the direction in which scores are
 * better, unit and origin of the scale, and what must not fall when a confidence rises.
 */
const RUNS = { seed: 2203, numRuns: 60 };

/** Scores as they come: with ties, with a few digits or all, near 0 or far from it. */
const scoresOf = (least: number) =>
  fc
    .tuple(
      fc.array(fc.double({ min: -1, max: 1, noNaN: true }), { minLength: least, maxLength: 40 }),
      fc.constantFrom(0, 60, -3e5, 1e9),
      fc.constantFrom(1, 8, 1e-3, 1e7),
      fc.constantFrom(undefined, 0.5, 1e-2),
    )
    .map(([values, origin, unit, grid]) => {
      const scores = values.map((value) => origin + unit * value);
      return grid === undefined ? scores : scores.map((score) => Math.round(score / unit / grid) * grid * unit);
    })
    .filter((scores) => Math.max(...scores) - Math.min(...scores) > 1e-100);

const fraction = fc.double({ min: 1e-6, max: 1 - 1e-6, noNaN: true });
const confidence = fc.double({ min: 1e-3, max: 1 - 1e-9, noNaN: true });

const column = (values: readonly Cell[]): Range => values.map((value) => [value]);

function value(name: string, ...given: Argument[]): Cell | Cell[][] {
  const outcome = callFunction(name, given)!;
  if ("error" in outcome) throw new Error(`${name}: ${outcome.message}`);
  return outcome.value;
}

const number = (name: string, ...given: Argument[]): number => value(name, ...given) as number;

/** The calls on one score column whose answer knows no order of rows. */
const ON_SCORES: readonly [name: string, ...rest: Argument[]][] = [
  ["SCORE_SUMMARY"],
  ["SCORE_CURVE"],
  ["NORMALITY_CHECK"],
  ["SHAPE_RANKING"],
  ["RANK_CUTOFF", 0.3],
  ["CUTOFF_LIMITS", 0.05],
  ["CUTOFF_REPORT", 0.05],
  ["SAFE_CUTOFF", 0.05],
  ["NEXT_SCORE_CUTOFF", 0.05],
  ["GATED_CURVE", -1e10, 3],
  ["GATED_CUTOFF_LIMITS", -1e10, 3, 0.3],
];

describe("the order of the rows", () => {
  const shuffled = (values: readonly number[], keys: readonly number[]) =>
    values.map((score, i) => ({ score, key: keys[i % keys.length]! * (i + 1) })).sort((a, b) => a.key - b.key);
  const keys = fc.array(fc.double({ min: -1, max: 1, noNaN: true }), { minLength: 5, maxLength: 9 });

  test.each(ON_SCORES.map(([name, ...rest]) => ({ name, rest })))("changes no bit of $name", ({ name, rest }) => {
    fc.assert(
      fc.property(scoresOf(5), keys, (scores, order) => {
        const other = shuffled(scores, order).map(({ score }) => score);
        expect(value(name, column(other), ...rest)).toEqual(value(name, column(scores), ...rest));
      }),
      RUNS,
    );
  });

  test.each(["lognormal", "boxcox", "boxcox(0.3)", "logit(-1,3)"])("changes no bit on the scale %s", (shape) => {
    fc.assert(
      fc.property(scoresOf(5), keys, (scores, order) => {
        const least = Math.min(...scores);
        const span = Math.max(...scores) - least;
        const positive = scores.map((score) => (score - least) / span + 0.25);
        const other = shuffled(positive, order).map(({ score }) => score);
        const on = (values: readonly number[]) => callFunction("CUTOFF_REPORT", [column(values), 0.2, null, shape]);
        expect(on(other)).toEqual(on(positive));
      }),
      RUNS,
    );
  });

  test("moves the flags of OUTLIER_FLAGS with the scores, and changes no bit of DRIFT_COMPARISON", () => {
    fc.assert(
      fc.property(scoresOf(12), scoresOf(3), keys, (scores, recent, order) => {
        const other = shuffled(scores, order).map(({ score }) => score);
        const flags = new Map(scores.map((score, i) => [score, flagsOf(scores)[i]]));
        expect(flagsOf(other)).toEqual(other.map((score) => flags.get(score)));
        const compared = value("DRIFT_COMPARISON", column(scores), column(recent));
        expect(value("DRIFT_COMPARISON", column(other), column(recent))).toEqual(compared);
      }),
      { ...RUNS, numRuns: 30 },
    );
    function flagsOf(scores: readonly number[]): Cell[] {
      return (value("OUTLIER_FLAGS", column(scores), 3) as Cell[][]).flat();
    }
  });
});

describe("lower is better", () => {
  const mirrored = (scores: readonly number[]) => column(scores.map((score) => -score));

  test("is the mirror image, to the bit", () => {
    fc.assert(
      fc.property(scoresOf(3), fraction, confidence, (scores, share, trust) => {
        const calls: [string, ...Argument[]][] = [
          ["TOP_FRACTION_CUTOFF", share, null],
          ["SAFE_CUTOFF", share, trust, null],
          ["NEXT_SCORE_CUTOFF", share, null],
        ];
        for (const [name, ...rest] of calls)
          expect(number(name, mirrored(scores), ...rest, "low") + number(name, column(scores), ...rest)).toBe(0);
        for (const [name, rest] of [
          ["CUTOFF_LIMITS", [share, trust, null]],
          ["RANK_CUTOFF", [share, trust]],
        ] as const)
          for (const [item, opposite] of [
            ["lower limit", "upper limit"],
            ["cutoff", "cutoff"],
            ["upper limit", "lower limit"],
          ] as const) {
            const low = value(name, mirrored(scores), ...rest, "low", item);
            const high = value(name, column(scores), ...rest, null, opposite);
            expect(typeof low === "number" ? low + (high as number) : low).toBe(typeof low === "number" ? 0 : high);
          }
      }),
      RUNS,
    );
  });

  test("mirrors the report, the clearances and the verdicts", () => {
    fc.assert(
      fc.property(scoresOf(3), fraction, (scores, share) => {
        const turned = ["curve mean", "cutoff", "safe cutoff", "lower limit", "upper limit"];
        const high = new Map(value("CUTOFF_REPORT", column(scores), share) as [string, Cell][]);
        const low = new Map(value("CUTOFF_REPORT", mirrored(scores), share, null, null, "low") as [string, Cell][]);
        for (const [label, cell] of low) {
          const other = label === "lower limit" ? "upper limit" : label === "upper limit" ? "lower limit" : label;
          if (turned.includes(label)) expect((cell as number) + (high.get(other) as number), label).toBe(0);
          else expect(cell, label).toBe(high.get(label));
        }
        expect(value("CLEARANCE_CONFIDENCE", mirrored(scores), mirrored(scores), share, "low")).toEqual(
          value("CLEARANCE_CONFIDENCE", column(scores), column(scores), share),
        );
        const [near, far] = [high.get("lower limit") as number, high.get("upper limit") as number];
        expect(value("CUTOFF_VERDICT", mirrored(scores), -far, -near, "low")).toEqual(
          value("CUTOFF_VERDICT", column(scores), near, far),
        );
      }),
      { ...RUNS, numRuns: 30 },
    );
  });
});

describe("unit and origin of the scores", () => {
  const marks = ["TOP_FRACTION_CUTOFF", "SAFE_CUTOFF", "NEXT_SCORE_CUTOFF"] as const;

  test("a unit of a power of two carries marks along to the bit, any other to 1e-12 of the spread", () => {
    fc.assert(
      fc.property(scoresOf(3), fraction, fc.integer({ min: -60, max: 60 }), (scores, share, power) => {
        const spread = number("SCORE_SUMMARY", column(scores), "standard deviation");
        const largest = Math.max(...scores.map(Math.abs));
        for (const name of marks) {
          const mark = number(name, column(scores), share);
          expect(number(name, column(scores.map((score) => score * 2 ** power)), share)).toBe(mark * 2 ** power);
          if (spread < 1e-6 * (largest + 11)) continue;
          const other = number(name, column(scores.map((score) => score * 3.7 - 11)), share);
          // Rounding the scores in their new unit moves the mark by so many standard deviations of that.
          const distance = Math.abs(mark - scores[0]!) + spread;
          const slack = 1e-12 * distance + 1e-14 * (distance / spread) * (largest + 11);
          expect(Math.abs((other + 11) / 3.7 - mark)).toBeLessThanOrEqual(slack);
        }
      }),
      RUNS,
    );
  });
});

describe("confidences and fractions", () => {
  test("limits are nested in confidence and hold the cutoff; marks fall as the fraction grows", () => {
    fc.assert(
      fc.property(scoresOf(3), fraction, fraction, confidence, confidence, (scores, f, g, c, d) => {
        const [less, more] = [Math.min(c, d), Math.max(c, d)];
        const limit = (trust: number, item: string) =>
          number("CUTOFF_LIMITS", column(scores), f, trust, null, null, item);
        const slack = 1e-11 * number("SCORE_SUMMARY", column(scores), "standard deviation");
        expect(limit(more, "lower limit")).toBeLessThanOrEqual(limit(less, "lower limit") + slack);
        expect(limit(more, "upper limit")).toBeGreaterThanOrEqual(limit(less, "upper limit") - slack);
        const safe = (trust: number) => number("SAFE_CUTOFF", column(scores), f, trust);
        expect(safe(more)).toBeGreaterThanOrEqual(safe(less) - slack);
        const [few, many] = [Math.min(f, g), Math.max(f, g)];
        for (const name of ["TOP_FRACTION_CUTOFF", "SAFE_CUTOFF", "NEXT_SCORE_CUTOFF"] as const)
          expect(number(name, column(scores), few)).toBeGreaterThanOrEqual(number(name, column(scores), many) - slack);
      }),
      RUNS,
    );
  });

  test("the safe mark at 95 % is never below the plain one, nor is the safe one low above it", () => {
    fc.assert(
      fc.property(scoresOf(2), fraction, (scores, share) => {
        const at = (name: string, better: string) =>
          name === "SAFE_CUTOFF"
            ? number(name, column(scores), share, 0.95, null, better)
            : number(name, column(scores), share, null, better);
        expect(at("SAFE_CUTOFF", "high")).toBeGreaterThanOrEqual(at("TOP_FRACTION_CUTOFF", "high"));
        expect(at("SAFE_CUTOFF", "low")).toBeLessThanOrEqual(at("TOP_FRACTION_CUTOFF", "low"));
      }),
      RUNS,
    );
  });
});
