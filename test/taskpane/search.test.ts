import { expect, test } from "vitest";
import { answerSearch, isRefusal } from "../../src/taskpane/search/answerSearch";
import { lookSteps } from "../../src/taskpane/search/chancePoints";
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
