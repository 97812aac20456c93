import { expect, test } from "vitest";
import { answerSearch, isRefusal } from "../../src/taskpane/search/answerSearch";
import { callFunction } from "../../src/functions/call";
import type { Cell } from "../../src/sheet/cell";
import { readColumn } from "../../src/taskpane/column/readColumn";
import type { Call } from "../../src/taskpane/context";
import { answerCutoff } from "../../src/taskpane/cutoff/answerCutoff";
import { FIRST_QUESTION } from "../../src/taskpane/cutoff/question";
import { readCases } from "../support/cases";
import { estimatedLooks, lookSteps } from "../../src/taskpane/search/chancePoints";
import { searchFormulas } from "../../src/taskpane/search/searchFormulas";
import { FIRST_SEARCH, keptSearch } from "../../src/taskpane/search/searchQuestion";
import { localFormula } from "../../src/taskpane/formula";
import { en } from "../../src/taskpane/texts/en";

const question = {
  ...FIRST_SEARCH,
  stages: [
    { reach: 1, cost: 2 },
    { reach: 0.4, cost: 15.5 },
  ],
};

test("what was kept and can't be a question any more falls back to the first", () => {
  expect(keptSearch(undefined)).toEqual(FIRST_SEARCH);
  expect(keptSearch({ hits: 0, chance: 3, stages: [{ reach: 2, cost: -1 }] })).toEqual(FIRST_SEARCH);
  expect(keptSearch({ ...question, arrivals: 3 })).toEqual({ ...question, arrivals: 3 });
});

test("without a column the search is answered all the same; a refusal stays beside its own question", () => {
  const asked: string[] = [];
  const answer = answerSearch(
    (name) => {
      asked.push(name);
      return name === "SEARCH_BUDGET" ? { error: "#VALUE!", message: "costs must …" } : { value: 20 };
    },
    0.05,
    question,
    undefined,
  );
  expect(answer.expected).toBe(20);
  expect(answer.estimated).toBe(false);
  expect(isRefusal(answer.budget)).toBe(true);
  expect(answer.periods).toBeUndefined();
  expect(asked).not.toContain("RESERVE_SCORE");
});

test("the stages go into a formula as columns of constants", () => {
  const formulas = searchFormulas(0.05, question, undefined, en).map(({ formula }) => formula.text);
  expect(formulas).toContain("=WEIR.SEARCH_BUDGET(0.05,{1;0.4},{2;15.5},0.9)");
  expect(formulas).toContain("=WEIR.STAGE_LOAD({1;0.4},{2;15.5},0.05)");
  expect(localFormula(formulas[2]!, { decimal: ",", argument: ";" })).toBe(
    "=WEIR.SEARCH_BUDGET(0,05;{1;0,4};{2;15,5};0,9)",
  );
});

test("the chance is worked out at whole looks only, the last included", () => {
  expect(lookSteps(4)).toEqual([0, 1, 2, 3, 4]);
  const many = lookSteps(1000);
  expect(many.every(Number.isInteger)).toBe(true);
  expect(many[many.length - 1]).toBe(1000);
  expect(many.length).toBeLessThan(60);
});

test("the looks for any chance take into account that the mark is only an estimate", () => {
  const cells = readCases("cutoff.json").columns[0]!.cells.map((cell) => [cell === "" ? null : cell] as [Cell]);
  const column = readColumn({ address: "Ropes!A2:A61", values: cells }, 0)!;
  const call: Call = (name, given) => callFunction(name, given);
  const cutoff = answerCutoff(call, column, FIRST_QUESTION);
  const atNinety = answerSearch(call, 0.05, FIRST_SEARCH, cutoff);
  expect(atNinety.estimated).toBe(true);
  expect(atNinety.looksMost).toBe(cutoff.report!.looksMost);
  // By the definition of the report the looks for 90 % are those at which the chance from count, mean and sd first reaches 90 %.
  expect(estimatedLooks(call, 57, 0.05, 0.9)).toBe(cutoff.report!.looksMost);
  const atEighty = answerSearch(call, 0.05, { ...FIRST_SEARCH, chance: 0.8 }, cutoff).looksMost as number;
  expect(atEighty).toBeLessThan(atNinety.looksMost as number);
  expect(atEighty).toBeGreaterThan(32); // 32 looks give 80 % where the mark is known: 1 − 0.95^32 = 0.806.
  const formulas = searchFormulas(0.05, FIRST_SEARCH, cutoff, en).map(({ formula }) => formula.text);
  expect(formulas[0]).toBe('=WEIR.CUTOFF_REPORT(Ropes!A2:A61,0.05,,,,"looks for a 90% chance")');
});
