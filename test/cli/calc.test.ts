import { describe, expect, test } from "vitest";
import { run } from "../../src/cli/run";
import { Stop, type Io } from "../../src/cli/io";
import { functionTable } from "../../src/functions/call";
import { xlsxFile } from "../support/xlsxFile";

const CSV = "supplier,score,keep\nAder,71.4,TRUE\nBolt,68,FALSE\nCord,,TRUE\nDock,77.25,TRUE\nEddy,#N/A,\n";
const FILES: Readonly<Record<string, string | Uint8Array>> = {
  "bids.csv": CSV,
  "bom.csv": `\ufeff${CSV}`,
  "bids;.csv": "supplier;score\nAder;71,4\nBolt;68\n",
  "list.txt": "\ufeff# the marks\n\nSUM(B2:B3)\r\n=B2\n",
  "book.xlsx": xlsxFile({
    names: '<definedName name="marks">Bids!$A$1:$A$2</definedName>',
    sheets: [
      { name: "Notes", rows: `<row r="1"><c r="A1"><v>1</v></c></row>` },
      { name: "Bids", rows: `<row r="1"><c r="A1"><v>2.5</v></c></row><row r="2"><c r="A2"><v>3</v></c></row>` },
    ],
  }),
  "broken.xlsx": "PK\u0003\u0004 nothing more",
  "fake.xlsx": "a,b",
  "strange.csv": "a\n\u001b[31mred\u202e\n",
};

async function weirmark(...args: string[]): Promise<{ code: number; out: string; err: string }> {
  let out = "";
  let err = "";
  const io: Io = {
    out: (text) => (out += text),
    err: (text) => (err += text),
    read: async (path) => {
      const file = path === "-" ? "=B2*2\n" : FILES[path];
      if (file === undefined) throw new Stop(`There is no file ${path}.`);
      return typeof file === "string" ? new TextEncoder().encode(file) : file;
    },
    write: async () => {
      throw new Error("calc writes no file");
    },
  };
  const code = await run(args, io);
  return { code, out, err };
}

async function json(...args: string[]): Promise<unknown[]> {
  const { out } = await weirmark("calc", ...args, "--json");
  return out
    .trimEnd()
    .split("\n")
    .map((line) => JSON.parse(line));
}

describe("weirmark calc --json", () => {
  test("prints one object a line, in the order of the formulas, numbers with all their digits", async () => {
    expect(await json("bids.csv", "=SUM(B2:B5)", "A2", "=C2", "=1/3", "=B2:C3")).toEqual([
      { formula: "=SUM(B2:B5)", value: 216.65 },
      { formula: "A2", value: "Ader" },
      { formula: "=C2", value: true },
      { formula: "=1/3", value: 1 / 3 },
      {
        formula: "=B2:C3",
        value: [
          [71.4, true],
          [68, false],
        ],
      },
    ]);
  });

  test("gives an error as code and message; one inside a table is its text", async () => {
    const [own, host, unknown, table] = (await json(
      "bids.csv",
      '=WEIR.SCORE_SUMMARY(B2:B6,"mean")',
      "=1/0",
      "=WEIR.SCORE_SUMARY(B2:B5)",
      "=B5:B6",
    )) as Record<string, unknown>[];
    expect(own).toMatchObject({ error: "#VALUE!", message: expect.stringContaining("the 5th cell") });
    expect(host).toMatchObject({ error: "#DIV/0!", message: expect.stringContaining("zero") });
    expect(unknown).toMatchObject({ error: "#NAME?", message: expect.stringContaining("WEIR.SCORE_SUMMARY") });
    expect(table).toEqual({ formula: "=B5:B6", value: [[77.25], ["#N/A"]] });
  });

  test("an error is a value: exit code 0", async () => {
    expect((await weirmark("calc", "bids.csv", "=1/0", "=NOPE(1)")).code).toBe(0);
  });

  test("a text that is no formula is named, the others are answered, and the exit code is 2", async () => {
    const { code, out } = await weirmark("calc", "bids.csv", "=SUM(B2", "=B2", "--json");
    expect(code).toBe(2);
    expect(out).toContain("a bracket is not closed");
    expect(out).toContain('{"formula":"=B2","value":71.4}');
  });

  test.each(["bids.csv", "bom.csv"])("%s has its first heading in A1", async (file) => {
    expect(await json(file, "=A1")).toEqual([{ formula: "=A1", value: "supplier" }]);
  });

  test("semicolons and decimal commas are found", async () => {
    expect(await json("bids;.csv", "=B2+1")).toEqual([{ formula: "=B2+1", value: 72.4 }]);
  });

  test("reads a list, with and without =, comments and empty lines passed over, behind the formulas typed", async () => {
    expect(await json("bids.csv", "=1", "--formulas", "list.txt")).toEqual([
      { formula: "=1", value: 1 },
      { formula: "SUM(B2:B3)", value: 139.4 },
      { formula: "=B2", value: 71.4 },
    ]);
    expect(await json("bids.csv", "--formulas", "-")).toEqual([{ formula: "=B2*2", value: 142.8 }]);
  });

  test("works on the sheet named, any case, or the first, and knows the names of the file", async () => {
    expect(await json("book.xlsx", "=A1", "=SUM(marks)")).toMatchObject([{ value: 1 }, { value: 5.5 }]);
    expect(await json("book.xlsx", "=A1", "--sheet", "bids")).toMatchObject([{ value: 2.5 }]);
  });
});

