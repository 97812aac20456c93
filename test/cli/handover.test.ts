import { strFromU8, unzipSync } from "fflate";
import { describe, expect, test } from "vitest";
import { evaluate } from "../../src/audit/evaluate";
import { run } from "../../src/cli/run";
import { Stop } from "../../src/cli/io";
import { readXlsx } from "../../src/hosts/file/readXlsx";
import type { Cell } from "../../src/sheet/cell";
import { column, CUTOFF, direct, SCORES, scoreCells, sheetRows, type CellXml } from "../support/auditBook";
import { xlsxFile, type BookXml } from "../support/xlsxFile";

const LIMITS = direct("CUTOFF_LIMITS", [column(SCORES), 0.1]) as Cell[][];
const CHAIN = `<calcChain xmlns="x"><c r="D2" i="1"/></calcChain>`;

const CELLS: Record<string, Cell | CellXml> = {
  ...scoreCells(),
  A2: 'a < b & "c"',
  D2: { f: "_xldudf_WEIR_TOP_FRACTION_CUTOFF(B2:B13,0.1)", v: CUTOFF, attributes: ' s="0"' },
  D3: { f: 'IF(B2>_xldudf_WEIR_TOP_FRACTION_CUTOFF($B$2:$B$13,0.1),"clears","falls short")', v: "falls short" },
  D4: { f: "_xldudf_WEIR_SD_PRECISION(60)", v: direct("SD_PRECISION", [60]) as number },
  D5: { f: "SUM(B2:B13)", v: 776 },
  E2: { f: "_xldudf_WEIR_SAFE_CUTOFF(B2:B13,0.1)", v: direct("SAFE_CUTOFF", [column(SCORES), 0.1]) as number },
  D6: {
    f: "_xldudf_WEIR_TAIL_FRACTION(_xldudf_WEIR_TOP_FRACTION_CUTOFF(B2:B13,0.1),65,8)",
    v: direct("TAIL_FRACTION", [CUTOFF, 65, 8]) as number,
  },
  D7: { f: "_xldudf_WEIR_SD_PRECISION(30)" },
  D8: { f: "_xldudf_WEIR_NEWER_THING(B2)" },
  F2: {
    f: "_xldudf_WEIR_CUTOFF_LIMITS(B2:B13,0.1)",
    v: LIMITS[0]![0]!,
    attributes: ' cm="1"',
    formulaAttributes: ' t="array" ref="F2:G4"',
  },
  G2: LIMITS[0]![1]!,
  F3: LIMITS[1]![0]!,
  G3: LIMITS[1]![1]!,
  F4: LIMITS[2]![0]!,
  G4: LIMITS[2]![1]!,
};

const BOOK: BookXml = {
  sheets: [
    { name: "Flats", rows: sheetRows(CELLS) },
    { name: "Hand-over", rows: sheetRows({ A1: "there is one already" }) },
  ],
  parts: { "xl/calcChain.xml": CHAIN, "docProps/custom.xml": "<p>kept\r\n</p>" },
};
const FILE = (() => {
  const rels = strFromU8(unzipSync(xlsxFile(BOOK))["xl/_rels/workbook.xml.rels"]!);
  const chained = rels.replace(
    "</Relationships>",
    `<Relationship Id="rId200" Type="http://x/calcChain" Target="calcChain.xml"/></Relationships>`,
  );
  return xlsxFile({ ...BOOK, parts: { ...BOOK.parts, "xl/_rels/workbook.xml.rels": chained } });
})();

async function weirmark(...args: string[]) {
  let out = "";
  let err = "";
  const written = new Map<string, Uint8Array>();
  const code = await run(["handover", ...args], {
    out: (text) => (out += text),
    err: (text) => (err += text),
    read: async (path) => {
      if (path === "book.xlsx") return FILE;
      if (path === "list.csv") return new TextEncoder().encode("a,b\n1,2\n");
      throw new Stop(`There is no file ${path}.`);
    },
    write: async (path, bytes) => void written.set(path, bytes),
  });
  return { code, out, err, copy: written.get("copy.xlsx") };
}

