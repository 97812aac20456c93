import { formatAddress } from "../../sheet/address";
import { ROLE_LOOKS, type CellRole } from "../../sheet/cellLook";
import type { SheetLook } from "../port";

/** Points to a letter of a column's width. */
const LETTER = 5.6;
const ALIGN = { left: "Left", center: "Center", right: "Right" } as const;
const EDGES = {
  bottom: ["EdgeBottom"],
  left: ["EdgeLeft"],
  box: ["EdgeTop", "EdgeBottom", "EdgeLeft", "EdgeRight"],
} as const;

/** Gives a written sheet its looks and sets it up for print, one page wide. */
export async function dress(context: Excel.RequestContext, name: string, look: SheetLook): Promise<void> {
  const sheet = context.workbook.worksheets.getItem(name);
  look.widths.forEach(
    (width, column) => (sheet.getCell(0, column).getEntireColumn().format.columnWidth = width * LETTER),
  );
  look.cells.forEach((row, r) =>
    row.forEach((cell, c) => {
      if (cell) dressCell(sheet.getCell(r, c), cell.role, cell.format);
    }),
  );
  for (const [row, height] of look.heights) sheet.getCell(row, 0).getEntireRow().format.rowHeight = height;
  for (const area of look.merged) sheet.getRange(formatAddress(area)).merge(false);
  if (Office.context.requirements.isSetSupported("ExcelApi", "1.9")) {
    sheet.showGridlines = false;
    sheet.pageLayout.orientation = Excel.PageOrientation.portrait;
    sheet.pageLayout.zoom = { horizontalFitToPages: 1 };
    sheet.pageLayout.setPrintTitleRows("$1:$1");
  }
  await context.sync();
}

function dressCell(range: Excel.Range, role: CellRole, format: string | undefined): void {
  const { size, bold, italic, ink, fill, rule, wrap, align, indent } = ROLE_LOOKS[role];
  const { font } = range.format;
  if (format) range.numberFormat = [[format]];
  if (size) font.size = size;
  if (bold) font.bold = true;
  if (italic) font.italic = true;
  if (ink) font.color = `#${ink}`;
  if (fill) range.format.fill.color = `#${fill}`;
  if (wrap) range.format.wrapText = true;
  if (align) range.format.horizontalAlignment = ALIGN[align];
  if (indent) range.format.indentLevel = indent;
  range.format.verticalAlignment = "Top";
  for (const edge of rule ? EDGES[rule.side] : []) {
    const line = range.format.borders.getItem(edge);
    line.style = "Continuous";
    line.weight = rule!.thick ? "Medium" : "Thin";
    line.color = `#${rule!.colour}`;
  }
}
