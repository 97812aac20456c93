import { describe, expect, test } from "vitest";
import { run } from "../../src/cli/run";
import { Stop } from "../../src/cli/io";
import { readXlsx } from "../../src/hosts/file/readXlsx";
import type { Cell } from "../../src/sheet/cell";
import { CUTOFF, scoreCells, sheetRows, type CellXml } from "../support/auditBook";
import { xlsxFile } from "../support/xlsxFile";

const CALL = "_xldudf_WEIR_TOP_FRACTION_CUTOFF(B2:B13,0.1)";
const EVIL = `=HYPERLINK("http://x","<script>alert(1)</script>")`;
const book = (cells: Record<string, Cell | CellXml>, name = "Flats") =>
  xlsxFile({ sheets: [{ name, rows: sheetRows({ ...scoreCells(), ...cells }) }] });
const FILES: Readonly<Record<string, Uint8Array>> = {
  "good.xlsx": book({ D2: { f: CALL, v: CUTOFF } }),
  "wrong.xlsx": book({ D2: { f: CALL, v: CUTOFF }, D3: { f: CALL, v: 70 }, D4: { f: `${CALL}+NOW()`, v: 1 } }),
  "unchecked.xlsx": book({ D4: { f: `${CALL}+NOW()`, v: 1 } }),
  "none.xlsx": book({}),
  "typed.xlsx": book({
    D2: { f: "_xldudf_WEIR_TAIL_FRACTION(B2,65,8)", v: 0.6226 },
    D3: 0.5,
    D4: { f: "_xldudf_WEIR_TAIL_FRACTION(B4,65,8)", v: 0.8 },
    D6: { f: "_xldudf_WEIR_TOP_FRACTION_CUTOFF(B2:B9,0.1)", v: 80 },
  }),
  "evil.xlsx": book({ A2: EVIL, D2: { f: `IF(TRUE,A2,${CALL})`, v: EVIL } }, "&lt;b&gt;="),
};

async function weirmark(...args: string[]) {
  let out = "";
  let err = "";
  const written = new Map<string, Uint8Array>();
  const code = await run(["audit", ...args], {
    out: (text) => (out += text),
    err: (text) => (err += text),
    read: async (path) => {
      if (FILES[path]) return FILES[path];
      throw new Stop(`There is no file ${path}.`);
    },
    write: async (path, bytes) => void written.set(path, bytes),
  });
  return { code, out, err, written };
}

describe("weirmark audit", () => {
  test("exit code 0 where all agree, 1 where any differs; what is not checkable counts with --strict", async () => {
    expect((await weirmark("good.xlsx")).code).toBe(0);
    expect((await weirmark("good.xlsx", "--strict")).code).toBe(0);
    expect((await weirmark("wrong.xlsx")).code).toBe(1);
    expect((await weirmark("unchecked.xlsx")).code).toBe(0);
    expect((await weirmark("unchecked.xlsx", "--strict")).code).toBe(1);
    expect((await weirmark("none.xlsx")).out).toBe("No cell calls one of these functions.\n");
  });

  test("--json has one object a call, in the order of the sheet", async () => {
    const { out } = await weirmark("wrong.xlsx", "--json");
    const lines = out
      .trimEnd()
      .split("\n")
      .map((line) => JSON.parse(line));
    expect(lines.map(({ cell, verdict }) => [cell, verdict])).toEqual([
      ["D2", "agrees"],
      ["D3", "differs"],
      ["D4", "not checkable"],
    ]);
    expect(Object.keys(lines[0])).toEqual(["sheet", "cell", "formula", "stored", "recomputed", "verdict", "why"]);
    expect(lines[1]).toMatchObject({
      sheet: "Flats",
      formula: "=WEIR.TOP_FRACTION_CUTOFF(B2:B13,0.1)",
      stored: 70,
      recomputed: CUTOFF,
    });
    expect(lines[2].recomputed).toBeNull();
  });

  test("--json tells notices at a call with it, others behind", async () => {
    const { out } = await weirmark("typed.xlsx", "--json");
    const lines = out
      .trimEnd()
      .split("\n")
      .map((line) => JSON.parse(line));
    expect(lines).toHaveLength(4);
    expect(lines[2]).toMatchObject({ cell: "D6", notices: [{ kind: "leaves data out" }] });
    expect(lines[3]).toMatchObject({ cell: "D3", notice: "typed over", stored: 0.5 });
  });

  test("plain output begins with a sentence that counts", async () => {
    const { out } = await weirmark("wrong.xlsx");
    expect(out).toMatch(/^3 calls: 1 agrees, 1 differs, 1 is not checkable\.\n/);
    expect(out).toContain("Flats!D3  differs  =WEIR.TOP_FRACTION_CUTOFF(B2:B13,0.1)\n    stored 70, recomputed ");
  });

  test("--tolerance takes what it is given, or says what it may be", async () => {
    expect((await weirmark("wrong.xlsx", "--tolerance", "0.5")).code).toBe(0);
    for (const bad of ["x", "-1", "1", ""]) {
      const { code, err } = await weirmark("good.xlsx", `--tolerance=${bad}`);
      expect(code).toBe(2);
      expect(err).toContain("--tolerance must be a number");
    }
  });

  test.each<[string[], RegExp]>([
    [[], /takes one file/],
    [["a.xlsx", "b.xlsx"], /takes one file/],
    [["missing.xlsx"], /no file missing\.xlsx/],
    [["good.xlsx", "--report", "out.pdf"], /ends in \.xlsx, \.html or \.csv/],
    [["good.xlsx", "--stric"], /no option --stric/],
  ])("%j ends with a sentence and 2", async (args, sentence) => {
    const { code, err } = await weirmark(...args);
    expect(code).toBe(2);
    expect(err).toMatch(sentence);
  });
});

describe("a report escapes everything that comes out of the file", () => {
  test("as a page", async () => {
    const { written } = await weirmark("evil.xlsx", "--report", "out.html");
    const page = new TextDecoder().decode(written.get("out.html"));
    expect(page).not.toContain("<script");
    expect(page).not.toContain("<b>");
    expect(page).toContain("&lt;script&gt;");
    expect(page).toContain("default-src 'none'");
  });

  test("as CSV: nothing begins like a formula", async () => {
    const { written } = await weirmark("evil.xlsx", "--report", "out.csv");
    const text = new TextDecoder("utf-8", { ignoreBOM: true }).decode(written.get("out.csv"));
    expect(text.charCodeAt(0)).toBe(0xfeff);
    expect(text).toContain(`"'=HYPERLINK(""http://x"",""<script>alert(1)</script>"")"`);
    for (const field of text.matchAll(/(?:^|,|\n)"?([=+\-@])/g)) expect.fail(`a field begins with ${field[1]}`);
  });

  test("as a workbook: texts only, and it can be read back", async () => {
    const { written } = await weirmark("evil.xlsx", "--report", "out.xlsx");
    const report = readXlsx(written.get("out.xlsx")!);
    expect(report.sheets.map(({ name }) => name)).toEqual(["Summary", "Calls", "Notices"]);
    expect(report.sheets.every(({ formulas }) => formulas.size === 0)).toBe(true);
    const [, row] = report.sheets[1]!.range({ top: 0, left: 0, bottom: 1, right: 6 });
    expect(row).toEqual([
      "<b>=",
      "D2",
      `=IF(TRUE,A2,WEIR.TOP_FRACTION_CUTOFF(B2:B13,0.1))`,
      EVIL,
      EVIL,
      "agrees",
      expect.any(String),
    ]);
  });
});
