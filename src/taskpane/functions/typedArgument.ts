import { parseAddress } from "../../sheet/address";
import type { Cell } from "../../sheet/cell";
import type { ParameterEntry } from "../../sheet/functionTable";
import type { Decimal } from "../../plot/numberStyle";
import type { FormulaArgument } from "../formula";
import { typedNumber } from "../typed";

/** What was typed for one argument, as it goes into a formula: a reference, a number, a truth value or a text; undefined where left out. */
export function typedArgument(typed: string, parameter: ParameterEntry, decimal: Decimal): FormulaArgument {
  const text = typed.trim();
  if (text === "") return undefined;
  // A fixed word comes first: "normal" is no name of a column, and `A1` none of the words.
  if (parameter.choices?.some((word) => word.toLowerCase() === text.toLowerCase())) return text;
  if (/^".*"$/.test(text)) return text.slice(1, -1).replace(/""/g, '"');
  if (parseAddress(text)) return { reference: text };
  const percent = /^(.*[\d.,])\s*%$/.exec(text);
  const number = typedNumber(percent?.[1] ?? text, decimal);
  if (number !== undefined) return percent ? Number(`${number}e-2`) : number;
  if (/^(true|wahr)$/i.test(text)) return true;
  if (/^(false|falsch)$/i.test(text)) return false;
  return text;
}

/** The value that a reference stands for where a single value is asked: its one cell, else the range as it is. */
export function referredValue(values: readonly (readonly Cell[])[]): Cell | readonly (readonly Cell[])[] {
  return values.length === 1 && values[0]!.length === 1 ? values[0]![0] : values;
}
