import { CellValueType, BooleanNumber, LocaleType, VerticalAlign, WrapStrategy } from "@univerjs/core";
import { zipSync, strToU8 } from "fflate";
import { describe, expect, test } from "vitest";
import { readFile } from "../../src/trial/open/readFile";
import { summaryWords } from "../../src/trial/open/summaryWords";
import { de } from "../../src/trial/texts/de";
import { en } from "../../src/trial/texts/en";
import { writeXlsx } from "../../src/hosts/file/writeXlsx";
import { OPENED_BOOK } from "../support/openedBook";
import { xlsxFile } from "../support/xlsxFile";

const FUNCTIONS = ["SUM", "STDEV.S", "SEQUENCE"];
const text = (words: string) => new TextEncoder().encode(words);

describe("a workbook, laid out for the trial sheet", async () => {
  const { book, summary } = await readFile(OPENED_BOOK, "bids.xlsx", FUNCTIONS);
  const [bids, notes] = book.sheetOrder.map((id) => book.sheets[id]!);
  const cell = (row: number, column: number) => bids!.cellData![row]?.[column];

  test("has its values, each of its kind, and a text that begins with = stays a text", () => {
    expect(cell(1, 0)).toEqual({ v: "=no formula", t: CellValueType.STRING });
    expect(cell(1, 1)).toMatchObject({ v: 71.4, t: CellValueType.NUMBER });
    expect(cell(2, 0)).toEqual({ v: 1, t: CellValueType.BOOLEAN });
    expect(cell(3, 0)).toEqual({ v: "#N/A", t: CellValueType.STRING });
  });

  test("has ours by their names and the others without the prefixes of files", () => {
    expect(cell(1, 3)).toMatchObject({ f: "=WEIR.SAMPLES_FOR_SD_PRECISION(fraction)", v: 193 });
    expect(cell(2, 3)).toMatchObject({ f: "=STDEV.S(marks)" });
  });

  test("keeps spilled values out of the way of the formula that fills them", () => {
    expect(cell(5, 3)).toMatchObject({ f: "=SEQUENCE(2,2)" });
    expect([cell(5, 4), cell(6, 3), cell(6, 4)]).toEqual([undefined, undefined, undefined]);
  });

  test("writes a spilled range and a column of a table as plain ranges", () => {
    expect(cell(7, 3)).toMatchObject({ f: "=SUM($D$6:$E$7)" });
    expect(cell(4, 3)).toMatchObject({ f: "=SUM($B$2:$B$4)" });
    expect(summary.differences.pinned).toBe(2);
  });

  test("shows the value of the file where the sheet can't compute: a function it hasn't, another workbook", () => {
    expect(cell(4, 4)).toEqual({ v: 12, t: CellValueType.NUMBER });
    expect(cell(7, 4)).toMatchObject({ v: 0.25 });
    expect(cell(7, 4)).not.toHaveProperty("f");
    expect(summary.differences).toMatchObject({ frozen: 2, firstFrozen: "Bids!E5" });
  });

  test("has number formats, bold letters and wrapped texts", () => {
    const middle = { vt: VerticalAlign.MIDDLE };
    const style = (row: number, column: number) => book.styles[cell(row, column)!.s as string];
    expect(style(0, 0)).toEqual({ ...middle, bl: 1 });
    expect(style(1, 1)).toEqual({ ...middle, n: { pattern: '0.0" points"' } });
    expect(style(3, 3)).toEqual({ ...middle, n: { pattern: "yyyy-mm-dd" } });
    expect(style(7, 4)).toEqual({ ...middle, n: { pattern: "0.00%" }, tb: WrapStrategy.WRAP });
  });

  test("has the heights of the file, and makes room for large letters and wrapped texts where it names none", async () => {
    expect(bids!.rowData).toEqual({ 2: { h: 40 } });
    const wrapped = { value: "a long note ".repeat(10), role: "note" } as const;
    const file = writeXlsx({
      sheets: [{ name: "S", rows: [[{ value: "Title", role: "title" }], [wrapped], ["plain"]], widths: [20] }],
    });
    const { rowData } = (await readFile(file, "s.xlsx", [])).book.sheets["sheet-1"]!;
    expect(Object.keys(rowData!)).toEqual(["0", "1"]);
    expect(rowData![0]!.h).toBeGreaterThan(25);
    // 120 letters on a width of 20: some six lines.
    expect(rowData![1]!.h).toBeGreaterThan(5 * 13);
  });

  test("has its names, merged cells and hidden sheets", () => {
    const kept = Object.values(JSON.parse(book.resources![0]!.data) as Record<string, Record<string, string>>);
    expect(kept.map(({ name, formulaOrRefString, localSheetId }) => [name, formulaOrRefString, localSheetId])).toEqual([
      ["fraction", "=0.1", "AllDefaultWorkbook"],
      ["marks", "Bids!$B$2:$B$4", "AllDefaultWorkbook"],
      ["here", "Notes!$A$1", "sheet-2"],
    ]);
    expect(bids!.mergeData).toEqual([{ startRow: 9, startColumn: 0, endRow: 10, endColumn: 1 }]);
    expect([bids!.hidden, notes!.hidden]).toEqual([BooleanNumber.FALSE, BooleanNumber.TRUE]);
  });

  test("names the engine's language, kinds of values and alignment by the engine's own numbers", () => {
    expect([book.locale, (book.defaultStyle as { vt: number }).vt]).toEqual([LocaleType.EN_US, VerticalAlign.MIDDLE]);
  });

  test("says in both languages what is not shown", () => {
    expect(summaryWords(summary, en, "en")).toEqual([
      "Not shown here, and missing in a copy saved from here: 1 chart, 1 picture, conditional formats, and some colours and borders. The file itself stays as it is.",
      "2 formulas can’t be computed in this sheet (the first in Bids!E5): it shows the values that the file holds.",
      "2 formulas name a spilled range (A1#) or a part of a table: here they stand as plain ranges, which don’t grow.",
    ]);
    expect(summaryWords(summary, de, "de").join(" ")).toMatch(
      /1 Diagramm, 1 Bild, .*2 Formeln kann dieses Blatt nicht/,
    );
  });
});

