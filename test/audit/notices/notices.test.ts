import { describe, expect, test } from "vitest";
import { FIXED_MARK_HEADINGS, fixedMarkRow, type FixedMark } from "../../../src/sheet/fixedMark";
import type { Notice } from "../../../src/audit/judgement";
import { auditWorkbook } from "../../../src/audit/auditWorkbook";
import { readXlsx } from "../../../src/hosts/file/readXlsx";
import type { Cell } from "../../../src/sheet/cell";
import { auditOf, column, CUTOFF, direct, SCORES, scoreCells, sheetRows, type CellXml } from "../../support/auditBook";
import { xlsxFile } from "../../support/xlsxFile";

type Cells = Record<string, Cell | CellXml>;
const call = (range: string, rest = "0.1") => ({ f: `_xldudf_WEIR_TOP_FRACTION_CUTOFF(${range},${rest})`, v: CUTOFF });
const SHARE = (score: number) => direct("TAIL_FRACTION", [score, 65, 8]) as number;

async function kinds(cells: Cells, book = {}): Promise<string[]> {
  return (await auditOf(cells, book)).notices.map(({ kind, address }) => `${address} ${kind}`);
}
async function only(cells: Cells, kind: string, book = {}): Promise<Notice> {
  const found = (await auditOf(cells, book)).notices.filter((one) => one.kind === kind);
  expect(found).toHaveLength(1);
  return found[0]!;
}

describe("a sheet in order gives no notice", () => {
  test("a whole column of scores under its heading, a total below it left out, a mark below that", async () => {
    expect(
      await kinds({ ...scoreCells(), A14: "Total", B14: { f: "SUM(B2:B13)", v: 775.5 }, B16: call("B2:B13") }),
    ).toEqual([]);
  });
  test("the call stands right below its range", async () => {
    expect(await kinds({ ...scoreCells(), B14: call("B2:B13") })).toEqual([]);
  });
  test("a column of calls, each on its own row, with a total below", async () => {
    const rows = Object.fromEntries(
      [2, 3, 4, 5].map((row, i) => [
        `C${row}`,
        { f: `_xldudf_WEIR_TAIL_FRACTION(B${row},65,8)`, v: SHARE([62.5, 71, 58, 80.5][i]!) },
      ]),
    );
    expect(await kinds({ ...scoreCells(), ...rows, C14: 12.5 })).toEqual([]);
  });
});

describe("a number typed over a call", () => {
  const calls = (skip: number): Cells =>
    Object.fromEntries(
      [62.5, 71, 58, 80.5, 66].map((score, i) => [
        `C${i + 2}`,
        i + 2 === skip ? 0.42 : { f: `_xldudf_WEIR_TAIL_FRACTION(B${i + 2},65,8)`, v: SHARE(score) },
      ]),
    );
  test.each([3, 4])("in row %d, between its neighbours, with what the formula would give", async (row) => {
    const notice = await only({ ...scoreCells(), ...calls(row) }, "typed over");
    expect(notice).toMatchObject({
      address: `C${row}`,
      stored: 0.42,
      recomputed: SHARE([62.5, 71, 58, 80.5][row - 2]!),
    });
    expect(notice.why).toMatch(/0\.42 is typed in .* would give/);
  });
  test.each([2, 6])("in row %d, at the end of a run of at least three", async (row) => {
    expect(await only({ ...scoreCells(), ...calls(row) }, "typed over")).toMatchObject({ address: `C${row}` });
  });
  test("across a row too", async () => {
    const cells: Cells = { A1: 62.5, B1: 71, C1: 58 };
    for (const [letter, score] of [
      ["A", 62.5],
      ["C", 58],
    ] as const)
      cells[`${letter}2`] = { f: `_xldudf_WEIR_TAIL_FRACTION(${letter}1,65,8)`, v: SHARE(score) };
    expect(await only({ ...cells, B2: 0.3 }, "typed over")).toMatchObject({ address: "B2" });
  });
  test("a number between two different calls is none", async () => {
    const cells = {
      ...scoreCells(),
      C2: call("B2:B13"),
      C3: 5,
      C4: { f: "_xldudf_WEIR_TAIL_FRACTION(B2,65,8)", v: SHARE(62.5) },
    };
    expect(await kinds(cells)).toEqual([]);
  });
});

