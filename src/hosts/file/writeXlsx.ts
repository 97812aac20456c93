import { strToU8, zipSync } from "fflate";
import { formatAddress } from "../../sheet/address";
import { isBlank, isCellError, type Cell } from "../../sheet/cell";

/** A sheet to be written: its first row are headings. Values only, never a formula. */
export interface SheetToWrite {
  readonly name: string;
  readonly rows: readonly (readonly Cell[])[];
  /** Widths in characters. */
  readonly widths: readonly number[];
}

const HEAD = '<?xml version="1.0" encoding="UTF-8" standalone="yes"?>\n';
const MAIN = "http://schemas.openxmlformats.org/spreadsheetml/2006/main";
const OFFICE = "http://schemas.openxmlformats.org/officeDocument/2006/relationships";
const PACKAGE = "http://schemas.openxmlformats.org/package/2006";
const SHEET_TYPE = "application/vnd.openxmlformats-officedocument.spreadsheetml";
const STYLE = { plain: 0, heading: 1, quoted: 2, wrapped: 3 } as const;

/** Bold headings, texts that are never taken for formulas, and wrapped sentences. */
const STYLES = `${HEAD}<styleSheet xmlns="${MAIN}"><fonts count="2"><font><sz val="11"/><name val="Calibri"/></font><font><b/><sz val="11"/><name val="Calibri"/></font></fonts><fills count="1"><fill><patternFill patternType="none"/></fill></fills><borders count="1"><border/></borders><cellStyleXfs count="1"><xf/></cellStyleXfs><cellXfs count="4"><xf/><xf fontId="1" applyFont="1"/><xf quotePrefix="1"/><xf applyAlignment="1"><alignment vertical="top" wrapText="1"/></xf></cellXfs></styleSheet>`;

/** The bytes of a new .xlsx file with values alone (ECMA-376), the first row of each sheet held in view. */
export function writeXlsx(sheets: readonly SheetToWrite[]): Uint8Array {
  const parts: Record<string, string> = {
    "[Content_Types].xml": `${HEAD}<Types xmlns="${PACKAGE}/content-types"><Default Extension="rels" ContentType="application/vnd.openxmlformats-package.relationships+xml"/><Default Extension="xml" ContentType="application/xml"/><Override PartName="/xl/workbook.xml" ContentType="${SHEET_TYPE}.sheet.main+xml"/><Override PartName="/xl/styles.xml" ContentType="${SHEET_TYPE}.styles+xml"/>${sheets
      .map(
        (_, index) =>
          `<Override PartName="/xl/worksheets/sheet${index + 1}.xml" ContentType="${SHEET_TYPE}.worksheet+xml"/>`,
      )
      .join("")}</Types>`,
    "_rels/.rels": relations([["rId1", "officeDocument", "xl/workbook.xml"]]),
    "xl/workbook.xml": `${HEAD}<workbook xmlns="${MAIN}" xmlns:r="${OFFICE}"><sheets>${sheets
      .map(({ name }, index) => `<sheet name="${escapeXml(name)}" sheetId="${index + 1}" r:id="rId${index + 1}"/>`)
      .join("")}</sheets></workbook>`,
    "xl/_rels/workbook.xml.rels": relations([
      ...sheets.map((_, index) => [`rId${index + 1}`, "worksheet", `worksheets/sheet${index + 1}.xml`] as const),
      ["rId1000", "styles", "styles.xml"],
    ]),
    "xl/styles.xml": STYLES,
  };
  sheets.forEach((sheet, index) => (parts[`xl/worksheets/sheet${index + 1}.xml`] = sheetXml(sheet, true)));
  return zipSync(Object.fromEntries(Object.entries(parts).map(([name, text]) => [name, strToU8(text)])));
}

function relations(list: readonly (readonly [id: string, kind: string, target: string])[]): string {
  const inside = list.map(
    ([id, kind, target]) => `<Relationship Id="${id}" Type="${OFFICE}/${kind}" Target="${target}"/>`,
  );
  return `${HEAD}<Relationships xmlns="${PACKAGE}/relationships">${inside.join("")}</Relationships>`;
}

/** The XML of one sheet; `styled` where the workbook has the styles of this file. */
export function sheetXml({ rows, widths }: SheetToWrite, styled: boolean): string {
  const columns = widths.map(
    (width, index) => `<col min="${index + 1}" max="${index + 1}" width="${width}" customWidth="1"/>`,
  );
  const lines = rows.map((row, top) => {
    const cells = row.map((cell, left) =>
      cellXml(cell, formatAddress({ top, left, bottom: top, right: left }), styled ? cellStyle(cell, top === 0) : 0),
    );
    return `<row r="${top + 1}">${cells.join("")}</row>`;
  });
  return `${HEAD}<worksheet xmlns="${MAIN}"><sheetViews><sheetView workbookViewId="0"><pane ySplit="1" topLeftCell="A2" activePane="bottomLeft" state="frozen"/></sheetView></sheetViews><cols>${columns.join("")}</cols><sheetData>${lines.join("")}</sheetData></worksheet>`;
}

function cellStyle(cell: Cell, heading: boolean): number {
  if (heading) return STYLE.heading;
  if (typeof cell !== "string") return STYLE.plain;
  return /^[=+\-@\t\r]/.test(cell) ? STYLE.quoted : cell.length > 60 ? STYLE.wrapped : STYLE.plain;
}

function cellXml(cell: Cell, address: string, style: number): string {
  if (isBlank(cell)) return "";
  const place = `<c r="${address}"${style === 0 ? "" : ` s="${style}"`}`;
  if (typeof cell === "number") return `${place}><v>${cell}</v></c>`;
  if (typeof cell === "boolean") return `${place} t="b"><v>${cell ? 1 : 0}</v></c>`;
  const text = isCellError(cell) ? cell.code : cell;
  return `${place} t="inlineStr"><is><t xml:space="preserve">${escapeXml(text.slice(0, 32_000))}</t></is></c>`;
}

/** For text and attributes; characters that XML can't hold are left out. */
export function escapeXml(text: string): string {
  return text
    .replace(/[^\t\n\r\u0020-\ud7ff\ue000-\ufffd\u{10000}-\u{10ffff}]/gu, "")
    .replace(/&/g, "&amp;")
    .replace(/</g, "&lt;")
    .replace(/>/g, "&gt;")
    .replace(/"/g, "&quot;");
}
