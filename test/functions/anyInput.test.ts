import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { callFunction, functionTable } from "../../src/functions/call";
import type { Cell } from "../../src/sheet/cell";
import type { FunctionEntry, ParameterEntry } from "../../src/sheet/functionTable";
import type { Argument, BlankPolicy, Outcome } from "../../src/sheet/invoke";
import { callParts, parseArgument } from "../support/cases";
import { processorTime } from "../support/processorTime";

/*
 * Every function of the table on anything that a sheet can hand over: its own example with a few arguments exchanged for numbers of any
 * size, words, blanks, errors and ranges of them. A new function is covered as soon as it is in the table.
 */
const RUNS = 120;
const SEED = 20_250_314;
/** What any call on a few cells may take, in milliseconds of processor time; simulations are bounded by 20 million draws instead. */
const ALLOWED = 250;
const SIMULATIONS: Readonly<Record<string, number>> = { SIMULATED_SEARCH: 1000, WEIGHT_SWAY: 1000 };

const anySize = fc
  .tuple(fc.constantFrom(1, -1), fc.double({ min: -320, max: 308.2, noNaN: true }))
  .map(([sign, power]) => sign * 10 ** power);
const share = fc.oneof(
  fc.double({ min: 0, max: 1, noNaN: true }),
  fc.double({ min: -300, max: 0, noNaN: true }).map((power) => 10 ** power),
  fc.double({ min: -16, max: -1, noNaN: true }).map((power) => 1 - 10 ** power),
);
const count = fc.oneof(fc.integer({ min: 0, max: 60 }), fc.integer({ min: 0, max: Number.MAX_SAFE_INTEGER }));
const ends = fc.constantFrom(0, -0, 1, -1, 2, 1.5, 5e-324, 1e-160, 1e15, 2 ** 53, Number.MAX_VALUE, -Number.MAX_VALUE);
const word = fc.constantFrom(
  "",
  "  ",
  "abc",
  "5%",
  "Score",
  "none",
  "low",
  "lognormal",
  "boxcox",
  "boxcox(-5)",
  "logit(0,1e308)",
);
const oddCell: fc.Arbitrary<Cell> = fc.constantFrom<Cell[]>(
  null,
  undefined,
  true,
  false,
  { code: "#N/A" },
  NaN,
  -Infinity,
);
const number = fc.oneof({ weight: 3, arbitrary: anySize }, { weight: 3, arbitrary: share }, count, ends);
const cell = fc.oneof({ weight: 4, arbitrary: number }, word, oddCell);

/** Columns, rows and blocks: scores about a centre, of any size, tied, tiny apart, with a few cells that are none. */
const range = fc
  .tuple(
    fc.oneof(
      fc.array(
        fc.double({ min: 40, max: 80, noNaN: true }).map((x) => Math.round(x * 4) / 4),
        { maxLength: 60 },
      ),
      fc.array(anySize, { maxLength: 12 }),
      fc.array(fc.constantFrom(1, 1 + 2 ** -52, 1 + 2 ** -51), { minLength: 2, maxLength: 30 }),
      fc.tuple(number, fc.integer({ min: 1, max: 2000 })).map(([value, many]) => new Array<number>(many).fill(value)),
    ),
    fc.array(fc.tuple(fc.nat(59), cell), { maxLength: 2 }),
    fc.integer({ min: 1, max: 4 }),
  )
  .map(([numbers, others, width]) => {
    const cells: Cell[] = [...numbers];
    for (const [place, other] of others) if (place < cells.length) cells[place] = other;
    const rows: Cell[][] = [];
    for (let i = 0; i < cells.length; i += width)
      rows.push(Array.from({ length: width }, (_, j) => (i + j < cells.length ? cells[i + j] : null)));
    return rows;
  });

function argument({ dimensionality, choices = [] }: ParameterEntry, own: Argument): fc.Arbitrary<Argument> {
  const words = choices.length > 0 ? fc.constantFrom<Argument[]>(...choices) : word;
  const others: fc.Arbitrary<Argument> = dimensionality === "matrix" ? range : cell;
  return fc.oneof(
    { weight: 12, arbitrary: fc.constant(own) },
    { weight: 4, arbitrary: others },
    { weight: 3, arbitrary: number },
    { weight: 1, arbitrary: words },
    { weight: 1, arbitrary: range },
    { weight: 1, arbitrary: fc.constant(undefined) },
  );
}

