import { isCellError, type Cell } from "../../sheet/cell";
import { compareCells, toNumber } from "../coerce";
import { NotKnown } from "../value";

export type Criterion = (cell: Cell) => boolean;

/** A criterion as COUNTIF and its like take it: `">=70"`, `"<>"`, `"Rope*"`, a number, a truth, an error. */
export function readCriterion(cell: Cell): Criterion {
  if (cell === null || cell === undefined) return (other) => other === 0;
  if (typeof cell === "number" || typeof cell === "boolean") return (other) => equal(other, cell);
  if (isCellError(cell)) return (other) => isCellError(other) && other.code === cell.code;
  const [, operator = "", operand = ""] = /^(<>|<=|>=|=|<|>)?([\s\S]*)$/.exec(cell)!;
  if (operand === "") return emptyCriterion(operator);
  const value = operandCell(operand);
  switch (operator) {
    case "":
    case "=":
      return typeof value === "string" ? matching(value) : (other) => equal(other, value);
    case "<>":
      if (typeof value !== "string") return (other) => !equal(other, value);
      return (
        (matches) => (other: Cell) =>
          !matches(other)
      )(matching(value));
    default:
      return (other) => comparable(other, value) && holds(operator, compareCells(other, value));
  }
}

function emptyCriterion(operator: string): Criterion {
  if (operator === "=") return (other) => other === null || other === undefined;
  if (operator === "<>") return (other) => other !== null && other !== undefined;
  if (operator === "") return (other) => other === null || other === undefined || other === "";
  return () => false;
}

function operandCell(text: string): Cell {
  const upper = text.toUpperCase();
  if (upper === "TRUE" || upper === "FALSE") return upper === "TRUE";
  if (/^#[A-Z0-9/]+[!?]?$/i.test(text)) return { code: upper };
  try {
    const number = toNumber(text);
    return typeof number === "number" ? number : text;
  } catch (failure) {
    // A date in a criterion counts as one in some languages only.
    if (failure instanceof NotKnown) throw new NotKnown(`the criterion “${text}” may be a date`);
    throw failure;
  }
}

function equal(other: Cell, value: Cell): boolean {
  if (isCellError(value)) return isCellError(other) && other.code === value.code;
  if (typeof value === "number" && typeof other === "string") {
    try {
      return other.trim() !== "" && toNumber(other) === value;
    } catch {
      return false;
    }
  }
  return typeof other === typeof value && compareCells(other, value) === 0;
}

function comparable(other: Cell, value: Cell): boolean {
  return typeof other === typeof value && !isCellError(other);
}

function holds(operator: string, order: number): boolean {
  return operator === "<" ? order < 0 : operator === "<=" ? order <= 0 : operator === ">" ? order > 0 : order >= 0;
}

/** Whole text, any case; `?` one character, `*` any number, `~` takes the next as it is. */
function matching(pattern: string): Criterion {
  const matches = wildcard(pattern);
  return (other) => typeof other === "string" && matches(other);
}

export function wildcard(pattern: string): (text: string) => boolean {
  const pieces: string[] = pattern.toLowerCase().match(/~[~?*]|[\s\S]/g) ?? [];
  if (!pieces.includes("*") && !pieces.includes("?")) {
    const plain = pieces.map((piece) => (piece.length === 2 ? piece[1]! : piece)).join("");
    return (text) => text.toLowerCase() === plain;
  }
  return (text) => matchPieces(pieces, [...text.toLowerCase()]);
}

/** Two pointers and one way back, to the last star: no pattern of a file can make it slow. */
function matchPieces(pieces: readonly string[], text: readonly string[]): boolean {
  let piece = 0;
  let at = 0;
  let star = -1;
  let marked = 0;
  while (at < text.length) {
    const wanted = pieces[piece];
    if (wanted === "*") {
      star = piece++;
      marked = at;
    } else if (
      wanted !== undefined &&
      (wanted === "?" || wanted === text[at] || (wanted.length === 2 && wanted[1] === text[at]))
    ) {
      piece++;
      at++;
    } else if (star >= 0) {
      piece = star + 1;
      at = ++marked;
    } else return false;
  }
  while (pieces[piece] === "*") piece++;
  return piece === pieces.length;
}
