import { describe, expect, test } from "vitest";
import { callFunction } from "../../src/functions/call";
import type { Cell } from "../../src/sheet/cell";
import { readColumn } from "../../src/taskpane/column/readColumn";
import { answerCutoff } from "../../src/taskpane/cutoff/answerCutoff";
import { FIRST_QUESTION } from "../../src/taskpane/cutoff/question";
import { checkTarget } from "../../src/taskpane/target/targetCells";
import { freeColumn } from "../../src/taskpane/target/freeColumn";
import { driftOf, marksOf, markToday, tiesAt, writeMark } from "../../src/taskpane/use/fixedMarks";
import { askPassRates, groupRates, groupsAddress, passRatesFormula } from "../../src/taskpane/use/passRatesOf";
import { verdictCounts } from "../../src/taskpane/use/verdictView";
import { verdictFormula } from "../../src/taskpane/use/verdictFormula";
import { readCases } from "../support/cases";
import { fakePort } from "./fakePort";

// The first column of the public cases, "rope score": 57 scores and 3 blanks, in A1:A61.
const { heading, cells } = readCases("cutoff.json").columns[0]!;
const rows: Cell[][] = [[heading], ...cells.map((cell) => [cell === "" ? null : cell])];
const column = readColumn({ address: "Ropes!A1:A61", values: rows }, 0)!;
const call = (name: string, given: Parameters<typeof callFunction>[1]) => callFunction(name, given);
const answer = answerCutoff(call, column, FIRST_QUESTION);
const book = () => fakePort({ Ropes: rows.map((row) => [...row]) }, "Ropes!A1:A61");

describe("the cutoff of a column", () => {
  test("is what the cells show, and is spoken on the grid of the scores", () => {
    // 81.95271223532491, 79.40321059787613, 85.39704975350084, 84.78644216025558, 82.26082345129394: test/reference/cases/cutoff.json.
    expect(answer.report!.cutoff).toBeCloseTo(81.95271223532491, 9);
    expect(answer.report!.lower).toBeCloseTo(79.40321059787613, 9);
    expect(answer.report!.upper).toBeCloseTo(85.39704975350084, 9);
    expect(answer.report!.safe).toBeCloseTo(84.78644216025558, 9);
    expect(answer.report!.next).toBeCloseTo(82.26082345129394, 9);
    expect(answer.report!.spoken).toEqual({ mark: 82, decimals: 1 });
  });

  test("a refusal is the cell's own", () => {
    const refused = answerCutoff(call, column, { ...FIRST_QUESTION, shape: "logit(0,80)" });
    expect(refused.report).toBeUndefined();
    expect(refused.refusal).toMatchObject({ error: "#VALUE!", name: "CUTOFF_REPORT" });
    expect(refused.refusal!.message).toContain("scores");
  });
});

describe("verdicts", () => {
  test("are one formula, its defaults left out", () => {
    expect(verdictFormula("Ropes!A2:A61", { ...FIRST_QUESTION, better: "low" })).toBe(
      '=WEIR.CUTOFF_VERDICT(Ropes!A2:A61,WEIR.CUTOFF_LIMITS(Ropes!A2:A61,0.05,,,"low","lower limit"),WEIR.CUTOFF_LIMITS(Ropes!A2:A61,0.05,,,"low","upper limit"),"low")',
    );
  });

  test("are counted as a look at the scores counts them", () => {
    const scores = [...column.values];
    const { lower, upper } = answer.report!;
    expect(verdictCounts({ call }, answer)).toEqual({
      clears: scores.filter((score) => score >= upper).length,
      close: scores.filter((score) => score >= lower && score < upper).length,
      short: scores.filter((score) => score < lower).length,
    });
  });

  test("go into the nearest column that is empty in every row, the row of the headings too", async () => {
    const port = book();
    await port.write("Ropes!B40", [["taken"]]);
    await port.write("Ropes!C1", [["taken"]]);
    expect(await freeColumn(port, column.address)).toEqual({ first: "Ropes!D2", heading: "Ropes!D1", shown: "D2:D61" });
  });
});