describe("a range that leaves data out", () => {
  test("stops short of rows below", async () => {
    expect((await only({ ...scoreCells(), D2: call("B2:B10") }, "leaves data out")).why).toMatch(
      /ends at row 10, but 3 rows of numbers stand below it, to row 13/,
    );
  });
  test("stops short where an entry has no score yet and others follow, but not at the next thing on the sheet", async () => {
    const names = Object.fromEntries(SCORES.map((_, i) => [`A${i + 2}`, `flat ${i + 1}`]));
    expect((await only({ ...scoreCells(), ...names, D2: call("B2:B6") }, "leaves data out")).why).toMatch(
      /ends at row 6, but 6 rows of numbers stand below it, to row 13/,
    );
    const below: Cells = { ...scoreCells(), ...names, A15: "rooms", B16: 4, D2: call("B2:B13") };
    expect(await kinds(below)).toEqual([]);
  });
  test("takes the column in pieces and passes over rows between them", async () => {
    const pieces = { f: "_xldudf_WEIR_TOP_FRACTION_CUTOFF(_xlfn.VSTACK(B2:B5,$B$9:$B$13),0.1)", v: CUTOFF };
    expect((await only({ ...scoreCells(), D2: pieces }, "skips rows")).why).toBe(
      "Between Flats!B2:B5 and Flats!B9:B13 2 rows of numbers are passed over: left out, on purpose or by mistake. Take them into the range if they are scores too.",
    );
    const whole = { f: "_xldudf_WEIR_TOP_FRACTION_CUTOFF(_xlfn.VSTACK(B2:B6,B7:B13),0.1)", v: CUTOFF };
    expect(await kinds({ ...scoreCells(), D2: whole })).toEqual([]);
  });
  test("begins below the first", async () => {
    expect((await only({ ...scoreCells(), D2: call("B4:B13") }, "leaves data out")).why).toMatch(
      /begins at row 4, but 2 rows of numbers stand above it, from row 2/,
    );
  });
  test("is told once where many cells take it", async () => {
    const cells = Object.fromEntries([2, 3, 4].map((row) => [`D${row}`, call("B$2:B$10")]));
    expect((await only({ ...scoreCells(), ...cells }, "leaves data out")).why).toContain(
      "2 more cells take the same range",
    );
  });
  test("two ranges of one call a row apart", async () => {
    const cells: Cells = { ...scoreCells() };
    for (let row = 2; row <= 14; row++) cells[`C${row}`] = row % 2 === 0;
    const groups = { f: "_xldudf_WEIR_SCORE_VALIDITY(B2:B13,C3:C14)", v: 1 };
    expect((await only({ ...cells, D2: groups }, "ranges out of line")).why).toMatch(/1 row apart/);
  });
});

describe("a range that takes in a total", () => {
  test("by its formula", async () => {
    expect(
      (await only({ ...scoreCells(), B14: { f: "AVERAGE(B2:B13)", v: 70.5 }, D2: call("B2:B14") }, "takes in a total"))
        .why,
    ).toMatch(/takes in B14 \(70\.5\)/);
  });
  test("by the word beside it", async () => {
    expect(await kinds({ ...scoreCells(), A14: "Total:", B14: 70, D2: call("B2:B14") })).toEqual([
      "D2 takes in a total",
    ]);
  });
  test("by its value, pasted without a formula", async () => {
    const sum = SCORES.reduce<number>((total, score) => total + (score ?? 0), 0);
    expect(await kinds({ ...scoreCells(), B14: sum, D2: call("B2:B14") })).toEqual(["D2 takes in a total"]);
  });
  test("a supplier whose name begins with the word is none", async () => {
    expect(await kinds({ ...scoreCells(), A13: "Total Rope Ltd", D2: call("B2:B13") })).toEqual([]);
  });
});

