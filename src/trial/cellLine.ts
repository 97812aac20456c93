import type { Port } from "../hosts/port";
import { frameTexts } from "./language";
import { isCellError, type Cell } from "../sheet/cell";

/** What stands in a cell, in words: of an error its reason, of a number all its digits. */
function cellText(cell: Cell): string {
  if (isCellError(cell)) return cell.message === undefined ? cell.code : `${cell.code}: ${cell.message}`;
  if (cell === null || cell === undefined) return "";
  return typeof cell === "boolean" ? String(cell).toUpperCase() : String(cell);
}

/** Keeps one line of text at what the selected cell holds: the grid is a picture that a screen reader can't read. */
export function showSelectedCell(port: Port, line: HTMLElement): void {
  let waiting: ReturnType<typeof setTimeout> | undefined;
  const show = async (): Promise<void> => {
    const block = await port.selection();
    const rows = block?.values.length ?? 0;
    const columns = block?.values[0]?.length ?? 0;
    const alone = rows === 1 && columns === 1;
    const text = !block ? "" : alone ? cellText(block.values[0]![0]) : frameTexts().selectedCells(rows, columns);
    line.firstElementChild!.textContent = block?.address ?? "";
    line.lastElementChild!.textContent = text;
  };
  const soon = (): void => {
    clearTimeout(waiting);
    waiting = setTimeout(() => void show(), 100);
  };
  port.onChange(soon);
  soon();
}
