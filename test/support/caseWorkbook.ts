import { Sheet, type Workbook } from "../../src/sheet/workbook";
import { cellAt, type CaseFile } from "./cases";

/** The columns of a case file as a workbook of one sheet: headings in row 1, cells from row 2. */
export function caseWorkbook(columns: CaseFile["columns"]): Workbook {
  const sheet = new Sheet("Sheet1");
  columns.forEach(({ cells }, column) => {
    for (let row = 1; row <= cells.length + 1; row++) {
      const cell = cellAt(columns, row, column);
      if (cell !== null && cell !== undefined) sheet.set(row - 1, column, cell);
    }
  });
  return { sheets: [sheet], names: [], tables: [], date1904: false };
}