describe("weirmark calc in plain text", () => {
  test("one formula gives its value alone", async () => {
    expect((await weirmark("calc", "bids.csv", "=B2/3")).out).toBe("23.8\n");
    expect((await weirmark("calc", "bids.csv", "=1/3")).out).toBe("0.3333333333\n");
  });

  test("a table has its columns under one another, numbers to the right", async () => {
    expect((await weirmark("calc", "bids.csv", "=A2:B5")).out).toBe(
      "Ader   71.4\nBolt     68\nCord      0\nDock  77.25\n",
    );
  });

  test("several formulas stand with their values", async () => {
    expect((await weirmark("calc", "bids.csv", "=B2", "=SUM(B2:B3)", "=A2:B3")).out).toBe(
      "=B2          71.4\n=SUM(B2:B3)  139.4\n=A2:B3\n  Ader  71.4\n  Bolt    68\n",
    );
  });

  test("nothing from a file reaches the terminal as a signal", async () => {
    expect((await weirmark("calc", "strange.csv", "=A2")).out).toBe(" [31mred \n");
  });
});

describe("what can't be used ends with a sentence and 2", () => {
  test.each<[string[], RegExp]>([
    [["calc"], /needs a file/],
    [["calc", "bids.csv"], /needs a formula/],
    [["calc", "bids.csv", ""], /formula is empty/],
    [["calc", "bids.csv", "="], /formula is empty/],
    [["calc", "none.csv", "=1"], /no file none\.csv/],
    [["calc", "broken.xlsx", "=1"], /broken\.xlsx: The file is cut off or damaged/],
    [["calc", "fake.xlsx", "=1"], /fake\.xlsx: .*no workbook inside/],
    [["calc", "book.xlsx", "=1", "--sheet", "Offers"], /no sheet “Offers”; it has “Notes”, “Bids”/],
    [["calc", "bids.csv", "=1", "--jsn"], /no option --jsn.*--json/],
    [["calc", "bids.csv", "=1", "--formulas"], /--formulas needs a value/],
    [["calc", "bids.csv", "=1", "--json=yes"], /--json takes no value/],
    [["calc", "bids.csv", "--formulas", "none.txt"], /no file none\.txt/],
    [["calk", "x"], /did you mean calc/],
    [["functions", "CUTOF"], /no function CUTOF/],
    [[], /weirmark COMMAND/],
  ])("%j", async (args, sentence) => {
    const { code, out, err } = await weirmark(...args);
    expect(code).toBe(2);
    expect(out).toBe("");
    expect(err).toMatch(sentence);
    expect(err).not.toMatch(/\bat .*:\d+:\d+/);
  });
});

describe("the rest of the command line", () => {
  test("--version says release and revision", async () => {
    expect((await weirmark("--version")).out).toMatch(/^Weirmark \d+\.\d+\.\d+, revision \d+ of the numbers\n$/);
  });

  test.each([["--help"], ["help"], ["calc", "--help"], ["help", "calc"], ["functions", "--help"]])(
    "%s %s",
    async (...args) => {
      const { code, out } = await weirmark(...args.filter((arg) => arg !== undefined));
      expect(code).toBe(0);
      expect(out).toMatch(/^weirmark /);
    },
  );

  test("functions --json is the table of functions", async () => {
    const { code, out } = await weirmark("functions", "--json");
    expect(code).toBe(0);
    expect(JSON.parse(out)).toEqual(functionTable);
  });

  test("functions lists every one; with a name it tells its arguments and examples", async () => {
    const { out } = await weirmark("functions");
    for (const { name } of functionTable) expect(out).toContain(`WEIR.${name}(`);
    expect((await weirmark("functions", "weir.release")).out).toContain('=WEIR.RELEASE("revision") → 1');
  });
});
