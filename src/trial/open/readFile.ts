import type { IWorkbookData } from "@univerjs/core";
import { readWorkbook } from "../../hosts/file/readWorkbook";
import { openXlsx } from "../../hosts/file/readXlsx";
import { UnusableFile } from "../../hosts/file/unusableFile";
import { bookOfFile, type ReadFile } from "./bookOfFile";
import type { FileSummary } from "./openProtocol";

const MOST_BYTES = 200 * 2 ** 20;
/** What the sheet still scrolls and calculates without the page standing still. */
const MOST_CELLS = 1_000_000;

export interface OpenedFile {
  readonly book: IWorkbookData;
  readonly summary: FileSummary;
  readonly settings: Readonly<Record<string, unknown>>;
}

/** Reads the bytes of a file and lays it out for the sheet. Throws an UnusableFile with a sentence for what can't be shown. */
export async function readFile(bytes: Uint8Array, name: string, functions: readonly string[]): Promise<OpenedFile> {
  if (bytes.length === 0) throw new UnusableFile("The file is empty.");
  if (bytes.length > MOST_BYTES)
    throw new UnusableFile(`The file has ${Math.round(bytes.length / 2 ** 20)} MB; this page opens up to 200 MB.`);
  const { file, settings } = await read(bytes, name);
  const cells = countCells(file);
  if (cells === 0) throw new UnusableFile("The file holds no cell with anything in it.");
  if (cells > MOST_CELLS)
    throw new UnusableFile(
      `The file holds ${cells} cells; this page shows up to ${MOST_CELLS}. The command line takes more: weirmark calc.`,
    );
  const known = new Set(functions.map((one) => one.toUpperCase()));
  const { book, differences } = bookOfFile(file, (one) => known.has(one));
  const extras = [...(file.extras ?? [])];
  return { book, summary: { name, sheets: file.workbook.sheets.length, cells, differences, extras }, settings };
}

async function read(
  bytes: Uint8Array,
  name: string,
): Promise<{ file: ReadFile; settings: Readonly<Record<string, unknown>> }> {
  // A workbook begins with the letters of a zip archive; everything else is told apart, or refused, by the common reader.
  if (bytes[0] === 0x50 && bytes[1] === 0x4b) {
    const opened = openXlsx(bytes);
    return { file: { name, ...opened }, settings: opened.settings };
  }
  return { file: { name, workbook: await readWorkbook(bytes, name) }, settings: {} };
}

function countCells({ workbook }: ReadFile): number {
  let cells = 0;
  for (const sheet of workbook.sheets) {
    sheet.forEachCell(() => cells++);
    cells += sheet.uncalculated.size;
  }
  return cells;
}
