import type { BinaryOperator } from "@borgar/fx/xlsx";
import type { Cell } from "../sheet/cell";
import { compareCells, toNumber, toText } from "./coerce";
import { errorCell, firstError } from "./value";

/** One value on each side of an operator of arithmetic, joining or comparing. */
export function applyOperator(operator: BinaryOperator, left: Cell, right: Cell): Cell {
  const error = firstError([left, right]);
  if (error) return error;
  switch (operator) {
    case "&":
      return `${toText(left)}${toText(right)}`;
    case "=":
      return compareCells(left, right) === 0;
    case "<>":
      return compareCells(left, right) !== 0;
    case "<":
      return compareCells(left, right) < 0;
    case ">":
      return compareCells(left, right) > 0;
    case "<=":
      return compareCells(left, right) <= 0;
    case ">=":
      return compareCells(left, right) >= 0;
    default:
      return arithmetic(operator, left, right);
  }
}

function arithmetic(operator: BinaryOperator, left: Cell, right: Cell): Cell {
  const a = toNumber(left);
  if (typeof a !== "number") return a;
  const b = toNumber(right);
  if (typeof b !== "number") return b;
  if (operator === "/" && b === 0) return errorCell("#DIV/0!");
  if (operator === "^") return power(a, b);
  const result = operator === "+" ? a + b : operator === "-" ? a - b : operator === "*" ? a * b : a / b;
  return Number.isFinite(result) ? result : errorCell("#NUM!");
}

export function power(base: number, exponent: number): Cell {
  if (base === 0 && exponent === 0) return errorCell("#NUM!");
  if (base === 0 && exponent < 0) return errorCell("#DIV/0!");
  const result = Math.pow(base, exponent);
  return Number.isFinite(result) ? result : errorCell("#NUM!");
}

/** A sign or a percent sign at one value. A plus changes nothing, not even a text. */
export function applySign(operator: string, cell: Cell): Cell {
  if (operator === "+") return cell;
  const value = toNumber(cell);
  if (typeof value !== "number") return value;
  return operator === "%" ? value / 100 : 0 - value;
}
