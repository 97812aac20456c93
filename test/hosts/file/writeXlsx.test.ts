import { read as readIndependently } from "@e965/xlsx";
import { strFromU8, unzipSync } from "fflate";
import { describe, expect, test } from "vitest";
import { readXlsx } from "../../../src/hosts/file/readXlsx";
import type { BookToWrite } from "../../../src/hosts/file/write/book";
import { writeXlsx } from "../../../src/hosts/file/writeXlsx";
import { NUMBER_FORMATS } from "../../../src/sheet/cellLook";
import { convert, CSV_OF_EVERY_SHEET, soffice } from "../../support/soffice";

/** 0.1 + 0.2 has 17 digits: a writer that rounds would lose the last. */
const AWKWARD = 0.1 + 0.2;

const BOOK: BookToWrite = {
  title: "Invented scores & marks",
  active: 1,
  names: [
    { name: "weir_scores", formula: "='Round <2>'!$A$2:$A$4" },
    { name: "weir_fraction", formula: "Plan!$B$2" },
  ],
  sheets: [
    {
      name: "Round <2>",
      rows: [
        [{ value: "score", role: "heading" }, "=not a formula", { value: "@text", role: "text" }],
        [AWKWARD, true, null, { code: "#N/A" }],
        [-1e-300, " kept  spaces ", "line\nbreak", "_x0041_ & <b>"],
        [45992, undefined, "ü 漢 \u{1f3f5}"],
      ],
      widths: [12, 0, 20],
      frozenRows: 1,
      hiddenRows: new Set([2]),
    },
    {
      name: "Plan",
      rows: [
        [{ value: "The plan", role: "title" }],
        [
          { value: "fraction", role: "label" },
          { value: 0.05, role: "input", format: NUMBER_FORMATS.percent },
        ],
        ["safe", { formula: "WEIR.SAFE_CUTOFF(weir_scores,weir_fraction)", value: 1.25, role: "result" }],
        ["table", { formula: "=WEIR.SD_TABLE(1)", value: "a", spills: { rows: 2, columns: 2 } }, 2],
        [null, "b", 3],
        ["native", { formula: `STDEV.S(weir_scores)&"WEIR.X("`, value: "0.2WEIR.X(" }],
        ["spilled", { formula: "=SORT({2;1})", value: 1, spills: { rows: 2, columns: 1 } }],
        [null, 2],
        ["blank result", { formula: 'IF(TRUE,"","x")', value: "" }],
        ["failed", { formula: "1/0", value: { code: "#DIV/0!" } }],
        ["day", { value: 45992, format: NUMBER_FORMATS.date }],
      ],
      widths: [20, 14],
      merged: [{ top: 0, left: 0, bottom: 0, right: 2 }],
      choices: [{ area: { top: 1, left: 1, bottom: 1, right: 1 }, words: ["high", "low"], strict: true }],
      print: {
        paper: "A4",
        orientation: "portrait",
        pagesWide: 1,
        area: { top: 0, left: 0, bottom: 9, right: 2 },
        titleRows: [0, 1],
        header: { left: "&F" },
        footer: { right: "&P/&N" },
      },
      charts: [
        {
          title: "Scores",
          xTitle: "score",
          yTitle: "entries",
          description: "Three scores.",
          from: { row: 1, column: 4 },
          to: { row: 15, column: 10 },
          series: [
            {
              nameAt: "'Round <2>'!$A$1",
              name: "score",
              xAt: "'Round <2>'!$A$2:$A$4",
              yAt: "'Round <2>'!$A$2:$A$4",
              x: [AWKWARD, undefined, 3],
              y: [1, 2, 3],
              colour: "0B4A6B",
              width: 1.5,
            },
          ],
        },
      ],
    },
  ],
};

const bytes = writeXlsx(BOOK);
const parts = Object.fromEntries(Object.entries(unzipSync(bytes)).map(([name, part]) => [name, strFromU8(part)]));

describe("a new workbook, read back by our own reader", () => {
  const workbook = readXlsx(bytes);
  const [scores, plan] = workbook.sheets as [(typeof workbook.sheets)[0], (typeof workbook.sheets)[0]];

  test("has its sheets, names and hidden rows", () => {
    expect(workbook.sheets.map(({ name }) => name)).toEqual(["Round <2>", "Plan"]);
    expect(workbook.names).toEqual([
      { name: "weir_fraction", formula: "Plan!$B$2", sheet: undefined },
      { name: "weir_scores", formula: "'Round <2>'!$A$2:$A$4", sheet: undefined },
    ]);
    expect([...scores.hiddenRows]).toEqual([2]);
  });

  test("has every value with all its digits and letters", () => {
    expect(scores.range({ top: 0, left: 0, bottom: 3, right: 3 })).toEqual([
      ["score", "=not a formula", "@text", null],
      [AWKWARD, true, null, { code: "#N/A" }],
      [-1e-300, " kept  spaces ", "line\nbreak", "_x0041_ & <b>"],
      [45992, null, "ü 漢 \u{1f3f5}", null],
    ]);
  });

  test("has formulas in the spelling of the file, with their values, and none where only text looks like one", () => {
    expect(scores.formulas.size).toBe(0);
    const at = (row: number) => plan.formulaAt(row, 1);
    expect(at(2)).toMatchObject({
      formula: "_xldudf_WEIR_SAFE_CUTOFF(weir_scores,weir_fraction)",
      dynamic: false,
      calculated: true,
    });
    expect(at(3)).toMatchObject({ dynamic: true, array: { top: 3, left: 1, bottom: 4, right: 2 } });
    expect(at(5)).toMatchObject({ formula: '_xlfn.STDEV.S(weir_scores)&"WEIR.X("', dynamic: false });
    expect(at(6)).toMatchObject({ formula: "_xlfn._xlws.SORT({2;1})", dynamic: true });
    expect(at(8)).toMatchObject({ calculated: true });
    expect(plan.cell(8, 1)).toBe("");
    expect(plan.cell(9, 1)).toEqual({ code: "#DIV/0!" });
    expect(plan.range({ top: 3, left: 1, bottom: 4, right: 2 })).toEqual([
      ["a", 2],
      ["b", 3],
    ]);
  });
});