describe("weirmark handover makes a copy that works without the add-in", async () => {
  const { code, out, copy } = await weirmark("book.xlsx", "-o", "copy.xlsx");
  const book = readXlsx(copy!);
  const sheet = book.sheets[0]!;
  const at = (row: number, col: number) => ({
    formula: sheet.formulaAt(row - 1, col)?.formula,
    value: sheet.cell(row - 1, col),
  });

  test("and says how many calls became what", () => {
    expect(code).toBe(0);
    expect(out).toMatch(/^copy\.xlsx: of 8 calls, 4 became formulas of the host, 3 values, 1 stayed as they were\./);
  });

  test("a call that the host can compute becomes its formula, in the spelling of files, the value kept", () => {
    expect(at(2, 3)).toEqual({ formula: "AVERAGE(B2:B13)-_xlfn.NORM.S.INV(0.1)*_xlfn.STDEV.S(B2:B13)", value: CUTOFF });
  });

  test("inside a larger formula, and one inside another", () => {
    expect(at(3, 3).formula).toMatch(/^IF\(B2>\(AVERAGE\(\$B\$2:\$B\$13\).*\),"clears","falls short"\)$/);
    expect(at(6, 3).formula).not.toMatch(/weir/i);
  });

  test("each new formula gives the stored value, worked out again", () => {
    for (const row of [2, 3, 6]) {
      const { formula, value } = at(row, 3);
      const answer = evaluate(formula!, { workbook: book, sheet, row: row - 1, column: 3 });
      if (typeof value === "number") expect((answer as { value: number }).value).toBeCloseTo(value, 9);
      else expect(answer).toEqual({ value });
    }
  });

  test("what only the add-in computes keeps its value, a spilled table all its cells", () => {
    expect(at(4, 3)).toEqual({ formula: undefined, value: direct("SD_PRECISION", [60]) });
    expect(sheet.range({ top: 1, left: 5, bottom: 3, right: 6 })).toEqual(LIMITS);
    expect(sheet.formulaAt(1, 5)).toBeUndefined();
  });

  test("a call that was never calculated gets its value; one that isn't known stays", () => {
    expect(at(7, 3)).toEqual({ formula: undefined, value: direct("SD_PRECISION", [30]) });
    expect(at(8, 3).formula).toBe("_xldudf_WEIR_NEWER_THING(B2)");
  });

  test("formulas that don't concern it stay", () => expect(at(5, 3)).toEqual({ formula: "SUM(B2:B13)", value: 776 }));

  test("a sheet lists what was replaced, under a name that was free", () => {
    expect(book.sheets.map(({ name }) => name)).toEqual(["Flats", "Hand-over", "Hand-over 2"]);
    const rows = book.sheets[2]!.range({ top: 0, left: 0, bottom: 8, right: 6 });
    expect(rows[1]).toEqual([
      "Flats",
      "D2",
      "=WEIR.TOP_FRACTION_CUTOFF(B2:B13,0.1)",
      "the host's own formula",
      "=AVERAGE(B2:B13)-NORM.S.INV(0.1)*STDEV.S(B2:B13)",
      CUTOFF,
      expect.any(String),
    ]);
    expect(rows.slice(1).map((row) => row[1])).toEqual(["D2", "E2", "F2", "D3", "D4", "D6", "D7", "D8"]);
    expect(book.sheets[2]!.formulas.size).toBe(0);
  });

  test("a formula that holds a factor for the count of the scores says so", () => {
    const [, , row] = book.sheets[2]!.range({ top: 0, left: 0, bottom: 2, right: 6 });
    expect(row![4]).toMatch(/^=AVERAGE\(B2:B13\)\+2\.27\d+\*STDEV\.S\(B2:B13\)$/);
    expect(row![6]).toMatch(/for as many scores as there are now: 2\.27/);
  });

  test("values have a note on their cell", () => {
    const parts = unzipSync(copy!);
    const notes = strFromU8(parts["xl/weirmarkNotes1.xml"]!);
    expect([...notes.matchAll(/ref="([A-Z]+\d+)"/g)].map(([, ref]) => ref)).toEqual(["F2", "D4", "D7"]);
    expect(strFromU8(parts["xl/worksheets/sheet1.xml"]!)).toMatch(
      /<legacyDrawing [^>]*r:id="weirmark2"\/><\/worksheet>$/,
    );
    expect(strFromU8(parts["[Content_Types].xml"]!)).toContain('PartName="/xl/drawings/weirmarkNotes1.vml"');
  });

  test("parts that it doesn't concern keep every byte, and so do cells; the order of calculation is left out", () => {
    const before = unzipSync(FILE);
    const after = unzipSync(copy!);
    for (const name of [
      "xl/sharedStrings.xml",
      "xl/metadata.xml",
      "xl/worksheets/sheet2.xml",
      "docProps/custom.xml",
      "_rels/.rels",
    ])
      expect(after[name]).toEqual(before[name]);
    expect(after["xl/calcChain.xml"]).toBeUndefined();
    expect(strFromU8(after["xl/_rels/workbook.xml.rels"]!)).not.toContain("calcChain");
    const rest = (xml: string) =>
      xml.replace(/<c r="(D[234678]|[EF]2)".*?<\/c>/g, "").replace(/<legacyDrawing[^>]*>/, "");
    expect(rest(strFromU8(after["xl/worksheets/sheet1.xml"]!))).toBe(
      rest(strFromU8(before["xl/worksheets/sheet1.xml"]!)),
    );
  });

  test("--json tells each call in an object a line", async () => {
    const lines = (await weirmark("book.xlsx", "-o", "copy.xlsx", "--json")).out
      .trimEnd()
      .split("\n")
      .map((line) => JSON.parse(line));
    expect(lines).toHaveLength(8);
    expect(lines[0]).toMatchObject({
      sheet: "Flats",
      cell: "D2",
      becomes: "formula",
      now: "=AVERAGE(B2:B13)-NORM.S.INV(0.1)*STDEV.S(B2:B13)",
    });
  });
});

