import { formatAddress } from "../../../sheet/address";
import { isBlank, isCellError, type Cell } from "../../../sheet/cell";
import type { CellToWrite } from "./book";
import type { StyleTable } from "./styleTable";
import { storedSpelling } from "./storedSpelling";
import { cellText } from "./xmlText";

/** What the cells of a workbook share while they are written. */
export interface CellSetting {
  /** Undefined where the workbook's styles are not ours to use. */
  readonly styles: StyleTable | undefined;
  /** Turned true by the first formula that spills. */
  dynamic: boolean;
}

/** A host cuts or refuses longer texts. */
const LONGEST_TEXT = 32_767;

/** A cell with more to it than its value, or a value alone. */
export function asCellToWrite(cell: Cell | CellToWrite): CellToWrite {
  return typeof cell === "object" && cell !== null && !isCellError(cell) ? cell : { value: cell };
}

/** The `<c>` of a cell; nothing where it holds nothing and looks like nothing. */
export function cellXml(cell: CellToWrite, row: number, column: number, setting: CellSetting): string {
  const { value, formula, spills, role = "plain", look, format } = cell;
  const style = setting.styles?.number(role, format, look) ?? 0;
  if (formula === undefined && isBlank(value) && style === 0) return "";
  const address = formatAddress({ top: row, left: column, bottom: row, right: column });
  const place = `<c r="${address}"${style === 0 ? "" : ` s="${style}"`}`;
  if (formula === undefined) return isBlank(value) ? `${place}/>` : `${place}${valueXml(value, false)}</c>`;
  const stored = cellText(storedSpelling(formula));
  // Only a table is marked as one: other programs work marked cells out as they open the file, and fail where the add-in is missing.
  if (!spills) return `${place}${valueXml(value, true, `<f>${stored}</f>`)}</c>`;
  setting.dynamic = true;
  const { rows, columns } = spills;
  const ref = formatAddress({ top: row, left: column, bottom: row + rows - 1, right: column + columns - 1 });
  return `${place} cm="1"${valueXml(value, true, `<f t="array" ref="${ref}">${stored}</f>`)}</c>`;
}

/** The kind of a value, the end of the opening tag, the formula, and the value itself. */
function valueXml(value: Cell, calculated: boolean, formula = ""): string {
  if (typeof value === "number")
    return Number.isFinite(value) ? `>${formula}<v>${value}</v>` : ` t="e">${formula}<v>#NUM!</v>`;
  if (typeof value === "boolean") return ` t="b">${formula}<v>${value ? 1 : 0}</v>`;
  if (isCellError(value)) return ` t="e">${formula}<v>${cellText(value.code)}</v>`;
  // A formula that shows nothing has a value all the same: without one it would count as never calculated.
  if (value === null || value === undefined) return calculated ? ` t="str">${formula}<v></v>` : ">";
  const text = cellText(value.slice(0, LONGEST_TEXT));
  if (calculated) return ` t="str">${formula}<v>${text}</v>`;
  return ` t="inlineStr"><is><t xml:space="preserve">${text}</t></is>`;
}
