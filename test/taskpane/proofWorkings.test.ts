import { describe, expect, test } from "vitest";
import type { Cell } from "../../src/sheet/cell";
import { numbersFor } from "../../src/taskpane/numbers";
import { liveAnswers } from "../../src/taskpane/proof/liveAnswers";
import { workingsCells } from "../../src/taskpane/proof/workingsCells";
import { workingsOf } from "../../src/taskpane/proof/workingsOf";
import { writeWorkings } from "../../src/taskpane/proof/writeWorkings";
import { freeBlock } from "../../src/taskpane/target/freeBlock";
import { en } from "../../src/taskpane/texts/en";
import { readCases } from "../support/cases";
import { fakePort, type FakePort } from "./fakePort";

// "rope score" of the public cases in A1:A61; 81.95271223532491: test/reference/cases/cutoff.json.
const { heading, cells } = readCases("cutoff.json").columns[0]!;
const MARK = "WEIR.TOP_FRACTION_CUTOFF(A2:A61,5%)";

function ropes(formula: string, value: Cell = 81.95271223532491): FakePort {
  const sheet: Cell[][] = [[heading], ...cells.map((cell) => [cell === "" ? null : cell])];
  sheet[1]![2] = value;
  const port = fakePort({ Ropes: sheet, Other: [[5]] }, "Ropes!C2");
  port.formulas.set("Ropes!C2", formula);
  return port;
}

async function worked(formula: string, address = "Ropes!C2") {
  return workingsOf(await ropes(formula).workbook(), address);
}

const contextOf = (port: FakePort) =>
  ({ port, texts: en, numbers: numbersFor(port.separators(), "") }) as unknown as Parameters<typeof writeWorkings>[0];

describe("the workings of a cell", () => {
  test("end with its value, on the cells of the call itself", async () => {
    const cell = (await worked(MARK))!;
    expect(cell.address).toBe("Ropes!C2");
    expect(cell.calls.map(({ text }) => text)).toEqual([MARK]);
    const { steps } = cell.calls[0]!;
    expect(steps[steps.length - 1]!.value).toBeCloseTo(81.95271223532491, 10);
    expect(
      steps.map(({ formula }) => formula).filter((formula) => formula !== "" && !formula.includes("A2:A61")),
    ).toEqual(["=-NORM.S.INV(5%)"]);
  });

  test("of several calls the whole one comes first, each of the others can be chosen", async () => {
    const cell = (await worked(`WEIR.CLEARANCE_CONFIDENCE(${MARK},A2:A61,5%)-1`))!;
    expect(cell.calls.map(({ text }) => text)).toEqual([`WEIR.CLEARANCE_CONFIDENCE(${MARK},A2:A61,5%)`, MARK]);
  });

  test("a cell that a result fills leads to the one that holds the formula", async () => {
    const book = await ropes("").workbook();
    const area = { top: 1, left: 2, bottom: 15, right: 3 };
    book.sheets[0]!.addFormula({
      row: 1,
      column: 2,
      formula: "WEIR.CUTOFF_REPORT(A2:A61,5%)",
      array: area,
      dynamic: true,
      calculated: true,
    });
    const cell = workingsOf(book, "Ropes!D9")!;
    expect(cell.address).toBe("Ropes!C2");
    expect(cell.touches).toContainEqual({ sheet: "Ropes", ...area });
    expect(workingsOf(book, "Ropes!E9")).toBeUndefined();
  });

  test("what is refused shows the refusal and no steps", async () => {
    const [call] = (await worked("WEIR.TOP_FRACTION_CUTOFF(A2:A61,5)"))!.calls;
    expect(call!.steps).toEqual([]);
    expect(call!.refusal).toContain("#VALUE!");
    expect(call!.refusal).toContain("fraction");
  });

  test("a name that LET gives stands for its cells, since it means nothing elsewhere", async () => {
    const [call] = (await worked("LET(x,A2:A61,WEIR.TOP_FRACTION_CUTOFF(x,5%))"))!.calls;
    const formulas = call!.steps.map(({ formula }) => formula).join();
    expect(formulas).toContain("AVERAGE(A2:A61)");
    expect(formulas).not.toMatch(/\bx\b/);
  });

  test("there are none where no function of ours is called", async () => {
    expect(await worked("SUM(A2:A61)")).toBeUndefined();
    expect(await worked(MARK, "Ropes!A2")).toBeUndefined();
    expect(await worked(MARK, "Gone!A2")).toBeUndefined();
  });
});

