import type { Area } from "./address";
import type { CellError } from "./cell";
import type { Table } from "./workbook";

/**
 * The rows of a table that the sections name (data where they name none), of the columns named (all where none is), seen from a
 * row of its sheet. The error that the cell shows where there is no such part.
 */
export function tableArea(
  table: Table,
  columns: readonly string[],
  sections: readonly string[],
  row: number,
): Area | CellError {
  const { area, headerRows, totalsRows } = table;
  const indexes = columns.map((name) => table.columns.findIndex((one) => one.toLowerCase() === name.toLowerCase()));
  const missing = columns[indexes.indexOf(-1)];
  if (missing !== undefined) return { code: "#REF!", message: `The table ${table.name} has no column “${missing}”.` };
  const firstData = area.top + headerRows;
  const lastData = area.bottom - totalsRows;
  const has = (section: string) => sections.includes(section);
  let [top, bottom] = [firstData, lastData];
  if (has("this row")) top = bottom = row;
  else if (has("all")) [top, bottom] = [area.top, area.bottom];
  else if (sections.length > 0) {
    top = has("headers") ? area.top : has("data") ? firstData : lastData + 1;
    bottom = has("totals") ? area.bottom : has("data") ? lastData : firstData - 1;
  }
  if (has("this row") && (top < firstData || bottom > lastData))
    return { code: "#VALUE!", message: `The formula stands beside no row of the table ${table.name}.` };
  if (top > bottom) return { code: "#REF!", message: `The table ${table.name} has no such rows.` };
  const left = indexes.length > 0 ? Math.min(...indexes) : 0;
  const right = indexes.length > 0 ? Math.max(...indexes) : area.right - area.left;
  return { sheet: table.sheet, top, left: area.left + left, bottom, right: area.left + right };
}
