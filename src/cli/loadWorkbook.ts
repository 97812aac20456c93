import { readWorkbook } from "../hosts/file/readWorkbook";
import { UnusableFile } from "../hosts/file/unusableFile";
import type { Sheet, Workbook } from "../sheet/workbook";
import { sheetNamed } from "../sheet/workbook";
import { Stop, type Io } from "./io";

/** Reads the file of a command; one that can't be used ends it with the reason. */
export async function loadWorkbook(path: string, io: Io): Promise<Workbook> {
  return parseWorkbook(await io.read(path), path);
}

export async function parseWorkbook(bytes: Uint8Array, path: string): Promise<Workbook> {
  try {
    return await readWorkbook(bytes, path);
  } catch (failure) {
    if (failure instanceof UnusableFile) throw new Stop(`${path}: ${failure.message}`);
    throw failure;
  }
}

/** The sheet with this name, in any case; the first where none is named. */
export function chooseSheet(workbook: Workbook, name: string | undefined, path: string): Sheet {
  const sheet = name === undefined ? workbook.sheets[0] : sheetNamed(workbook, name);
  if (sheet) return sheet;
  const names = workbook.sheets.map((one) => `“${one.name}”`).join(", ");
  throw new Stop(`${path} has no sheet “${name}”; it has ${names}.`);
}
