import type { Workbook } from "../../sheet/workbook";
import { readDelimited } from "./readDelimited";
import { UnusableFile } from "./unusableFile";

/** Reads a file of cells by its contents and its name: .xlsx, .csv or .tsv. Throws an UnusableFile with a sentence for anything else. */
export async function readWorkbook(bytes: Uint8Array, fileName: string): Promise<Workbook> {
  const [, base = "Sheet1", ending = ""] = /([^/\\]*?)(?:\.([^./\\]*))?$/.exec(fileName) ?? [];
  const kind = ending.toLowerCase();
  if (startsWith(bytes, 0xd0, 0xcf, 0x11, 0xe0))
    throw new UnusableFile(
      "The file is an old workbook (.xls) or one with a password: save it as .xlsx, without a password.",
    );
  if (startsWith(bytes, 0x50, 0x4b)) {
    // Loaded only where it is needed, so that a .csv is answered at once.
    const { readXlsx } = await import("./readXlsx");
    return readXlsx(bytes);
  }
  if (kind === "xlsx")
    throw new UnusableFile("The file is named .xlsx, but is no workbook inside: it is damaged or misnamed.");
  if (kind !== "csv" && kind !== "tsv" && kind !== "txt")
    throw new UnusableFile(`A file named .${ending} can't be read: .xlsx, .csv and .tsv can.`);
  return readDelimited(bytes, base, kind === "tsv" ? "\t" : undefined);
}

function startsWith(bytes: Uint8Array, ...signature: number[]): boolean {
  return signature.every((byte, index) => bytes[index] === byte);
}
