import { describe, expect, test } from "vitest";
import { auditWorkbook } from "../../src/audit/auditWorkbook";
import { readXlsx } from "../../src/hosts/file/readXlsx";
import type { Cell } from "../../src/sheet/cell";
import { auditOf, column, CUTOFF, direct, SCORES, scoreCells, sheetRows, type CellXml } from "../support/auditBook";
import { xlsxFile } from "../support/xlsxFile";

const LIMITS = direct("CUTOFF_LIMITS", [column(SCORES), 0.1]) as Cell[][];
const STORED = "_xldudf_WEIR_TOP_FRACTION_CUTOFF(B2:B13,0.1)";

async function judged(formula: string, stored: Cell, more: Readonly<Record<string, Cell | CellXml>> = {}, book = {}) {
  const { judgements } = await auditOf({ ...scoreCells(), D2: { f: formula, v: stored }, ...more }, book);
  return judgements.find(({ address }) => address === "D2")!;
}

describe("a call is judged on the stored values of its file", () => {
  test.each([
    STORED,
    "[2]!_xldudf_WEIR_TOP_FRACTION_CUTOFF(B2:B13,0.1)",
    "_xldudf_weir_top_fraction_cutoff(B2:B13,0.1)",
    "WEIR.TOP_FRACTION_CUTOFF(B2:B13,10%)",
    "weir_top_fraction_cutoff(Flats!$B$2:$B$13,0.1)",
    "_xldudf_WEIR_TOP_FRACTION_CUTOFF(marks,share)",
    "_xldudf_WEIR_TOP_FRACTION_CUTOFF(B:B,0.1)+0*IFERROR(1/0,1)",
  ])("%s agrees", async (formula) => {
    const names = `<definedName name="marks">Flats!$B$2:$B$13</definedName><definedName name="share">0.1</definedName>`;
    const whole = formula.includes("B:B");
    const judgement = await judged(formula, CUTOFF, whole ? { B1: null } : {}, { names });
    expect(judgement).toMatchObject({ verdict: "agrees", stored: CUTOFF, recomputed: CUTOFF });
    expect(judgement.formula).toMatch(/^=WEIR\.TOP_FRACTION_CUTOFF\(/);
    expect(judgement.why).toContain("from the stored inputs");
  });

  test("inside a larger formula the whole is judged", async () => {
    const formula = `IF(COUNT(B2:B13)>5,ROUND(${STORED},1),"too few")`;
    expect(await judged(formula, Math.round(CUTOFF * 10) / 10)).toMatchObject({ verdict: "agrees" });
    expect(await judged(formula, "too few")).toMatchObject({ verdict: "differs" });
  });

  test("a value within the tolerance agrees, one beyond it differs, and by how much is said", async () => {
    expect(await judged(STORED, CUTOFF * (1 + 1e-11))).toMatchObject({ verdict: "agrees" });
    const judgement = await judged(STORED, CUTOFF * 1.02);
    expect(judgement).toMatchObject({ verdict: "differs", recomputed: CUTOFF });
    expect(judgement.why).toMatch(/The file holds .*; the stored inputs give .*: it is 2% too high\./);
  });

  test("a rounded value is called one", async () => {
    expect((await judged(STORED, Number(CUTOFF.toFixed(2)))).why).toContain("rounded to 2 decimals");
  });

  test("an error that the call rightly gives agrees; one where a value comes out differs", async () => {
    expect(await judged("_xldudf_WEIR_TOP_FRACTION_CUTOFF(B2:B13,5)", { code: "#VALUE!" })).toMatchObject({
      verdict: "agrees",
    });
    expect(await judged(STORED, { code: "#VALUE!" })).toMatchObject({ verdict: "differs" });
  });

  test("an input on another sheet, and another call's stored value, are taken as they are stored", async () => {
    const sheets = [{ name: "Rules", rows: sheetRows({ A1: 0.1 }) }];
    expect(await judged("_xldudf_WEIR_TOP_FRACTION_CUTOFF(B2:B13,Rules!A1)", CUTOFF, {}, { sheets })).toMatchObject({
      verdict: "agrees",
    });
    const chained = await judged(
      "_xldudf_WEIR_TAIL_FRACTION(E1,50,8)",
      direct("TAIL_FRACTION", [66, 50, 8]) as number,
      { E1: { f: STORED, v: 66 } },
    );
    expect(chained).toMatchObject({ verdict: "agrees" });
  });

  test("a table of the sheet, its rows named by column", async () => {
    const tables = [
      `<table xmlns="x" id="1" name="F" displayName="Flat" ref="B1:B13"><tableColumns count="1"><tableColumn id="1" name="score"/></tableColumns></table>`,
    ];
    const rows = sheetRows({
      ...scoreCells(),
      D2: { f: "_xldudf_WEIR_TOP_FRACTION_CUTOFF(Flat[score],0.1)", v: CUTOFF },
    });
    const { judgements } = await auditWorkbook(readXlsx(xlsxFile({ sheets: [{ name: "Flats", rows, tables }] })), {
      tolerance: 1e-9,
    });
    expect(judgements).toMatchObject([{ verdict: "agrees" }]);
  });

  test("a shared formula is judged at each of its cells, and shown as it stands there", async () => {
    const { judgements } = await auditOf({
      ...scoreCells(),
      D2: {
        f: "_xldudf_WEIR_TAIL_FRACTION(B2,65,8)",
        v: direct("TAIL_FRACTION", [62.5, 65, 8]) as number,
        formulaAttributes: ' t="shared" ref="D2:D4" si="0"',
      },
      D3: { f: "", v: direct("TAIL_FRACTION", [71, 65, 8]) as number, formulaAttributes: ' t="shared" si="0"' },
      D4: { f: "", v: 0.5, formulaAttributes: ' t="shared" si="0"' },
    });
    expect(judgements.map(({ verdict, formula }) => [verdict, formula])).toEqual([
      ["agrees", "=WEIR.TAIL_FRACTION(B2,65,8)"],
      ["agrees", "=WEIR.TAIL_FRACTION(B3,65,8)"],
      ["differs", "=WEIR.TAIL_FRACTION(B4,65,8)"],
    ]);
  });

  test("dates of the 1904 system are counted as the file counts them", async () => {
    const formula = "_xldudf_WEIR_TAIL_FRACTION(YEAR(E1),2000,8)";
    const inputs = { E1: 39_448 };
    const in1904 = direct("TAIL_FRACTION", [2012, 2000, 8]) as number;
    expect(await judged(formula, in1904, inputs, { date1904: true })).toMatchObject({ verdict: "agrees" });
    expect(await judged(formula, in1904, inputs)).toMatchObject({ verdict: "differs" });
  });
});

describe("a spilled table is judged as one, at its first cell", () => {
  const spilled = (
    rows: Cell[][],
    formula = "_xldudf_WEIR_CUTOFF_LIMITS(B2:B13,0.1)",
  ): Record<string, Cell | CellXml> => ({
    ...scoreCells(),
    D2: { f: formula, v: rows[0]![0], attributes: ' cm="1"', formulaAttributes: ' t="array" ref="D2:E4"' },
    E2: rows[0]![1]!,
    D3: rows[1]![0]!,
    E3: rows[1]![1]!,
    D4: rows[2]![0]!,
    E4: rows[2]![1]!,
  });

  test("all cells as they come out: agrees, once", async () => {
    const { judgements } = await auditOf(spilled(LIMITS));
    expect(judgements).toMatchObject([{ address: "D2", verdict: "agrees", stored: LIMITS, recomputed: LIMITS }]);
  });

  test("one cell of it changed: differs, and the cell is named by its label", async () => {
    const changed = LIMITS.map((row) => [...row]);
    changed[2]![1] = 99;
    const { judgements } = await auditOf(spilled(changed));
    expect(judgements).toMatchObject([{ verdict: "differs" }]);
    expect(judgements[0]!.why).toMatch(/In row 3, column 2 of the table \(“upper limit”\) the file holds 99/);
  });

  test("a formula that takes the spilled range by # is judged on its stored cells", async () => {
    const cells = {
      ...spilled(LIMITS),
      G2: {
        f: "_xldudf_WEIR_TAIL_FRACTION(INDEX(_xlfn.ANCHORARRAY(D2),2,2),65,8)",
        v: direct("TAIL_FRACTION", [CUTOFF, 65, 8]) as number,
      },
    };
    expect((await auditOf(cells)).counts).toEqual({ agrees: 2, differs: 0, "not checkable": 0 });
  });

  test("in an old-style cell only the first cell shows, and is judged", async () => {
    expect(await judged("_xldudf_WEIR_CUTOFF_LIMITS(B2:B13,0.1)", "lower limit")).toMatchObject({ verdict: "agrees" });
  });
});

describe("what can't be checked says why", () => {
  test.each<[string, Cell | undefined, RegExp]>([
    [`${STORED}+NOW()*0`, CUTOFF, /NOW gives something else each time/],
    [`${STORED}+FROBNICATE(1)`, CUTOFF, /FROBNICATE is not known/],
    ["_xldudf_WEIR_TOP_FRACTION_CUTOFF([1]Sheet1!A1:A9,0.1)", CUTOFF, /another workbook/],
    ["_xldudf_WEIR_NEWER_THING(B2:B13)", 5, /no function WEIR\.NEWER_THING/],
    [STORED, undefined, /never calculated/],
    [STORED, { code: "#NAME?" }, /didn't have the add-in/],
    [STORED, { code: "#BUSY!" }, /still being worked out/],
    [`${STORED}+E9`, CUTOFF, /Flats!E9 holds a formula without a stored value/],
    [`_xldudf_WEIR_TOP_FRACTION_CUTOFF(loop,0.1)`, CUTOFF, /leads back to itself/],
    [`_xldudf_WEIR_TOP_FRACTION_CUTOFF(B2:B13,0.1`, CUTOFF, /can't be read \(a bracket is not closed\)/],
    [`${"IF(1,".repeat(1000)}${STORED}${")".repeat(1000)}`, CUTOFF, /nested more than 128 deep/],
  ])("%s", async (formula, stored, reason) => {
    const names = `<definedName name="loop">pool+1</definedName><definedName name="pool">loop+1</definedName>`;
    const judgement = await judged(formula, stored as Cell, { E9: { f: "B2*2" } }, { names });
    expect(judgement.verdict).toBe("not checkable");
    expect(judgement.why).toMatch(reason);
  });

  test("a text that names a function is no call", async () => {
    expect(
      (await auditOf({ ...scoreCells(), D2: { f: `"see WEIR.RELEASE() there"`, v: "see WEIR.RELEASE() there" } }))
        .judgements,
    ).toEqual([]);
  });
});

describe("a difference is explained where something explains it", () => {
  test("blanks that were taken as 0", async () => {
    const asZero = direct("TOP_FRACTION_CUTOFF", [column(SCORES), 0.1], "zero") as number;
    const judgement = await judged(STORED, asZero);
    expect(judgement.verdict).toBe("differs");
    expect(judgement.why).toMatch(/blank cells are taken as 0 \(1 blank cell in Flats!B2:B13\)/);
  });

  test("an older revision of the numbers, where the file tells it", async () => {
    const judgement = await judged(STORED, CUTOFF * 1.01, { G1: { f: '_xldudf_WEIR_RELEASE("revision")', v: 0 } });
    expect(judgement.why).toContain("computed by revision 0 of the numbers");
  });

  test("the cell that tells the revision is itself not checkable when it is an older one", async () => {
    const { judgements } = await auditOf({ G1: { f: '_xldudf_WEIR_RELEASE("revision")', v: 0 } });
    expect(judgements).toMatchObject([{ verdict: "not checkable", why: expect.stringContaining("revision 0") }]);
  });

  test("a whole column that came with its blanks", async () => {
    const { judgements } = await auditOf({
      ...scoreCells(),
      B1: null,
      D2: { f: '_xldudf_WEIR_SCORE_SUMMARY(B:B,"blanks skipped")', v: 1_048_576 - 11 },
    });
    expect(judgements).toMatchObject([{ verdict: "agrees", why: expect.stringContaining("with its blank cells") }]);
  });
});

describe("a second opinion by jStat, which shares no code with ours", () => {
  test.each<[string, number]>([
    [STORED, CUTOFF],
    ["_xldudf_WEIR_CURVE_CUTOFF(65,8,0.05)", direct("CURVE_CUTOFF", [65, 8, 0.05]) as number],
    ["_xldudf_WEIR_TAIL_FRACTION(70,65,8)", direct("TAIL_FRACTION", [70, 65, 8]) as number],
    ["_xldudf_WEIR_NEXT_SCORE_CUTOFF(B2:B13,0.1)", direct("NEXT_SCORE_CUTOFF", [column(SCORES), 0.1]) as number],
    ["_xldudf_WEIR_SAFE_CUTOFF(B2:B13,0.1)", direct("SAFE_CUTOFF", [column(SCORES), 0.1]) as number],
    ["_xldudf_WEIR_TOLERANCE_FACTOR(20,0.9)", direct("TOLERANCE_FACTOR", [20, 0.9]) as number],
    ["_xldudf_WEIR_HIT_CHANCE(0.05,59)", direct("HIT_CHANCE", [0.05, 59]) as number],
    ["_xldudf_WEIR_POOL_HIT_CHANCE(100,10,12)", direct("POOL_HIT_CHANCE", [100, 10, 12]) as number],
    ["_xldudf_WEIR_SEARCH_DURATION(0.05,12,0.9)", direct("SEARCH_DURATION", [0.05, 12, 0.9]) as number],
    ["_xldudf_WEIR_SD_PRECISION(60)", direct("SD_PRECISION", [60]) as number],
  ])("%s", async (formula, stored) => {
    expect((await judged(formula, stored)).why).toMatch(
      /Second opinion, by jStat: .*, the same as worked out here \(within /,
    );
  });

  test("is silent outside the range where jStat was measured", async () => {
    const far = direct("TAIL_FRACTION", [150, 65, 8]) as number;
    expect((await judged("_xldudf_WEIR_TAIL_FRACTION(150,65,8)", far)).why).not.toContain("jStat");
  });
});
