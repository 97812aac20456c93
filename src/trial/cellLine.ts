import type { Port } from "../hosts/port";
import { frameTexts } from "./language";
import { formatAddress, type Area } from "../sheet/address";
import { isCellError, type Cell } from "../sheet/cell";

/** What stands in a cell, in words: of an error its reason, of a number all its digits. */
function cellText(cell: Cell): string {
  if (isCellError(cell)) return cell.message === undefined ? cell.code : `${cell.code}: ${cell.message}`;
  if (cell === null || cell === undefined) return "";
  return typeof cell === "boolean" ? String(cell).toUpperCase() : String(cell);
}

/** Keeps one line of text at what the selected cell holds: the grid is a picture that a screen reader can't read. */
export function showSelectedCell(port: Port, selected: () => Area | undefined, line: HTMLElement): void {
  let waiting: ReturnType<typeof setTimeout> | undefined;
  const show = async (): Promise<void> => {
    const area = selected();
    const [place, words] = [line.firstElementChild!, line.lastElementChild!];
    place.textContent = area ? formatAddress(area) : "";
    if (!area) return void (words.textContent = "");
    const rows = area.bottom - area.top + 1;
    const columns = area.right - area.left + 1;
    // More than one cell is not read: a whole column would be, a second time beside the pane.
    const alone = rows === 1 && columns === 1;
    words.textContent = alone
      ? cellText((await port.read(formatAddress(area))).values[0]![0])
      : frameTexts().selectedCells(rows, columns);
  };
  const soon = (): void => {
    clearTimeout(waiting);
    waiting = setTimeout(() => void show(), 100);
  };
  port.onChange(soon);
  soon();
}
