import { afterAll, beforeAll, describe, expect, test } from "vitest";
import type { Browser, Page } from "playwright-core";
import { startServer } from "../../scripts/serve.mjs";
import { launchBrowser, requireBuild, withoutBrowser } from "./browser";

/** As little of the host as the page needs to open; there is no workbook behind it, so every reading fails. */
const HOST = `
  globalThis.CustomFunctions = { associate() {} };
  globalThis.Office = {
    HostType: { Excel: "Excel" },
    onReady: async () => ({ host: "Excel" }),
    context: { requirements: { isSetSupported: () => false }, document: { settings: { get: () => null } } },
  };
  globalThis.Excel = { run: async () => { throw new Error("no workbook"); } };
`;

describe.skipIf(withoutBrowser)("the page of the add-in", () => {
  let browser: Browser;
  let server: { address: string; close(): Promise<void> };
  beforeAll(async () => {
    requireBuild();
    server = await startServer();
    browser = await launchBrowser();
  });
  afterAll(async () => {
    await browser?.close();
    await server?.close();
  });

  async function open(host: string | undefined): Promise<{ page: Page; asked: string[] }> {
    const page = await browser.newPage({ viewport: { width: 320, height: 640 } });
    const asked: string[] = [];
    page.on("request", (request) => asked.push(request.url()));
    await page.route("https://appsforoffice.microsoft.com/**", (route) =>
      host === undefined ? route.abort() : route.fulfill({ contentType: "text/javascript", body: host }),
    );
    await page.goto(`${server.address}/taskpane.html`);
    return { page, asked };
  }

  test("opens the pane in the host, and says what to do where nothing is selected", async () => {
    const { page, asked } = await open(HOST);
    await page.getByText("Select a column of scores in the sheet").first().waitFor();
    expect(await page.locator("h1").innerText()).toBe("Weirmark");
    // Without a column the search is answered all the same: 45 looks give 90 % where 5 % pass (1 − 0.95^45 = 0.9006).
    await page.getByText("Plan for 45 looks: enough with a chance of 90%").waitFor();
    const outside = asked.filter((url) => !url.startsWith(server.address) && !url.startsWith("https://appsforoffice."));
    expect(outside).toEqual([]);
  });

  test("outside the host it says where it belongs", async () => {
    const { page } = await open(HOST.replace('{ host: "Excel" }', "{ host: null }"));
    await page.getByText("This page belongs into Excel").waitFor();
  });

  test("where the host's script is blocked it says so instead of staying silent", async () => {
    const { page } = await open(undefined);
    await page.getByText("Excel does not answer").waitFor();
  });
});
