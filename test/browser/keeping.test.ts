import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { withoutBrowser } from "./browser";
import { startTrial, type TrialBrowser, type TrialPage } from "./trialPage";

async function reload({ page }: TrialPage): Promise<void> {
  // Longer than the page waits for quiet before it keeps a change.
  await page.waitForTimeout(1200);
  await page.reload();
  await page.waitForSelector("body[data-state=computed]");
}

function keptBooks({ page }: TrialPage): Promise<number> {
  return page.evaluate(
    () =>
      new Promise<number>((resolve, reject) => {
        const opening = indexedDB.open("weirmark-trial");
        opening.onerror = () => reject(opening.error);
        opening.onsuccess = () => {
          const counting = opening.result.transaction("books").objectStore("books").count();
          counting.onsuccess = () => resolve(counting.result);
        };
      }),
  );
}

describe.skipIf(withoutBrowser)("what the user changes in the trial sheet", () => {
  let trial: TrialBrowser;
  beforeAll(async () => {
    trial = await startTrial();
  });
  afterAll(() => trial?.close());

  test("nothing is kept of a visit without a change", async () => {
    const sheet = await trial.open();
    await sheet.select("Applicants!C7:C84");
    await sheet.page.waitForTimeout(1500);
    expect(await keptBooks(sheet)).toBe(0);
  });

  test("is there again after a reload, formulas computed anew, and gone after starting over", async () => {
    const sheet = await trial.open();
    await sheet.write("Bids!O3", [[0.1, "=WEIR.SAMPLES_FOR_SD_PRECISION(O3)"]]);
    await sheet.page.evaluate(() =>
      weirmarkTrial.port.insertPicture("Bids!O9", {
        name: "a picture",
        svg: '<svg xmlns="http://www.w3.org/2000/svg" width="40" height="20"/>',
        width: 40,
        height: 20,
      }),
    );
    await reload(sheet);
    expect((await sheet.read("Bids!O3:P3")).values).toEqual([[0.1, 193]]);
    expect(await sheet.page.locator(".pictures img[alt='a picture']").count()).toBe(1);
    await sheet.write("Bids!O3", [[0.2]]);
    const [[changed]] = (await sheet.read("Bids!P3")).values as [[number]];
    expect(changed).toBeLessThan(193);

    await sheet.page.click("#start-over");
    await sheet.page.click("#go-on");
    await sheet.page.click("#start-over");
    await Promise.all([sheet.page.waitForEvent("load"), sheet.page.click("#discard")]);
    await sheet.page.waitForSelector("body[data-state=computed]");
    expect((await sheet.read("Bids!O3:P3")).values).toEqual([[null, null]]);
    expect(await sheet.page.locator(".pictures img").count()).toBe(0);
    expect(sheet.problems).toEqual([]);
  });

  test("a setting of the pane is kept without the workbook", async () => {
    const sheet = await trial.open();
    await sheet.page.evaluate(() => weirmarkTrial.port.keepSetting("test", { a: [1, "b"] }));
    await reload(sheet);
    expect(await sheet.page.evaluate(() => weirmarkTrial.port.readSetting("test"))).toEqual({ a: [1, "b"] });
    expect(await keptBooks(sheet)).toBe(0);
  });
});
