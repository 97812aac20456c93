import type { Port } from "../../hosts/port";
import { formatAddress, parseAddress, type Area } from "../../sheet/address";
import type { Formula } from "../formula";
import { hasSheet } from "./hasSheet";
import { overlap } from "./overlap";
import { isBlank, isCellError, type Cell } from "../../sheet/cell";

/** What stands in the way of a formula at a cell, or nothing. */
export type TargetCheck =
  | { readonly kind: "missing" }
  | { readonly kind: "bad" }
  | { readonly kind: "no-sheet"; readonly sheet: string }
  /** The result would reach over the edge of the sheet. */
  | { readonly kind: "edge" }
  /** The cell lies inside the range that the formula reads. */
  | { readonly kind: "inside" }
  | { readonly kind: "free"; readonly address: string }
  /** The very cell holds something: it can be replaced. */
  | { readonly kind: "taken"; readonly address: string; readonly holds: Cell }
  /** A cell that the result would spill into holds something. */
  | { readonly kind: "no-room"; readonly area: string; readonly first: string; readonly holds: Cell };

const LAST_ROW = 1_048_575;
const LAST_COLUMN = 16_383;

/** Looks at the cells that a formula would fill, before anything is written. */
export async function checkTarget(
  port: Port,
  typed: string,
  { rows, columns }: Pick<Formula, "rows" | "columns">,
  reads: string | undefined,
): Promise<TargetCheck> {
  if (typed.trim() === "") return { kind: "missing" };
  const cell = parseAddress(typed);
  if (!cell || cell.top !== cell.bottom || cell.left !== cell.right) return { kind: "bad" };
  const source = reads === undefined ? undefined : parseAddress(reads);
  const sheet = cell.sheet ?? source?.sheet;
  const area: Area = {
    ...cell,
    ...(sheet !== undefined && { sheet }),
    bottom: cell.top + rows - 1,
    right: cell.left + columns - 1,
  };
  if (area.bottom > LAST_ROW || area.right > LAST_COLUMN) return { kind: "edge" };
  if (cell.sheet !== undefined && !(await hasSheet(port, cell.sheet))) return { kind: "no-sheet", sheet: cell.sheet };
  if (source && overlap(area, source)) return { kind: "inside" };
  const address = formatAddress({ ...area, bottom: area.top, right: area.left });
  const { values } = await port.read(formatAddress(area));
  for (const [r, row] of values.entries()) {
    for (const [c, holds] of row.entries()) {
      if (isBlank(holds) || (r === 0 && c === 0)) continue;
      const first = formatAddress({
        top: area.top + r,
        bottom: area.top + r,
        left: area.left + c,
        right: area.left + c,
      });
      return { kind: "no-room", area: formatAddress({ ...area, sheet: undefined }), first, holds };
    }
  }
  const holds = values[0]?.[0];
  return isBlank(holds) ? { kind: "free", address } : { kind: "taken", address, holds };
}

/** A cell's content in a sentence; `quoted` puts a text between the marks of the language. */
export function cellShown(cell: Cell, quoted: (text: string) => string): string {
  if (isCellError(cell)) return cell.code;
  if (typeof cell === "boolean") return cell ? "TRUE" : "FALSE";
  const words = String(cell).trim();
  return typeof cell === "string" ? quoted(words.length > 30 ? `${words.slice(0, 30)}…` : words) : words;
}
