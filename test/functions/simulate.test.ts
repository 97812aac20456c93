import { describe, expect, test } from "vitest";
import { callFunction } from "../../src/functions/call";
import { callParts, parseArgument, testCases } from "../support/cases";

function call(formula: string): unknown {
  const { name, args } = callParts(formula);
  return callFunction(
    name,
    args.map((text) => parseArgument(text, [])),
  );
}
const rows = (formula: string) => Object.fromEntries((call(formula) as { value: [string, unknown][] }).value);

describe("the public cases", () => {
  testCases("simulate.json");
});

describe("SIMULATED_SEARCH", () => {
  test("left out, blank and white space take the defaults", () => {
    const expected = call("=WEIR.SIMULATED_SEARCH(60,8,10%,60)");
    expect(call('=WEIR.SIMULATED_SEARCH(60,8,10%,60,"plain",10000,1,10000)')).toEqual(expected);
    expect(call('=WEIR.SIMULATED_SEARCH(60,8,10%,60," ","",,"  ","")')).toEqual(expected);
  });

  test("mean and sd name the curve; the numbers don't depend on them", () => {
    expect(call("=WEIR.SIMULATED_SEARCH(-3,0.001,10%,60,,500)")).toEqual(
      call("=WEIR.SIMULATED_SEARCH(60,8,10%,60,,500)"),
    );
  });

  test("the item gives the row of the table, in any case", () => {
    const table = rows("=WEIR.SIMULATED_SEARCH(60,8,10%,20,,500,3)");
    for (const label of Object.keys(table))
      expect(call(`=WEIR.SIMULATED_SEARCH(60,8,10%,20,,500,3,," ${label.toUpperCase()} ")`)).toEqual({
        value: table[label],
      });
    expect(Object.keys(table)).toHaveLength(7);
  });

  test("where no run found one, the share of finds is empty and looks are most_looks", () => {
    expect(rows('=WEIR.SIMULATED_SEARCH(60,8,0.000000000001,500,"safe",20,1,50)')).toMatchObject({
      "average looks": 50,
      "first hit not truly top": "",
      "found nothing": 1,
    });
  });

  test("the safe mark lets through less than the plain one, and searches longer", () => {
    const [safe, plain] = ["safe", "plain"].map((method) => rows(`=WEIR.SIMULATED_SEARCH(0,1,5%,40,"${method}",2000)`));
    expect(safe["highest passing fraction"]).toBeLessThan(plain["highest passing fraction"] as number);
    expect(safe["average looks"]).toBeGreaterThan(plain["average looks"] as number);
    expect(safe["first hit not truly top"]).toBeLessThan(plain["first hit not truly top"] as number);
  });

  test("more than 20 million draws are refused at once, with advice", () => {
    const started = performance.now();
    expect(call("=WEIR.SIMULATED_SEARCH(60,8,0.1%,60)")).toEqual({
      error: "#VALUE!",
      message: "runs must be at most 6535 with these arguments (longer simulations run in the pane); 10000 was given.",
    });
    expect(call("=WEIR.SIMULATED_SEARCH(60,8,10%,30000000,,1)")).toMatchObject({
      error: "#VALUE!",
      message: expect.stringMatching(/^learn_count/),
    });
    expect(performance.now() - started).toBeLessThan(250);
  });

  test("the same seed plays the same runs to the bit, another seed others", () => {
    const seeded = (seed: number) => call(`=WEIR.SIMULATED_SEARCH(60,8,10%,20,,1000,${seed})`);
    expect(seeded(4)).toEqual(seeded(4));
    expect(seeded(5)).not.toEqual(seeded(4));
  });

  test.each([
    ['=WEIR.SIMULATED_SEARCH("x",8,5%,30)', "mean", '"x"'],
    ["=WEIR.SIMULATED_SEARCH(60,0,5%,30)", "sd", "0"],
    ["=WEIR.SIMULATED_SEARCH(60,8,100%,30)", "fraction", "1"],
    ["=WEIR.SIMULATED_SEARCH(60,8,0,30)", "fraction", "0"],
    ["=WEIR.SIMULATED_SEARCH(60,8,5%,1)", "learn_count", "1"],
    ["=WEIR.SIMULATED_SEARCH(60,8,5%,)", "learn_count", "left out"],
    ["=WEIR.SIMULATED_SEARCH(60,8,5%,30,3)", "method", "3"],
    ["=WEIR.SIMULATED_SEARCH(60,8,5%,30,,0)", "runs", "0"],
    ["=WEIR.SIMULATED_SEARCH(60,8,5%,30,,10.5)", "runs", "10.5"],
    ["=WEIR.SIMULATED_SEARCH(60,8,5%,30,,,-1)", "seed", "-1"],
    ["=WEIR.SIMULATED_SEARCH(60,8,5%,30,,,TRUE)", "seed", "TRUE"],
    ["=WEIR.SIMULATED_SEARCH(60,8,5%,30,,,,0)", "most_looks", "0"],
    ["=WEIR.SIMULATED_SEARCH(60,8,5%,30,,,,2.5)", "most_looks", "2.5"],
    ['=WEIR.SIMULATED_SEARCH(60,8,5%,30,,,,,"mode looks")', "item", '"mode looks"'],
  ])("refuses %s", (formula, argument, came) => {
    const outcome = call(formula) as { error: string; message: string };
    expect(outcome.error).toBe("#VALUE!");
    expect(outcome.message.startsWith(argument)).toBe(true);
    expect(outcome.message).toContain(came);
  });
});

test.each(["null", "empty", "zero"] as const)(
  "blanks handed over as %s change nothing where there are none",
  (policy) => {
    expect(callFunction("SIMULATED_SEARCH", [60, 8, 0.1, 20, "plain", 500, 1, 100, "average looks"], policy)).toEqual(
      call('=WEIR.SIMULATED_SEARCH(60,8,10%,20,"plain",500,1,100,"average looks")'),
    );
  },
);
