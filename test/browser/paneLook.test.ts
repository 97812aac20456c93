import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { withoutBrowser } from "./browser";
import { axeFindings, paneOnRopes, settled, unfold } from "./paneOf";
import { startTrial, type TrialBrowser } from "./trialPage";

describe.skipIf(withoutBrowser)("the look of the pane", () => {
  let trial: TrialBrowser;
  beforeAll(async () => {
    trial = await startTrial();
  });
  afterAll(() => trial?.close());

  test.each(["light", "dark"] as const)("with everything open axe finds nothing, %s", async (scheme) => {
    const sheet = await trial.open({ scheme });
    const pane = await paneOnRopes(sheet);
    await unfold(pane);
    expect(await pane.getAttribute("data-theme")).toBe(scheme);
    expect(await axeFindings(sheet.page)).toEqual([]);
    // With a problem shown and a form of the finder open too.
    await pane.getByLabel("Share to take").fill("5");
    await pane.getByRole("button", { name: "CUTOFF_PRECISION", exact: true }).click();
    await settled(sheet.page);
    expect(await axeFindings(sheet.page)).toEqual([]);
    expect(sheet.problems).toEqual([]);
  });

  test("at 320 pixels nothing is cut off or scrolls sideways but tables that say so", async () => {
    const sheet = await trial.open({ width: 320, height: 640 });
    const pane = await paneOnRopes(sheet);
    await sheet.page.click("[data-shows=pane]");
    await unfold(pane);
    const wide = await pane.evaluate((root) => {
      const edge = root.getBoundingClientRect().right;
      return [...root.querySelectorAll("*")]
        .filter((one) => !one.closest(".table, svg") && one.getBoundingClientRect().right > edge + 0.5)
        .map((one) => `${one.tagName} ${one.className} ${one.textContent?.slice(0, 40)}`);
    });
    expect(wide).toEqual([]);
    expect(await pane.evaluate((root) => root.scrollWidth <= root.clientWidth)).toBe(true);
  });

  test("texts keep a contrast of 4.5 where the user forces colours, and the mark stays visible", async () => {
    const sheet = await trial.open();
    const pane = await paneOnRopes(sheet);
    await sheet.page.emulateMedia({ forcedColors: "active" });
    await settled(sheet.page);
    const colours = await pane.evaluate((root) => {
      const paint = (selector: string, property: "stroke" | "fill") =>
        getComputedStyle(root.querySelector(`svg ${selector}`)!)[property];
      return [paint(".mark", "stroke"), paint(".paper", "fill"), paint(".label", "fill")];
    });
    expect(new Set(colours).size).toBeGreaterThan(1);
    expect(colours[0]).not.toBe(colours[1]);
    expect(colours[2]).not.toBe(colours[1]);
    expect((await axeFindings(sheet.page)).filter(({ id }) => id === "color-contrast")).toEqual([]);
  });

  test("nothing moves by itself", async () => {
    const sheet = await trial.open();
    const pane = await paneOnRopes(sheet);
    const moving = await pane.evaluate(
      (root) =>
        [...root.querySelectorAll("*")].filter((one) => {
          const { animationName, transitionDuration } = getComputedStyle(one);
          return animationName !== "none" || !/^(0s(, )?)+$/.test(transitionDuration);
        }).length,
    );
    expect(moving).toBe(0);
  });

  test("with the keyboard alone: every control is reached, in the order of the page, with its focus to be seen", async () => {
    const sheet = await trial.open();
    const pane = await paneOnRopes(sheet);
    await pane.getByRole("button", { name: "Scores", exact: true }).focus();
    const expected = await pane.evaluate(
      (root) =>
        [...root.querySelectorAll("a[href], button, input, select, summary, [tabindex='0']")].filter(
          (one) => (one as HTMLElement).checkVisibility() && !(one as HTMLButtonElement).disabled,
        ).length,
    );
    const seen: string[] = [];
    for (let i = 0; i < expected; i++) {
      const here = await sheet.page.evaluate(() => {
        const one = document.activeElement as HTMLElement;
        const style = getComputedStyle(one);
        const shown = style.outlineStyle !== "none" && parseFloat(style.outlineWidth) >= 2;
        return one.closest("#pane") ? `${shown ? "" : "unseen "}${one.tagName}` : "outside";
      });
      seen.push(here);
      await sheet.page.keyboard.press("Tab");
    }
    expect(seen).toHaveLength(expected);
    expect(seen.filter((one) => one === "outside" || one.startsWith("unseen"))).toEqual([]);
  });

  test("in German every word that is not a function's is German, numbers keep the host's marks", async () => {
    const sheet = await trial.open();
    const pane = await paneOnRopes(sheet);
    await pane.getByLabel("Language").selectOption("de");
    await pane.getByText("Nehmen ab 82.0").waitFor();
    expect(await pane.getAttribute("lang")).toBe("de");
    expect(await pane.innerText()).toContain("5\u00a0%");
    expect(await axeFindings(sheet.page)).toEqual([]);
    await pane.getByLabel("Sprache").selectOption("en");
    await pane.getByText("Take entries scoring 82.0 or more").waitFor();
  });
});
