import { read as readIndependently } from "@e965/xlsx";
import { strFromU8, unzipSync } from "fflate";
import { beforeAll, describe, expect, test } from "vitest";
import { functionTable } from "../../src/functions/call";
import { readXlsx } from "../../src/hosts/file/readXlsx";
import { parseAddress } from "../../src/sheet/address";
import type { Workbook } from "../../src/sheet/workbook";
import { commandLine } from "../support/commandLine";
import { convert, CSV_OF_EVERY_SHEET, soffice } from "../support/soffice";

/** Invented scores. */
const SCORES = [71.5, 64, 58.5, 80, 66.5, 62, 69, 74.5, 55, 60.5, 67, 63.5, 77, 59, 65.5, 70, 61, 68.5, 72, 57.5];
const CSV = `bid,score,remark\n${SCORES.map((score, index) => `${index + 1},${score},${index === 3 ? "=cmd()" : "fine"}`).join("\n")}\n`;
const FILES = { "bids.csv": CSV };
const PLAN = ["plan", "bids.csv", "--column", "score", "--fraction", "5%", "-o", "plan.xlsx"];

async function written(args: readonly string[], files: Record<string, Uint8Array | string> = FILES) {
  const done = await commandLine(args, files);
  expect(done.err).toBe("");
  expect(done.code).toBe(0);
  return done.written.get("plan.xlsx")!;
}

function named(workbook: Workbook, name: string) {
  const area = parseAddress(workbook.names.find((one) => one.name === name)!.formula.replace(/\$/g, ""))!;
  return workbook.sheets.find((sheet) => sheet.name === area.sheet)!.cell(area.top, area.left);
}

