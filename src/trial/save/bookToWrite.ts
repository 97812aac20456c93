import type { ICellData } from "@univerjs/core";
import type { BookToWrite, CellToWrite, SheetToWrite } from "../../hosts/file/write/book";
import { cellOfData } from "../../hosts/trial/cellOfData";
import { eachCell } from "../../hosts/trial/eachCell";
import type { SavedBook } from "../../hosts/trial/savedBook";
import type { SaveRequest } from "./saveProtocol";
import { frameToWrite } from "./frameToWrite";
import { lookOfStyle } from "../../hosts/trial/styles";

/** The workbook of the trial sheet as a file takes it. `settings` are the pane's own, kept with it. */
export function bookToWrite({ book: saved, settings, pictures }: SaveRequest): BookToWrite {
  const { snapshot, names } = saved;
  const order = snapshot.sheetOrder;
  return {
    sheets: order.map((id) => ({
      ...sheetToWrite(saved, id),
      pictures: pictures.filter(({ sheetId }) => sheetId === id),
    })),
    names: names.map(({ name, formula, sheetId }) => ({
      name,
      formula,
      ...(sheetId !== undefined && { sheet: snapshot.sheets[sheetId]?.name }),
    })),
    title: snapshot.name,
    active: Math.max(0, order.indexOf(saved.activeSheetId)),
    settings,
  };
}

function sheetToWrite(saved: SavedBook, id: string): SheetToWrite {
  const { styles, sheets } = saved.snapshot;
  const sheet = sheets[id]!;
  const rows: CellToWrite[][] = [];
  const looks = new Map<string, ReturnType<typeof lookOfStyle>>();
  const lookOf = (style: ICellData["s"]) => {
    if (typeof style !== "string") return lookOfStyle(style);
    if (!looks.has(style)) looks.set(style, lookOfStyle(styles[style]));
    return looks.get(style);
  };
  const put = (row: number, column: number, cell: CellToWrite) => {
    (rows[row] ??= [])[column] = { ...rows[row]?.[column], ...cell };
  };
  eachCell<ICellData>(saved.spilled[id], (row, column, data) => put(row, column, { value: cellOfData(data) }));
  eachCell<ICellData>(sheet.cellData, (row, column, data) => {
    const value = cellOfData(data);
    const style = lookOf(data.s);
    const formula = data.f ? { formula: data.f } : {};
    // A cell that a formula fills holds no value of its own, but may be formatted.
    if (value !== null || data.f || style) put(row, column, { ...(value !== null && { value }), ...formula, ...style });
  });
  for (const [row, column, formula] of saved.copied[id] ?? []) put(row, column, { formula });
  eachCell(saved.ranges[id], (row, column, { startRow, startColumn, endRow, endColumn }) => {
    const spills = { rows: endRow - startRow + 1, columns: endColumn - startColumn + 1 };
    const filled = spills.rows > 1 || spills.columns > 1;
    if (filled && rows[row]?.[column]?.formula !== undefined) put(row, column, { spills });
  });
  return { name: sheet.name ?? id, rows, ...frameToWrite(sheet) };
}
