import { CellValueType, type ICellData, type Nullable } from "@univerjs/core";
import { isBlank, isCellError, type Cell } from "../../sheet/cell";

/** What is written into a cell, as the engine keeps it. Whatever stood there, formula or value, is gone. */
export function cellData(cell: Cell): ICellData {
  if (typeof cell === "string" && cell.startsWith("=")) return { f: cell, v: null, t: null, si: null };
  const nothing = { f: null, si: null };
  if (isBlank(cell)) return { ...nothing, v: null, t: null };
  if (typeof cell === "number") return { ...nothing, v: cell, t: CellValueType.NUMBER };
  if (typeof cell === "boolean") return { ...nothing, v: cell ? 1 : 0, t: CellValueType.BOOLEAN };
  return { ...nothing, v: isCellError(cell) ? cell.code : cell, t: CellValueType.STRING };
}

const ERRORS = new Set(["#NULL!", "#DIV/0!", "#VALUE!", "#REF!", "#NAME?", "#NUM!", "#N/A", "#SPILL!", "#CALC!"]);

/** What stands in a cell, with all its digits. */
export function cellOfData(data: Nullable<ICellData>): Cell {
  if (!data || data.v === null || data.v === undefined) return null;
  const value = data.v;
  if (data.t === CellValueType.BOOLEAN) return value === 1 || value === true || value === "TRUE";
  if (typeof value === "string" && ERRORS.has(value)) return { code: value };
  if (typeof value === "string" && data.t === CellValueType.NUMBER && value.trim() !== "") return Number(value);
  return data.t === CellValueType.STRING || data.t === CellValueType.FORCE_STRING ? String(value) : value;
}
