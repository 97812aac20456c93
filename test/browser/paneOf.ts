import { readFileSync } from "node:fs";
import { createRequire } from "node:module";
import type { Locator, Page } from "playwright-core";
import type { Cell } from "../../src/sheet/cell";
import { readCases } from "../support/cases";
import type { TrialPage } from "./trialPage";

/** The "rope score" column of the public cases: 57 scores, 3 blanks, and a heading. */
export function ropeScores(): Cell[][] {
  const { heading, cells } = readCases("cutoff.json").columns[0]!;
  return [[heading], ...cells.map((cell) => [cell === "" ? null : cell])];
}

/** Puts the rope scores on a sheet of their own, selects them, and waits for the pane's answer. Returns the pane. */
export async function paneOnRopes(sheet: TrialPage, name = "Ropes"): Promise<Locator> {
  const given = await sheet.addSheet(name);
  await sheet.write(`${given}!A1`, ropeScores());
  await sheet.select(`${given}!A1:A61`);
  const pane = sheet.page.locator("#pane");
  await pane.getByText(`${given}!A2:A61`).first().waitFor({ state: "attached" });
  await settled(sheet.page);
  return pane;
}

/** Long enough for the quiet after a change, the reading, and what is done after the paint. */
export async function settled(page: Page): Promise<void> {
  await page.waitForTimeout(700);
}

/** Opens everything that folds. */
export async function unfold(pane: Locator): Promise<void> {
  await pane.locator("details").evaluateAll((folds) => {
    for (const fold of folds) (fold as HTMLDetailsElement).open = true;
  });
  await settled(pane.page());
}

export interface AxeFinding {
  readonly id: string;
  readonly help: string;
  readonly nodes: readonly string[];
}

/** What axe finds in the pane: all of its rules, best practices included. */
export async function axeFindings(page: Page): Promise<AxeFinding[]> {
  const source = readFileSync(createRequire(__filename).resolve("axe-core/axe.min.js"), "utf8");
  await page.evaluate(source);
  return page.evaluate(async () => {
    const { violations } = await (globalThis as any).axe.run("#pane");
    return violations.map(({ id, help, nodes }: any) => ({ id, help, nodes: nodes.map((node: any) => node.html) }));
  });
}
