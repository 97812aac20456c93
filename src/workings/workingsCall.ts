import { formatAddress, parseAddress } from "../sheet/address";
import { isBlank, isCellError, type Cell, type Range } from "../sheet/cell";
import type { Argument } from "../sheet/invoke";
import { LONGEST_FORMULA, type Step } from "./steps";

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
    return typed === undefined ? literalText(this.values[this.place(name)]) : operandText(typed);
  }

  /** What stands for the first cell of the argument: of a range, the address of that one cell. */
  firstCellText(name: string): string {
    return this.partText(name, 0, 0);
  }

  /** What stands for a part of the argument, rows and columns counted from 0, ends included: its address, of one cell its place, else its values. */
  partText(name: string, top: number, left: number, bottom = top, right = left): string {
    const typed = this.texts[this.place(name)];
    const range = this.range(name);
    const whole = top === 0 && left === 0 && bottom === range.length - 1 && right === range[0]!.length - 1;
    const area = parseAddress(typed ?? "");
    // `F2:F2` and `{7}` are one cell, but arrays to an engine.
    const array = typed?.startsWith("{") || (area && typed!.includes(":"));
    if (typed !== undefined && whole && !array) return operandText(typed);
    if (area) {
      const [row, column] = [area.top, area.left];
      return formatAddress({
        ...area,
        top: row + top,
        left: column + left,
        bottom: row + bottom,
        right: column + right,
      });
    }
    const part = range.slice(top, bottom + 1).map((row) => row.slice(left, right + 1));
    const single = part.length === 1 && part[0]!.length === 1;
    // A name, a table's column, a calculation: its value written out would follow nothing any more.
    if (typed !== undefined && single && !array) return `INDEX(${typed},${top + 1},${left + 1})`;
    return single ? literalText(part[0]![0]) : literalText(part);
  }

  /** The first cell of the argument that holds something: in a range of blanks the first one. */
  firstFilled(name: string): {
    readonly row: number;
    readonly column: number;
    readonly cell: Cell;
    readonly text: string;
  } {
    const range = this.range(name);
    const row = range.findIndex((cells) => cells.some((cell) => !isBlank(cell)));
    const column = row < 0 ? 0 : range[row]!.findIndex((cell) => !isBlank(cell));
    const [top, left] = [Math.max(row, 0), column];
    return { row: top, column: left, cell: range[top]![left], text: this.partText(name, top, left) };
  }

  private place(name: string): number {
    const place = this.names.indexOf(name);
    if (place < 0) throw new Error(`no argument ${name} among ${this.names.join(", ")}`);
    return place;
  }
}

export type Workings = (call: WorkingsCall) => readonly Step[];

/** An argument as typed, in parentheses where an operator in it would be torn apart by what stands around it: `B2+1` in a formula `1-…`. */
function operandText(typed: string): string {
  const plain = typed.replace(/"[^"]*"|'[^']*'/g, "");
  let depth = 0;
  for (const sign of plain) {
    if ("({[".includes(sign)) depth++;
    else if (")}]".includes(sign)) depth--;
    else if (depth === 0 && "+-*/^&=<> ,".includes(sign)) return `(${typed})`;
  }
  return typed;
}

/** A value as a literal of a formula: 0.05, "low", TRUE, {1,2;3,4}. Blank cells of a range are "". */
export function literalText(value: Argument): string {
  if (Array.isArray(value)) return arrayText(value as Range);
  const cell = value as Cell;
  if (isCellError(cell)) return cell.code;
  if (isBlank(cell)) return '""';
  if (typeof cell === "string") return `"${cell.replace(/"/g, '""')}"`;
  return typeof cell === "boolean" ? String(cell).toUpperCase() : String(cell);
}

/** An array as a literal, row by row until it is too long for any formula to hold: a full column would not fit a text. */
function arrayText(range: Range): string {
  let text = "";
  for (const row of range) {
    text += `${text && ";"}${row.map(literalText).join(",")}`;
    if (text.length >= LONGEST_FORMULA) break;
  }
  return `{${text}}`;
}
