import { strToU8, zipSync } from "fflate";
import { describe, expect, test } from "vitest";
import { readXlsx } from "../../../src/hosts/file/readXlsx";
import { numberRows, xlsxFile, xlsxParts } from "../../support/xlsxFile";

const PLAIN = { sheets: [{ name: "A", rows: numberRows("A", 1, [1, 2, 3]) }] };
const plain = xlsxFile(PLAIN);

/** The file with a number in its list of parts overwritten, at `offset` behind the signature of the entry of `name`. */
function withClaim(bytes: Uint8Array, name: string, offset: number, value: number): Uint8Array {
  const copy = bytes.slice();
  const view = new DataView(copy.buffer);
  const wanted = strToU8(name);
  for (let at = 0; at + 46 < copy.length; at++) {
    if (view.getUint32(at, true) !== 0x02014b50) continue;
    const found = wanted.every((byte, index) => copy[at + 46 + index] === byte);
    if (found && view.getUint16(at + 28, true) === wanted.length) view.setUint32(at + offset, value, true);
  }
  return copy;
}

const SHEET = "xl/worksheets/sheet1.xml";
const withSheet = (xml: string) => xlsxFile({ ...PLAIN, parts: { [SHEET]: xml } });
const worksheet = (rows: string) => `<worksheet><sheetData>${rows}</sheetData></worksheet>`;

function bomb(): Uint8Array {
  const parts = Object.fromEntries(Object.entries(xlsxParts(PLAIN)).map(([name, text]) => [name, strToU8(text)]));
  return zipSync({ ...parts, [SHEET]: [new Uint8Array(300 * 2 ** 20).fill(32), { level: 9 }] });
}

describe("a file made to harm is refused with a sentence, in bounded time", () => {
  test("the plain file that these are made from is read", () => expect(readXlsx(plain).sheets[0]!.lastRow).toBe(2));

  test.each<[string, () => Uint8Array, RegExp]>([
    ["cut off in the middle", () => plain.slice(0, plain.length / 2), /cut off or damaged/],
    ["cut off in its list", () => plain.slice(0, plain.length - 30), /cut off or damaged/],
    ["four bytes of zip and nothing more", () => plain.slice(0, 4), /cut off or damaged/],
    ["claiming 2 GB for a part", () => withClaim(plain, SHEET, 24, 2 ** 31), /claims to unpack to 2048 MB/],
    ["claiming less than a part holds", () => withClaim(plain, SHEET, 24, 10), /damaged/],
    ["packing 300 MB into 300 KB", bomb, /made to burst/],
    ["placing a part outside the file", () => withClaim(plain, SHEET, 42, 2 ** 30), /cut off or damaged/],
    ["placing two parts on one another", () => withClaim(plain, SHEET, 42, 0), /overlap/],
    ["with a password", () => withClaim(plain, SHEET, 8, 1), /encrypted/],
    ["packed in an unknown way", () => withClaim(plain, SHEET, 10, 99), /unusual way/],
    [
      "with entities that multiply",
      () =>
        withSheet(
          `<!DOCTYPE x [<!ENTITY a "aaaaaaaaaa"><!ENTITY b "&a;&a;&a;&a;&a;">]><worksheet><sheetData><row r="1"><c r="A1" t="str"><v>&b;</v></c></row></sheetData></worksheet>`,
        ),
      /document type/,
    ],
    [
      "with an entity that nothing declares",
      () => withSheet(worksheet(`<row r="1"><c r="A1"><v>&lol;</v></c></row>`)),
      /not proper XML/,
    ],
    ["with XML that ends too soon", () => withSheet("<worksheet><sheetData><row>"), /not proper XML/],
    ["nested without end", () => withSheet("<a>".repeat(100)), /nested too deep/],
    [
      "with bytes that are no text",
      () => {
        const parts = Object.fromEntries(Object.entries(xlsxParts(PLAIN)).map(([name, text]) => [name, strToU8(text)]));
        return zipSync({ ...parts, [SHEET]: Uint8Array.from([60, 97, 62, 0xff, 0xfe]) });
      },
      /not text in UTF-8/,
    ],
    [
      "with a cell off the sheet",
      () => withSheet(worksheet(`<row r="1"><c r="ZZZZ9"><v>1</v></c></row>`)),
      /cell “ZZZZ9”/,
    ],
    ["with a row off the sheet", () => withSheet(worksheet(`<row r="99999999"/>`)), /row 99999999/],
    [
      "with a word for a number",
      () => withSheet(worksheet(`<row r="1"><c r="A1"><v>seven</v></c></row>`)),
      /holds “seven”/,
    ],
    [
      "with a text that isn't there",
      () => withSheet(worksheet(`<row r="1"><c r="A1" t="s"><v>7</v></c></row>`)),
      /no text number 7/,
    ],
    [
      "with a cell of an unknown kind",
      () => withSheet(worksheet(`<row r="1"><c r="A1" t="zz"><v>7</v></c></row>`)),
      /unknown kind/,
    ],
    ["with macros", () => xlsxFile({ ...PLAIN, parts: { "xl/vbaProject.bin": "x" } }), /macros/],
    [
      "with macros by its declared kind",
      () =>
        xlsxFile({
          ...PLAIN,
          parts: {
            "[Content_Types].xml": `<Types><Override PartName="/xl/workbook.xml" ContentType="application/vnd.ms-excel.sheet.macroEnabled.main+xml"/></Types>`,
          },
        }),
      /macros/,
    ],
    ["that is no workbook", () => zipSync({ "word/document.xml": strToU8("<a/>") }), /no workbook/],
    [
      "that is a binary workbook",
      () =>
        xlsxFile({
          ...PLAIN,
          parts: {
            "_rels/.rels": `<Relationships><Relationship Id="r" Type="x/officeDocument" Target="xl/workbook.bin"/></Relationships>`,
          },
        }),
      /\.xlsb/,
    ],
    [
      "without its sheet",
      () => xlsxFile({ ...PLAIN, parts: { "xl/_rels/workbook.xml.rels": "<Relationships/>" } }),
      /leads nowhere/,
    ],
  ])("%s", (_, make, reason) => {
    const file = make();
    const start = performance.now();
    expect(() => readXlsx(file)).toThrow(reason);
    expect(performance.now() - start).toBeLessThan(1_000);
  });

  test("one cell in the last corner takes no memory for the rest", () => {
    const book = readXlsx(withSheet(worksheet(`<row r="1048576"><c r="XFD1048576"><v>1</v></c></row>`)));
    expect(book.sheets[0]).toMatchObject({ lastRow: 1_048_575, lastColumn: 16_383 });
  });
});
