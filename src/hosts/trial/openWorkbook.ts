import type { ICellData, IWorksheetData } from "@univerjs/core";
import type { Area } from "../../sheet/address";
import { Sheet } from "../../sheet/workbook";
import type { OpenWorkbook } from "../port";
import { cellOfData } from "./cellOfData";
import { eachCell } from "./eachCell";
import type { SavedBook } from "./savedBook";

/** The workbook of the trial sheet as the evaluator and the audit read it. */
export function openWorkbook(saved: SavedBook): OpenWorkbook {
  const { snapshot, names } = saved;
  const file = snapshot.custom?.["file"];
  return {
    title: typeof file === "string" ? file : "",
    sheets: snapshot.sheetOrder.map((id) => sheetOf(saved, id, snapshot.sheets[id]!)),
    names: names.map(({ name, formula, sheetId }) => {
      const sheet = sheetId === undefined ? undefined : snapshot.sheets[sheetId]?.name;
      return { name, formula: formula.replace(/^=/, ""), ...(sheet !== undefined && { sheet }) };
    }),
    tables: [],
    date1904: false,
  };
}

function sheetOf(saved: SavedBook, id: string, data: Partial<IWorksheetData>): Sheet {
  const sheet = new Sheet(data.name ?? id, data.hidden !== 1);
  const put = (row: number, column: number, cell: ICellData) => {
    const value = cellOfData(cell);
    if (value !== null) sheet.set(row, column, value);
  };
  const addFormula = (row: number, column: number, text: string) => {
    const filled = saved.ranges[id]?.[row]?.[column];
    const array: Area = filled
      ? { top: row, left: column, bottom: filled.endRow, right: filled.endColumn }
      : { top: row, left: column, bottom: row, right: column };
    // The engine lets every formula fill what its result needs.
    sheet.addFormula({ row, column, formula: text.replace(/^=/, ""), array, dynamic: true, calculated: true });
  };
  eachCell<ICellData>(saved.spilled[id], put);
  eachCell<ICellData>(data.cellData, (row, column, cell) => {
    put(row, column, cell);
    if (cell.f) addFormula(row, column, cell.f);
  });
  for (const [row, column, formula] of saved.copied[id] ?? []) addFormula(row, column, formula);
  for (const [row, look] of Object.entries(data.rowData ?? {})) if (look?.hd === 1) sheet.hiddenRows.add(Number(row));
  return sheet;
}