test("a cell that stays, but shared its formula with one that doesn't, gets its own", async () => {
  const shared = (attributes: string) => ({ formulaAttributes: ` t="shared" si="0"${attributes}` });
  const cells: Record<string, Cell | CellXml> = {
    B2: 62.5,
    B3: { f: "NOW()" },
    D2: {
      f: "_xldudf_WEIR_TAIL_FRACTION(B2,65,8)",
      v: direct("TAIL_FRACTION", [62.5, 65, 8]) as number,
      ...shared(' ref="D2:D3"'),
    },
    D3: { f: "", ...shared("") },
  };
  let copy: Uint8Array | undefined;
  await run(["handover", "book.xlsx", "-o", "copy.xlsx"], {
    out: () => undefined,
    err: () => undefined,
    read: async () => xlsxFile({ sheets: [{ name: "Flats", rows: sheetRows(cells) }] }),
    write: async (_, bytes) => void (copy = bytes),
  });
  const sheet = readXlsx(copy!).sheets[0]!;
  expect(sheet.formulaAt(1, 3)!.formula).toBe("_xlfn.NORM.S.DIST(-((B2-65)/8),TRUE)");
  expect(sheet.formulaAt(2, 3)).toMatchObject({ formula: "_xldudf_WEIR_TAIL_FRACTION(B3,65,8)", shift: undefined });
});

describe("what can't be handed over ends with a sentence and 2", () => {
  test.each<[string[], RegExp]>([
    [[], /takes one file/],
    [["book.xlsx"], /needs a name for the copy/],
    [["book.xlsx", "-o", "book.xlsx"], /another file than the original/],
    [["book.xlsx", "-o", "copy.csv"], /ends in \.xlsx/],
    [["list.csv", "-o", "copy.xlsx"], /Only an \.xlsx/],
    [["none.xlsx", "-o", "copy.xlsx"], /no file none\.xlsx/],
  ])("%j", async (args, sentence) => {
    const { code, err, copy } = await weirmark(...args);
    expect(code).toBe(2);
    expect(err).toMatch(sentence);
    expect(copy).toBeUndefined();
  });
});
