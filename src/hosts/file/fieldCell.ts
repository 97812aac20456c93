import type { Cell } from "../../sheet/cell";
import type { NumberStyle } from "./numberStyle";

const ERRORS = new Set(["#N/A", "#VALUE!", "#REF!", "#DIV/0!", "#NUM!", "#NAME?", "#NULL!", "#SPILL!", "#CALC!"]);
const DIGITS = /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i;
/** Thousands parted by one sign throughout: a comma or point, a space (also one that doesn't break), an apostrophe. */
const GROUPED = {
  ".": /^[+-]?[1-9]\d{0,2}([, \u00a0\u202f'’])\d{3}(\1\d{3})*(\.\d+)?$/,
  ",": /^[+-]?[1-9]\d{0,2}([. \u00a0\u202f'’])\d{3}(\1\d{3})*(,\d+)?$/,
} as const;

/**
 * One field of a delimited file as a cell: number, percent, TRUE/FALSE, error value, blank, else text. Dates stay text: which of
 * day and month comes first is not in the file, and a serial number among scores would pass for one.
 */
export function fieldCell(field: string, style: NumberStyle): Cell {
  if (field === "") return null;
  const text = field.trim();
  if (text === "") return null;
  const first = text.charCodeAt(0);
  // Most fields of a large file are numbers or words: what can't begin a number is not tried as one.
  if ((first >= 48 && first <= 57) || first === 43 || first === 45 || first === 46 || first === 44) {
    const number = fieldNumber(text, style);
    return number === undefined ? field : number;
  }
  if (first === 35 && ERRORS.has(text.toUpperCase())) return { code: text.toUpperCase() };
  if (text.length <= 5) {
    const upper = text.toUpperCase();
    if (upper === "TRUE") return true;
    if (upper === "FALSE") return false;
  }
  return field;
}

function fieldNumber(text: string, style: NumberStyle): number | undefined {
  const percent = text.endsWith("%");
  let digits = percent ? text.slice(0, -1).trimEnd() : text;
  if (style.grouped && GROUPED[style.decimal].test(digits))
    digits = digits.replace(style.decimal === "." ? /[, \u00a0\u202f'’]/g : /[. \u00a0\u202f'’]/g, "");
  if (style.decimal === ",") {
    if (digits.includes(".")) return undefined;
    digits = digits.replace(",", ".");
  }
  if (!DIGITS.test(digits)) return undefined;
  const value = percent ? Number(digits) / 100 : Number(digits);
  return Number.isFinite(value) ? value : undefined;
}
