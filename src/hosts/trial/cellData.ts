import type { ICellData } from "@univerjs/core";
import { isBlank, isCellError, type Cell } from "../../sheet/cell";
import { CELL_KIND } from "./cellKinds";

/** What is written into a cell, as the engine keeps it. Whatever stood there, formula or value, is gone. */
export function cellData(cell: Cell): ICellData {
  if (typeof cell === "string" && cell.startsWith("=")) return { f: cell, v: null, t: null, si: null };
  const nothing = { f: null, si: null };
  if (isBlank(cell)) return { ...nothing, v: null, t: null };
  if (typeof cell === "number") return { ...nothing, v: cell, t: CELL_KIND.number };
  if (typeof cell === "boolean") return { ...nothing, v: cell ? 1 : 0, t: CELL_KIND.flag };
  return { ...nothing, v: isCellError(cell) ? cell.code : cell, t: CELL_KIND.text };
}
