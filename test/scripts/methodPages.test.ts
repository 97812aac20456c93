import { existsSync } from "node:fs";
import { describe, expect, test } from "vitest";
import { hostFiles } from "../../scripts/hostFiles.mjs";
import { methodPages } from "../../scripts/methodPages.mjs";
import { functionTable } from "../../src/functions/call";

const pages = methodPages();
const help = new Map(hostFiles("https://example.org"));

const SECTIONS = [
  /^What (it|they) answers?$/,
  /^Formula$/,
  /^Assumptions, and how to see that they fail$/,
  /^Accuracy as measured$/,
  /^How tested$/,
  /^Why this (way|formula)$/,
  /^References$/,
];

describe("the pages of the methods", () => {
  test.each(functionTable.map(({ name, helpPath }) => [name, helpPath] as const))(
    "%s has one, and its help says how exact it was measured to be",
    (name, helpPath) => {
      expect(pages.filter(({ functions }) => functions.includes(name)).length).toBeGreaterThan(0);
      expect(help.get(helpPath)).toContain("<h3>Accuracy as measured</h3>");
    },
  );

  test.each(pages.map((page) => [page.file, page] as const))("%s says all that a page must, in order", (_, page) => {
    const places = SECTIONS.map((section) => page.sections.findIndex(({ heading }) => section.test(heading)));
    expect(places).not.toContain(-1);
    expect(places).toEqual([...places].sort((a, b) => a - b));
    for (const { heading, paragraphs } of page.sections) expect(paragraphs.join(""), heading).not.toBe("");
    const names = new Set(functionTable.map(({ name }) => name));
    for (const name of page.functions) expect(names).toContain(name);
  });

  test("name only test files that exist", () => {
    for (const { file, sections } of pages) {
      const words = sections.flatMap(({ paragraphs }) => paragraphs).join(" ");
      for (const [, path] of words.matchAll(/`(test\/[^`]+)`/g))
        for (const one of spelledOut(path!)) expect(existsSync(one), `${file}: ${one}`).toBe(true);
    }
  });
});

/** `a/{b,c}.ts` is a/b.ts and a/c.ts. */
function spelledOut(path: string): string[] {
  const [, before, among, after] = /^(.*)\{([^}]*)\}(.*)$/.exec(path) ?? [];
  return among === undefined ? [path] : among.split(",").map((one) => `${before}${one}${after}`);
}
