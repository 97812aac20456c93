import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { readXlsx } from "../../src/hosts/file/readXlsx";
import { formatAddress, parseAddress } from "../../src/sheet/address";
import type { Cell } from "../../src/sheet/cell";
import { commandLine } from "../support/commandLine";
import { withoutBrowser } from "./browser";
import { axeFindings, paneOnRopes, ropeScores, settled } from "./paneOf";
import { startTrial, type TrialBrowser, type TrialPage } from "./trialPage";

/** What the command line writes for the same scores: every named cell with its value. */
async function byCommandLine(): Promise<Map<string, Cell[]>> {
  const csv = ropeScores()
    .map(([cell], row) => `${row},${cell ?? ""}`)
    .join("\n");
  const { written } = await commandLine(
    ["plan", "Ropes.csv", "--column", "rope score", "--fraction", "5%", "-o", "plan.xlsx"],
    { "Ropes.csv": csv },
  );
  const book = readXlsx(written.get("plan.xlsx")!);
  const values = new Map<string, Cell[]>();
  for (const { name, formula } of book.names) {
    const area = parseAddress(formula.replace(/\$/g, ""))!;
    const sheet = book.sheets.find((one) => one.name === area.sheet)!;
    if (sheet.name === "Plan") values.set(name, sheet.range(area).flat());
  }
  return values;
}

describe.skipIf(withoutBrowser)("the plan in the trial page", () => {
  let trial: TrialBrowser;
  let sheet: TrialPage;
  beforeAll(async () => {
    trial = await startTrial();
    sheet = await trial.open({ width: 1400, height: 900 });
  });
  afterAll(() => trial?.close());

  const names = () =>
    sheet.page.evaluate(async () =>
      Object.fromEntries((await weirmarkTrial.port.readNames()).map(({ name, address }) => [name, address])),
    );
  const value = async (name: string) => (await sheet.read((await names())[name]!)).values.flat();

  test("is written at a press; every name resolves, and every value is the command line's to all digits", async () => {
    const pane = await paneOnRopes(sheet);
    await pane.getByText("The whole plan on a sheet").click();
    await pane.getByRole("button", { name: "Write the plan" }).click();
    await pane.getByText("The plan stands on the sheet").waitFor();
    await settled(sheet.page);
    const expected = await byCommandLine();
    const there = await names();
    expect(Object.keys(there).filter((name) => expected.has(name)).length).toBe(expected.size);
    for (const [name, cells] of expected) {
      if (name === "weir_written" || name === "weir_fixed_day") continue;
      // The engine's own minus rounds what little is left of two numbers that are nearly alike.
      if (name === "weir_fixed_moved") expect((await value(name))[0]).toBeCloseTo(cells[0] as number, 12);
      else expect(await value(name), name).toEqual(cells);
    }
    expect(await axeFindings(sheet.page)).toEqual([]);
    expect(sheet.problems).toEqual([]);
  });

  test("follows its inputs, also after a row was put in above them", async () => {
    const { weir_fraction: fraction, weir_safe_cutoff: safe } = await names();
    const before = (await value("weir_safe_cutoff"))[0] as number;
    await sheet.page.evaluate((address) => {
      const name = /'?([^'!]+)'?!/.exec(address)![1]!;
      const book = (weirmarkTrial.api as any).getActiveWorkbook();
      book.getSheetByName(name).insertRowsBefore(3, 1);
    }, fraction!);
    await settled(sheet.page);
    const moved = await names();
    expect(parseAddress(moved["weir_safe_cutoff"]!)!.top).toBe(parseAddress(safe!)!.top + 1);
    expect((await value("weir_safe_cutoff"))[0]).toBe(before);
    await sheet.write(moved["weir_fraction"]!, [[0.2]]);
    await settled(sheet.page);
    const { out } = await commandLine(["calc", "r.csv", "--json", "WEIR.SAFE_CUTOFF(A2:A61,20%)"], {
      "r.csv": ropeScores()
        .map(([cell]) => cell ?? "")
        .join("\n"),
    });
    expect((await value("weir_safe_cutoff"))[0]).toBe((JSON.parse(out) as { value: number }).value);
  });

  test("written again it keeps the changed input and the user's notes, says so, and adds no second sheet", async () => {
    const home = parseAddress((await names())["weir_fraction"]!)!.sheet!;
    const note = formatAddress({ sheet: home, top: 3, left: 0, bottom: 3, right: 0 });
    const beside = formatAddress({ sheet: home, top: 11, left: 5, bottom: 11, right: 5 });
    await sheet.write(note, [["my own note"]]);
    await sheet.write(beside, [["beside"]]);
    await sheet.select("Ropes!A1:A61");
    await settled(sheet.page);
    const sheets = () => sheet.page.evaluate(() => weirmarkTrial.port.sheetNames());
    const before = await sheets();
    const pane = sheet.page.locator("#pane");
    await pane.getByRole("button", { name: "Write the plan" }).click();
    await pane.getByText("Left as you changed it: Top fraction that is to pass").waitFor();
    await settled(sheet.page);
    expect(await sheets()).toEqual(before);
    expect((await value("weir_fraction"))[0]).toBe(0.2);
    expect((await sheet.read(note)).values).toEqual([["my own note"]]);
    expect((await sheet.read(beside)).values).toEqual([["beside"]]);
    expect((await value("weir_revision"))[0]).toBe(1);
    expect(await sheet.page.locator(".pictures figure").count()).toBeLessThanOrEqual(1);
    expect(sheet.problems).toEqual([]);
  });
});
