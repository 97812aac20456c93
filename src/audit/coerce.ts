import { isCellError, type Cell, type CellError } from "../sheet/cell";
import { errorCell, NotKnown } from "./value";

/*
 * One cell as number, text or truth, by the rules of a sheet's operators and of arguments that want one of them.
 */

const NUMBER_TEXT = /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?\s*(%?)$/i;
const GROUPED_TEXT = /^[+-]?\d{1,3}(,\d{3})+(\.\d+)?%?$/;
const MAYBE_DATE = /\d\s*[-/.:]\s*\d|\d\s*[a-z]{3,}|[a-z]{3,}\s*\d|[$€£¥]/i;

export function toNumber(cell: Cell): number | CellError {
  if (typeof cell === "number") return cell;
  if (cell === null || cell === undefined) return 0;
  if (typeof cell === "boolean") return cell ? 1 : 0;
  if (isCellError(cell)) return cell;
  const text = cell.trim();
  if (NUMBER_TEXT.test(text) || GROUPED_TEXT.test(text)) {
    const digits = text.replace(/,/g, "");
    return digits.endsWith("%") ? Number(digits.slice(0, -1)) / 100 : Number(digits);
  }
  // What such a text counts as depends on the language of the host.
  if (/^[^a-z]*\d/i.test(text) && MAYBE_DATE.test(text))
    throw new NotKnown(`the text “${text}” may be a date or an amount`);
  return errorCell("#VALUE!", `“${cell}” is no number.`);
}

export function toText(cell: Cell): string | CellError {
  if (typeof cell === "string") return cell;
  if (cell === null || cell === undefined) return "";
  if (typeof cell === "boolean") return cell ? "TRUE" : "FALSE";
  if (isCellError(cell)) return cell;
  return numberAsText(cell);
}

/** A number as a sheet joins it to a text: 15 digits, and E for what is very large or small. */
export function numberAsText(value: number): string {
  const text = String(Number(value.toPrecision(15)));
  return text.replace(/e([+-])(\d)$/, "E$10$2").replace("e", "E");
}

export function toTruth(cell: Cell): boolean | CellError {
  if (typeof cell === "boolean") return cell;
  if (typeof cell === "number") return cell !== 0;
  if (cell === null || cell === undefined) return false;
  if (isCellError(cell)) return cell;
  const word = cell.trim().toUpperCase();
  if (word === "TRUE" || word === "FALSE") return word === "TRUE";
  return errorCell("#VALUE!", `“${cell}” is neither TRUE nor FALSE.`);
}

/** The order of a sheet: numbers before texts (any case) before FALSE before TRUE; a blank counts as 0, "" or FALSE. */
export function compareCells(a: Cell, b: Cell): number {
  const left = a ?? blankLike(b);
  const right = b ?? blankLike(a);
  const rank = (cell: Cell) => (typeof cell === "number" ? 0 : typeof cell === "string" ? 1 : 2);
  if (rank(left) !== rank(right)) return rank(left) - rank(right);
  if (typeof left === "number" && typeof right === "number") return compareNumbers(left, right);
  if (typeof left === "string" && typeof right === "string") {
    const [x, y] = [left.toLowerCase(), right.toLowerCase()];
    return x === y ? 0 : x < y ? -1 : 1;
  }
  return Number(left) - Number(right);
}

/** Numbers that agree in the 15 digits of a sheet are equal there. */
function compareNumbers(a: number, b: number): number {
  if (a === b || (Math.abs(a - b) <= 1e-14 * Math.abs(a) && a.toPrecision(15) === b.toPrecision(15))) return 0;
  return a < b ? -1 : 1;
}

function blankLike(other: Cell): Cell {
  return typeof other === "string" ? "" : typeof other === "boolean" ? false : 0;
}
