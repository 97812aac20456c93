import { isBlank, isCellError, type Cell } from "../sheet/cell";

/** A value as a sentence says it. */
export function showCell(cell: Cell): string {
  if (isBlank(cell)) return "nothing";
  if (typeof cell === "number") return Number.isInteger(cell) ? String(cell) : String(Number(cell.toPrecision(10)));
  if (typeof cell === "boolean") return cell ? "TRUE" : "FALSE";
  if (isCellError(cell)) return cell.code;
  return `“${cell.length > 60 ? `${cell.slice(0, 57)}…` : cell}”`;
}

/** 1 row, 2 rows. */
export function counted(count: number, word: string): string {
  return `${count} ${word}${count === 1 ? "" : "s"}`;
}
