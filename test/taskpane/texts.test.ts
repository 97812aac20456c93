import { describe, expect, test } from "vitest";
import { languageFor } from "../../src/taskpane/texts/languageFor";
import { languages } from "../../src/taskpane/texts/languages";
import { en } from "../../src/taskpane/texts/en";

const others = Object.entries(languages).filter(([code]) => code !== "en");

/** A text with marked pieces put in: each must come back, or the sentence says less than the English one. */
function said(text: unknown): string {
  if (typeof text !== "function") return String(text);
  return (text as (...given: string[]) => string)(...Array.from({ length: text.length }, (_, index) => `<${index}>`));
}

describe.each(others)("the texts in %s", (_code, texts) => {
  test("are as many as the English ones, under the same keys", () => {
    expect(Object.keys(texts).sort()).toEqual(Object.keys(en).sort());
  });

  test("none is empty, or left in English where it is a sentence", () => {
    for (const [key, text] of Object.entries(texts)) {
      if (key === "percentGap") continue;
      expect(said(text).trim(), key).not.toBe("");
      if (said(en[key as keyof typeof en]).split(" ").length > 3)
        expect(said(text), key).not.toBe(said(en[key as keyof typeof en]));
    }
  });

  test("every sentence puts in what the English one puts in", () => {
    for (const [key, text] of Object.entries(en)) {
      const pieces = (words: string) => [...new Set(words.match(/<\d>/g) ?? [])].sort();
      expect(pieces(said(texts[key as keyof typeof en])), key).toEqual(pieces(said(text)));
    }
  });
});

test("every English sentence puts in all that it is given, but for a truth value that only chooses a word", () => {
  for (const [key, text] of Object.entries(en)) {
    if (typeof text !== "function") continue;
    const missing = Array.from({ length: text.length }, (_, index) => index).filter(
      (index) => !said(text).includes(`<${index}>`),
    );
    const choosing: Readonly<Record<string, number[]>> = { markMoves: [3], groupsBelow: [1], driftShift: [1] };
    expect(missing, key).toEqual(choosing[key] ?? []);
  }
});

test("the kept language comes first, then the user's own, then English", () => {
  expect(languageFor("de", ["en-GB"], Object.keys(languages))).toBe("de");
  expect(languageFor(undefined, ["fr-FR", "de-AT", "en"], Object.keys(languages))).toBe("de");
  expect(languageFor("xx", ["fr"], Object.keys(languages))).toBe("en");
});
