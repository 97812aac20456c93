import { describe, expect, test } from "vitest";
import { auditWorkbook } from "../../src/audit/auditWorkbook";
import { readXlsx } from "../../src/hosts/file/readXlsx";
import { foreignBook, type ForeignBook } from "../support/foreignBooks";

/*
 * Workbooks made by other programs (test/reference/workbooks/README.md). The values in them were computed by SciPy 1.17.1, so that a verdict
 * of “agrees” holds this program against another.
 */
async function audited(name: ForeignBook) {
  const { judgements, notices, counts, fileRevision } = await auditWorkbook(readXlsx(foreignBook(name)), {
    tolerance: 1e-9,
  });
  const at = (address: string, sheet?: string) =>
    judgements.find((one) => one.address === address && (sheet === undefined || one.sheet.name === sheet))!;
  return { judgements, notices, counts, fileRevision, at };
}

describe.each(["openpyxl", "libreOffice"] as const)("a workbook saved by %s", (name) => {
  test("agrees but for the two values that were made wrong", async () => {
    const { counts, judgements } = await audited(name);
    expect(counts).toEqual({ agrees: 17, differs: 2, "not checkable": 0 });
    expect(judgements.filter(({ verdict }) => verdict === "differs").map(({ address }) => address)).toEqual([
      "B11",
      "B12",
    ]);
  });

  test("blanks counted as 0 are told from a value that was changed", async () => {
    const { at } = await audited(name);
    expect(at("B11").why).toContain("blank cells are taken as 0 (1 blank cell in Offers!B2:B41)");
    expect(at("B12").why).toContain("changed by hand");
  });

  test("names of the book and of a sheet, a table, another sheet, a date of the 1904 system lead to their cells", async () => {
    const { at } = await audited(name);
    expect(["B4", "B5", "B6", "B7", "B9", "B10"].map((address) => at(address).formula)).toEqual([
      "=WEIR.TOP_FRACTION_CUTOFF(Offers!$B$2:$B$41,B1)",
      "=WEIR.SAFE_CUTOFF(marks,share,sure)",
      "=ROUND(WEIR.NEXT_SCORE_CUTOFF(marks,share),1)",
      '=IF(WEIR.HIT_CHANCE(share,59)>0.95,"enough","too few")',
      '=WEIR.TOP_FRACTION_CUTOFF(Bids[price],10%,,"low")',
      "=WEIR.HIT_CHANCE(share,YEAR(Offers!C2)-1967)",
    ]);
  });

  test("rows under its filter and the two fractions are noticed", async () => {
    const { notices } = await audited(name);
    expect(notices.map(({ kind, address }) => `${address} ${kind}`)).toEqual([
      "B4 hidden rows",
      "B11 asked in two ways",
    ]);
    expect(notices[0]!.why).toMatch(/^2 rows of Offers!B2:B41 with numbers are hidden by a filter/);
  });
});

test("formulas that openpyxl wrote and no host calculated are not checkable, and what to do is said", async () => {
  const { counts, judgements } = await audited("openpyxlUncalculated");
  expect(counts).toEqual({ agrees: 0, differs: 0, "not checkable": 19 });
  for (const { why } of judgements) expect(why).toMatch(/never calculated\. Open the file where the add-in is loaded/);
});

test("what LibreOffice worked out without knowing the functions holds #NAME?, which is no value to judge", async () => {
  const { counts, at } = await audited("libreOfficeUnknown");
  // B7 is a text, which LibreOffice left as it was.
  expect(counts).toEqual({ agrees: 1, differs: 0, "not checkable": 18 });
  expect(at("B7").verdict).toBe("agrees");
  expect(at("B4").why).toContain("saved by a program that didn't have the add-in at hand");
});

describe("a workbook by XlsxWriter", () => {
  test("spilled tables, a spilled column, FILTER, LET, # and a cell that takes one of a range agree", async () => {
    const { counts, at } = await audited("xlsxWriter");
    expect(counts).toEqual({ agrees: 6, differs: 1, "not checkable": 1 });
    expect(["E2", "H2", "J2", "J3", "J4", "J6"].map((address) => at(address).verdict)).toEqual(
      Array.from({ length: 6 }, () => "agrees"),
    );
    expect(at("J3").formula).toBe("=WEIR.TAIL_FRACTION(INDEX(E2#,2,2),65,8)");
  });

  test("its older revision is named where a value differs, by what its RELEASE table says", async () => {
    const { fileRevision, at } = await audited("xlsxWriter");
    expect(fileRevision).toBe(0);
    expect(at("J5").why).toContain("computed by revision 0 of the numbers");
    expect(at("E6")).toMatchObject({ verdict: "not checkable", why: expect.stringContaining("revision 0") });
  });
});

describe("XML by hand, as Excel writes it", () => {
  test("shared formulas, runs and reading aids, a link before the name, SINGLE and arrays: one wrong value is found", async () => {
    const { counts, judgements, at } = await audited("byHand");
    expect(counts).toEqual({ agrees: 11, differs: 1, "not checkable": 0 });
    expect(judgements.find(({ verdict }) => verdict === "differs")).toMatchObject({
      address: "D8",
      formula: "=WEIR.TAIL_FRACTION($B8,65,8)",
    });
    expect(at("J4").formula).toBe("=WEIR.NEXT_SCORE_CUTOFF(INDEX($B$2:$B$11,SEQUENCE(@10)),0.1)");
  });

  test("texts come without their reading aids, with their spaces", () => {
    const [sheet] = readXlsx(foreignBook("byHand")).sheets;
    expect([0, 1, 2].map((row) => sheet!.cell(row, 0))).toEqual(["bookcase ", " oak ", "two\nlines"]);
  });
});

describe("the strict form, with prefixes, cells without a place, texts in place, dates as dates", () => {
  test("the date taken in the wrong system is the one value that differs; a formula in CDATA is judged", async () => {
    const { counts, at } = await audited("byHandStrict");
    expect(counts).toEqual({ agrees: 3, differs: 1, "not checkable": 0 });
    expect(at("D5")).toMatchObject({ verdict: "differs", formula: "=WEIR.TAIL_FRACTION(DAY(C5)+60,65,8)" });
    expect(at("D3").formula).toBe("=IF(B3<60,1,WEIR.TAIL_FRACTION(B3,65,8))");
  });

  test("a text in place comes without its reading aid; a date counts from 1904", () => {
    const [sheet] = readXlsx(foreignBook("byHandStrict")).sheets;
    // By hand: 2026-01-05 is day 46027 from 1900, and 1462 fewer from 1904.
    expect([sheet!.cell(0, 0), sheet!.cell(1, 2)]).toEqual(["bookcase", 44_565]);
  });
});
