import type { Port } from "../../hosts/port";
import { formatAddress, parseAddress, type Area } from "../../sheet/address";
import type { Formula } from "../formula";
import { overlap } from "./overlap";
import { isBlank, isCellError, type Cell } from "../../sheet/cell";

/** What stands in the way of a formula at a cell, or nothing. */
export type TargetCheck =
  | { readonly kind: "missing" }
  | { readonly kind: "bad" }
  /** The cell lies inside the range that the formula reads. */
  | { readonly kind: "inside" }
  | { readonly kind: "free"; readonly address: string }
  /** The very cell holds something: it can be replaced. */
  | { readonly kind: "taken"; readonly address: string; readonly holds: Cell }
  /** A cell that the result would spill into holds something. */
  | { readonly kind: "no-room"; readonly area: string; readonly first: string; readonly holds: Cell };

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

/** A cell's content in a sentence. */
export function cellShown(cell: Cell): string {
  if (isCellError(cell)) return cell.code;
  if (typeof cell === "boolean") return cell ? "TRUE" : "FALSE";
  const words = String(cell).trim();
  return typeof cell === "string" ? `“${words.length > 30 ? `${words.slice(0, 30)}…` : words}”` : words;
}