describe("rows that nobody sees", () => {
  const hidden = (behind: string) =>
    auditWorkbook(
      readXlsx(
        xlsxFile({
          sheets: [
            {
              name: "Flats",
              behind,
              rows: sheetRows({ ...scoreCells(), D2: call("B2:B13") })
                .replace('<row r="5">', '<row r="5" hidden="1">')
                .replace('<row r="7">', '<row r="7" hidden="1">'),
            },
          ],
        }),
      ),
      { tolerance: 1e-9 },
    );
  test("hidden rows with numbers are counted, those without are not", async () => {
    expect((await hidden("")).notices).toMatchObject([
      { kind: "hidden rows", why: expect.stringMatching(/^1 row of Flats!B2:B13 with numbers is hidden:/) },
    ]);
  });
  test("a filter is named", async () => {
    expect((await hidden('<autoFilter ref="A1:B13"/>')).notices[0]!.why).toContain("hidden by a filter");
  });
});

describe("one column asked in two ways", () => {
  test("different fractions, with where each stands", async () => {
    const cells = {
      ...scoreCells(),
      D2: call("B2:B13"),
      D3: { ...call("B2:B13", "5%"), v: direct("TOP_FRACTION_CUTOFF", [column(SCORES), 0.05]) as number },
    };
    expect((await only(cells, "asked in two ways")).why).toMatch(
      /different values of fraction: 10% in Flats!D2, 5% in Flats!D3/,
    );
  });
  test("different shapes; a shape left out is the normal one", async () => {
    const cells = {
      ...scoreCells(),
      D2: call("B2:B13"),
      D3: call("B2:B13", '0.1," Normal "'),
      D4: call("B2:B13", '0.1,"lognormal"'),
    };
    expect((await only(cells, "asked in two ways")).why).toMatch(/shape: normal in Flats!D2, lognormal in Flats!D4/);
  });
});

describe("a fixed mark", () => {
  const mark = (changes: Partial<FixedMark> = {}): FixedMark => ({
    mark: 84,
    better: "high",
    date: "2025-03-14",
    reason: "before the second round",
    count: 11,
    scores: "Flats!B2:B20",
    kind: "plain",
    fraction: 0.1,
    confidence: 0.95,
    shape: "normal",
    cutoff: CUTOFF,
    lower: 70,
    upper: 90,
    revision: 1,
    ...changes,
  });
  const book = (one: FixedMark) => {
    const cells: Cells = {};
    const put = (row: number, values: readonly Cell[]) =>
      values.forEach((value, i) => (cells[`${String.fromCharCode(65 + i)}${row}`] = value));
    put(1, FIXED_MARK_HEADINGS);
    put(2, fixedMarkRow(one));
    return { sheets: [{ name: "Fixed marks", rows: sheetRows(cells) }] };
  };
  const strict = Math.ceil(CUTOFF * 10) / 10;

  test("that follows from its scores gives no notice, also once more scores have come", async () => {
    expect(await kinds(scoreCells(), book(mark({ mark: strict })))).toEqual([]);
    expect(await kinds({ ...scoreCells(), B14: 20, B15: 99 }, book(mark({ mark: strict })))).toEqual([]);
  });
  test("tells the revision of the file where no cell calls RELEASE, and a value that differs is named as one of it", async () => {
    const differs = { f: "_xldudf_WEIR_TOP_FRACTION_CUTOFF(B2:B13,0.1)", v: 70 };
    const audit = await auditOf({ ...scoreCells(), D2: differs }, book(mark({ mark: strict, revision: 0 })));
    expect(audit.fileRevision).toBe(0);
    expect(audit.judgements[0]!.why).toContain("computed by revision 0 of the numbers");
  });
  test.each<[string, Partial<FixedMark>, Cells, RegExp]>([
    ["a score was changed", {}, { B3: 99 }, /give a plain cutoff of .* was written down/],
    ["a score was taken out", {}, { B3: null }, /rests on 11 scores, and Flats!B2:B20 holds 10/],
    ["the cutoff was changed", { cutoff: 80 }, {}, /and 80 was written down/],
    ["the mark was changed", { mark: 75 }, {}, /not the next score on its strict side/],
    ["its sheet is gone", { scores: "Gone!B2:B20" }, {}, /Gone!B2:B20\) are not in this file/],
    ["it was another promise", { kind: "safe" }, {}, /give a safe cutoff of/],
  ])("is named where %s", async (_, changes, cells, reason) => {
    const notice = await only(
      { ...scoreCells(), ...cells },
      "fixed mark moved",
      book(mark({ mark: strict, ...changes })),
    );
    expect(notice).toMatchObject({ sheet: "Fixed marks", address: "A2" });
    expect(notice.why).toMatch(reason);
  });
});
