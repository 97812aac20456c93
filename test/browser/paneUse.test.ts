import { readFileSync } from "node:fs";
import { join } from "node:path";
import type { Locator } from "playwright-core";
import { afterAll, beforeAll, beforeEach, describe, expect, test } from "vitest";
import { withoutBrowser } from "./browser";
import { paneOnRopes, settled } from "./paneOf";
import { startTrial, type TrialBrowser, type TrialPage } from "./trialPage";

describe.skipIf(withoutBrowser)("working in the pane", () => {
  let trial: TrialBrowser;
  let sheet: TrialPage;
  let pane: Locator;
  beforeAll(async () => {
    trial = await startTrial();
  });
  afterAll(() => trial?.close());
  beforeEach(async () => {
    sheet = await trial.open();
    pane = await paneOnRopes(sheet);
    return async () => {
      expect(sheet.problems).toEqual([]);
      expect(sheet.outside).toEqual([]);
      await sheet.page.context().close();
    };
  });

  test("the column, its blanks by address, and the mark in a sentence", async () => {
    const words = await pane.innerText();
    expect(words).toContain("“rope score”, Ropes!A2:A61");
    expect(words).toContain("57 scores, 3 blanks skipped (A6, A22 and A43).");
    // 81.9527…, limits 79.4032… and 85.3970…: test/reference/cases/cutoff.json.
    expect(words).toContain("Take entries scoring 82.0 or more");
    expect(words).toContain("computed as 81.95");
    expect(words).toContain("between 79.40 and 85.40");
  });

  test("a 5 typed for 5 % is asked back, 10 % is taken at once", async () => {
    const share = pane.getByLabel("Share to take");
    await share.fill("5");
    await pane.getByText("Did you mean 5%?").waitFor();
    expect(await share.getAttribute("aria-invalid")).toBe("true");
    expect(await pane.innerText()).toContain("82.0 or more");
    await share.fill("10 %");
    await pane.getByText("Take entries scoring 79.4 or more").waitFor();
    expect(await share.getAttribute("aria-invalid")).toBeNull();
  });

  test("a selection elsewhere never takes the keyboard away from the pane", async () => {
    await pane.getByLabel("Share to take").focus();
    await sheet.select("Bids!I7:I78");
    await pane.getByText("Bids!I7:I73").first().waitFor();
    expect(await sheet.page.evaluate(() => document.activeElement?.closest("#pane") !== null)).toBe(true);
  });

  test("a text among the scores is named by its address, with the cell's own refusal", async () => {
    await sheet.write("Ropes!A9", [["n/a"]]);
    await pane.getByText("No cutoff yet").waitFor();
    const words = await pane.innerText();
    expect(words).toContain("A9 holds the text “n/a”");
    expect(words).toContain("#VALUE! scores must be numbers");
    expect(words).toContain("Correct the cells listed under Scores");
  });

  test("a formula goes into an empty cell, and never over something unasked", async () => {
    const target = pane.locator(".cutoff .target");
    const put = target.getByRole("button", { name: "Put it in" });
    await target.getByLabel("Cell", { exact: true }).fill("C2");
    await put.click();
    await pane.getByText("The formula stands in Ropes!C2.").waitFor();
    const report = await sheet.read("Ropes!C2:D15");
    expect(report.values.map(([label]) => label)).toContain("safe cutoff");
    expect(report.values[0]).toEqual(["scores used", 57]);
    await target.getByLabel("Cell", { exact: true }).fill("C4");
    await put.click();
    await target.getByText("it would show #SPILL!").waitFor();
    await pane.getByLabel("What to put").first().selectOption({ label: "the cutoff" });
    await sheet.write("Ropes!F9", [["mine"]]);
    await settled(sheet.page);
    await target.getByLabel("Cell", { exact: true }).fill("F9");
    await put.click();
    await target.getByText("Ropes!F9 holds “mine”. Shall it be replaced?").waitFor();
    expect((await sheet.read("Ropes!F9")).values).toEqual([["mine"]]);
    await target.getByRole("button", { name: "Replace it" }).click();
    await pane.getByText("The formula stands in Ropes!F9.").waitFor();
    expect((await sheet.read("Ropes!F9")).values[0]![0]).toBeCloseTo(81.95271223532491, 9);
  });

  test("verdicts go into the next free column in one action, one step to undo", async () => {
    await pane.getByRole("button", { name: "Write the verdicts into the next free column" }).click();
    await pane.getByText("The verdicts stand in B2:B61.").waitFor();
    const { values } = await sheet.read("Ropes!A1:B61");
    expect(values[0]).toEqual(["rope score", "verdict"]);
    for (const [score, verdict] of values.slice(1)) {
      const expected =
        typeof score !== "number"
          ? ""
          : score >= 85.397
            ? "clears"
            : score >= 79.403
              ? "too close to call"
              : "falls short";
      expect(verdict ?? "", String(score)).toBe(expected);
    }
    await sheet.undo();
    expect((await sheet.read("Ropes!B1:B2")).values).toEqual([[null], [null]]);
  });

  test("a mark is written down with its reason, and newer scores are told from it", async () => {
    const use = pane.locator(".use");
    await use.locator("summary", { hasText: "Fix the mark" }).click();
    await use.getByRole("button", { name: "Write it down" }).click();
    await use.getByText("Say why").waitFor();
    await use.getByLabel("Reason").fill("Agreed by the panel");
    await use.getByRole("button", { name: "Write it down" }).click();
    await use.getByText("It stands in 'Fixed marks'!A2.").waitFor();
    const { values } = await sheet.read("'Fixed marks'!A1:N2");
    expect(values[1]!.slice(0, 2)).toEqual([82, "high"]);
    expect(values[1]!.slice(3, 8)).toEqual(["Agreed by the panel", 57, "Ropes!A2:A61", "plain", 0.05]);
    await use.getByText("The 57 scores of today give the same.").waitFor();
    await sheet.write("Ropes!A62", [[95], [96], [97]]);
    await use.getByText(/The 60 scores of today would set it at [\d.]+, [\d.]+ higher/).waitFor();
  });

  test("a long simulation shows its progress, can be stopped, and ends with its table", async () => {
    const search = pane.locator(".search");
    await search.locator("summary", { hasText: "Try the search out" }).click();
    await search.getByLabel("Runs").fill("3000000");
    await search.getByRole("button", { name: "Start" }).click();
    await search.locator("progress").waitFor();
    await sheet.page.waitForFunction(() => document.querySelector<HTMLProgressElement>("#pane progress")!.value > 0);
    await search.getByRole("button", { name: "Cancel" }).click();
    await search.getByText("Cancelled.").waitFor();
    await search.getByLabel("Runs").fill("2000");
    await search.getByRole("button", { name: "Start" }).click();
    await search.getByText(/Half of the runs ended within \d+ searching looks/).waitFor();
    // The same runs as in a cell: the same seed, the same bits.
    const [outcome] = await sheet.call([
      { name: "SIMULATED_SEARCH", given: [0, 1, 0.05, 57, "plain", 2000, 1, 10000, "median looks"] },
    ]);
    expect(await search.innerText()).toContain(`within ${(outcome as { value: number }).value} searching looks`);
  });

  test("pictures can be taken along as SVG and PNG, and into the sheet without covering the scores", async () => {
    const figure = pane.locator("figure").first();
    const saved = async (words: string) => {
      const waiting = sheet.page.waitForEvent("download");
      await figure.getByRole("button", { name: words }).click();
      const download = await waiting;
      return { name: download.suggestedFilename(), bytes: readFileSync(await download.path()) };
    };
    const svg = await saved("Save as SVG");
    expect(svg.name).toBe("Scores and cutoff- rope score.svg");
    expect(svg.bytes.toString("utf8")).toMatch(/^<svg xmlns="http:\/\/www\.w3\.org\/2000\/svg"/);
    const png = await saved("Save as PNG");
    expect(png.bytes.subarray(1, 4).toString("latin1")).toBe("PNG");
    // Twice the size of the SVG, so that it stays sharp in print: 2 × (640 + 2 × 16).
    expect(png.bytes.readUInt32BE(16)).toBe(1344);
    await figure.getByRole("button", { name: "Put into the sheet" }).click();
    await figure.getByText("The picture stands at Ropes!B2.").waitFor();
  });

  test("the finder answers a question, builds the formula and shows its value before it goes into a cell", async () => {
    const finder = pane.locator(".functions");
    await finder.getByLabel("What do you want to know?").fill("tolerance factor");
    await finder.getByRole("button", { name: "TOLERANCE_FACTOR", exact: true }).click();
    await finder.getByText("Still needed: count, coverage.").waitFor();
    await finder.getByLabel("count", { exact: true }).fill("10");
    await finder.getByLabel("coverage", { exact: true }).fill("90%");
    // k for n = 10, coverage 90 %, confidence 95 %: 2.355 (table kB of test/reference/published/tolerance_factors.json).
    await finder.getByText(/^2\.35\d+$/).waitFor();
    expect(await finder.innerText()).toContain("=WEIR.TOLERANCE_FACTOR(10,0.9)");
  });

  test("pass rates of groups are read beside the scores", async () => {
    await sheet.write("Ropes!B1", [
      ["team"],
      ...Array.from({ length: 60 }, (_, row) => [row % 2 === 0 ? "north" : "south"]),
    ]);
    const use = pane.locator(".use");
    await use.locator("summary", { hasText: "Pass rates of groups" }).click();
    await use.getByRole("textbox", { name: "Column that names the groups" }).fill("B2");
    await use.locator("figcaption", { hasText: /north: \d/ }).waitFor();
    expect(await use.innerText()).toContain("Where the entries are people");
    // What can't be groups is said, and not warned of sixty times.
    const names = use.getByRole("textbox", { name: "Column that names the groups" });
    await names.fill("Nowhere!B2");
    await use.getByText("There is no sheet “Nowhere”.").waitFor();
    await sheet.write(
      "Ropes!D2",
      Array.from({ length: 60 }, (_, row) => [`bid ${row}`]),
    );
    await names.fill("D2");
    await use.getByText("That column names 57 groups for 57 entries").waitFor();
  });

  test("what was asked is kept with the workbook, and a mere look changes nothing in it", async () => {
    const keep = () => sheet.page.evaluate(() => weirmarkTrial.port.readSetting("cutoff"));
    await settled(sheet.page);
    expect(await keep()).toBeUndefined();
    await pane.getByLabel("Better is").selectOption("low");
    await sheet.page.waitForTimeout(1200);
    expect(await keep()).toMatchObject({ better: "low", fraction: 0.05 });
  });
});

test.skipIf(withoutBrowser)("the functions bundle holds nothing of the pane", () => {
  const bundle = readFileSync(join(__dirname, "../../dist/functions.js"), "utf8");
  expect(bundle).not.toContain("weirmark-pane");
  expect(bundle).not.toContain("Take entries scoring");
});