describe("a fixed mark", () => {
  const mark = markToday(answer, "safe", "Agreed by the panel", "2025-03-14", 1)!;

  test("is the chosen cutoff on the grid of the scores", () => {
    expect(mark).toMatchObject({ mark: 84.8, kind: "safe", count: 57, scores: "Ropes!A2:A61", confidence: 0.95 });
  });

  test("off the grid is the cutoff with all its digits, then and today", () => {
    const exact = markToday(answer, "safe", "Agreed by the panel", "2025-03-14", 1, false)!;
    expect(exact.mark).toBeCloseTo(84.78644216025558, 9);
    expect(exact.mark).toBe(exact.cutoff);
    expect(driftOf(call, column, exact)).toEqual({ today: exact.mark, count: 57 });
  });

  test("knows how many entries score just that", () => {
    expect(tiesAt({ values: Float64Array.of(70, 71.5, 71.5, 72) }, 71.5)).toBe(2);
    expect(tiesAt({ values: Float64Array.of(70, 71.5) }, 71)).toBe(0);
  });

  test("goes on a sheet of its own, below its forerunners, and is found again", async () => {
    const port = book();
    expect(await writeMark(port, mark)).toBe("'Fixed marks'!A2");
    expect(await writeMark(port, { ...mark, mark: 85 })).toBe("'Fixed marks'!A3");
    expect((await marksOf(port, column)).map((one) => one.mark)).toEqual([84.8, 85]);
  });

  test("marks of another column are not shown, and a sheet of that name with other contents is left alone", async () => {
    const port = fakePort({ Ropes: rows, "Fixed marks": [["my own list"], [1]] }, "Ropes!A1:A61");
    expect(await writeMark(port, { ...mark, scores: "Ropes!C2:C61" })).toBe("'Fixed marks 2'!A2");
    expect(await marksOf(port, column)).toEqual([]);
    expect((await port.read("'Fixed marks'!A1:A2")).values).toEqual([["my own list"], [1]]);
  });

  test("tells where the scores of today would set it, asked as it was asked then", () => {
    expect(driftOf(call, column, mark)).toEqual({ today: 84.8, count: 57 });
    const fewer = readColumn({ address: "Ropes!A1:A31", values: rows.slice(0, 31) }, 0)!;
    const moved = driftOf(call, fewer, mark);
    const expected = callFunction("SAFE_CUTOFF", [fewer.cells, 0.05, 0.95]) as { value: number };
    expect(moved.today).toBe(Math.ceil(expected.value * 10) / 10);
  });
});

describe("pass rates of groups", () => {
  test("are read beside the scores, entries without a score left out", () => {
    expect(groupsAddress("Ropes!B5", column.address)).toBe("Ropes!B2:B61");
    expect(groupsAddress("Ropes!B1:C61", column.address)).toBeUndefined();
    const groups = column.cells.map((_, index) => [index % 2 === 0 ? "even" : "odd"]);
    const outcome = askPassRates(call, answer, groups) as { value: Cell[][] };
    const rates = groupRates(outcome.value);
    expect(rates.map(({ name }) => name)).toEqual(["even", "odd"]);
    expect(rates.reduce((sum, { assessed }) => sum + assessed, 0)).toBe(57);
    expect(rates.reduce((sum, { passed }) => sum + passed, 0)).toBe(answer.report!.passing);
  });

  test("as a formula hold the scores against the mark on their grid", () => {
    expect(passRatesFormula(answer, "Ropes!B2:B61")).toBe(
      '=WEIR.GROUP_PASS_RATES(IF(ISNUMBER(Ropes!A2:A61),Ropes!B2:B61,""),IF(ISNUMBER(Ropes!A2:A61),Ropes!A2:A61>=82,""))',
    );
  });
});

describe("the cell that a formula goes into", () => {
  const report = { rows: 14, columns: 2 };
  test.each([
    ["", { kind: "missing" }],
    ["somewhere", { kind: "bad" }],
    ["B2:B3", { kind: "bad" }],
    ["A7", { kind: "inside" }],
    ["Round2!B2", { kind: "no-sheet", sheet: "Round2" }],
    ["B1048570", { kind: "edge" }],
    ["XFD1", { kind: "edge" }],
    ["C2", { kind: "free", address: "Ropes!C2" }],
    ["E9", { kind: "taken", address: "Ropes!E9", holds: "mine" }],
    ["D3", { kind: "no-room", area: "D3:E16", first: "E9", holds: "mine" }],
  ])("%j is %o", async (typed, expected) => {
    const port = book();
    await port.write("Ropes!E9", [["mine"]]);
    const found = await checkTarget(
      port,
      typed,
      typed === "C2" || typed === "E9" ? { rows: 1, columns: 1 } : report,
      column.address,
    );
    expect(found).toEqual(expected);
  });
});
