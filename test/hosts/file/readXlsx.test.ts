import { describe, expect, test } from "vitest";
import { readXlsx } from "../../../src/hosts/file/readXlsx";
import { xlsxFile } from "../../support/xlsxFile";

const BOOK = xlsxFile({
  strings: [
    "name",
    "score",
    '<r><t>Rope</t></r><r><t xml:space="preserve"> &amp; tar</t></r><rPh sb="0" eb="1"><t>no</t></rPh>',
    "a_x000D_b",
  ],
  names: `<definedName name="marks">Bids!$B$2:$B$4</definedName><definedName name="rate" localSheetId="1">0.05</definedName><definedName name="_xlnm._FilterDatabase" localSheetId="0" hidden="1">Bids!$A$1:$B$4</definedName>`,
  sheets: [
    {
      name: "Bids",
      rows: `<row r="1"><c r="A1" t="s"><v>0</v></c><c r="B1" t="s"><v>1</v></c></row>
<row r="2" hidden="1"><c r="A2" t="s"><v>2</v></c><c r="B2" s="4"><v>71.400000000000006</v></c><c r="C2" s="4"/></row>
<row r="3"><c r="A3" t="inlineStr"><is><t>inline</t></is></c><c r="B3" t="e"><v>#N/A</v></c><c r="D3" t="b"><v>1</v></c></row>
<row r="4"><c r="A4" t="s"><v>3</v></c><c r="B4"><f>B2*2</f><v>142.8</v></c><c r="C4" t="str"><f>IF(B2&gt;0,"","x")</f><v></v></c></row>
<row r="5"><c r="B5"><f t="shared" ref="B5:B6" si="0">B4+$A$1</f><v>1</v></c></row>
<row r="6"><c r="B6"><f t="shared" si="0"/><v>2</v></c></row>
<row r="8"><c r="A8" cm="1"><f t="array" ref="A8:B9">_xlfn.SEQUENCE(2,2)</f><v>1</v></c><c r="B8"><v>2</v></c></row>
<row r="9"><c r="A9"><v>3</v></c><c r="B9"><v>4</v></c></row>
<row r="10"><c r="A10"><f t="array" ref="A10">SUM(B2:B2*2)</f><v>5</v></c><c r="B10"><f>1+1</f></c></row>`,
      behind: `<autoFilter ref="A1:B4"/>`,
      tables: [
        `<table xmlns="x" id="1" name="T" displayName="Offers" ref="A1:B4" totalsRowCount="1"><tableColumns count="2"><tableColumn id="1" name="name"/><tableColumn id="2" name="score"/></tableColumns></table>`,
      ],
    },
    { name: "Notes &amp; more", state: "hidden", rows: `<row><c><v>1</v></c><c t="d"><v>2024-01-15</v></c></row>` },
  ],
});

describe("a workbook as Excel writes it", () => {
  const book = readXlsx(BOOK);
  const [bids, notes] = book.sheets;

  test("has its sheets, also a hidden one", () => {
    expect(book.sheets.map(({ name, visible }) => [name, visible])).toEqual([
      ["Bids", true],
      ["Notes & more", false],
    ]);
  });

  test("has its cells: shared, rich and inline texts, numbers to the last bit, errors, truths, blanks", () => {
    expect(bids!.range({ top: 0, left: 0, bottom: 3, right: 3 })).toEqual([
      ["name", "score", null, null],
      ["Rope & tar", 71.400000000000006, null, null],
      ["inline", { code: "#N/A" }, null, true],
      ["a\rb", 142.8, "", null],
    ]);
  });

  test("has dates as numbers, and cells that tell no place", () => {
    expect(notes!.range({ top: 0, left: 0, bottom: 0, right: 1 })).toEqual([[1, 45306]]);
  });

  test("tells a shared formula by its origin and the way from there", () => {
    expect(bids!.formulaAt(5, 1)).toMatchObject({ formula: "B4+$A$1", shift: { rows: 1, columns: 0 } });
  });

  test("tells a spilling formula from an array entered over a range, and what it fills", () => {
    expect(bids!.formulaAt(7, 0)).toMatchObject({ dynamic: true, array: { top: 7, left: 0, bottom: 8, right: 1 } });
    expect(bids!.formulaAt(9, 0)).toMatchObject({ dynamic: false, array: { top: 9, left: 0, bottom: 9, right: 0 } });
    expect(bids!.formulaAt(3, 1)).toMatchObject({ dynamic: false, array: undefined });
  });

  test("tells a formula that was never calculated", () => {
    expect(bids!.formulaAt(9, 1)!.calculated).toBe(false);
    expect(bids!.formulaAt(3, 2)!.calculated).toBe(true);
  });

  test("has its names, its table, its filter and its hidden rows, and leaves the host's own names out", () => {
    expect(book.names).toEqual([
      { name: "marks", formula: "Bids!$B$2:$B$4", sheet: undefined },
      { name: "rate", formula: "0.05", sheet: "Notes & more" },
    ]);
    expect(book.tables).toMatchObject([
      { name: "Offers", sheet: "Bids", columns: ["name", "score"], headerRows: 1, totalsRows: 1 },
    ]);
    expect(bids!.filter).toEqual({ top: 0, left: 0, bottom: 3, right: 1 });
    expect([...bids!.hiddenRows]).toEqual([1]);
  });

  test("tells the 1904 system", () => {
    expect(readXlsx(xlsxFile({ date1904: true, sheets: [{ name: "A", rows: "" }] })).date1904).toBe(true);
    expect(book.date1904).toBe(false);
  });
});
