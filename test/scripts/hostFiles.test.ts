import { describe, expect, test } from "vitest";
import { withSemicolons } from "../../scripts/helpPages.mjs";
import { hostFiles } from "../../scripts/hostFiles.mjs";
import { functionTable } from "../../src/functions/call";

const files = new Map(hostFiles("https://example.org"));

describe("the host's metadata", () => {
  const metadata = JSON.parse(files.get("functions.json")!) as {
    allowErrorForDataTypeAny: boolean;
    functions: { id: string; name: string; helpUrl: string; parameters: { name: string; type: string }[] }[];
  };

  test("names every function of the table, each with a help page that exists", () => {
    expect(metadata.functions.map(({ id }) => id)).toEqual(functionTable.map(({ name }) => name));
    for (const { id, name, helpUrl } of metadata.functions) {
      expect(name).toBe(id);
      expect(files.has(helpUrl.replace("https://example.org/", ""))).toBe(true);
    }
  });

  test("lets every value through to the function, error cells too", () => {
    expect(metadata.allowErrorForDataTypeAny).toBe(true);
    for (const { parameters } of metadata.functions) for (const { type } of parameters) expect(type).toBe("any");
  });
});

describe("the help pages", () => {
  const unescaped = (text: string) =>
    text
      .replace(/&lt;/g, "<")
      .replace(/&gt;/g, ">")
      .replace(/&quot;/g, '"')
      .replace(/&amp;/g, "&");

  test.each(functionTable.map((entry) => [entry.name, entry] as const))(
    "%s: says all that the table says",
    (_, entry) => {
      const text = unescaped(files.get(entry.helpPath)!);
      const said = [
        ...entry.description.split(/(?<=[.]) (?=[A-Z])/),
        entry.returns,
        ...entry.cautions,
        ...entry.questions,
        ...entry.examples.map(({ formula }) => formula),
        ...entry.parameters.flatMap(({ name, description }) => [name, description]),
      ];
      for (const words of said) expect(text).toContain(words);
    },
  );

  test("link only to pages that exist, and load nothing from elsewhere", () => {
    for (const [path, text] of files) {
      if (!path.endsWith(".html")) continue;
      for (const [, link] of text.matchAll(/(?:href|src)="([^"]*)"/g)) {
        const [file, place] = new URL(link!, `https://example.org/${path}`).href
          .replace("https://example.org/", "")
          .split("#");
        if (file !== "icons/icon-32.png") expect(files.has(file!), `${path} links to ${link}`).toBe(true);
        if (place) expect(files.get(file!)).toContain(`id="${place}"`);
      }
    }
  });

  test.each([
    ["=WEIR.X(A1:A9,5%,0.95)", "=WEIR.X(A1:A9;5%;0,95)"],
    ['=WEIR.X("logit(0,100)",1.5)', '=WEIR.X("logit(0,100)";1,5)'],
    ['=WEIR.X("a ""b"", c",2)', '=WEIR.X("a ""b"", c";2)'],
    ["=WEIR.X({1,2;3,4})", undefined],
  ])("%s with semicolons reads %s", (formula, expected) => {
    expect(withSemicolons(formula)).toBe(expected);
  });
});
