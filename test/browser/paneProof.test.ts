import { readFileSync } from "node:fs";
import { strFromU8, unzipSync } from "fflate";
import type { Locator } from "playwright-core";
import { afterAll, beforeAll, beforeEach, describe, expect, test } from "vitest";
import { withoutBrowser } from "./browser";
import { axeFindings, paneOnRopes, settled, unfold } from "./paneOf";
import { startTrial, type TrialBrowser, type TrialPage } from "./trialPage";

/** 60 + 10 times the 95 % quantile of the normal distribution, 1.644853626951473 (any table of it). */
const MARK = 76.44853626951472;

describe.skipIf(withoutBrowser)("proof in the pane", () => {
  let trial: TrialBrowser;
  let sheet: TrialPage;
  let pane: Locator;
  let proof: Locator;
  beforeAll(async () => {
    trial = await startTrial();
  });
  afterAll(() => trial?.close());
  beforeEach(async () => {
    sheet = await trial.open();
    pane = await paneOnRopes(sheet);
    proof = pane.locator(".proof");
    return async () => {
      expect(sheet.problems).toEqual([]);
      expect(sheet.outside).toEqual([]);
      await sheet.page.context().close();
    };
  });

  const check = async () => {
    await proof.getByRole("button", { name: /^Check all calls/ }).click();
    await proof.getByText(/^\d+ calls?: /).waitFor();
  };
  const found = (address: string) =>
    proof.locator(".findings li", { has: sheet.page.getByRole("button", { name: address, exact: true }) });
  const selected = () => sheet.page.evaluate(() => weirmarkTrial.port.selection().then((block) => block?.address));
  const typeOver = async () => {
    await sheet.write(
      "Ropes!E2",
      Array.from({ length: 6 }, () => ["=WEIR.CURVE_CUTOFF(60,10,5%)"]),
    );
    expect((await sheet.read("Ropes!E5")).values[0]![0]).toBeCloseTo(MARK, 10);
    await sheet.write("Ropes!E5", [[75]]);
  };

  test("the audit is loaded when it is first asked for, and every call of the trial workbook agrees", async () => {
    const scripts: string[] = [];
    sheet.page.on("request", (request) => void (request.url().endsWith(".js") && scripts.push(request.url())));
    const calls = (await sheet.calls()).length;
    await check();
    expect(scripts.length).toBeGreaterThan(0);
    await proof.getByText(`${calls} calls: ${calls} agree, 0 differ, 0 not checkable.`).waitFor();
    expect(await proof.innerText()).toMatch(
      /Checked on \d{4}-\d\d-\d\d at \d\d:\d\d, by revision \d+ of the numbers\./,
    );
  });

  test("a number typed over is named, and a press leads to its cell", async () => {
    await typeOver();
    await check();
    const line = found("Ropes!E5");
    expect(await line.innerText()).toContain("typed over");
    expect(await line.innerText()).toContain("76.448");
    await sheet.select("Bids!A1");
    await line.getByRole("button").click();
    await expect.poll(selected).toBe("Ropes!E5");
  });

  test("what agrees is shown on request; cells that change afterwards are told of", async () => {
    await typeOver();
    await check();
    const narrow = proof.getByLabel("Only what does not agree");
    expect(await narrow.isChecked()).toBe(true);
    expect(await found("Ropes!E4").count()).toBe(0);
    await narrow.uncheck();
    const all = proof.getByRole("button", { name: /^Show all \d+$/ });
    if (await all.isVisible()) await all.click();
    expect(await found("Ropes!E4").innerText()).toContain("agrees");
    expect(await proof.getByText("Cells have changed since").isVisible()).toBe(false);
    await sheet.write("Ropes!A2", [[50]]);
    await proof.getByText("Cells have changed since: check again.").waitFor();
    await check();
    await expect.poll(() => proof.getByText("Cells have changed since").isVisible()).toBe(false);
  });

  test("the workings of the selected cell, one call chosen among several, written beside as live formulas", async () => {
    const call = "WEIR.TOP_FRACTION_CUTOFF(A2:A61,5%)";
    await sheet.write("Ropes!C2", [[`=WEIR.CLEARANCE_CONFIDENCE(${call},A2:A61,5%)`]]);
    const fold = proof.locator("details", { hasText: "Workings of the selected cell" }).first();
    await fold.locator("summary").first().click();
    await sheet.select("Ropes!B9");
    await fold.getByText("No call in Ropes!B9 has workings.").waitFor();
    await sheet.select("Ropes!C2");
    await fold.getByText("How the value of Ropes!C2 comes about:").waitFor();
    await fold.getByLabel("Which call").selectOption({ label: call });
    await fold.getByText("=-NORM.S.INV(5%)", { exact: true }).waitFor();
    // The last step is the value of the call: 81.95271223532491, test/reference/cases/cutoff.json.
    expect(await fold.locator(".steps .value").last().innerText()).toMatch(/^81\.95271223532/);
    await fold.getByRole("button", { name: "Write the workings beside it" }).click();
    const said = fold.getByText("The workings stand in E2:I8.");
    await said.waitFor();
    expect(await said.innerText()).toContain("All 5 formulas are live and give the values beside them.");
    const { values } = await sheet.read("Ropes!E8:H8");
    expect(values[0]![3]).toBeCloseTo(81.95271223532491, 9);
    // Live: it follows the cell that it reads.
    await sheet.write("Ropes!A2", [[0]]);
    await expect.poll(async () => (await sheet.read("Ropes!H8")).values[0]![0]).not.toBeCloseTo(81.95271223532491, 3);
    // A second time it goes beside the first, never over it.
    await settled(sheet.page);
    await fold.getByRole("button", { name: "Write the workings beside it" }).click();
    await fold.getByText("The workings stand in K2:").waitFor();
    // Where the user wants it, but never over something.
    const first = fold.getByLabel("First cell for the table");
    await first.fill("F7");
    await fold.getByRole("button", { name: "Write the workings beside it" }).click();
    await fold.getByText(/^\S+ holds .+, and is not written over\. Choose another cell\.$/).waitFor();
    await first.fill("E20");
    await fold.getByRole("button", { name: "Write the workings beside it" }).click();
    await fold.getByText("The workings stand in E20:I26.").waitFor();
  });

  test("cells are read where they were asked for, however empty the first of them are", async () => {
    await sheet.write("Ropes!D3", [["taken"]]);
    // Beyond the last column of the sheet, which has 26: what is read ends there, but begins where it was asked for.
    const wide = await sheet.read("Ropes!B2:AZ4");
    expect(wide.address).toMatch(/^Ropes!B2:[A-Z]+4$/);
    expect(wide.values[1]!.slice(0, 4)).toEqual([null, null, "taken", null]);
    expect((await sheet.read("Ropes!AZ900")).values).toEqual([[null]]);
    expect((await sheet.read("Ropes!D:D")).values).toEqual([["taken"]]);
  });

  test("a report can be taken along as a page, a workbook and CSV", async () => {
    await typeOver();
    await check();
    const saved = async (words: string) => {
      const waiting = sheet.page.waitForEvent("download");
      await proof.getByRole("button", { name: words }).click();
      const download = await waiting;
      return { name: download.suggestedFilename(), bytes: readFileSync(await download.path()) };
    };
    const page = await saved("To print (HTML)");
    expect(page.name).toMatch(/^Proof \d{4}-\d\d-\d\d\.html$/);
    const text = page.bytes.toString("utf8");
    expect(text).toContain("typed over");
    expect(text).toMatch(/revision \d+ of the numbers; tolerance 1e-9; checked \d{4}-\d\d-\d\d \d\d:\d\d/);
    const calls = (await sheet.calls()).length;
    expect(text.match(/<td class="short[^>]*>(agrees|differs|not checkable)<\/td>/g)).toHaveLength(calls);
    const book = await saved("Workbook (.xlsx)");
    expect(book.name).toMatch(/\.xlsx$/);
    expect(strFromU8(unzipSync(book.bytes)["xl/workbook.xml"]!)).toContain('name="Calls"');
    const plain = await saved("CSV");
    expect(plain.bytes.toString("utf8").split("\r\n")[0]).toBe(
      '\ufeff"sheet","cell","formula","stored","recomputed","verdict","why"',
    );
  });

  test("a check that takes long shows how far it is and can be cancelled", async () => {
    const games = Array.from({ length: 80 }, (_, seed) => [
      `=WEIR.SIMULATED_SEARCH(0,1,5%,57,,8000,${seed + 1},,"average looks")`,
    ]);
    await sheet.write("Ropes!C2", games);
    await proof.getByRole("button", { name: "Check all calls" }).click();
    const cancel = proof.getByRole("button", { name: "Cancel" });
    // Pressed from within the page at the first word of progress: on a quick machine the check would be over before a press from outside.
    const seen = await sheet.page.evaluate(
      () =>
        new Promise<{ words: string; bar: boolean }>((resolve) => {
          const timer = setInterval(() => {
            const part = document.querySelector("#pane .proof")!;
            const words = /\d+ of \d+ calls/.exec((part as HTMLElement).innerText)?.[0];
            const press = [...part.querySelectorAll("button")].find((one) => one.textContent === "Cancel");
            if (words === undefined || !press) return;
            clearInterval(timer);
            resolve({ words, bar: part.querySelector("progress")!.checkVisibility() });
            press.click();
          }, 5);
        }),
    );
    expect(seen.words).toMatch(/^[1-9]\d* of \d+ calls$/);
    expect(seen.bar).toBe(true);
    await proof.getByText("Cancelled: this check gave no result.").waitFor();
    expect(await cancel.isVisible()).toBe(false);
    await sheet.page.waitForTimeout(500);
    expect(await proof.locator(".findings li").count()).toBe(0);
  });
});

describe.skipIf(withoutBrowser)("the look of the proof", () => {
  let trial: TrialBrowser;
  beforeAll(async () => {
    trial = await startTrial();
  });
  afterAll(() => trial?.close());

  async function proven(options: Parameters<TrialBrowser["open"]>[0]) {
    const sheet = await trial.open(options);
    const pane = await paneOnRopes(sheet);
    await sheet.write("Ropes!C2", [["=WEIR.CUTOFF_REPORT(A2:A61,5%)"]]);
    await sheet.select("Ropes!C2");
    if ((options?.width ?? 1280) < 600) await sheet.page.click("[data-shows=pane]");
    const proof = pane.locator(".proof");
    await proof.getByRole("button", { name: "Check all calls" }).click();
    await proof.locator(".findings li").first().waitFor();
    await proof.getByLabel("Only what does not agree").uncheck();
    await unfold(proof);
    await proof.locator(".steps li").first().waitFor();
    await unfold(proof);
    return { sheet, proof };
  }

  test.each(["light", "dark"] as const)("axe finds nothing, %s", async (scheme) => {
    const { sheet } = await proven({ scheme });
    expect(await axeFindings(sheet.page)).toEqual([]);
    expect(sheet.problems).toEqual([]);
  });

  test("at 320 pixels nothing is cut off or scrolls sideways", async () => {
    const { proof } = await proven({ width: 320, height: 640 });
    const wide = await proof.evaluate((root) => {
      const edge = root.getBoundingClientRect().right;
      return [...root.querySelectorAll("*")]
        .filter((one) => one.getBoundingClientRect().right > edge + 0.5 || one.scrollWidth > one.clientWidth + 1)
        .filter((one) => getComputedStyle(one).display !== "inline")
        .map((one) => `${one.tagName} ${one.className} ${one.textContent?.slice(0, 40)}`);
    });
    expect(wide).toEqual([]);
  });

  test("in German its words are German", async () => {
    const { sheet } = await proven({});
    const pane = sheet.page.locator("#pane");
    await pane.getByLabel("Language").selectOption("de");
    await pane.getByRole("button", { name: "Alle Aufrufe prüfen" }).click();
    await pane.getByText(/^\d+ Aufrufe: \d+ stimmen, 0 weichen ab, 0 nicht prüfbar\./).waitFor();
    expect(await axeFindings(sheet.page)).toEqual([]);
  });
});
