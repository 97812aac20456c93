import { execFileSync } from "node:child_process";
import { existsSync } from "node:fs";
import { join } from "node:path";
import { chromium, type Browser } from "playwright-core";

// Where Chromium, Chrome and Edge are usually installed; the names are looked up on the search path.
const NAMES = [
  "chromium",
  "chromium-browser",
  "google-chrome",
  "google-chrome-stable",
  "chrome",
  "microsoft-edge",
  "msedge",
];
const PLACES = [
  "/Applications/Google Chrome.app/Contents/MacOS/Google Chrome",
  "/Applications/Chromium.app/Contents/MacOS/Chromium",
  "/Applications/Microsoft Edge.app/Contents/MacOS/Microsoft Edge",
  ...["ProgramFiles", "ProgramFiles(x86)", "LocalAppData"].flatMap((folder) => [
    join(process.env[folder] ?? "C:\\", "Google/Chrome/Application/chrome.exe"),
    join(process.env[folder] ?? "C:\\", "Microsoft/Edge/Application/msedge.exe"),
  ]),
];
// A browser under test calls nobody: what it would ask of its maker is switched off.
const FLAGS = [
  "--headless",
  "--no-sandbox",
  "--disable-gpu",
  "--disable-quic",
  "--no-first-run",
  "--disable-background-networking",
  "--disable-component-update",
  "--disable-sync",
];

function onSearchPath(name: string): string | undefined {
  const folders = (process.env["PATH"] ?? "").split(process.platform === "win32" ? ";" : ":");
  return folders.map((folder) => join(folder, name)).find((path) => existsSync(path));
}

function findBrowser(): string | undefined {
  const named = process.env["WEIRMARK_BROWSER"];
  if (named) return named;
  for (const name of NAMES) {
    const path = onSearchPath(name);
    if (path) return path;
  }
  return PLACES.find((path) => existsSync(path));
}

export const browserPath = findBrowser();

/** Without a browser these tests say so and are left out; where the build is checked for good they fail instead. */
export const withoutBrowser = browserPath === undefined && process.env["CI"] !== "true";
if (withoutBrowser)
  console.warn(
    "The browser tests are skipped: this machine has no Chromium, Chrome or Edge (WEIRMARK_BROWSER may name one).",
  );

export async function launchBrowser(): Promise<Browser> {
  if (browserPath === undefined) throw new Error("no Chromium, Chrome or Edge was found on this machine");
  return chromium.launch({ executablePath: browserPath, args: FLAGS });
}

/** The build that the tests open; they never make one themselves. */
export function requireBuild(): void {
  if (!existsSync(join(__dirname, "../../dist/index.html"))) throw new Error("dist/ is empty: run npm run build first");
}

export function runWeirmark(args: readonly string[], input?: string): string {
  return execFileSync(process.execPath, [join(__dirname, "../../dist/cli/weirmark.js"), ...args], {
    encoding: "utf8",
    ...(input !== undefined && { input }),
  });
}
