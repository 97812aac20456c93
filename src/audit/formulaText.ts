import { stringifyTokens, tokenize, translateFormulaToA1, translateFormulaToR1C1 } from "@borgar/fx/xlsx";
import { formatAddress } from "../sheet/address";
import type { FormulaCell } from "../sheet/workbook";
import { readFunctionName } from "./functionName";
import { MOST_CHARACTERS } from "./readFormula";

function cellAddress(row: number, column: number): string {
  return formatAddress({ top: row, left: column, bottom: row, right: column });
}

/** Of a formula longer than any cell takes only the beginning is shown. */
const LONGEST_SHOWN = 200;

/** The formula of a cell as the file spells it, a shared one brought to its own cell. */
export function storedFormula({ formula, shift, row, column }: FormulaCell): string {
  if (!shift || formula.length > MOST_CHARACTERS) return `=${formula}`;
  const origin = cellAddress(row - shift.rows, column - shift.columns);
  return translateFormulaToA1(translateFormulaToR1C1(`=${formula}`, origin), cellAddress(row, column));
}

/** The same formula in every cell that it was filled into has the same text here. */
export function relativeFormula({ formula, shift, row, column }: FormulaCell): string {
  return translateFormulaToR1C1(`=${formula}`, cellAddress(row - (shift?.rows ?? 0), column - (shift?.columns ?? 0)));
}

/** A formula as it is typed: our functions by their names, without the prefixes that files put before newer functions and names. */
export function typedFormula(stored: string): string {
  if (stored.length > MOST_CHARACTERS) return `${stored.slice(0, LONGEST_SHOWN)}…`;
  let tokens;
  try {
    tokens = tokenize(stored);
  } catch {
    return stored;
  }
  const shown = tokens.map((token, index) => {
    if (token.type === "func") {
      const callee = readFunctionName(token.value);
      if (callee.kind === "ours") return { ...token, value: `WEIR.${callee.entry.name}` };
      if (callee.kind === "unknown") return { ...token, value: callee.shown };
      return { ...token, value: token.value.replace(/^(_xlfn\.|_xlws\.)+/i, "").toUpperCase() };
    }
    if (token.value.includes("_xlpm.")) return { ...token, value: token.value.replace(/_xlpm\./gi, "") };
    // `[2]!` before one of ours.
    const behind = token.type === "context" ? tokens[index + 2] : tokens[index + 1];
    const stray =
      (token.type === "context" && tokens[index + 1]?.value === "!") || tokens[index - 1]?.type === "context";
    return stray && behind?.type === "func" ? { ...token, value: "" } : token;
  });
  return stringifyTokens(shown).replace(SPILLED, "$1#").replace(ONE_OF, "@$1");
}

/** What files spell as functions and a sheet shows as signs behind or before an address: `E2#`, `@B2:B9`. */
const SPILLED = /\bANCHORARRAY\(((?:'[^']*'!|[\w.]+!)?\$?[A-Z]{1,3}\$?\d+)\)/gi;
const ONE_OF = /\bSINGLE\(((?:'[^']*'!|[\w.]+!)?[\w.$:]+)\)/gi;
