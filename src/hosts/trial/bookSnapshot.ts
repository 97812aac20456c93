import { LocaleType, type ICellData, type IStyleData, type IWorkbookData, type IWorksheetData } from "@univerjs/core";
import { parseAddress } from "../../sheet/address";
import type { Book, BookBlock, BookSheet, BookStyle } from "./book";
import { cellData } from "./cellData";

const SPARE_ROWS = 40;
const LEAST_ROWS = 200;
const LEAST_COLUMNS = 26;
const RULE = { s: 1, cl: { rgb: "#9aa5ae" } } as const;
const CENTRE = 2;
const MIDDLE = 2;

const STYLES: Readonly<Record<BookStyle, IStyleData>> = {
  title: { fs: 14, bl: 1 },
  note: { cl: { rgb: "#565e66" } },
  caution: { cl: { rgb: "#0b4a6b" }, bl: 1 },
  heading: { bl: 1, bd: { b: RULE } },
  centred: { ht: CENTRE },
};

/** The workbook as the engine opens it. */
export function bookSnapshot(book: Book): IWorkbookData {
  const sheets = book.sheets.map(sheetSnapshot);
  return {
    id: "book",
    name: book.name,
    appVersion: "1",
    locale: LocaleType.EN_US,
    styles: {},
    defaultStyle: { ff: "Arial", fs: 10, vt: MIDDLE },
    sheetOrder: sheets.map(({ id }) => id),
    sheets: Object.fromEntries(sheets.map((sheet) => [sheet.id, sheet])),
  };
}

function sheetSnapshot(sheet: BookSheet, index: number): Partial<IWorksheetData> & { id: string } {
  const cells: Record<number, Record<number, ICellData>> = {};
  for (const block of sheet.blocks) layOut(block, cells);
  const rows = Math.max(...Object.keys(cells).map(Number)) + 1;
  const frozen = sheet.frozenRows ?? 0;
  return {
    id: `sheet-${index + 1}`,
    name: sheet.name,
    cellData: cells,
    rowCount: Math.max(LEAST_ROWS, rows + SPARE_ROWS),
    columnCount: Math.max(LEAST_COLUMNS, sheet.columnWidths.length + 4),
    columnData: Object.fromEntries(sheet.columnWidths.map((w, column) => [column, { w }])),
    defaultRowHeight: 22,
    // The line under frozen rows would cut the letters of their last row.
    rowData: frozen > 0 ? { [frozen - 1]: { h: 26 } } : {},
    freeze: { startRow: frozen, startColumn: -1, ySplit: frozen, xSplit: 0 },
  };
}

function layOut(block: BookBlock, cells: Record<number, Record<number, ICellData>>): void {
  const first = parseAddress(block.at)!;
  const style: IStyleData = {
    ...(block.style && STYLES[block.style]),
    ...(block.format && { n: { pattern: block.format } }),
  };
  const styled = block.style !== undefined || block.format !== undefined;
  block.cells.forEach((row, down) =>
    row.forEach((cell, across) => {
      const line = (cells[first.top + down] ??= {});
      line[first.left + across] = { ...cellData(cell), ...(styled && { s: style }) };
    }),
  );
}
