import type { IWorkbookData, IWorksheetData } from "@univerjs/core";
import type { Extras } from "../../hosts/file/notShown";
import type { CellStyle, SheetLook } from "../../hosts/file/sheetLook";
import type { Workbook } from "../../sheet/workbook";
import { cellsOfSheet, type Differences } from "./cellsOfSheet";
import { frameOfSheet } from "./frameOfSheet";
import { styleOfLook } from "../../hosts/trial/styles";
import { namesResource } from "./namesResource";

/** A file as read: cells, and where it is a workbook with looks also those. */
export interface ReadFile {
  readonly name: string;
  readonly workbook: Workbook;
  /** By the name of the sheet. */
  readonly looks?: ReadonlyMap<string, SheetLook>;
  readonly styles?: readonly CellStyle[];
  readonly extras?: Extras;
}

const MIDDLE = 2;

/** A file laid out as the trial sheet opens it; `knows` tells which functions that sheet has. */
export function bookOfFile(
  file: ReadFile,
  knows: (name: string) => boolean,
): { book: IWorkbookData; differences: Differences } {
  const differences: Differences = { frozen: 0, pinned: 0 };
  const { workbook, looks, styles = [] } = file;
  const names = sheetNames(workbook);
  const sheets = workbook.sheets.map((sheet, index): Partial<IWorksheetData> & { id: string } => {
    const look = looks?.get(sheet.name);
    return {
      ...frameOfSheet(sheet, look, styles),
      id: `sheet-${index + 1}`,
      name: names[index]!,
      cellData: cellsOfSheet({ sheet, workbook, look, styles, knows }, differences),
    };
  });
  // A workbook needs a sheet in view.
  if (sheets.every(({ hidden }) => hidden === 1)) sheets[0]!.hidden = 0;
  const book = {
    id: "book",
    name: file.name,
    appVersion: "1",
    locale: "enUS",
    styles: Object.fromEntries(styles.map((style, index) => [`file-${index}`, styleOfLook(style)])),
    defaultStyle: { ff: "Arial", fs: 10, vt: MIDDLE },
    sheetOrder: sheets.map(({ id }) => id),
    sheets: Object.fromEntries(sheets.map((sheet) => [sheet.id, sheet])),
    resources: [namesResource(workbook)],
    custom: { file: file.name },
  };
  // The engine's list of languages is its code: naming the one here keeps that out of the background.
  return { book: book as unknown as IWorkbookData, differences };
}

/** The name of a .csv file may be no name of a sheet. */
function sheetNames({ sheets }: Workbook): string[] {
  return sheets.map(
    ({ name }) =>
      name
        .replace(/[[\]:*?/\\]/g, " ")
        .slice(0, 31)
        .trim() || "Sheet1",
  );
}
