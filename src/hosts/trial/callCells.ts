import type { FWorksheet } from "@univerjs/preset-sheets-core";
import { formatAddress } from "../../sheet/address";
import type { CallCell } from "../port";
import { readCell, type ReadFrom } from "./readArea";

const OURS = /(?:WEIR\.|_XLDUDF_WEIR_)[A-Z]/i;

/** The cells of one sheet whose formula calls a function of ours. */
export function callCells(from: ReadFrom, sheet: FWorksheet): CallCell[] {
  const model = sheet.getSheet();
  const found: CallCell[] = [];
  model.getCellMatrix().forValue((row, column, data) => {
    if (!data?.f && !data?.si) return;
    const formula = from.formulas.getFormulaStringByCell(row, column, model.getSheetId(), model.getUnitId());
    if (!formula || !OURS.test(formula)) return;
    const address = formatAddress({
      sheet: sheet.getSheetName(),
      top: row,
      left: column,
      bottom: row,
      right: column,
    });
    found.push({ address, formula, value: readCell(from, sheet, row, column) });
  });
  return found;
}
