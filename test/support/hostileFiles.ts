import { strToU8, zipSync } from "fflate";
import { numberRows, xlsxFile, xlsxParts, type BookXml } from "./xlsxFile";

/** One file made to harm, and what every command must say of it: a refusal, or verdicts that say why nothing was judged. */
export interface HostileFile {
  readonly name: string;
  readonly make: () => Uint8Array;
  /** The sentence it is refused with; left out where the file is read and its calls are judged for what they are. */
  readonly refusal?: RegExp;
  /** The sentence with which only a copy of it is refused. */
  readonly copyRefusal?: RegExp;
  /** What the audit says of the call in D2. */
  readonly verdict?: RegExp;
}

const SHEET = "xl/worksheets/sheet1.xml";
const CALL = "_xldudf_WEIR_TOP_FRACTION_CUTOFF(A1:A3,0.1)";
const escape = (text: string) => text.replace(/&/g, "&amp;").replace(/</g, "&lt;");
const cell = (formula: string, value = "<v>1</v>", attributes = "") =>
  `<c r="D2"><f${attributes}>${escape(formula)}</f>${value}</c>`;
const book = (extra: string, rest: Partial<BookXml> = {}, behind = ""): BookXml => ({
  ...rest,
  sheets: [{ name: "A", rows: `${numberRows("A", 1, [1, 2, 4])}<row r="2">${extra}</row>`, behind }],
});
const file = (extra: string, rest?: Partial<BookXml>, behind?: string) => () => xlsxFile(book(extra, rest, behind));
const packed = (level: 0 | 9, part: string, bytes: Uint8Array) => () => {
  const parts = Object.entries(xlsxParts(book(cell(CALL)))).map(([name, text]) => [name, strToU8(text)]);
  return zipSync({ ...(Object.fromEntries(parts) as Record<string, Uint8Array>), [part]: [bytes, { level }] });
};

/** The file with a number in its list of parts overwritten, `offset` behind the signature of the entry of the sheet. */
function withClaim(offset: number, value: number): Uint8Array {
  const copy = xlsxFile(book(cell(CALL)));
  const view = new DataView(copy.buffer);
  const wanted = strToU8(SHEET);
  for (let at = 0; at + 46 < copy.length; at++)
    if (view.getUint32(at, true) === 0x02014b50 && wanted.every((byte, index) => copy[at + 46 + index] === byte))
      view.setUint32(at + offset, value, true);
  return copy;
}

const chain = (count: number) =>
  Array.from({ length: count }, (_, i) => `<definedName name="level_${i}">level_${i + 1}+1</definedName>`).join("");

