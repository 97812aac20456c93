// The files that the host and the reader need beside the code, made from the table of functions: the host's metadata and the help pages.
import { readFileSync } from "node:fs";
import { dirname, join } from "node:path";
import { fileURLToPath } from "node:url";
import { helpPages } from "./helpPages.mjs";
import { methodPages } from "./methodPages.mjs";
import { hostMetadata } from "./hostMetadata.mjs";

const tablePath = join(dirname(fileURLToPath(import.meta.url)), "../src/functions/functions.json");

/** @returns {[path: string, text: string][]} paths are relative to where the add-in is served. */
export function hostFiles(origin) {
  const table = JSON.parse(readFileSync(tablePath, "utf8"));
  return [
    ["functions.json", `${JSON.stringify(hostMetadata(table, origin), null, 1)}\n`],
    ...helpPages(table, methodPages()),
  ];
}
