import { strFromU8, strToU8, unzipSync, zipSync } from "fflate";
import { expect, test } from "vitest";
import { openXlsx } from "../../src/hosts/file/readXlsx";
import { writeXlsx } from "../../src/hosts/file/writeXlsx";
import type { SavedBook } from "../../src/hosts/trial/savedBook";
import { readFile } from "../../src/trial/open/readFile";
import { bookToWrite } from "../../src/trial/save/bookToWrite";
import { OPENED_BOOK } from "../support/openedBook";

const FUNCTIONS = ["SUM", "STDEV.S", "SEQUENCE"];

/** The opened workbook as the engine holds it once its one spilling formula, in D6, is computed. */
async function saved(): Promise<SavedBook> {
  const { book } = await readFile(OPENED_BOOK, "bids.xlsx", FUNCTIONS);
  const number = (v: number) => ({ v, t: 2 });
  return {
    snapshot: book,
    spilled: { "sheet-1": { 5: { 3: number(1), 4: number(2) }, 6: { 3: number(3), 4: number(4) } } },
    ranges: { "sheet-1": { 5: { 3: { startRow: 5, startColumn: 3, endRow: 6, endColumn: 4 } } } },
    copied: {},
    names: [
      { name: "fraction", formula: "=0.1" },
      { name: "marks", formula: "Bids!$B$2:$B$4" },
      { name: "here", formula: "Notes!$A$1", sheetId: "sheet-2" },
    ],
    activeSheetId: "sheet-1",
  };
}

test("a workbook opened, saved and opened again is laid out the same", async () => {
  const first = await saved();
  const bytes = writeXlsx(bookToWrite({ book: first, settings: { cutoff: { fraction: 0.05 } }, pictures: [] }));
  const again = await readFile(bytes, "bids.xlsx", FUNCTIONS);
  expect(again.settings).toEqual({ cutoff: { fraction: 0.05 } });
  expect(again.summary.extras).toEqual([]);
  const names = (data: string) =>
    Object.values(JSON.parse(data) as Record<string, Record<string, string>>)
      .map(({ name, formulaOrRefString, localSheetId }) => [name, formulaOrRefString, localSheetId])
      .sort();
  expect(names(again.book.resources![0]!.data)).toEqual(names(first.snapshot.resources![0]!.data));
  for (const id of first.snapshot.sheetOrder) {
    const [before, after] = [first.snapshot.sheets[id]!, again.book.sheets[id]!];
    const styled = (book: SavedBook["snapshot"], sheet: typeof before) =>
      Object.entries(sheet.cellData!).map(([row, line]) => [
        row,
        Object.entries(line as object).map(([column, cell]) => [column, { ...cell, s: book.styles[cell.s] ?? {} }]),
      ]);
    expect(styled(again.book, after)).toEqual(styled(first.snapshot, before));
    expect({ ...after, cellData: {} }).toEqual({ ...before, cellData: {} });
  }
});

test("ours are stored in the spelling of files, a table with its cells marked as one that spills", async () => {
  const { workbook } = openXlsx(writeXlsx(bookToWrite({ book: await saved(), settings: {}, pictures: [] })));
  const bids = workbook.sheets[0]!;
  expect(bids.formulaAt(1, 3)).toMatchObject({ formula: "_xldudf_WEIR_SAMPLES_FOR_SD_PRECISION(fraction)" });
  expect(bids.cell(1, 3)).toBe(193);
  expect(bids.formulaAt(5, 3)).toMatchObject({
    formula: "_xlfn.SEQUENCE(2,2)",
    dynamic: true,
    array: { top: 5, left: 3, bottom: 6, right: 4 },
  });
  expect([bids.cell(5, 4), bids.cell(6, 3), bids.cell(6, 4)]).toEqual([2, 3, 4]);
});

test("settings that are none, or are damaged, are left aside", () => {
  const sheets = [{ name: "S", rows: [[1]] }];
  expect(openXlsx(writeXlsx({ sheets })).settings).toEqual({});
  const parts = unzipSync(writeXlsx({ sheets, settings: { a: 1 } }));
  const part = strFromU8(parts["customXml/item1.xml"]!);
  for (const damaged of ["[1]", "{", "null", "", "5"]) {
    const text = part.replace(/>\{[^<]*</, `>${damaged}<`);
    expect(text).not.toBe(part);
    expect(openXlsx(zipSync({ ...parts, "customXml/item1.xml": strToU8(text) })).settings).toEqual({});
  }
});

test("a picture goes along at its cell, in its size, as a part of its own", async () => {
  const png = Uint8Array.of(0x89, 0x50, 0x4e, 0x47);
  const picture = { sheetId: "sheet-1", name: "scores & cutoff", png, row: 9, column: 3, width: 288, height: 216 };
  const parts = unzipSync(writeXlsx(bookToWrite({ book: await saved(), settings: {}, pictures: [picture] })));
  expect(parts["xl/media/image1.png"]).toEqual(png);
  const drawing = strFromU8(parts["xl/drawings/drawing1.xml"]!);
  expect(drawing).toContain("<xdr:col>3</xdr:col>");
  expect(drawing).toContain("<xdr:row>9</xdr:row>");
  // 914,400 to the inch (ECMA-376 part 1, 20.1.2.1), 96 pixels to the inch: 288 pixels are three inches.
  expect(drawing).toContain(`cx="${3 * 914_400}" cy="${2.25 * 914_400}"`);
  expect(drawing).toContain('name="scores &amp; cutoff"');
  expect(strFromU8(parts["xl/worksheets/_rels/sheet1.xml.rels"]!)).toContain("drawings/drawing1.xml");
  expect(strFromU8(parts["xl/worksheets/sheet2.xml"]!)).not.toContain("<drawing");
});
