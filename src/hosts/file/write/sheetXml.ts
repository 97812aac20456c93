import { formatAddress, type Area } from "../../../sheet/address";
import type { SheetToWrite } from "./book";
import { asCellToWrite, cellXml, type CellSetting } from "./cellXml";
import { printXml } from "./printXml";
import { cellText, escapeXml, HEAD, MAIN, OFFICE } from "./xmlText";

/** The part of one sheet. `drawing` is the id of the relation that leads to its charts. */
export function sheetXml(sheet: SheetToWrite, setting: CellSetting, shown: boolean, drawing?: string): string {
  const merged = sheet.merged ?? [];
  return [
    `${HEAD}<worksheet xmlns="${MAIN}" xmlns:r="${OFFICE}">`,
    sheet.print?.pagesWide ? '<sheetPr><pageSetUpPr fitToPage="1"/></sheetPr>' : "",
    viewXml(sheet, shown),
    '<sheetFormatPr defaultRowHeight="15"/>',
    columnsXml(sheet),
    `<sheetData>${rowsXml(sheet, setting)}</sheetData>`,
    merged.length === 0
      ? ""
      : `<mergeCells count="${merged.length}">${merged.map((area) => `<mergeCell ref="${formatAddress(area)}"/>`).join("")}</mergeCells>`,
    choicesXml(sheet),
    sheet.print ? printXml(sheet.print) : "",
    drawing === undefined ? "" : `<drawing r:id="${drawing}"/>`,
    "</worksheet>",
  ].join("");
}

function viewXml({ frozenRows = 0, frozenColumns = 0, gridLines = true }: SheetToWrite, shown: boolean): string {
  const corner = formatAddress({ top: frozenRows, left: frozenColumns, bottom: frozenRows, right: frozenColumns });
  const pane = frozenRows > 0 && frozenColumns > 0 ? "bottomRight" : frozenRows > 0 ? "bottomLeft" : "topRight";
  const frozen =
    frozenRows > 0 || frozenColumns > 0
      ? `<pane${frozenColumns > 0 ? ` xSplit="${frozenColumns}"` : ""}${frozenRows > 0 ? ` ySplit="${frozenRows}"` : ""} topLeftCell="${corner}" activePane="${pane}" state="frozen"/>`
      : "";
  return `<sheetViews><sheetView${gridLines ? "" : ' showGridLines="0"'}${shown ? ' tabSelected="1"' : ""} workbookViewId="0">${frozen}</sheetView></sheetViews>`;
}

function columnsXml({ widths = [], hiddenColumns = new Set() }: SheetToWrite): string {
  const last = Math.max(widths.length - 1, ...hiddenColumns);
  const columns = Array.from({ length: last + 1 }, (_, column) => {
    const width = widths[column] ?? 0;
    const hidden = hiddenColumns.has(column) ? ' hidden="1"' : "";
    if (width <= 0 && hidden === "") return "";
    return `<col min="${column + 1}" max="${column + 1}" width="${width > 0 ? width : 9}" customWidth="1"${hidden}/>`;
  }).join("");
  return columns === "" ? "" : `<cols>${columns}</cols>`;
}

function rowsXml({ rows, heights, hiddenRows }: SheetToWrite, setting: CellSetting): string {
  const lines: string[] = [];
  const count = Math.max(rows.length, hiddenRows ? Math.max(0, ...[...hiddenRows].map((row) => row + 1)) : 0);
  for (let row = 0; row < count; row++) {
    const cells = (rows[row] ?? []).map((cell, column) => cellXml(asCellToWrite(cell), row, column, setting)).join("");
    const height = heights?.get(row);
    const look = `${height === undefined ? "" : ` ht="${height}" customHeight="1"`}${hiddenRows?.has(row) ? ' hidden="1"' : ""}`;
    if (cells !== "" || look !== "") lines.push(`<row r="${row + 1}"${look}>${cells}</row>`);
  }
  return lines.join("");
}

function choicesXml({ choices = [] }: SheetToWrite): string {
  if (choices.length === 0) return "";
  const one = (area: Area, words: readonly string[], strict: boolean) =>
    `<dataValidation type="list" allowBlank="1"${strict ? ' showErrorMessage="1"' : ""} sqref="${escapeXml(formatAddress(area))}"><formula1>${cellText(`"${words.join(",")}"`)}</formula1></dataValidation>`;
  const list = choices.map(({ area, words, strict = false }) => one(area, words, strict));
  return `<dataValidations count="${list.length}">${list.join("")}</dataValidations>`;
}
