import { describe, expect, test } from "vitest";
import { readDelimited } from "../../../src/hosts/file/readDelimited";
import { readWorkbook } from "../../../src/hosts/file/readWorkbook";
import type { Separator } from "../../../src/hosts/file/separator";
import type { Cell } from "../../../src/sheet/cell";

const bytes = (text: string) => new TextEncoder().encode(text);

function cells(text: string, separator?: Separator): Cell[][] {
  const sheet = readDelimited(bytes(text), "x", separator).sheets[0]!;
  return sheet
    .range({ top: 0, left: 0, bottom: Math.max(0, sheet.lastRow), right: Math.max(0, sheet.lastColumn) })
    .map((row) => [...row]);
}

describe("a delimited file becomes cells as a careful user would type them", () => {
  test("numbers, texts, truths, errors and blanks", () => {
    expect(cells("name,score,ok\nA,71.4,TRUE\nB,-3e2,false\nC,,#N/A\n")).toEqual([
      ["name", "score", "ok"],
      ["A", 71.4, true],
      ["B", -300, false],
      ["C", null, { code: "#N/A" }],
    ]);
  });

  test("a byte order mark is no part of the first cell", () => expect(cells("\ufeffa,1\n")).toEqual([["a", 1]]));

  test("semicolons go with the decimal comma", () =>
    expect(cells("a;b\n71,5;2\n1.234,5;0,25\n")).toEqual(
      [
        ["a", "b"],
        [71.5, 2],
        ["1.234,5", 0.25],
      ].map((row, i) => (i === 2 ? [1234.5, 0.25] : row)),
    ));

  test("semicolons with decimal points are taken for what they are", () =>
    expect(cells("a;b\n71.5;2\n0.25;3\n")).toEqual([
      ["a", "b"],
      [71.5, 2],
      [0.25, 3],
    ]));

  test("one column with decimal commas has no separator at all", () => {
    expect(cells("score\n71,5\n68\n\n,25\n")).toEqual([["score"], [71.5], [68], [null], [0.25]]);
    expect(cells("71,5\n68,25\n")).toEqual([
      [71, 5],
      [68, 25],
    ]);
    expect(cells("score\n1,234\n2,345\n")).toEqual([["score"], [1.234], [2.345]]);
  });

  test("1.234 behind a semicolon may be thousands or decimals, so it stays a text", () =>
    expect(cells("a;b\n1.234;2\n")).toEqual([
      ["a", "b"],
      ["1.234", 2],
    ]));

  test("thousands in quotes are a number, unless the file shows that the comma is decimal", () => {
    expect(cells('a,b\n"1,234",2\n')[1]).toEqual([1234, 2]);
    expect(cells('a,b\n"1,234",2\n"71,5",3\n')).toEqual([
      ["a", "b"],
      ["1,234", 2],
      ["71,5", 3],
    ]);
  });

  test("a tab parts fields, in a .tsv and where a .csv has them", () => {
    expect(cells("a\tb\n1,5\t2\n", "\t")).toEqual([
      ["a", "b"],
      [1.5, 2],
    ]);
    expect(cells("a\tb\n1.5\t2\n")).toEqual([
      ["a", "b"],
      [1.5, 2],
    ]);
  });

  test("quotes hold separators, line ends and doubled quotes", () =>
    expect(cells('"a,b","line\r\nend","say ""yes"""\r\n1,2,3')).toEqual([
      ["a,b", "line\r\nend", 'say "yes"'],
      [1, 2, 3],
    ]));

  test("commas in a text column don't outvote the semicolons", () =>
    expect(cells("what;score\nrope, thick;7\ncable, thin;8\n")).toEqual([
      ["what", "score"],
      ["rope, thick", 7],
      ["cable, thin", 8],
    ]));

  test("a semicolon in one heading doesn't outvote the commas", () =>
    expect(cells("what,score (0;10)\nrope,7\n")).toEqual([
      ["what", "score (0;10)"],
      ["rope", 7],
    ]));

  test.each(["\n", "\r\n", "\r"])("lines end with %j", (end) =>
    expect(cells(["a,b", "1,2", ""].join(end))).toEqual([
      ["a", "b"],
      [1, 2],
    ]),
  );

  test("percentages are numbers; dates, currencies and infinities are texts", () =>
    expect(cells("5%,12.5 %,2024-01-15,€ 5,1e999,NaN,1/2")).toEqual([
      [0.05, 0.125, "2024-01-15", "€ 5", "1e999", "NaN", "1/2"],
    ]));

  test("what begins with = is a text: nothing in a file is worked out", () =>
    expect(cells("=1+1,2")).toEqual([["=1+1", 2]]));

  test("a line that tells the separator is taken at its word", () =>
    expect(cells("sep=;\na,b;c\n")).toEqual([["a,b", "c"]]));

  test("an empty field in quotes is blank, and so is one of spaces", () =>
    expect(cells('"", ,x')).toEqual([[null, null, "x"]]));

  test("empty lines keep their row", () => expect(cells("a\n\n3\n")).toEqual([["a"], [null], [3]]));

  test("an empty file has no cells", () => expect(readDelimited(bytes(""), "x").sheets[0]!.lastRow).toBe(-1));
});

describe("a delimited file that can't be trusted is refused with a sentence", () => {
  test.each<[string, Uint8Array, RegExp]>([
    ["an unclosed quote", bytes('a,b\n1,"2\n3,4\n'), /quote opened in line 2/],
    ["bytes that are no UTF-8", Uint8Array.from([97, 0xe4, 98, 10]), /not text in UTF-8/],
    ["zero bytes", bytes("a\0b"), /not text/],
    ["too many columns", bytes(",".repeat(16_384)), /16385 fields/],
  ])("%s", (_, file, reason) => {
    expect(() => readDelimited(file, "x")).toThrow(reason);
  });

  test.each<[string, number[], RegExp]>([
    ["old.xls", [0xd0, 0xcf, 0x11, 0xe0], /old workbook/],
    ["page.pdf", [37, 80, 68, 70], /named \.pdf/],
    ["fake.xlsx", [97, 44, 98], /no workbook inside/],
  ])("%s", async (name, start, reason) => {
    await expect(readWorkbook(Uint8Array.from(start), name)).rejects.toThrow(reason);
  });
});

test("100,000 rows of five columns are read in less than two seconds", () => {
  const lines = Array.from({ length: 100_000 }, (_, i) => `bid ${i},${(i % 97) / 7},TRUE,,x${i % 3}`);
  const file = bytes(lines.join("\n"));
  const start = performance.now();
  expect(readDelimited(file, "x").sheets[0]!.lastRow).toBe(99_999);
  expect(performance.now() - start).toBeLessThan(2_000);
});