describe("the same, read by an independent reader (SheetJS)", () => {
  const book = readIndependently(bytes, { cellStyles: true, cellNF: true });

  test("has the same values, formulas, spills, formats, widths and names", () => {
    expect(book.SheetNames).toEqual(["Round <2>", "Plan"]);
    const scores = book.Sheets["Round <2>"]!;
    const plan = book.Sheets["Plan"]!;
    expect(scores["A2"].v).toBe(AWKWARD);
    expect(scores["B2"]).toMatchObject({ t: "b", v: true });
    expect(scores["D2"]).toMatchObject({ t: "e", v: 42 });
    expect(scores["B1"]).toMatchObject({ t: "s", v: "=not a formula" });
    expect(scores["B1"].f).toBeUndefined();
    expect(scores["!cols"]![0]!.width).toBeCloseTo(12, 0);
    expect(plan["B4"]).toMatchObject({ F: "B4:C5", D: true, v: "a" });
    expect(plan["B2"]).toMatchObject({ v: 0.05, z: "0.0%", w: "5.0%" });
    expect(plan["B11"]).toMatchObject({ w: "2025-12-01" });
    expect(plan["B10"]).toMatchObject({ t: "e", v: 7 });
    expect(plan["!merges"]).toHaveLength(1);
    expect(book.Workbook!.Names!.map(({ Name, Ref }) => [Name, Ref])).toEqual(
      expect.arrayContaining([
        ["weir_fraction", "Plan!$B$2"],
        ["_xlnm.Print_Area", "Plan!$A$1:$C$10"],
        ["_xlnm.Print_Titles", "Plan!$1:$2"],
      ]),
    );
  });
});

describe("the parts of the package", () => {
  test("every part has its kind, every relation leads somewhere, and there are no macros", () => {
    const types = parts["[Content_Types].xml"]!;
    const named = [...types.matchAll(/PartName="\/([^"]+)"/g)].map(([, name]) => name!);
    const unnamed = Object.keys(parts).filter((name) => !name.endsWith(".rels") && name !== "[Content_Types].xml");
    expect([...named].sort()).toEqual([...unnamed].sort());
    expect(types).not.toMatch(/macro|vba/i);
    for (const [name, text] of Object.entries(parts).filter(([one]) => one.endsWith(".rels"))) {
      const folder = name.replace(/_rels\/[^/]+$/, "");
      for (const [, target] of text.matchAll(/Target="([^"]+)"/g)) {
        const path = new URL(target!, `http://x/${folder}`).pathname.slice(1);
        expect(Object.keys(parts), `${name} → ${target}`).toContain(path);
      }
    }
  });

  test("the parts of a sheet stand in the order that the format asks for (ECMA-376 Part 1, CT_Worksheet)", () => {
    const order =
      "sheetPr sheetViews sheetFormatPr cols sheetData mergeCells dataValidations pageMargins pageSetup headerFooter drawing".split(
        " ",
      );
    const places = order.map((tag) => parts["xl/worksheets/sheet2.xml"]!.indexOf(`<${tag}`));
    expect(places.every((place) => place > 0)).toBe(true);
    expect([...places].sort((a, b) => a - b)).toEqual(places);
  });

  test("the same workbook gives the same bytes", () => {
    expect(Buffer.compare(writeXlsx(BOOK), bytes)).toBe(0);
  });

  test("a hundred thousand scores are written in good time", () => {
    const rows = Array.from({ length: 100_000 }, (_, row) => [row * 1.1, `entry ${row}`]);
    const start = performance.now();
    const long = writeXlsx({ sheets: [{ name: "Long", rows }] });
    expect(performance.now() - start).toBeLessThan(15_000);
    expect(readXlsx(long).sheets[0]!.cell(99_999, 0)).toBe(99_999 * 1.1);
  });
});

test.runIf(soffice)(
  soffice
    ? "LibreOffice opens it, shows the values that were stored and draws the chart"
    : "LIBREOFFICE IS NOT HERE: the written file was not opened by it",
  () => {
    const csv = convert(bytes, CSV_OF_EVERY_SHEET);
    const plan = csv.get("book-Plan.csv")!.toString("utf8");
    expect(plan).toContain('safe,"1.25"');
    expect(plan).toContain("native,0.2WEIR.X(");
    expect(plan).toContain('fraction,"5%"');
    const [, svg] = [...convert(bytes, "html")].find(([name]) => /\.(gif|png|jpg)$/.test(name)) ?? [];
    expect(svg?.length ?? 0).toBeGreaterThan(1000);
  },
);
