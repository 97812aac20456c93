import { formatAddress, parseAddress } from "../sheet/address";
import { isBlank, isCellError, type Cell, type Range } from "../sheet/cell";
import type { Argument } from "../sheet/invoke";
import type { Step } from "./steps";

/**
 * One call to be worked through: its arguments by name, each as value and as text. The text is what stands for it in a native formula:
 * the caller's address, else the literal as typed, else the value written out.
 */
export class WorkingsCall {
  constructor(
    private readonly names: readonly string[],
    private readonly values: readonly Argument[],
    private readonly texts: readonly (string | undefined)[],
  ) {}

  /** The argument's one cell; null where it was left out. */
  cell(name: string): Cell {
    const value = this.values[this.place(name)];
    return Array.isArray(value) ? ((value as Range)[0]?.[0] ?? null) : ((value as Cell) ?? null);
  }

  range(name: string): Cell[][] {
    const value = this.values[this.place(name)];
    if (value === undefined || value === null) return [[null]];
    return Array.isArray(value) ? (value as Cell[][]) : [[value as Cell]];
  }

  isGiven(name: string): boolean {
    const value = this.values[this.place(name)];
    return Array.isArray(value)
      ? value.some((row) => row.some((cell: Cell) => !isBlank(cell)))
      : !isBlank(value as Cell);
  }

  /** What stands for the argument in a native formula; `fallback` where it was left out. */
  text(name: string, fallback = ""): string {
    if (!this.isGiven(name)) return fallback;
    const typed = this.texts[this.place(name)];
    return typed ?? literalText(this.values[this.place(name)]);
  }

  /** What stands for the first cell of the argument: of a range, the address of that one cell. */
  firstCellText(name: string): string {
    const text = this.text(name);
    const area = parseAddress(text);
    if (area) return formatAddress({ ...area, bottom: area.top, right: area.left });
    return literalText(this.cell(name));
  }

  private place(name: string): number {
    const place = this.names.indexOf(name);
    if (place < 0) throw new Error(`no argument ${name} among ${this.names.join(", ")}`);
    return place;
  }
}

export type Workings = (call: WorkingsCall) => readonly Step[];

/** A value as a literal of a formula: 0.05, "low", TRUE, {1,2;3,4}. Blank cells of a range are "". */
export function literalText(value: Argument): string {
  if (Array.isArray(value)) return `{${(value as Range).map((row) => row.map(literalText).join(",")).join(";")}}`;
  const cell = value as Cell;
  if (isCellError(cell)) return cell.code;
  if (isBlank(cell)) return '""';
  if (typeof cell === "string") return `"${cell.replace(/"/g, '""')}"`;
  return typeof cell === "boolean" ? String(cell).toUpperCase() : String(cell);
}
