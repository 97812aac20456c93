import { afterAll, afterEach, beforeAll, describe, expect, test } from "vitest";
import { callFunction } from "../../src/functions/call";
import { withoutBrowser } from "./browser";
import { startTrial, type TrialBrowser, type TrialPage } from "./trialPage";

describe.skipIf(withoutBrowser)("the trial page", () => {
  let trial: TrialBrowser;
  let sheet: TrialPage;
  beforeAll(async () => {
    trial = await startTrial();
    sheet = await trial.open();
  });
  afterAll(() => trial?.close());
  afterEach(() => {
    expect(sheet.problems).toEqual([]);
    expect(sheet.outside).toEqual([]);
  });

  test("opens without an error and asks nobody but its own server", async () => {
    await sheet.page.waitForSelector("#pane :is(h2, p)");
    expect(await sheet.page.title()).toContain("Weirmark");
  });

  test("computes every formula of the invented workbook", async () => {
    const calls = await sheet.calls();
    expect(calls.length).toBeGreaterThan(50);
    expect(calls.filter(({ value }) => typeof value === "object" && value !== null)).toEqual([]);
  });

  test("says above the sheet that the data are invented and what does not work", async () => {
    const about = await sheet.page.textContent(".about");
    expect(about).toMatch(/invented/);
    expect(about).toMatch(/A1# and @A1 don’t work/);
  });

  test("recalculates after an edit, takes it back with undo, and follows inserted rows", async () => {
    await sheet.addSheet("Edit");
    await sheet.write("Edit!A1", [[0.1], [0.2]]);
    await sheet.write("Edit!C1", [["=WEIR.SAMPLES_FOR_SD_PRECISION(A1)", "=WEIR.SAMPLES_FOR_SD_PRECISION(A2)"]]);
    const before = await sheet.read("Edit!C1:D1");
    // Greenwood & Sandomire 1950: 10 % at 95 % confidence takes 193 scores.
    expect(before.values[0]![0]).toBe(193);
    await sheet.write("Edit!A2", [[0.1]]);
    expect((await sheet.read("Edit!D1")).values).toEqual([[193]]);
    await sheet.undo();
    expect(await sheet.read("Edit!C1:D1")).toEqual(before);
    expect((await sheet.read("Edit!A2")).values).toEqual([[0.2]]);
    await sheet.page.evaluate(() =>
      (weirmarkTrial.api as any).getActiveWorkbook().getSheetByName("Edit").insertRows(0, 3),
    );
    await sheet.write("Edit!A5", [[0.1]]);
    expect((await sheet.read("Edit!C4:D4")).values).toEqual([[193, 193]]);
  });

  test("writes a block as one step that undo takes back", async () => {
    await sheet.addSheet("Block");
    await sheet.write("Block!A1", [["typed"]]);
    await sheet.write("Block!A1", [
      [1, '=WEIR.RELEASE("name")'],
      [true, "text"],
    ]);
    expect((await sheet.read("Block!A1:B2")).values).toEqual([
      [1, "Weirmark"],
      [true, "text"],
    ]);
    await sheet.undo();
    expect((await sheet.read("Block!A1:B2")).values).toEqual([
      ["typed", null],
      [null, null],
    ]);
  });

  test("spills a table, and refuses to where a cell is in the way", async () => {
    await sheet.addSheet("Spill");
    await sheet.write("Spill!A1", [["=WEIR.RELEASE()"]]);
    const { value } = callFunction("RELEASE", []) as { value: unknown };
    expect((await sheet.read("Spill!A1:B3")).values).toEqual(value);
    await sheet.write("Spill!D2", [["in the way"]]);
    await sheet.write("Spill!D1", [["=WEIR.RELEASE()"]]);
    expect((await sheet.read("Spill!D1")).values).toEqual([[{ code: "#SPILL!" }]]);
  });

  test("leaves blank cells blank", async () => {
    await sheet.addSheet("Blank");
    await sheet.write("Blank!B1", [["=WEIR.BLANK_CHECK(A1)"]]);
    expect((await sheet.read("Blank!B1")).values).toEqual([["blanks arrive as blanks"]]);
  });

  test("says why a cell is an error, in the port and in the line below the grid", async () => {
    await sheet.addSheet("Errors");
    const formulas = [
      ["=WEIR.SAMPLES_FOR_SD_PRECISION(12)", "SAMPLES_FOR_SD_PRECISION", [12]],
      ["=WEIR.SAMPLES_FOR_SD_PRECISION()", "SAMPLES_FOR_SD_PRECISION", []],
      ["=WEIR.SAMPLES_FOR_SD_PRECISION(0.1,0.9,3)", "SAMPLES_FOR_SD_PRECISION", [0.1, 0.9, 3]],
      ["=WEIR.SCORE_SUMMARY({1})", "SCORE_SUMMARY", [[[1]]]],
      ["=WEIR.SCORE_SUMMARY({1,2,#N/A})", "SCORE_SUMMARY", [[[1, 2, { code: "#N/A" }]]]],
    ] as const;
    await sheet.write(
      "Errors!A1",
      formulas.map(([formula]) => [formula]),
    );
    const { values } = await sheet.read(`Errors!A1:A${formulas.length}`);
    formulas.forEach(([formula, name, given], row) => {
      const outcome = callFunction(name, given as never) as { error: string; message: string };
      expect(values[row]![0], formula).toEqual({ code: outcome.error, message: outcome.message });
    });
    await sheet.select("Errors!A1");
    await sheet.page.waitForFunction(() => document.getElementById("cell")!.textContent!.includes("precision must be"));
    await sheet.write("Errors!A1", [['="a"+1']]);
    expect((await sheet.read("Errors!A1")).values).toEqual([[{ code: "#VALUE!" }]]);
    await sheet.write("Errors!D1", [[12, "=IF(D1>1,WEIR.SAMPLES_FOR_SD_PRECISION(D1),1/0)"]]);
    expect((await sheet.read("Errors!E1")).values[0]![0]).toHaveProperty("message");
    await sheet.write("Errors!D1", [[0]]);
    expect((await sheet.read("Errors!E1")).values).toEqual([[{ code: "#DIV/0!" }]]);
    await sheet.write("Errors!C1", [['=IFERROR(WEIR.SAMPLES_FOR_SD_PRECISION(12),"caught")']]);
    expect((await sheet.read("Errors!C1")).values).toEqual([["caught"]]);
  });

  test("knows the spelling in which a saved file holds our names, and any case", async () => {
    await sheet.addSheet("Names");
    await sheet.write("Names!A1", [
      ['=_XLDUDF_WEIR_RELEASE("name")', '=_xldudf_WEIR_RELEASE("name")', '=weir.release("name")'],
    ]);
    expect((await sheet.read("Names!A1:C1")).values).toEqual([["Weirmark", "Weirmark", "Weirmark"]]);
  });

  test("hands WORKINGS the addresses and the texts of its arguments", async () => {
    await sheet.addSheet("Proof of work");
    await sheet.write("'Proof of work'!A1", [[0.1], [0.9]]);
    await sheet.write("'Proof of work'!C1", [['=WEIR.WORKINGS("SAMPLES_FOR_SD_PRECISION",$A$1, A2)']]);
    const { values } = await sheet.read("'Proof of work'!C1:G20");
    const formulas = values.map((row) => String(row[3] ?? "")).join("\n");
    expect(formulas).toContain("$A$1");
    expect(formulas).toMatch(/[^$]A2/);
  });

  test("suggests our functions while one types, with their arguments", async () => {
    await sheet.addSheet("Typing");
    await sheet.select("Typing!B2");
    await sheet.page.mouse.click(300, 300);
    await sheet.page.keyboard.type("=weir.samples_for_sd", { delay: 30 });
    await sheet.page.waitForSelector("text=SAMPLES_FOR_SD_PRECISION");
    await sheet.page.keyboard.press("Escape");
    await sheet.page.keyboard.press("Escape");
  });
});