test("dates counted from 1904 are brought to the count from 1900, other numbers stay", async () => {
  const file = xlsxFile({
    date1904: true,
    sheets: [{ name: "D", rows: `<row r="1"><c r="A1" t="d"><v>2024-01-15</v></c><c r="B1"><v>7</v></c></row>` }],
  });
  const { book } = await readFile(file, "d.xlsx", []);
  // Without a date format nobody can tell that a number is a date.
  expect(book.sheets["sheet-1"]!.cellData![0]![1]).toMatchObject({ v: 7 });
});

test("a list is laid out under a name that a sheet may have, wide enough for its first rows", async () => {
  const { book, summary } = await readFile(text("Entry;Score\nA;71,4\nB;65,5\n"), "a[1]*.csv", []);
  const sheet = book.sheets["sheet-1"]!;
  expect(sheet.name).toBe("a 1");
  expect(sheet.cellData![1]).toEqual({ 0: { v: "A", t: 1 }, 1: { v: 71.4, t: 2 } });
  expect(summary).toMatchObject({ sheets: 1, cells: 6, extras: [], differences: { frozen: 0, pinned: 0 } });
});

test("a file with one cell in each corner is no work", async () => {
  const rows = `<row r="1"><c r="A1"><v>1</v></c></row><row r="1048576"><c r="XFD1048576"><v>2</v></c></row>`;
  const start = performance.now();
  const { book } = await readFile(xlsxFile({ sheets: [{ name: "S", rows }] }), "corners.xlsx", []);
  expect(performance.now() - start).toBeLessThan(2000);
  expect(book.sheets["sheet-1"]).toMatchObject({ rowCount: 1_048_576, columnCount: 16_384 });
});

test("formulas that claim to fill the whole sheet by the hundred are refused", async () => {
  const cells = Array.from(
    { length: 300 },
    (_, row) =>
      `<row r="${row + 1}"><c r="A${row + 1}"><f t="array" ref="A1:CV1000">1</f><v>1</v></c><c r="CV1000"><v>1</v></c></row>`,
  );
  await expect(readFile(xlsxFile({ sheets: [{ name: "S", rows: cells.join("") }] }), "x.xlsx", [])).rejects.toThrow(
    /refused/,
  );
});

test.each([
  ["an empty file", new Uint8Array(), "e.csv", "The file is empty."],
  ["a list of nothing", text("\n\n"), "e.csv", "The file holds no cell with anything in it."],
  ["a picture", new Uint8Array([0x89, 0x50, 0x4e, 0x47, 0]), "e.png", "A file named .png can't be read"],
  ["a cut workbook", OPENED_BOOK.slice(0, 900), "e.xlsx", "The file is cut off or damaged"],
  ["another archive", zipSync({ "a.txt": strToU8("a") }), "e.xlsx", "no workbook"],
  ["an old workbook", new Uint8Array([0xd0, 0xcf, 0x11, 0xe0]), "e.xls", "old workbook"],
])("%s is refused in a sentence", async (_, bytes, name, sentence) => {
  await expect(readFile(bytes, name, [])).rejects.toThrow(expect.objectContaining({ name: "UnusableFile" }));
  await expect(readFile(bytes, name, [])).rejects.toThrow(sentence);
});

test("a file of a program that lists kinds of parts it doesn't use is no file with macros", async () => {
  const { write, utils } = await import("@e965/xlsx");
  const book = utils.book_new(utils.aoa_to_sheet([["score"], [71.4]]), "S");
  const { summary } = await readFile(new Uint8Array(write(book, { type: "array", bookType: "xlsx" })), "s.xlsx", []);
  expect(summary.cells).toBe(2);
});
