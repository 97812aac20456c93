import { afterAll, afterEach, beforeAll, describe, expect, test } from "vitest";
import { mkdtempSync, readFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { read as readIndependently } from "@e965/xlsx";
import { strFromU8, unzipSync } from "fflate";
import { OPENED_BOOK } from "../support/openedBook";
import { runWeirmark, withoutBrowser } from "./browser";
import { axeFindings } from "./paneOf";
import { startTrial, type TrialBrowser, type TrialPage } from "./trialPage";

const file = (name: string, bytes: Uint8Array | string) => ({
  name,
  mimeType: "application/octet-stream",
  buffer: Buffer.from(bytes),
});
const CSV = "Entry;Score\n" + Array.from({ length: 40 }, (_, i) => `E${i};${50 + ((i * 7) % 31)},5`).join("\n");

async function computed({ page }: TrialPage): Promise<void> {
  await page.waitForSelector("body[data-state=computed]", { timeout: 30_000 });
}

/** Picks a file and waits until the page has been loaded anew with it. */
async function open(sheet: TrialPage, name: string, bytes: Uint8Array | string): Promise<void> {
  const loaded = sheet.page.waitForEvent("load");
  await sheet.page.setInputFiles("#file", file(name, bytes));
  await loaded;
  await computed(sheet);
}

describe.skipIf(withoutBrowser)("files of the user's own in the trial page", () => {
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

  test("a broken file is refused aloud, and the workbook stays as it was", async () => {
    await sheet.page.setInputFiles("#file", file("broken.xlsx", OPENED_BOOK.slice(0, 2000)));
    const alert = sheet.page.getByRole("alert");
    await alert.waitFor();
    expect(await alert.innerText()).toMatch(
      /broken\.xlsx can’t be opened; the workbook here stays.*\n+.*cut off or damaged/,
    );
    expect((await sheet.read("Bids!A1")).values).not.toEqual([[null]]);
    await sheet.page.locator("#message button").press("Enter");
    expect(await sheet.page.locator("#message").isVisible()).toBe(false);
    expect(await sheet.page.evaluate(() => document.activeElement?.id)).toBe("open");
  });

  test("a list opens at once over the untouched workbook, with its decimal commas", async () => {
    await open(sheet, "scores.csv", CSV);
    expect((await sheet.read("scores!A1:B2")).values).toEqual([
      ["Entry", "Score"],
      ["E0", 50.5],
    ]);
    expect(await sheet.page.textContent(".about")).toMatch(/scores\.csv, opened from your files/);
    expect(await sheet.page.textContent(".about")).not.toMatch(/invented/);
    await sheet.select("scores!B2:B41");
    await sheet.page.getByText("40 scores").first().waitFor();
  });

  test("before a workbook takes the place of another, the page asks and says what it can't show", async () => {
    await sheet.page.setInputFiles("#file", file("bids.xlsx", OPENED_BOOK));
    const message = sheet.page.locator("#message");
    await sheet.page.getByRole("button", { name: "Open it" }).waitFor();
    const words = await message.innerText();
    expect(words).toMatch(/bids\.xlsx: 20 cells on 2 sheets/);
    expect(words).toMatch(/takes the place of the workbook here/);
    expect(words).toMatch(/1 chart, 1 picture/);
    expect(await axeFindings(sheet.page)).toEqual([]);
    await sheet.page.getByRole("button", { name: "Keep what is here" }).click();
    expect(await message.isVisible()).toBe(false);
    expect((await sheet.read("scores!B2")).values).toEqual([[50.5]]);

    await sheet.page.setInputFiles("#file", file("bids.xlsx", OPENED_BOOK));
    await Promise.all([sheet.page.waitForEvent("load"), sheet.page.getByRole("button", { name: "Open it" }).click()]);
    await computed(sheet);
  });

  test("its formulas are computed: ours, names, spills, what was pinned; its errors and flags are those of the file", async () => {
    // Greenwood & Sandomire 1950 for 10 %; the others by hand: 71.4 + 65.5 + 68 = 204.9, 1 + 2 + 3 + 4 = 10,
    // 3.1² + 2.8² + 0.3² = 17.54.
    expect((await sheet.read("Bids!D2")).values).toEqual([[193]]);
    expect((await sheet.read("Bids!D5:E8")).values).toEqual([
      [204.9, 12],
      [1, 2],
      [3, 4],
      [10, 0.25],
    ]);
    expect((await sheet.read("Bids!D3")).values[0]![0]).toBeCloseTo(Math.sqrt(17.54 / 2), 12);
    expect((await sheet.read("Bids!A2:A4")).values).toEqual([["=no formula"], [true], [{ code: "#N/A" }]]);
    await sheet.write("Bids!B2", [[81.4]]);
    expect((await sheet.read("Bids!D5")).values).toEqual([[214.9]]);
  });

  test("a reload loses nothing of it", async () => {
    await sheet.page.waitForTimeout(1200);
    await sheet.page.reload();
    await computed(sheet);
    expect((await sheet.read("Bids!B2:D2")).values).toEqual([[81.4, null, 193]]);
    expect((await sheet.read("Bids!D6:E7")).values).toEqual([
      [1, 2],
      [3, 4],
    ]);
    expect(await sheet.page.textContent(".about")).toMatch(/bids\.xlsx/);
  });

  test("starting over asks, and leads back to the invented workbook", async () => {
    await sheet.page.click("#start-over");
    await Promise.all([sheet.page.waitForEvent("load"), sheet.page.click("#discard")]);
    await computed(sheet);
    expect(await sheet.page.textContent(".about")).toMatch(/invented/);
    expect((await sheet.read("Bids!A1")).values).not.toEqual([["entry"]]);
  });

  test("a file dropped on the page opens, two at once don't", async () => {
    const drop = (names: readonly string[]) =>
      sheet.page.evaluate(
        ({ all, csv }) => {
          const data = new DataTransfer();
          for (const name of all) data.items.add(new File([csv], name));
          const target = document.getElementById("grid")!;
          for (const kind of ["dragenter", "dragover", "drop"])
            target.dispatchEvent(new DragEvent(kind, { bubbles: true, cancelable: true, dataTransfer: data }));
        },
        { all: names as string[], csv: CSV },
      );
    await drop(["a.csv", "b.csv"]);
    await sheet.page.getByText("One file at a time").waitFor();
    const loaded = sheet.page.waitForEvent("load");
    await drop(["dropped.csv"]);
    await loaded;
    await computed(sheet);
    expect((await sheet.read("dropped!B2")).values).toEqual([[50.5]]);
    // Its first cell is selected, which holds no score: the pane has something else to try.
    await sheet.page.getByRole("button", { name: "Try it with invented scores" }).click();
    await sheet.page.getByText("48 scores").first().waitFor();
  });

  test("where the browser keeps nothing, it says so and leaves the workbook as it was", async () => {
    const other = await trial.open();
    await other.page.evaluate(() => {
      // Only the background writes: what it asks of the browser is refused there.
      const Real = Worker;
      globalThis.Worker = class extends Real {
        override postMessage(message: unknown) {
          if ((message as { kind: string }).kind === "take")
            this.onmessage?.(new MessageEvent("message", { data: { kind: "notKept" } }));
          else super.postMessage(message);
        }
      };
    });
    await other.page.setInputFiles("#file", file("scores.csv", CSV));
    await other.page.getByText("This browser keeps nothing for this page").waitFor();
    expect((await other.read("Bids!A1")).values).not.toEqual([[null]]);
  });

  test("100,000 rows are read in the background: the page never stands still for long", async () => {
    const rows = Array.from({ length: 100_000 }, (_, i) => `E${i},${(i * 7919) % 1000},${i % 7},late,fine`);
    const other = await trial.open();
    await other.page.evaluate(() => {
      const longest = { ms: 0 };
      Object.assign(globalThis, { longest });
      new PerformanceObserver((list) => {
        for (const { duration } of list.getEntries()) longest.ms = Math.max(longest.ms, duration);
      }).observe({ type: "longtask" });
    });
    const loaded = other.page.waitForEvent("load");
    await other.page.setInputFiles("#file", file("many.csv", ["Entry,Score,Week,A,B", ...rows].join("\n")));
    await other.page.getByText("Reading many.csv").waitFor();
    await other.page.waitForTimeout(300);
    const longest = await other.page.evaluate(() => (globalThis as unknown as { longest: { ms: number } }).longest.ms);
    await loaded;
    await computed(other);
    expect(longest).toBeLessThan(400);
    expect((await other.read("many!B100001")).values).toEqual([[(99_999 * 7919) % 1000]]);
    expect(other.problems).toEqual([]);
  });

  test("reading can be cancelled", async () => {
    const other = await trial.open();
    await other.page.evaluate(() => {
      globalThis.Worker = class extends Worker {
        override postMessage() {}
      };
    });
    await other.page.setInputFiles("#file", file("scores.csv", CSV));
    await other.page.getByRole("button", { name: "Cancel" }).click();
    expect(await other.page.locator("#message").isVisible()).toBe(false);
  });
});

/** Presses "Save as .xlsx" and gives the path of what the browser was handed. */
async function save({ page }: TrialPage): Promise<{ name: string; path: string }> {
  const [download] = await Promise.all([page.waitForEvent("download"), page.click("#save")]);
  const name = download.suggestedFilename();
  const path = join(mkdtempSync(join(tmpdir(), "weirmark-")), name);
  await download.saveAs(path);
  return { name, path };
}

/** Every cell of the workbook in the page, sheet by sheet. */
async function everyCell(sheet: TrialPage): Promise<Record<string, unknown>> {
  const names = await sheet.page.evaluate(() => weirmarkTrial.port.sheetNames());
  const cells: Record<string, unknown> = {};
  for (const name of names) cells[name] = await sheet.read(`'${name.replace(/'/g, "''")}'!A1:Z200`);
  return cells;
}

describe.skipIf(withoutBrowser)("a workbook saved from the trial page", () => {
  let trial: TrialBrowser;
  beforeAll(async () => {
    trial = await startTrial();
  });
  afterAll(() => trial?.close());

  test("opens again with the same cells, formulas and settings, and the audit agrees with all of it", async () => {
    const sheet = await trial.open();
    await sheet.write("Bids!O3", [[0.1, "=WEIR.SAMPLES_FOR_SD_PRECISION(O3)", true, "=O3", '="=" & "x"']]);
    await sheet.page.evaluate(() => weirmarkTrial.port.keepSetting("test", { asked: "“5 %” & <so on>" }));
    const before = { cells: await everyCell(sheet), calls: await sheet.calls() };
    const { name, path } = await save(sheet);
    expect(name).toBe("weirmark-trial.xlsx");
    await sheet.page.getByText("handed to your browser").waitFor();

    const audit = runWeirmark(["audit", path, "--json"])
      .trim()
      .split("\n")
      .map((line) => JSON.parse(line) as { verdict: string });
    expect(audit.length).toBeGreaterThan(50);
    expect(audit.filter(({ verdict }) => verdict !== "agrees")).toEqual([]);

    const book = readIndependently(readFileSync(path), { type: "buffer", cellFormula: true });
    expect(book.SheetNames).toEqual(Object.keys(before.cells));
    expect(book.Sheets["Bids"]!["P3"]).toMatchObject({
      t: "n",
      v: 193,
      f: "_xldudf_WEIR_SAMPLES_FOR_SD_PRECISION(O3)",
    });

    const other = await trial.open();
    await open(other, name, readFileSync(path));
    expect(await other.calls()).toEqual(before.calls);
    expect(await everyCell(other)).toEqual(before.cells);
    expect(await other.page.evaluate(() => weirmarkTrial.port.readSetting("test"))).toEqual({
      asked: "“5 %” & <so on>",
    });
    expect([...sheet.problems, ...other.problems]).toEqual([]);
  });

  test("takes pictures along, drawn as PNG", async () => {
    const sheet = await trial.open();
    await sheet.page.evaluate(() =>
      weirmarkTrial.port.insertPicture("Bids!O9", {
        name: "a blue square",
        svg: '<svg xmlns="http://www.w3.org/2000/svg" width="40" height="20"><rect width="40" height="20" fill="#0000ff"/></svg>',
        width: 40,
        height: 20,
      }),
    );
    const { path } = await save(sheet);
    const parts = unzipSync(readFileSync(path));
    // Begins as every PNG does (W3C PNG, 5.2), and is drawn at two dots a pixel: 80 wide, at byte 16.
    const png = parts["xl/media/image1.png"]!;
    expect([...png.slice(0, 8)]).toEqual([137, 80, 78, 71, 13, 10, 26, 10]);
    expect(new DataView(png.buffer, png.byteOffset).getUint32(16)).toBe(80);
    expect(strFromU8(parts["xl/drawings/drawing1.xml"]!)).toContain('descr="a blue square"');
    expect(sheet.problems).toEqual([]);
  });

  test("100,000 rows are written in the background", async () => {
    const sheet = await trial.open();
    const rows = Array.from({ length: 100_000 }, (_, i) => `E${i},${(i * 7919) % 1000},${i % 7},late,fine`);
    await open(sheet, "many.csv", ["Entry,Score,Week,A,B", ...rows].join("\n"));
    await sheet.page.evaluate(() => {
      const longest = { ms: 0 };
      Object.assign(globalThis, { longest });
      new PerformanceObserver((list) => {
        for (const { duration } of list.getEntries()) longest.ms = Math.max(longest.ms, duration);
      }).observe({ type: "longtask" });
    });
    const { name, path } = await save(sheet);
    const longest = await sheet.page.evaluate(() => (globalThis as unknown as { longest: { ms: number } }).longest.ms);
    expect(name).toBe("many.xlsx");
    expect(longest).toBeLessThan(1500);
    expect(readIndependently(readFileSync(path)).Sheets["many"]!["B100001"]).toMatchObject({
      v: (99_999 * 7919) % 1000,
    });
  });
});
