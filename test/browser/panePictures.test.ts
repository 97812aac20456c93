import { existsSync, mkdirSync, readFileSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { withoutBrowser } from "./browser";
import { paneOnRopes, unfold } from "./paneOf";
import { startTrial, type TrialBrowser } from "./trialPage";

const FOLDER = join(__dirname, "pictures");

/** A picture as text that only changes when the picture does: places on whole pixels, words as they are, one element a line. */
function normalised(svg: string): string {
  return `${svg
    .replace(/ font-family="[^"]*"/, "")
    .replace(/ (d|x|y)="[^"]*"/g, (places) => places.replace(/-?\d+\.\d+/g, (at) => String(Math.round(Number(at)) + 0)))
    .replace(/></g, ">\n<")}\n`;
}

/*
 * The pictures of the rope scores as they were when somebody last looked at them and found them good. WEIRMARK_PICTURES=new writes them
 * anew: look at each before it is committed.
 */
describe.skipIf(withoutBrowser)("the pictures of the pane", () => {
  let trial: TrialBrowser;
  let drawn: string[];
  beforeAll(async () => {
    trial = await startTrial();
    const sheet = await trial.open({ width: 320, height: 640 });
    const pane = await paneOnRopes(sheet);
    await sheet.page.click("[data-shows=pane]");
    await unfold(pane);
    drawn = await pane.locator("figure:not([hidden]) .drawing").evaluateAll((all) => all.map((one) => one.innerHTML));
  });
  afterAll(() => trial?.close());

  test.each(["scores", "fit", "more-scores", "hit-chance", "drift"].map((name, index) => [name, index] as const))(
    "%s",
    (name, index) => {
      const file = join(FOLDER, `${name}.svg`);
      const picture = normalised(drawn[index]!);
      if (process.env["WEIRMARK_PICTURES"] === "new" || !existsSync(file)) {
        mkdirSync(FOLDER, { recursive: true });
        writeFileSync(file, picture);
      }
      expect(picture).toBe(readFileSync(file, "utf8"));
    },
  );
});
