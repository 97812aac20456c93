import type { Separators } from "../hosts/port";
import type { Cell } from "../sheet/cell";

/** A formula and how many cells its result takes. */
export interface Formula {
  readonly text: string;
  readonly rows: number;
  readonly columns: number;
}

/** One argument of a formula: an address or other text to stand as it is, a value, or undefined for one left out. */
export type FormulaArgument = { readonly reference: string } | Exclude<Cell, object | null> | undefined;

/** `=WEIR.NAME(…)` as a file holds it: English names, comma between arguments, decimal point; arguments left out at the end vanish. */
export function formulaText(name: string, given: readonly FormulaArgument[]): string {
  const texts = given.map(argumentText);
  while (texts.length > 0 && texts[texts.length - 1] === "") texts.pop();
  return `=WEIR.${name}(${texts.join(",")})`;
}

function argumentText(argument: FormulaArgument): string {
  if (argument === undefined) return "";
  if (typeof argument === "object") return argument.reference;
  if (typeof argument === "string") return `"${argument.replace(/"/g, '""')}"`;
  if (typeof argument === "boolean") return argument ? "TRUE" : "FALSE";
  return numberLiteral(argument);
}

/** A number as a formula wants it: the shortest text that gives the same number back. */
function numberLiteral(value: number): string {
  return String(value).replace("e", "E");
}

/** The formula as this user would type it: their separator between arguments, their decimal mark; texts and sheet names untouched. */
export function localFormula(formula: string, { decimal, argument }: Separators): string {
  if (decimal === "." && argument === ",") return formula;
  // In quotes, single or double, nothing is a separator.
  return formula.replace(/"(?:[^"]|"")*"|'(?:[^']|'')*'|(\d)\.(\d)|,/g, (piece, before?: string, after?: string) => {
    if (before !== undefined) return `${before}${decimal}${after}`;
    return piece === "," ? argument : piece;
  });
}
