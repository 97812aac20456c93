import type { Nullable } from "@univerjs/core";
import {
  ArrayValueObject,
  BooleanValueObject,
  ErrorValueObject,
  NullValueObject,
  NumberValueObject,
  StringValueObject,
  type BaseValueObject,
  type ErrorType,
} from "@univerjs/preset-sheets-core";
import { isCellError, type Cell } from "../../sheet/cell";
import type { Argument } from "../../sheet/invoke";

/** One value of the engine as a cell: a blank stays null, which the engine itself would turn into 0. */
function cellOf(value: Nullable<BaseValueObject>): Cell {
  if (!value || value.isNull()) return null;
  if (value.isError()) return { code: (value as ErrorValueObject).getErrorType() };
  return value.getValue() as Cell;
}

/** An argument as the engine hands it over. What is null by itself, not inside a range, was left out. */
export function argumentOf(value: BaseValueObject): Argument {
  if (value.isArray()) {
    const array = value as ArrayValueObject;
    const columns = array.getColumnCount();
    return Array.from({ length: array.getRowCount() }, (_, row) =>
      Array.from({ length: columns }, (_, column) => cellOf(array.get(row, column))),
    );
  }
  return value.isNull() ? undefined : cellOf(value);
}

function valueOfCell(cell: Cell): BaseValueObject {
  if (typeof cell === "number") return NumberValueObject.create(cell);
  if (typeof cell === "string") return StringValueObject.create(cell);
  if (typeof cell === "boolean") return BooleanValueObject.create(cell);
  if (isCellError(cell)) return ErrorValueObject.create(cell.code as ErrorType);
  return NullValueObject.create();
}

/** A result as the engine wants it; a table is no longer tied to any place, so that it spills from where the formula stands. */
export function valueOf(result: Cell | Cell[][]): BaseValueObject {
  if (!Array.isArray(result)) return valueOfCell(result);
  return ArrayValueObject.create({
    calculateValueList: result.map((row) => row.map(valueOfCell)),
    rowCount: result.length,
    columnCount: result[0]?.length ?? 0,
    unitId: "",
    sheetId: "",
    row: -1,
    column: -1,
  });
}
