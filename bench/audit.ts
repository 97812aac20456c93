/*
 * Time and memory of an audit beside reading alone, on books made here (invented scores).
 *
 *   node bench/run.mjs audit calls      100,000 rows, 2,000 calls that each take the whole column with another fraction
 *   node bench/run.mjs audit cells      a million cells, 20 calls
 *   node bench/run.mjs audit rows       100,000 calls, one a row
 *
 * "parse" is what no reader can do without: inflating the parts (fflate) and walking their XML (saxes), nothing kept. One book a run, so that
 * the memory is its own: the largest resident size of the whole program, the making of the book included.
 */
import { strToU8, unzipSync, zipSync } from "fflate";
import { SaxesParser } from "saxes";
import { auditWorkbook } from "../src/audit/auditWorkbook";
import { readXlsx } from "../src/hosts/file/readXlsx";

const ROUNDS = 3;
const CALL = "_xldudf_WEIR_TOP_FRACTION_CUTOFF";
const PACKAGE = "http://schemas.openxmlformats.org/package/2006";
const OFFICE = "http://schemas.openxmlformats.org/officeDocument/2006/relationships";
const MAIN = "http://schemas.openxmlformats.org/spreadsheetml/2006/main";
const relation = (kind: string, target: string) =>
  `<Relationships xmlns="${PACKAGE}/relationships"><Relationship Id="r1" Type="${OFFICE}/${kind}" Target="${target}"/></Relationships>`;

/** A fixed recurrence: the same scores in every run. */
function score(row: number): number {
  return 40 + ((row * 7919) % 4001) / 100;
}

const BOOKS: Readonly<Record<string, () => string[]>> = {
  calls: () =>
    rows(100_000, (row) => [
      `<c r="A${row}"><v>${row}</v></c><c r="B${row}"><v>${score(row)}</v></c>`,
      row <= 2_000 ? `<c r="D${row}"><f>${CALL}($B$1:$B$100000,${row / 2_001})</f><v>1</v></c>` : "",
    ]),
  cells: () =>
    rows(100_000, (row) => [
      ..."ABCDEFGHIJ".split("").map((column, i) => `<c r="${column}${row}"><v>${score(row + i)}</v></c>`),
      row <= 20 ? `<c r="L${row}"><f>${CALL}($B$1:$B$100000,${row / 21})</f><v>1</v></c>` : "",
    ]),
  rows: () =>
    rows(100_000, (row) => [
      `<c r="B${row}"><v>${score(row)}</v></c><c r="D${row}"><f>_xldudf_WEIR_TAIL_FRACTION(B${row},60,8)</f><v>0.5</v></c>`,
    ]),
};

function rows(count: number, cells: (row: number) => string[]): string[] {
  return Array.from({ length: count }, (_, index) => `<row r="${index + 1}">${cells(index + 1).join("")}</row>`);
}

function bookOf(sheet: readonly string[]): Uint8Array {
  return zipSync({
    "[Content_Types].xml": strToU8(`<Types xmlns="${PACKAGE}/content-types"/>`),
    "_rels/.rels": strToU8(relation("officeDocument", "xl/workbook.xml")),
    "xl/_rels/workbook.xml.rels": strToU8(relation("worksheet", "worksheets/sheet1.xml")),
    "xl/workbook.xml": strToU8(
      `<workbook xmlns="${MAIN}" xmlns:r="${OFFICE}"><sheets><sheet name="Scores" sheetId="1" r:id="r1"/></sheets></workbook>`,
    ),
    "xl/worksheets/sheet1.xml": strToU8(
      `<worksheet xmlns="${MAIN}"><sheetData>${sheet.join("")}</sheetData></worksheet>`,
    ),
  });
}

function parseAlone(bytes: Uint8Array): void {
  for (const part of Object.values(unzipSync(bytes))) {
    const parser = new SaxesParser({ position: false });
    const decoder = new TextDecoder();
    for (let at = 0; at < part.length; at += 16_384)
      parser.write(decoder.decode(part.subarray(at, at + 16_384), { stream: true }));
    parser.close();
  }
}

async function best(work: () => unknown): Promise<number> {
  let least = Infinity;
  for (let round = 0; round < ROUNDS; round++) {
    const start = process.cpuUsage();
    await work();
    const { user, system } = process.cpuUsage(start);
    least = Math.min(least, (user + system) / 1e6);
  }
  return least;
}

const name = process.argv[3] ?? "calls";
const make = BOOKS[name];
if (!make) throw new Error(`There is no book ${name}; there are ${Object.keys(BOOKS).join(", ")}.`);
const bytes = bookOf(make());
const parse = await best(() => parseAlone(bytes));
const read = await best(() => readXlsx(bytes));
const audit = await best(() => auditWorkbook(readXlsx(bytes), { tolerance: 1e-9 }));
const ratio = (time: number) => `${time.toFixed(2)} s, ${(time / parse).toFixed(1)} × parse`;
console.log(`${name}: ${(bytes.length / 2 ** 20).toFixed(1)} MB packed`);
console.log(`parse   ${ratio(parse)}`);
console.log(`read    ${ratio(read)}`);
console.log(`audit   ${ratio(audit)} (reading included)`);
console.log(`memory  ${(process.resourceUsage().maxRSS / 1024).toFixed(0)} MB at most`);