export const HOSTILE_FILES: readonly HostileFile[] = [
  {
    name: "a part that bursts",
    make: packed(9, SHEET, new Uint8Array(300 * 2 ** 20).fill(32)),
    refusal: /made to burst/,
  },
  {
    name: "a picture that bursts",
    make: packed(9, "xl/media/image1.png", new Uint8Array(300 * 2 ** 20).fill(32)),
    verdict: /stored inputs give 4/,
    copyRefusal: /made to burst/,
  },
  { name: "a claim of 2 GB", make: () => withClaim(24, 2 ** 31), refusal: /claims to unpack to 2048 MB/ },
  { name: "cut off", make: () => xlsxFile(book(cell(CALL))).slice(0, 900), refusal: /cut off or damaged/ },
  { name: "macros", make: file(cell(CALL), { parts: { "xl/vbaProject.bin": "x" } }), refusal: /macros/ },
  {
    name: "entities that multiply",
    make: file(cell(CALL), {
      parts: {
        "xl/sharedStrings.xml": `<!DOCTYPE x [<!ENTITY a "aaaaaaaaaa"><!ENTITY b "&a;&a;&a;&a;">]><sst><si><t>&b;</t></si></sst>`,
      },
    }),
    refusal: /document type/,
  },
  {
    name: "a text that isn't there",
    make: file('<c r="D2" t="s"><v>1000000000</v></c>'),
    refusal: /no text number 1000000000/,
  },
  { name: "a text before the first", make: file('<c r="D2" t="s"><v>-1</v></c>'), refusal: /no text number -1/ },
  { name: "a word for a number", make: file(cell(CALL, "<v>seven</v>")), refusal: /holds “seven”/ },
  { name: "a number of a programming language", make: file(cell(CALL, "<v>0x10</v>")), refusal: /holds “0x10”/ },
  { name: "maybe for TRUE", make: file('<c r="D2" t="b"><v>maybe</v></c>'), refusal: /holds “maybe”/ },
  {
    name: "a shared formula that leads to itself",
    make: file('<c r="D2"><f t="shared" si="0"/><v>1</v></c>'),
    refusal: /shared formula stands before its text/,
  },
  {
    name: "a result that claims the whole sheet",
    make: file(cell(CALL, undefined, ' t="array" ref="A1:XFD1048576"')),
    refusal: /claim to fill more than/,
  },
  {
    name: "marks, merges and a filter over the whole sheet",
    make: file(
      cell(CALL, "<v>4</v>"),
      {},
      '<autoFilter ref="A1:XFD1048576"/><mergeCells><mergeCell ref="A1:XFD1048576"/></mergeCells><conditionalFormatting sqref="A1:XFD1048576"/>',
    ),
    verdict: /stored inputs give 4\.\d+/,
  },
  {
    name: "a range over nearly the whole sheet",
    make: file(cell("_xldudf_WEIR_TOP_FRACTION_CUTOFF(A1:XFC1048575,0.1)")),
    verdict: /has too many cells/,
  },
  {
    name: "many ranges of ten million cells, each another",
    make: file(
      cell(
        `SUM(${Array.from({ length: 120 }, (_, i) => `_xldudf_WEIR_TOP_FRACTION_CUTOFF(A1:I${1_000_000 + i},0.1)`).join(",")})`,
      ),
    ),
    verdict: /too many steps/,
  },
  {
    name: "names that lead in a circle",
    make: file(cell("_xldudf_WEIR_TOP_FRACTION_CUTOFF(A1:A3,a)"), {
      names: `<definedName name="a">b</definedName><definedName name="b">a</definedName>`,
    }),
    verdict: /leads back to itself/,
  },
  {
    name: "names 1,000 deep",
    make: file(cell("_xldudf_WEIR_TOP_FRACTION_CUTOFF(A1:A3,level_0)"), { names: chain(1000) }),
    verdict: /more than 32 deep/,
  },
  {
    name: "names that double at each level",
    make: file(cell("_xldudf_WEIR_TOP_FRACTION_CUTOFF(A1:A3,level_0)"), {
      names: Array.from(
        { length: 30 },
        (_, i) => `<definedName name="level_${i}">level_${i + 1}+level_${i + 1}</definedName>`,
      ).join(""),
    }),
    verdict: /There is no name|deep|steps/,
  },
  {
    name: "a formula nested 1,000 deep",
    make: file(cell(`${"IF(1,".repeat(1000)}${CALL}${")".repeat(1000)}`)),
    verdict: /nested more than 128 deep/,
  },
  {
    name: "a formula of a million signs",
    make: file(cell(`${CALL}${"+1".repeat(500_000)}`)),
    verdict: /a cell takes 8192/,
  },
  {
    name: "a formula that begins a name a million times",
    make: file(cell("weir_".repeat(200_000))),
  },
  {
    name: "a long label of spaces beside the scores",
    make: () =>
      xlsxFile({
        sheets: [
          {
            name: "A",
            rows: `<row r="1"><c r="B1"><v>1</v></c></row><row r="2"><c r="B2"><v>2</v></c><c r="D2"><f>${CALL.replace(/A(\d)/g, "B$1")}</f><v>1</v></c></row><row r="3"><c r="A3" t="inlineStr"><is><t xml:space="preserve">total${" ".repeat(200_000)}x</t></is></c><c r="B3"><v>4</v></c></row>`,
          },
        ],
      }),
    verdict: /stored inputs give 4/,
  },
  {
    name: "a command for another program",
    make: file(cell(`${CALL}+cmd|'/c calc'!A0`)),
    verdict: /Not checkable/,
  },
];
