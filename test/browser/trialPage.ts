import type { Browser, Page } from "playwright-core";
import { startServer } from "../../scripts/serve.mjs";
import type { Block, CallCell, Port } from "../../src/hosts/port";
import type { callFunction } from "../../src/functions/call";
import type { Cell } from "../../src/sheet/cell";
import type { Argument, Outcome } from "../../src/sheet/invoke";
import { launchBrowser, requireBuild } from "./browser";

/** The trial page in a browser: what it asks for and what goes wrong in it is noted from the first byte on. */
export interface TrialPage {
  readonly page: Page;
  readonly problems: readonly string[];
  readonly outside: readonly string[];
  read(address: string): Promise<Block>;
  write(address: string, cells: readonly (readonly Cell[])[]): Promise<void>;
  select(address: string): Promise<void>;
  calls(): Promise<CallCell[]>;
  addSheet(name: string): Promise<string>;
  undo(): Promise<void>;
  /** Calls functions in the page, without its sheet. */
  call(calls: readonly { name: string; given: readonly Argument[] }[]): Promise<Outcome[]>;
}

export interface TrialBrowser {
  readonly address: string;
  open(options?: { width?: number; height?: number; scheme?: "light" | "dark" }): Promise<TrialPage>;
  close(): Promise<void>;
}

interface Engine {
  undo(): Promise<boolean>;
  getFormula(): { onCalculationResultApplied(): Promise<void> };
}
declare global {
  // The page sets it once the sheet is computed.
  var weirmarkTrial: { port: Port; api: Engine; call: typeof callFunction };
}

export async function startTrial(): Promise<TrialBrowser> {
  requireBuild();
  const server = await startServer();
  const browser: Browser = await launchBrowser();
  return {
    address: server.address,
    open: (options) => openPage(browser, server.address, options),
    async close() {
      await browser.close();
      await server.close();
    },
  };
}

async function openPage(
  browser: Browser,
  address: string,
  { width = 1280, height = 800, scheme = "light" as "light" | "dark" } = {},
): Promise<TrialPage> {
  const context = await browser.newContext({ viewport: { width, height }, colorScheme: scheme });
  const page = await context.newPage();
  const problems: string[] = [];
  const outside: string[] = [];
  page.on("console", (message) => {
    if (message.type() === "error" || message.type() === "warning") problems.push(message.text());
  });
  page.on("pageerror", (failure) => problems.push(String(failure)));
  page.on("request", (request) => {
    if (!/^(data|blob):/.test(request.url()) && !request.url().startsWith(`${address}/`)) outside.push(request.url());
  });
  await page.goto(`${address}/`);
  await page.waitForSelector("body[data-state=computed]", { timeout: 30_000 });
  return {
    page,
    problems,
    outside,
    read: (place) => page.evaluate((at) => weirmarkTrial.port.read(at), place),
    write: (place, cells) =>
      page.evaluate(({ at, what }) => weirmarkTrial.port.write(at, what), { at: place, what: cells as Cell[][] }),
    select: (place) => page.evaluate((at) => weirmarkTrial.port.select(at), place),
    calls: () => page.evaluate(() => weirmarkTrial.port.calls()),
    addSheet: (name) => page.evaluate((wanted) => weirmarkTrial.port.addSheet(wanted), name),
    call: (calls) =>
      page.evaluate(
        (all) => all.map(({ name, given }) => weirmarkTrial.call(name, given)!),
        calls as { name: string; given: Argument[] }[],
      ),
    undo: () =>
      page.evaluate(async () => {
        await weirmarkTrial.api.undo();
        await weirmarkTrial.api.getFormula().onCalculationResultApplied();
      }),
  };
}
