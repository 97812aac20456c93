// Bundles bench/NAME.ts to a temporary file and runs it: node bench/run.mjs NAME [arguments for the bench]
import { build } from "esbuild";
import { mkdtempSync, readdirSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { dirname, join } from "node:path";
import { fileURLToPath, pathToFileURL } from "node:url";

const here = dirname(fileURLToPath(import.meta.url));
const names = readdirSync(here)
  .filter((file) => file.endsWith(".ts"))
  .map((file) => file.slice(0, -3));
const name = process.argv[2];
if (!names.includes(name)) {
  console.error(`node bench/run.mjs NAME, NAME one of: ${names.join(", ")}`);
  process.exit(2);
}

const folder = mkdtempSync(join(tmpdir(), "bench-"));
const outfile = join(folder, `${name}.mjs`);
try {
  await build({
    entryPoints: [join(here, `${name}.ts`)],
    outfile,
    bundle: true,
    format: "esm",
    platform: "node",
    target: "node20",
    logLevel: "warning",
    // Packages that still ask for require() find it.
    banner: {
      js: 'import { createRequire as requireFor } from "node:module"; const require = requireFor(import.meta.url);',
    },
  });
  await import(pathToFileURL(outfile).href);
} finally {
  rmSync(folder, { recursive: true, force: true });
}
