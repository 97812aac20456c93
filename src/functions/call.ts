import type { FunctionEntry } from "../sheet/functionTable";
import {
  invoke,
  type Argument,
  type CellFunction,
  type BlankPolicy,
  type Invocation,
  type Outcome,
} from "../sheet/invoke";
import { WORKINGS } from "./audit.workings";
import table from "./functions.json";
import { immediate } from "./immediate";
import { later } from "./later";

export const functionTable = table as readonly FunctionEntry[];

/** Every cell function by name. */
export const implementations: Readonly<Record<string, CellFunction>> = { ...immediate, ...later, WORKINGS };

const entries = new Map(functionTable.map((entry) => [entry.name, entry]));

/** The table's row for a name as it may stand in a formula: any case, with or without the namespace. */
export function functionEntry(name: string): FunctionEntry | undefined {
  return entries.get(name.toUpperCase().replace(/^WEIR\./, ""));
}

/** Calls a cell function by name under the rules of the host; undefined where no function has that name. */
export function callFunction(
  name: string,
  given: readonly Argument[],
  blanks: BlankPolicy = "null",
  invocation: Invocation = {},
): Outcome | undefined {
  const entry = functionEntry(name);
  return entry && invoke(entry, implementations[entry.name]!, given, blanks, invocation);
}
