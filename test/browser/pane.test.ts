import { mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { relativeError } from "../support/relativeError";
import { runWeirmark, withoutBrowser } from "./browser";
import { startTrial, type TrialBrowser, type TrialPage } from "./trialPage";

/** What `weirmark calc` says of a formula over one column, in its own cells A2 and down. */
function calculated(scores: readonly unknown[], formula: string): unknown {
  const folder = mkdtempSync(join(tmpdir(), "weirmark-pane-"));
  try {
    const file = join(folder, "scores.csv");
    writeFileSync(
      file,
      ["Score", ...scores.map((score) => (typeof score === "number" ? String(score) : ""))].join("\n"),
    );
    const answer = JSON.parse(runWeirmark(["calc", file, formula, "--json"])) as { value?: unknown; message?: string };
    if (answer.value === undefined) throw new Error(answer.message);
    return answer.value;
  } finally {
    rmSync(folder, { recursive: true });
  }
}

describe.skipIf(withoutBrowser)("sheet, pane and command line", () => {
  let trial: TrialBrowser;
  let sheet: TrialPage;
  beforeAll(async () => {
    trial = await startTrial();
    sheet = await trial.open();
  });
  afterAll(() => trial?.close());

  test("say the same cutoff of the score column", async () => {
    await sheet.select("Bids!I7:I78");
    const computed = sheet.page.locator("#pane", { hasText: /computed as [\d.]+/ });
    await computed.waitFor();
    const [, shown] = /computed as ([\d.]+\d)/.exec(await computed.innerText())!;

    const scores = (await sheet.read("Bids!I7:I78")).values.map(([score]) => score);
    expect(scores.filter((score) => score === null).length).toBeGreaterThan(2);
    const expected = calculated(scores, "=WEIR.TOP_FRACTION_CUTOFF(A2:A73,5%)") as number;
    expect(Number(shown)).toBeCloseTo(expected, shown!.split(".")[1]!.length);

    // Typed by hand into a cell, key by key.
    const selected = () => sheet.page.locator("#cell b").innerText();
    await sheet.select("Bids!O9");
    await expect.poll(selected).toBe("Bids!O9");
    // The grid is still scrolling there: a click that comes too early finds nothing, so it is repeated.
    const grid = (await sheet.page.locator("#grid canvas[id^=univer-sheet]").boundingBox())!;
    const click = async () => {
      await sheet.page.mouse.click(grid.x + 400, grid.y + 300);
      return selected();
    };
    await expect.poll(click, { interval: 500, timeout: 20_000 }).not.toBe("Bids!O9");
    const cell = await selected();
    await sheet.page.keyboard.type("=WEIR.TOP_FRACTION_CUTOFF(I7:I78,5%)", { delay: 15 });
    await sheet.page.keyboard.press("Enter");
    await sheet.page.waitForTimeout(500);
    const [[typed]] = (await sheet.read(cell)).values as [[number]];
    // Two engines may round Math.log and its kin differently in the last place.
    expect(relativeError(typed, expected)).toBeLessThanOrEqual(1e-14);
    expect(sheet.problems).toEqual([]);
  });

  test("say the same of a whole report", async () => {
    const scores = (await sheet.read("Bids!I7:I78")).values.map(([score]) => score);
    const expected = calculated(scores, "=WEIR.CUTOFF_REPORT(A2:A73,10%)") as [string, number][];
    const { values } = await sheet.read("Bids!L7:M20");
    expect(values.map(([label]) => label)).toEqual(expected.map(([label]) => label));
    values.forEach(([label, value], row) =>
      expect(relativeError(value as number, expected[row]![1]), String(label)).toBeLessThanOrEqual(1e-12),
    );
  });

  test("on a narrow screen one of sheet and pane is shown, and the other is a press away", async () => {
    const narrow = await trial.open({ width: 320, height: 640 });
    const pane = narrow.page.locator("#pane");
    await pane.getByText(/computed as/).waitFor({ state: "attached" });
    expect(await pane.isVisible()).toBe(false);
    await narrow.page.click("[data-shows=pane]");
    expect(await pane.isVisible()).toBe(true);
    expect(await narrow.page.locator("#grid").isVisible()).toBe(false);
    expect(await narrow.page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(320);
    expect(narrow.problems).toEqual([]);
  });
});
