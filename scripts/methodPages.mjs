// The pages of docs/methods as data: which functions each is about, and its sections. A help page repeats the sections of its function's page.
import { readdirSync, readFileSync } from "node:fs";
import { dirname, join } from "node:path";
import { fileURLToPath } from "node:url";

const folder = join(dirname(fileURLToPath(import.meta.url)), "../docs/methods");

/**
 * A page is a heading, a line that begins with the functions it is about, and paragraphs; one that begins with bold words opens a section.
 * @returns {{file: string, title: string, functions: string[], sections: {heading: string, paragraphs: string[]}[]}[]}
 */
export function methodPages() {
  const files = readdirSync(folder).filter((file) => file.endsWith(".md"));
  return files.map((file) => readPage(file, readFileSync(join(folder, file), "utf8")));
}

function readPage(file, text) {
  const [heading, about, ...paragraphs] = text.trim().split(/\n{2,}/);
  const functions = [...about.split("·")[0].matchAll(/`([A-Z][A-Z_]+)`/g)].map(([, name]) => name);
  const sections = [];
  for (const paragraph of paragraphs) {
    const [, bold, rest] = /^\*\*([^*]+?)\.?\*\*\s*([^]*)$/.exec(paragraph) ?? [undefined, undefined, paragraph];
    if (bold !== undefined) sections.push({ heading: bold, paragraphs: [] });
    // A numbered line is a paragraph of its own.
    sections.at(-1).paragraphs.push(...rest.split(/\n(?=\d+\. )/).map((one) => one.replace(/\s*\n\s*/g, " ")));
  }
  return { file, title: heading.replace(/^# /, ""), functions, sections };
}
