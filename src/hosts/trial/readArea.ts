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

/** One cell with all its digits: what the engine shows is cut. */
export function readCell(from: ReadFrom, sheet: FWorksheet, row: number, column: number): Cell {
  return cellReader(from, sheet)(row, column);
}

/** Reads cells of one sheet; what is the same for all of them is looked up once, since a column has a hundred thousand. */
function cellReader({ formulas, messages }: ReadFrom, sheet: FWorksheet): (row: number, column: number) => Cell {
  const model = sheet.getSheet();
  const id = model.getSheetId();
  const matrix = model.getCellMatrix();
  // The cells that a formula fills are kept apart from the typed ones.
  const spilled = formulas.getArrayFormulaCellData()[model.getUnitId()]?.[id];
  return (row, column) => {
    const cell = cellOfData(matrix.getValue(row, column)) ?? cellOfData(spilled?.[row]?.[column]);
    if (typeof cell !== "object" || cell === null) return cell;
    const message = messages.messageAt(id, row, column, cell.code);
    return message === undefined ? cell : { ...cell, message };
  };
}

/** The cells of an area, cut at the end of the sheet; with `used` to the part that holds something. What lies beyond the sheet is blank. */
export function readArea(from: ReadFrom, sheet: FWorksheet, area: Area, used: boolean): Block {
  const { top, left } = area;
  const bottom = Math.max(top, Math.min(area.bottom, sheet.getMaxRows() - 1));
  const right = Math.max(left, Math.min(area.right, sheet.getMaxColumns() - 1));
  const read = cellReader(from, sheet);
  const values: Cell[][] = [];
  for (let row = top; row <= bottom; row++) {
    const line: Cell[] = [];
    for (let column = left; column <= right; column++) line.push(read(row, column));
    values.push(line);
  }
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
