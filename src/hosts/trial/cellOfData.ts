import type { ICellData, Nullable } from "@univerjs/core";
import type { Cell } from "../../sheet/cell";
import { CELL_KIND } from "./cellKinds";

const ERRORS = new Set(["#NULL!", "#DIV/0!", "#VALUE!", "#REF!", "#NAME?", "#NUM!", "#N/A", "#SPILL!", "#CALC!"]);

/** What stands in a cell, with all its digits. */
export function cellOfData(data: Nullable<ICellData>): Cell {
  if (!data || data.v === null || data.v === undefined) return null;
  const value = data.v;
  if (data.t === CELL_KIND.flag) return value === 1 || value === true || value === "TRUE";
  if (typeof value === "string" && ERRORS.has(value)) return { code: value };
  if (typeof value === "string" && data.t === CELL_KIND.number && value.trim() !== "") return Number(value);
  return data.t === CELL_KIND.text || data.t === CELL_KIND.forcedText ? String(value) : value;
}