describe("weirmark plan", () => {
  let bytes: Uint8Array;
  let book: Workbook;
  beforeAll(async () => {
    bytes = await written(PLAN);
    book = readXlsx(bytes);
  });

  test("the audit of what it writes says that every call agrees, also to the last digit", async () => {
    const { code, out } = await commandLine(["audit", "plan.xlsx", "--tolerance", "0", "--strict"], {
      "plan.xlsx": bytes,
    });
    expect(out).toMatch(/^4\d calls: 4\d agree, 0 differ, 0 are not checkable\.\n$/);
    expect(code).toBe(0);
  });

  test("cells hold what weirmark calc says of the same scores", async () => {
    const formulas = [
      "WEIR.SAFE_CUTOFF(B2:B21,5%)",
      'WEIR.CUTOFF_LIMITS(B2:B21,5%,,,,"upper limit")',
      "WEIR.TRIALS_FOR_HIT_CHANCE(5%,90%)",
      "AVERAGE(B2:B21)",
    ];
    const { out } = await commandLine(["calc", "bids.csv", "--json", ...formulas], FILES);
    const values = out
      .trim()
      .split("\n")
      .map((line) => (JSON.parse(line) as { value: number }).value);
    expect(named(book, "weir_safe_cutoff")).toBe(values[0]);
    expect(named(book, "weir_upper_limit")).toBe(values[1]);
    // Wilks 1941: 45 looks for 90 % (0.95^45 = 0.0994).
    expect(named(book, "weir_looks_needed")).toBe(45);
    expect(values[2]).toBe(45);
    expect(named(book, "weir_mean")).toBeCloseTo(values[3]!, 12);
  });

  test("no cell holds an error, and none a truth value, which other programs don't show without the add-in", () => {
    for (const sheet of book.sheets)
      for (const { row, column } of sheet.formulas.values())
        expect(["number", "string"], `${sheet.name} ${row + 1}:${column + 1}`).toContain(
          typeof sheet.cell(row, column),
        );
  });

  test("the scores go along with all their columns, a text that looks like a formula as a text", () => {
    const sheet = book.sheets[1]!;
    expect(sheet.name).toBe("bids");
    expect(sheet.range({ top: 0, left: 0, bottom: 1, right: 2 })).toEqual([
      ["bid", "score", "remark"],
      [1, 71.5, "fine"],
    ]);
    expect(sheet.cell(4, 2)).toBe("=cmd()");
    expect(sheet.formulas.size).toBe(0);
    expect(book.names.find(({ name }) => name === "weir_scores")!.formula).toBe("bids!$B$2:$B$21");
  });

  test("the mark that is held lies on the grid of the scores, on the strict side", () => {
    const plain = named(book, "weir_plain_cutoff") as number;
    expect(named(book, "weir_fixed_mark")).toBe(Math.ceil(plain * 10) / 10);
  });

  test("the histogram counts every score once, and the chart holds what the cells hold", () => {
    const chart = book.sheets[2]!;
    let total = 0;
    for (let row = 3; typeof chart.cell(row, 2) === "number"; row++) total += chart.cell(row, 2) as number;
    expect(total).toBe(SCORES.length);
    const xml = strFromU8(unzipSync(bytes)["xl/charts/chart1.xml"]!);
    expect([...xml.matchAll(/<c:ser>/g)]).toHaveLength(6);
    const [, at, cached] = /<c:xVal><c:numRef><c:f>('Plan chart'!\$K\$4:\$K\$5)<\/c:f>.*?<c:v>([^<]*)<\/c:v>/.exec(
      xml,
    )!;
    expect(at).toBeDefined();
    expect(Number(cached)).toBe(named(book, "weir_plain_cutoff"));
  });

  test("an independent reader (SheetJS) finds the names, the inputs as percent and the formulas", () => {
    const other = readIndependently(bytes, { cellNF: true });
    const names = other.Workbook!.Names!;
    const fraction = names.find(({ Name }) => Name === "weir_fraction")!.Ref.replace(/^Plan!|\$/g, "");
    expect(other.Sheets["Plan"]![fraction]).toMatchObject({ v: 0.05, w: "5.0%" });
    const safe = names.find(({ Name }) => Name === "weir_safe_cutoff")!.Ref.replace(/^Plan!|\$/g, "");
    expect(other.Sheets["Plan"]![safe].f).toBe(
      "_xldudf_WEIR_SAFE_CUTOFF(weir_scores,weir_fraction,weir_confidence,weir_shape,weir_better)",
    );
  });

  test.each([
    ["--shape", "lognormal"],
    ["--shape", "logit(40,100)"],
    ["--shape", "boxcox"],
    ["--better", "low"],
    ["--confidence", "0.99"],
  ])("with %s %s all agrees as well", async (option, value) => {
    const made = await written([...PLAN, option, value]);
    const { out } = await commandLine(["audit", "plan.xlsx"], { "plan.xlsx": made });
    expect(out).toMatch(/ agree, 0 differ, 0 are not checkable\./);
    const plan = readXlsx(made);
    expect(named(plan, "weir_safe_cutoff")).toEqual(expect.any(Number));
    const curve = plan.sheets[2]!;
    expect(curve.cell(30, 8)).toEqual(expect.any(Number));
  });

  test.each([2, 3, 5, 5001])("with %d scores no cell fails but those that say so in words", async (count) => {
    const csv = ["score", ...Array.from({ length: count }, (_, i) => 50 + ((i * 7919) % 1000) / 50)].join("\n");
    const { code, out } = await commandLine(PLAN, { "bids.csv": csv });
    expect(code).toBe(0);
    expect(out).not.toMatch(/no answer/);
  });

  test("a sheet whose name no host takes gets one that all take", async () => {
    const { written: made } = await commandLine(["plan", "'a[b].csv", ...PLAN.slice(2)], { "'a[b].csv": CSV });
    expect(readXlsx(made.get("plan.xlsx")!).sheets[1]!.name).toBe("a b");
  });

  test("takes the sheet of an .xlsx that is named, its values alone, with headings further down", async () => {
    const first = await written([...PLAN.slice(0, -1), "plan.xlsx"]);
    const again = await commandLine(
      ["plan", "first.xlsx", "--sheet", "Bids", "--column", " SCORE ", "--fraction", "0,05", "-o", "plan.xlsx"],
      { "first.xlsx": first },
    );
    expect(again.code).toBe(0);
    const plan = readXlsx(again.written.get("plan.xlsx")!);
    expect(named(plan, "weir_safe_cutoff")).toBe(named(book, "weir_safe_cutoff"));
  });

  test("every function it calls is one of the table", () => {
    const known = new Set(functionTable.map(({ name }) => name));
    const called = book.sheets[0]!.formulas.values();
    for (const { formula } of called)
      for (const [, name] of formula.matchAll(/_xldudf_WEIR_([A-Z_]+)\(/g)) expect(known).toContain(name);
  });

  test.runIf(soffice)(
    soffice
      ? "LibreOffice opens it: the stored numbers and texts are there, no cell fails"
      : "LIBREOFFICE IS NOT HERE: the plan was not opened by it",
    () => {
      const csv = convert(bytes, CSV_OF_EVERY_SHEET);
      const plan = csv.get("book-Plan.csv")!.toString("utf8");
      expect(plan).not.toMatch(/#NAME\?|#VALUE!|Err:|#N\/A/);
      expect(plan).toMatch(/Looks for the chance wanted,"?45"?,/);
      expect(plan).toMatch(/So the shape,may hold,/);
      expect(csv.get("book-Plan chart.csv")!.toString("utf8")).not.toMatch(/#NAME\?|Err:/);
    },
  );
});

describe("weirmark plan refuses, with what to do next", () => {
  const without = (option: string) => PLAN.filter((_, index) => PLAN[index] !== option && PLAN[index - 1] !== option);
  test.each<[string, readonly string[], RegExp, Record<string, string>?]>([
    ["no file", ["plan"], /takes one file/],
    ["no column", without("--column"), /needs the heading of the scores by --column/],
    ["no fraction", without("--fraction"), /--fraction, such as 5%/],
    ["no name", without("-o"), /needs a name for the workbook by -o/],
    ["a name that is no workbook", [...without("-o"), "-o", "plan.csv"], /ends in \.xlsx/],
    [
      "its own file",
      ["plan", "./a.xlsx", "--column", "x", "--fraction", "5%", "-o", "a.xlsx"],
      /another file than the scores/,
    ],
    ["a file that is there", PLAN, /is there already/, { ...FILES, "plan.xlsx": "x" }],
    [
      "a heading that is not there",
      [...without("--column"), "--column", "scroe"],
      /Did you mean “score”\?.*“bid”, “score”, “remark”/,
    ],
    ["5 for 5 %", [...without("--fraction"), "--fraction", "5"], /If you mean 5 percent, write 5%\./],
    ["a fraction of nothing", [...without("--fraction"), "--fraction", "0%"], /between 0 and 1/],
    ["a fraction that is no number", [...without("--fraction"), "--fraction", "NaN"], /between 0 and 1/],
    ["a confidence of everything", [...PLAN, "--confidence", "100%"], /--confidence must lie between 0 and 1/],
    ["a shape that is none", [...PLAN, "--shape", "bell"], /--shape.*lognormal/],
    ["a side that is none", [...PLAN, "--better", "more"], /high or low; more was given/],
    ["a sheet that is not there", [...PLAN, "--sheet", "Other"], /no sheet “Other”/],
    ["no scores", PLAN, /There are no scores below “score”/, { "bids.csv": "bid,score\n1,\n2,\n" }],
    ["one score", PLAN, /at least 2 numbers/, { "bids.csv": "bid,score\n1,4\n" }],
    ["a text among the scores", PLAN, /“score”.*n\/a/, { "bids.csv": "bid,score\n1,4\n2,n/a\n3,5\n" }],
    [
      "a shape that can't hold the scores",
      [...PLAN, "--shape", "lognormal"],
      /numbers above 0 for the shape "lognormal"/,
      { "bids.csv": "bid,score\n1,-4\n2,4\n3,5\n" },
    ],
    ["scores all alike", PLAN, /all 2 are 4/, { "bids.csv": "bid,score\n1,4\n2,4\n" }],
    ["two columns of one heading", PLAN, /stands above 2 columns/, { "bids.csv": "score,score\n1,4\n2,5\n" }],
  ])("%s", async (_, args, message, files = FILES) => {
    const { code, err, written: made } = await commandLine(args, files);
    expect(err.replace(/\n/g, " ")).toMatch(message);
    expect(code).toBe(2);
    expect(made.size).toBe(0);
  });

  test("writes over a file only with --replace", async () => {
    const { code, written: made } = await commandLine([...PLAN, "--replace"], { ...FILES, "plan.xlsx": "x" });
    expect(code).toBe(0);
    expect(made.size).toBe(1);
  });
});