describe("workings as cells", () => {
  const step = (value: Cell, formula: string) => ({ meaning: "=label", value, formula, source: "=a source" });

  test("formulas stay live; a text that begins with the sign of equality never becomes one", () => {
    expect(workingsCells("Workings of it", ["a", "b", "c", "d", "e"], [step('=1+"2"', "=1+2"), step(3, "")])).toEqual([
      ["Workings of it", null, null, null, null],
      ["a", "b", "c", "d", "e"],
      [1, '="=label"', '="=1+""2"""', "=1+2", '="=a source"'],
      [2, '="=label"', 3, null, '="=a source"'],
    ]);
  });

  test("what the formulas come to is held against the steps", () => {
    const steps = [step(1, "=1"), step(2, "=2"), step(3, "=NOVEL()"), step(4, "")];
    const area = { top: 4, left: 3, bottom: 7, right: 3 };
    expect(liveAnswers(steps, [1 + 1e-12, 2.1, { code: "#NAME?" }, null], area)).toEqual({
      formulas: 3,
      off: ["D6"],
      lacking: ["D7"],
    });
    // A residual that should be 0 is rounding; an error that the step itself has is none of the sheet's.
    const residual = [step(0, "=A1-A2"), step({ code: "#N/A" }, "=NA()"), step(4, "=REFUSED()")];
    expect(liveAnswers(residual, [2e-11, { code: "#N/A" }, { code: "#REF!" }], area)).toEqual({
      formulas: 3,
      off: [],
      lacking: ["D7"],
    });
  });
});

describe("free cells beside a cell", () => {
  const beside = (port: FakePort, apart: Parameters<typeof freeBlock>[4] = []) =>
    freeBlock(port, { sheet: "Ropes", top: 1, left: 2, bottom: 1, right: 2 }, 3, 2, apart);

  test("leave one column empty before them, and step over what is taken", async () => {
    const port = ropes(MARK);
    expect(await beside(port)).toEqual({ sheet: "Ropes", top: 1, left: 4, bottom: 3, right: 5 });
    await port.write("Ropes!F4", [["mine"]]);
    expect(await beside(port)).toEqual({ sheet: "Ropes", top: 1, left: 7, bottom: 3, right: 8 });
  });

  test("touch no range that the formula reads, even where it is empty", async () => {
    const read = { sheet: "Ropes", top: 0, left: 4, bottom: 1_048_575, right: 6 };
    expect(await beside(ropes(MARK), [read])).toEqual({ sheet: "Ropes", top: 1, left: 8, bottom: 3, right: 9 });
  });

  test("there are none at the edge of the sheet", async () => {
    const corner = { sheet: "Other", top: 1_048_575, left: 0, bottom: 1_048_575, right: 0 };
    expect(await freeBlock(ropes(MARK), corner, 2, 2, [])).toBeUndefined();
    const edge = { sheet: "Other", top: 0, left: 16_381, bottom: 0, right: 16_381 };
    expect(await freeBlock(ropes(MARK), edge, 2, 2, [])).toBeUndefined();
  });
});

describe("writing the workings beside a cell", () => {
  test("is one step into free cells, and says what came out there", async () => {
    const port = ropes(MARK);
    const cell = (await worked(MARK))!;
    const said = await writeWorkings(contextOf(port), cell, cell.calls[0]!);
    expect(port.writes).toHaveLength(1);
    const { address, cells: written } = port.writes[0]!;
    expect(address).toBe(`Ropes!E2:I${cell.calls[0]!.steps.length + 3}`);
    expect(written[0]![0]).toBe(`Workings of ${MARK}, Ropes!C2`);
    expect(written.slice(2).map(([number]) => number)).toEqual(cell.calls[0]!.steps.map((_, index) => index + 1));
    // The workbook in memory computes nothing: the texts of the formulas are no values of the steps, and that is said.
    expect(said).toContain("The workings stand in E2:I");
    expect(said).toContain("another value than the step's comes out in H4");
  });

  test("goes to the cell that was typed, on the sheet of the call where none is named", async () => {
    const port = ropes(MARK);
    const cell = (await worked(MARK))!;
    const last = 10 + cell.calls[0]!.steps.length + 1;
    await writeWorkings(contextOf(port), cell, cell.calls[0]!, " k10 ");
    await writeWorkings(contextOf(port), cell, cell.calls[0]!, "Ropes!Q10");
    expect(port.writes.map(({ address }) => address)).toEqual([`Ropes!K10:O${last}`, `Ropes!Q10:U${last}`]);
  });

  test.each([
    ["somewhere", en.targetBad("somewhere")],
    ["Gone!B2", en.targetNoSheet("Gone")],
    ["XFD1", en.targetEdge],
    ["C2", en.workingsInside],
    ["A70", en.workingsInside],
    ["E9", en.workingsTaken("Ropes!E9", "“mine”")],
    ["E8", en.workingsTaken("E9", "“mine”")],
    ["Other!D5", en.workingsOtherSheet("C2", "Ropes")],
  ])("typed %j it says why not, and nothing is written", async (typed, refusal) => {
    const port = ropes(MARK);
    await port.write("Ropes!E9", [["mine"]]);
    const cell = (await worked("WEIR.TOP_FRACTION_CUTOFF(A2:A200,5%)"))!;
    expect(await writeWorkings(contextOf(port), cell, cell.calls[0]!, typed)).toBe(refusal);
    expect(port.writes).toHaveLength(1);
  });

  test("without room nothing is written", async () => {
    const port = ropes(MARK);
    const cell = (await worked(MARK))!;
    await port.write("Ropes!D3", [Array.from({ length: 120 }, () => 1)]);
    const said = await writeWorkings(contextOf(port), cell, cell.calls[0]!);
    expect(said).toBe(en.workingsNoRoom("Ropes!C2"));
    expect(port.writes).toHaveLength(1);
  });
});
