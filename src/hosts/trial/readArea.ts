import { FormulaDataModel, type FWorksheet } from "@univerjs/preset-sheets-core";
import { formatAddress, type Area } from "../../sheet/address";
import type { Cell } from "../../sheet/cell";
import type { Block } from "../port";
import { cellOfData } from "./cellOfData";
import type { MessageBook } from "./messageBook";

/** What a read of the trial sheet needs beside the sheet itself. */
export interface ReadFrom {
  readonly formulas: FormulaDataModel;
  readonly messages: MessageBook;
}

/** One cell with all its digits: what the engine shows is cut, and a spilled cell is kept apart from the typed ones. */
export function readCell(from: ReadFrom, sheet: FWorksheet, row: number, column: number): Cell {
  const model = sheet.getSheet();
  const typed = cellOfData(model.getCellRaw(row, column));
  const spilled = from.formulas.getArrayFormulaCellData()[model.getUnitId()]?.[model.getSheetId()]?.[row]?.[column];
  const cell = typed ?? cellOfData(spilled);
  if (typeof cell !== "object" || cell === null) return cell;
  const message = from.messages.messageAt(model.getSheetId(), row, column, cell.code);
  return message === undefined ? cell : { ...cell, message };
}

/** The cells of an area, cut to the rows and columns that the sheet has; with `used` also to the part that holds something. */
export function readArea(from: ReadFrom, sheet: FWorksheet, area: Area, used: boolean): Block {
  const bottom = Math.min(area.bottom, sheet.getMaxRows() - 1);
  const right = Math.min(area.right, sheet.getMaxColumns() - 1);
  const top = Math.min(area.top, bottom);
  const left = Math.min(area.left, right);
  const values = Array.from({ length: bottom - top + 1 }, (_, down) =>
    Array.from({ length: right - left + 1 }, (_, across) => readCell(from, sheet, top + down, left + across)),
  );
  const name = sheet.getSheetName();
  if (!used) return { address: formatAddress({ sheet: name, top, left, bottom, right }), values };
  const part = usedPart(values);
  return {
    address: formatAddress({
      sheet: name,
      top: top + part.top,
      left: left + part.left,
      bottom: top + part.bottom,
      right: left + part.right,
    }),
    values: values.slice(part.top, part.bottom + 1).map((row) => row.slice(part.left, part.right + 1)),
  };
}

/** The smallest rectangle around the cells that hold something; the first cell alone where none does. */
function usedPart(values: readonly (readonly Cell[])[]): Area {
  let part: Area | undefined;
  values.forEach((row, down) =>
    row.forEach((cell, across) => {
      if (cell === null) return;
      part = part
        ? {
            top: part.top,
            left: Math.min(part.left, across),
            bottom: down,
            right: Math.max(part.right, across),
          }
        : { top: down, left: across, bottom: down, right: across };
    }),
  );
  return part ?? { top: 0, left: 0, bottom: 0, right: 0 };
}
