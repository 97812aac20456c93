import { existsSync, readFileSync, readdirSync, statSync } from "node:fs";
import { dirname, join, relative, resolve, sep } from "node:path";
import ts from "typescript";
import { describe, expect, test } from "vitest";

/*
 * The layers of the house, read from every import. A layer may import from itself and from the layers named beside it.
 */
const LAYERS: Record<string, readonly string[]> = {
  core: [],
  sheet: ["core"],
  workings: ["core", "sheet"],
  functions: ["core", "sheet", "workings"],
  audit: ["core", "sheet", "workings", "functions"],
  plot: ["core", "sheet"],
  plan: ["core", "sheet", "plot"],
  hosts: ["sheet"],
  report: ["core", "sheet", "audit", "hosts"],
  taskpane: ["core", "sheet", "workings", "functions", "audit", "plot", "plan", "hosts", "report"],
  trial: ["core", "sheet", "workings", "functions", "audit", "plot", "plan", "hosts", "report", "taskpane"],
  cli: ["core", "sheet", "workings", "functions", "audit", "plot", "plan", "hosts", "report"],
};
/** Packages that a layer may load; the pure layers get by without any but these. */
const PACKAGES: Record<string, RegExp> = {
  core: /^$/,
  sheet: /^$/,
  workings: /^$/,
  functions: /^$/,
  audit: /^(@borgar\/fx(\/xlsx)?|jstat|saxes|fflate)$/,
  plan: /^$/,
  plot: /^d3-(scale|shape|array)$/,
};
/** Entries of a bundle: the only files of their layer that see the whole house. */
const ENTRIES = ["hosts/excel/functions.ts"];

const source = join(__dirname, "../src");
const files = readdirSync(source, { recursive: true })
  .map(String)
  .filter((file) => /\.tsx?$/.test(file) && statSync(join(source, file)).isFile())
  .map((file) => file.split(sep).join("/"));

function importsOf(file: string): string[] {
  const { importedFiles } = ts.preProcessFile(readFileSync(join(source, file), "utf8"), true, true);
  return importedFiles.map(({ fileName }) => fileName);
}

function layerOf(file: string): string {
  return file.split("/")[0]!;
}

describe("the layers", () => {
  test("every file stands in a known layer", () => {
    expect(files.length).toBeGreaterThan(20);
    expect([...new Set(files.map(layerOf))].filter((layer) => !(layer in LAYERS))).toEqual([]);
  });

  test.each(Object.keys(LAYERS))("%s imports only what stands above it", (layer) => {
    const wrong: string[] = [];
    for (const file of files.filter((one) => layerOf(one) === layer && !ENTRIES.includes(one))) {
      for (const name of importsOf(file)) {
        if (!name.startsWith(".")) {
          if (PACKAGES[layer] && !PACKAGES[layer].test(name)) wrong.push(`${file} loads ${name}`);
          continue;
        }
        const target = relative(source, resolve(source, dirname(file), name))
          .split(sep)
          .join("/");
        const targetLayer = layerOf(target);
        const [, host] = file.split("/");
        const [, otherHost] = target.split("/");
        const otherWorld =
          layer === "hosts" &&
          targetLayer === "hosts" &&
          file.split("/").length > 2 &&
          target.split("/").length > 2 &&
          host !== otherHost;
        if (otherWorld || (targetLayer !== layer && !LAYERS[layer]!.includes(targetLayer)))
          wrong.push(`${file} imports ${target}`);
      }
    }
    expect(wrong).toEqual([]);
  });

  test("only the entries of a bundle know the host's global CustomFunctions", () => {
    const knowing = files.filter((file) =>
      /\bCustomFunctions\.(associate|Error)|associateAll\(CustomFunctions/.test(
        readFileSync(join(source, file), "utf8"),
      ),
    );
    expect(knowing).toEqual(ENTRIES);
  });

  test("no file imports itself in a circle within core and sheet", () => {
    const graph = new Map(
      files
        .filter((file) => ["core", "sheet"].includes(layerOf(file)))
        .map((file) => [
          file.replace(/\.ts$/, ""),
          importsOf(file)
            .filter((name) => name.startsWith("."))
            .map((name) =>
              relative(source, resolve(source, dirname(file), name))
                .split(sep)
                .join("/"),
            ),
        ]),
    );
    const done = new Set<string>();
    const circle = (file: string, path: readonly string[]): string | undefined => {
      if (path.includes(file)) return [...path.slice(path.indexOf(file)), file].join(" → ");
      if (done.has(file)) return undefined;
      for (const next of graph.get(file) ?? []) {
        const found = circle(next, [...path, file]);
        if (found) return found;
      }
      done.add(file);
      return undefined;
    };
    expect([...graph.keys()].map((file) => circle(file, [])).filter(Boolean)).toEqual([]);
  });
});

describe("the proof that a comment names", () => {
  test("exists: every path of a test or reference in the sources and pages", () => {
    const root = join(source, "..");
    const pages = readdirSync(join(root, "docs"), { recursive: true })
      .map(String)
      .filter((file) => file.endsWith(".md"))
      .map((file) => join("docs", file));
    for (const file of [...files.map((one) => join("src", one)), ...pages])
      for (const [path] of readFileSync(join(root, file), "utf8").matchAll(/\btest\/[\w./]+\.(test\.ts|json|py)\b/g))
        expect(existsSync(join(root, path)), `${file} names ${path}`).toBe(true);
  });
});
