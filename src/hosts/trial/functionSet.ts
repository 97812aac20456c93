import type { FunctionEntry } from "../../sheet/functionTable";
import type { Argument, Invocation, Outcome } from "../../sheet/invoke";

/** The cell functions as a host gets them: their table, and the one way to call them. */
export interface FunctionSet {
  readonly table: readonly FunctionEntry[];
  call(name: string, given: readonly Argument[], invocation: Invocation): Outcome | undefined;
}