/** The arguments of the examples to start from; WORKINGS works the examples of all the others. */
function examplesOf(entry: FunctionEntry): Argument[][] {
  const own = entry.examples.map(({ formula }) => callParts(formula).args.map((text) => parseArgument(text, [])));
  if (entry.name !== "WORKINGS") return own;
  return functionTable.flatMap((other) =>
    other === entry ? own : examplesOf(other).map((args) => [other.name, ...args]),
  );
}

const callOf = (entry: FunctionEntry): fc.Arbitrary<Argument[]> =>
  fc
    .constantFrom(...examplesOf(entry))
    .chain((own) => fc.tuple(...entry.parameters.map((parameter, i) => argument(parameter, own[i]))));

/** What holds of the outcome of any call. */
function requireSound(entry: FunctionEntry, given: readonly Argument[], outcome: Outcome): void {
  if (!("error" in outcome)) {
    for (const value of [outcome.value].flat(2)) {
      expect(["number", "string", "boolean"]).toContain(typeof value);
      if (typeof value === "number") expect(Number.isFinite(value)).toBe(true);
    }
    return;
  }
  const { error, message } = outcome;
  expect(["#VALUE!", "#N/A"]).toContain(error);
  expect(message).not.toMatch(/fault in the add-in|undefined|\[object|null/);
  if (!JSON.stringify(given, (_, value: unknown) => (Number.isNaN(value) ? "NaN" : value)).includes("NaN"))
    expect(message).not.toContain("NaN");
  const worked = entry.name === "WORKINGS" ? functionTable.find(({ name }) => name === given[0]) : undefined;
  const names = [entry, ...(worked ? [worked] : [])].flatMap(({ parameters }) => parameters.map(({ name }) => name));
  expect(message).toMatch(new RegExp(`\\b(${names.join("|")}|WEIR)\\b`));
  // What is wrong is shown behind what is allowed.
  if (error === "#VALUE!") expect(message).toMatch(/; .+\.$/s);
}

describe("any input", () => {
  test.each(functionTable.map((entry) => [entry.name, entry] as const))(
    "%s answers or names the argument, in time, and twice the same",
    (name, entry) => {
      const policies = fc.constantFrom<BlankPolicy[]>("null", "empty", "zero");
      fc.assert(
        fc.property(callOf(entry), policies, (given, blanks) => {
          let outcome: Outcome | undefined;
          const call = () => (outcome = callFunction(name, given, blanks));
          // Measured anew, as the first measure may have caught a collection of garbage, or a function met for the first time.
          const time = processorTime(call);
          const first = outcome!;
          expect(Math.min(time, processorTime(call))).toBeLessThan(SIMULATIONS[name] ?? ALLOWED);
          expect(outcome).toEqual(first);
          requireSound(entry, given, first);
        }),
        { seed: SEED, numRuns: RUNS },
      );
    },
  );
});

/** Calls that did not come back, failed, or gave a number without digits, before they were looked for. */
describe("calls that once went wrong", () => {
  const column = (...values: number[]) => values.map((value) => [value]);

  test.each<[string, ...Argument[]]>([
    ["GATED_CURVE", column(1, 3), -1e300, 0],
    ["GATED_CUTOFF_LIMITS", column(1, 3), -1e300, 0, 0.5],
    ["GATED_CUTOFF_LIMITS", column(4, 5), 4, 1230679603822, 3e-11, 5e-228],
    ["GATED_CUTOFF_LIMITS", column(45060, 45250), -254542, 52, 0.21, 6e-15],
    ["CURVE_HIT_CHANCE", 12, 1e308, 1.3, -7, 4],
    ["CURVE_HIT_CHANCE", 15, 63, 2e-215, 51521, 1023163999],
    ["TOLERANCE_FACTOR", 27, 5e-324, null, 2],
    ["SD_PRECISION", 2, 1.5e-289],
    ["SEARCH_BUDGET", 0.999999999999999, 1, 21.87, 0.003],
    ["SEARCH_BUDGET", 7e-18, column(1, 1), column(53, 27), 0.69],
    ["SEARCH_BUDGET", 0.32, column(1, 1), column(96, 46), 1 - 2 ** -53, 124],
    ["SEARCH_BUDGET", 0.4086695046238777, column(1, 0.4236845667473972), column(22, 99), 0.9999999999999865, 14942],
    [
      "COMPOSITE_SPREAD",
      [[1, 1]],
      [[1e200, 1e-200]],
      [
        [1, 0.5],
        [0.5, 1],
      ],
    ],
    [
      "COMPOSITE_SPREAD",
      [[1, 1]],
      [[1e-200, 2e-200]],
      [
        [1, 0.5],
        [0.5, 1],
      ],
    ],
    ["SHAPE_RANKING", column(1e-308, 8, 7, 1, 2e-308, 6), 0, 21],
    ["SCORE_CURVE", column(5e-324, 1e-308, 1, 1e160, 1.7e308), "lognormal"],
    ["RANK_CUTOFF", column(1.5e308, -1.3e308), 0.56],
    ["TRIALS_FOR_HIT_CHANCE", 0.99, 0.05, 5e15],
    ["WORKINGS", "GATED_CURVE", column(1e-7, 3e-7), -1e307, 0],
    ["WORKINGS", "WEIGHTED_SCORE", [[1, 2]], [[1e308, 1e308]]],
  ])("%s has an answer: %j %j %j %j %j", (name, ...given) => {
    const time = processorTime(() => expect(callFunction(name, given)).toHaveProperty("value"));
    expect(time).toBeLessThan(ALLOWED);
  });

  test.each<[string, RegExp, "#VALUE!" | "#N/A", ...Argument[]]>([
    ["SAMPLES_FOR_SD_PRECISION", /^precision of 1e-300 would take more than/, "#N/A", 1e-300],
    ["SAMPLES_FOR_VARIANCE_PRECISION", /^precision of 1e-300 would take more than/, "#N/A", 1e-300],
    ["SAMPLES_FOR_MEAN_PRECISION", /^half_width of 1e-300 would take more than/, "#N/A", 1e-300, 1],
    ["SAMPLES_FOR_MEAN_PRECISION", /^half_width of 1 would take more than/, "#N/A", 1, 1e300, 0.95, false, 0.9],
    ["SAMPLES_FOR_CUTOFF_PRECISION", /would take more than/, "#N/A", 0.5, 0.499999999999, 0.5000000000001],
    ["CUTOFF_PRECISION", /^count must be .*; 4000000000000000 was given\.$/, "#VALUE!", 4e15, 0.1],
    ["TOLERANCE_FACTOR", /^count must be .*; 9007199254740991 was given\.$/, "#VALUE!", 2 ** 53 - 1, 0.95],
    ["TOLERANCE_FACTOR", /^count must be /, "#VALUE!", 2 ** 53 - 1, 0.95, 0.95, 2],
    ["SD_PRECISION", /^count must be /, "#VALUE!", 2 ** 53 - 1],
    ["CURVE_CUTOFF_LIMITS", /^count must be /, "#VALUE!", 2 ** 53 - 1, 60, 8, 0.05],
    ["SEARCH_DURATION", /^hits must be .*; 9007199254740991 was given\.$/, "#VALUE!", 0.5, 3, 0.9, 2 ** 53 - 1],
    ["CURVE_CUTOFF", /^sd must be of a size.*; 1e\+308 was given\.$/, "#VALUE!", 0, 1e308, 1e-9],
    ["CURVE_CUTOFF_LIMITS", /^sd must be of a size/, "#VALUE!", 5, 0, 1e308, 0.05],
    ["CURVE_HIT_CHANCE", /^cutoff must be of a size/, "#VALUE!", 5, -1e308, 1e-10, 1e308, 3],
    ["GATED_CURVE", /^gate must be of a size/, "#VALUE!", column(1, 3), -1.7e308, 5],
    [
      "SCORE_SUMMARY",
      /^scores must be .*; they run from 1e-160 to 3e-160\.$/,
      "#VALUE!",
      column(1e-160, 2e-160, 3e-160),
    ],
    ["DRIFT_FLAGS", /^sd must be of a size/, "#VALUE!", 1.6, 42, 1e308],
    ["DRIFT_FLAGS", /^recent must be of a size/, "#VALUE!", column(1.7e308, -1.7e308), 60, 1e225],
    [
      "PANEL_SCORE",
      /^ratings must be of a size.*; 1.7e\+308 was given\.$/,
      "#VALUE!",
      [
        [1.7e308, 1.6e308],
        [1.5e308, 1],
      ],
    ],
  ])("%s says what is wrong: %s", (name, message, error, ...given) => {
    const outcome = callFunction(name, given);
    expect(outcome).toMatchObject({ error });
    expect((outcome as { message: string }).message).toMatch(message);
  });
});
