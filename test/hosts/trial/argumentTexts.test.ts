import { describe, expect, test } from "vitest";
import { argumentTexts } from "../../../src/hosts/trial/argumentTexts";

describe("argumentTexts", () => {
  test.each<[string, string[] | undefined]>([
    ["=WEIR.WORKINGS(A1)", ["A1"]],
    ["=WEIR.WORKINGS()", [""]],
    ['=WEIR.WORKINGS("X", $A$1:B2 ,,5%)', ['"X"', "$A$1:B2", "", "5%"]],
    ['=weir.workings("a,b)",{1,2;3,4},SUM(A1,B1))', ['"a,b)"', "{1,2;3,4}", "SUM(A1,B1)"]],
    ["=_xldudf_WEIR_WORKINGS('My, sheet'!A1,2)", ["'My, sheet'!A1", "2"]],
    ['=IF(A1="WEIR.WORKINGS(",1,WEIR.WORKINGS(B1,2))', ["B1", "2"]],
    ["=WEIR.WORKINGS(WEIR.HIT_CHANCE(1,2),3)", ["WEIR.HIT_CHANCE(1,2)", "3"]],
    ["=WEIR.WORKINGS(A1)+WEIR.WORKINGS(A2)", undefined],
    ["=WEIR.WORKINGS(A1", undefined],
    ["=A1", undefined],
  ])("reads the arguments of %s as typed", (formula, expected) => {
    expect(argumentTexts(formula, "WORKINGS")).toEqual(expected);
  });
});
