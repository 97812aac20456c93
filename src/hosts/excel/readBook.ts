import { parseAddress } from "../../sheet/address";
import { Sheet, type Table } from "../../sheet/workbook";
import type { OpenWorkbook } from "../port";
import { addCells, setSpill, wantsSpill } from "./sheetOfHost";

/** What one answer of the host may hold: in a browser it refuses more than 5 MB. */
const CELLS_AT_ONCE = 50_000;
const MOST_CELLS = 2_000_000;
const SPILLS_AT_ONCE = 2_000;

/** The whole workbook, sheet by sheet and in pieces. */
export async function readBook(context: Excel.RequestContext): Promise<OpenWorkbook> {
  const { workbook } = context;
  const { worksheets, tables, names } = workbook;
  workbook.load("name");
  worksheets.load("items/name,items/visibility");
  names.load("items/name,items/formula");
  tables.load("items/name,items/showHeaders,items/showTotals");
  await context.sync();
  const shown = worksheets.items.map((item) => ({ item, names: item.names.load("items/name,items/formula") }));
  const placed = tables.items.map((item) => ({
    item,
    range: item.getRange().load("address"),
    columns: item.columns.load("items/name"),
  }));
  await context.sync();
  const sheets: Sheet[] = [];
  let cells = 0;
  for (const { item } of shown) {
    const used = item.getUsedRangeOrNullObject(true);
    used.load("rowIndex,columnIndex,rowCount,columnCount");
    await context.sync();
    const sheet = new Sheet(item.name, item.visibility === Excel.SheetVisibility.visible);
    sheets.push(sheet);
    if (used.isNullObject) continue;
    cells += used.rowCount * used.columnCount;
    if (cells > MOST_CELLS)
      throw new Error(`The sheets take up more than ${MOST_CELLS} cells: check the saved file by the command line.`);
    await readCells(context, item, used, sheet);
  }
  const known = (item: Excel.NamedItem) => ({ name: item.name, formula: String(item.formula).replace(/^=/, "") });
  return {
    title: workbook.name ?? "",
    sheets,
    names: [
      ...names.items.map(known),
      ...shown.flatMap(({ item, names: own }) => own.items.map((one) => ({ ...known(one), sheet: item.name }))),
    ],
    tables: placed.flatMap(({ item, range, columns }): Table[] => {
      const area = parseAddress(range.address);
      if (area?.sheet === undefined) return [];
      return [
        {
          name: item.name,
          sheet: area.sheet,
          area,
          columns: columns.items.map((column) => column.name),
          headerRows: item.showHeaders ? 1 : 0,
          totalsRows: item.showTotals ? 1 : 0,
        },
      ];
    }),
    // The host doesn't tell from which year it counts its dates.
    date1904: false,
  };
}

async function readCells(
  context: Excel.RequestContext,
  item: Excel.Worksheet,
  { rowIndex: top, columnIndex: left, rowCount, columnCount }: Excel.Range,
  sheet: Sheet,
): Promise<void> {
  const supports = (version: string) => Office.context.requirements.isSetSupported("ExcelApi", version);
  const rowsAtOnce = Math.max(1, Math.floor(CELLS_AT_ONCE / columnCount));
  for (let row = 0; row < rowCount; row += rowsAtOnce) {
    const piece = item.getRangeByIndexes(top + row, left, Math.min(rowsAtOnce, rowCount - row), columnCount);
    piece.load("formulas,values,valueTypes");
    const hidden = supports("1.9") ? piece.getRowProperties({ rowHidden: true }) : undefined;
    await context.sync();
    addCells(sheet, top + row, left, piece.formulas, piece.values, piece.valueTypes);
    hidden?.value.forEach((one, down) => one.rowHidden && sheet.hiddenRows.add(top + row + down));
  }
  // An older host knows no results that fill several cells.
  if (!supports("1.12")) return;
  const asked = wantsSpill(sheet);
  for (let first = 0; first < asked.length; first += SPILLS_AT_ONCE) {
    const spills = asked.slice(first, first + SPILLS_AT_ONCE).map((cell) => {
      const range = item.getRangeByIndexes(cell.row, cell.column, 1, 1).getSpillingToRangeOrNullObject();
      range.load("rowCount,columnCount");
      return { cell, range };
    });
    await context.sync();
    for (const { cell, range } of spills)
      setSpill(sheet, cell, range.isNullObject ? 1 : range.rowCount, range.isNullObject ? 1 : range.columnCount);
  }
}
