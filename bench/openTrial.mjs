// How long the trial page takes from navigation to computed functions and to the pane, and how large its files are:
// `node bench/openTrial.mjs [BROWSER]` after a build. Each opening is a fresh browser with nothing cached; the median of seven counts.
import { execFileSync } from "node:child_process";
import { readdirSync, readFileSync } from "node:fs";
import { fileURLToPath } from "node:url";
import { gzipSync } from "node:zlib";
import { chromium } from "playwright-core";
import { startServer } from "../scripts/serve.mjs";

const executablePath = process.argv[2] ?? execFileSync("which", ["chromium"], { encoding: "utf8" }).trim();
const args = ["--headless", "--no-sandbox", "--disable-gpu", "--disable-background-networking"];
const median = (values) => [...values].sort((a, b) => a - b)[Math.floor(values.length / 2)];

const server = await startServer();
const openings = [];
for (let run = 0; run < 7; run++) {
  const browser = await chromium.launch({ executablePath, args });
  const page = await browser.newPage({ viewport: { width: 1280, height: 800 } });
  await page.goto(server.address);
  await page.waitForFunction(() => performance.getEntriesByName("pane").length > 0);
  openings.push(
    await page.evaluate(() => ["computed", "pane"].map((name) => performance.getEntriesByName(name)[0].startTime)),
  );
  await browser.close();
}
await server.close();
console.log(`functions computed after ${Math.round(median(openings.map(([computed]) => computed)))} ms`);
console.log(`pane shown after ${Math.round(median(openings.map(([, pane]) => pane)))} ms`);
console.log(`fastest opening ${Math.round(Math.min(...openings.map(([computed]) => computed)))} ms`);

const dist = fileURLToPath(new URL("../dist/", import.meta.url));
for (const file of readdirSync(dist, { recursive: true }).filter((name) => /\.(js|css)$/.test(name))) {
  const bytes = readFileSync(dist + file);
  console.log(
    `${file}: ${(bytes.length / 1000).toFixed(1)} kB, ${(gzipSync(bytes, { level: 9 }).length / 1000).toFixed(1)} kB gzip`,
  );
}
