import { VerticalAlign, type IStyleData } from "@univerjs/core";
import type { FWorksheet } from "@univerjs/preset-sheets-core";
import { ROLE_LOOKS, type CellRole } from "../../sheet/cellLook";
import type { SheetLook } from "../port";
import { styleOfLook } from "./styles";

/** CSS pixels to a letter and to a point. */
const LETTER = 7.6;
const POINT = 4 / 3;

/** Gives a written sheet its looks. */
export function dressSheet(sheet: FWorksheet, { cells, widths, heights, merged }: SheetLook): void {
  const columns = Math.max(1, ...cells.map((row) => row.length));
  if (cells.length > sheet.getMaxRows()) sheet.setRowCount(cells.length);
  const styles = cells.map((row) =>
    Array.from({ length: columns }, (_, column) => {
      const look = row[column];
      return look ? { s: styleOf(look.role, look.format) } : {};
    }),
  );
  if (cells.length > 0) sheet.getRange(0, 0, cells.length, columns).setValues(styles);
  widths.forEach((width, column) => sheet.setColumnWidth(column, Math.round(width * LETTER)));
  for (const [row, height] of heights) sheet.setRowHeight(row, Math.round(height * POINT));
  for (const { top, left, bottom, right } of merged) {
    const range = sheet.getRange(top, left, bottom - top + 1, right - left + 1);
    if (!range.isMerged()) range.merge();
  }
}

function styleOf(role: CellRole, format: string | undefined): IStyleData {
  return { ...styleOfLook({ look: ROLE_LOOKS[role], ...(format && { format }) }), vt: VerticalAlign.TOP };
}
