import { DomainError, NoAnswerError } from "../core/domain";
import { isBlank, isCellError, type Cell, type Range } from "./cell";
import type { FunctionEntry, ParameterEntry } from "./functionTable";

/** One argument of a call: a value, a range, or undefined where it was left out. */
export type Argument = Cell | Range;

/** How a host hands over a blank cell. Excel on the web gives null, some desktop builds 0, a read of values "". */
export type BlankPolicy = "null" | "empty" | "zero";

/** What a host tells of the call itself: the address of each argument that is a reference. */
export interface Invocation {
  readonly address?: string;
  readonly parameterAddresses?: readonly (string | undefined)[];
  /** The arguments as typed, where the host knows them (our own engines do, Excel does not). */
  readonly parameterTexts?: readonly (string | undefined)[];
}

export type CellFunction = (...cells: any[]) => unknown;
export type Outcome = { readonly value: Cell | Cell[][] } | { readonly error: string; readonly message: string };

export const MOST_ROWS = 1_048_576;

/** Calls a cell function as the host would: arity, one cell or range, blanks, errors, shape of the result. Never throws. */
export function invoke(
  entry: FunctionEntry,
  implementation: CellFunction,
  given: readonly Argument[],
  blanks: BlankPolicy = "null",
  invocation: Invocation = {},
): Outcome {
  try {
    return { value: run(entry, implementation, given, blanks, invocation) };
  } catch (failure) {
    return failureOutcome(failure);
  }
}

/** The same call, but what is refused is thrown: for functions that call another one. */
export function run(
  entry: FunctionEntry,
  implementation: CellFunction,
  given: readonly Argument[],
  blanks: BlankPolicy = "null",
  invocation: Invocation = {},
): Cell | Cell[][] {
  const cells = prepareArguments(entry, given, blanks);
  if (entry.takesAddresses) cells.push(invocation);
  return plainResult(implementation(...cells));
}

/** An exception of core as the error value and message that a cell shows. */
export function failureOutcome(failure: unknown): { error: string; message: string } {
  if (failure instanceof DomainError) return { error: "#VALUE!", message: failure.message };
  if (failure instanceof NoAnswerError) return { error: "#N/A", message: failure.message };
  const message = failure instanceof Error ? failure.message : String(failure);
  return { error: "#VALUE!", message: `This could not be computed, which is a fault in the add-in: ${message}` };
}

function prepareArguments(entry: FunctionEntry, given: readonly Argument[], blanks: BlankPolicy): unknown[] {
  const { name, parameters } = entry;
  if (given.length > parameters.length) {
    const takes = parameters.length === 1 ? "1 argument" : `at most ${parameters.length} arguments`;
    throw new DomainError(`WEIR.${name}`, given.length, `given ${takes}`, `${given.length} were given`);
  }
  return parameters.map((parameter, index) => {
    const argument = given[index];
    if (isMissing(argument)) {
      if (!parameter.optional)
        throw new DomainError(parameter.name, null, `given (${inPassing(parameter.description)})`, "it was left out");
      return null;
    }
    return parameter.dimensionality === "matrix" ? asMatrix(argument, blanks) : asScalar(parameter, argument, blanks);
  });
}

/** A sentence as a remark inside another one. */
function inPassing(sentence: string): string {
  return sentence.replace(/\.$/, "").replace(/^[A-Z](?=[a-z ])/, (letter) => letter.toLowerCase());
}

function isMissing(argument: Argument): argument is undefined {
  return argument === undefined;
}

function isRange(argument: Argument): argument is Range {
  return Array.isArray(argument);
}

function asMatrix(argument: Argument, blanks: BlankPolicy): Range {
  const range = isRange(argument) ? argument : [[argument]];
  // No host hands over a range without cells, but a test or a file may; nothing is in it either.
  if (!(range[0]?.length > 0)) return [[handedBlank(null, blanks)]];
  // Functions only read, and a hole counts as a blank like null: copying a column would cost as much as reading it.
  if (blanks === "null") return range;
  return range.map((row) => row.map((cell) => handedBlank(cell, blanks)));
}

function asScalar(parameter: ParameterEntry, argument: Argument, blanks: BlankPolicy): Cell {
  if (!isRange(argument)) return handedBlank(argument, blanks);
  const rows = argument.length;
  const columns = argument[0]?.length ?? 0;
  if (rows === 1 && columns === 1) return handedBlank(argument[0]![0], blanks);
  throw new DomainError(
    parameter.name,
    argument,
    "one cell or value",
    `a range of ${rows} rows and ${columns} columns was given`,
  );
}

function handedBlank(cell: Cell, blanks: BlankPolicy): Cell {
  if (cell !== null && cell !== undefined) return cell;
  return blanks === "zero" ? 0 : blanks === "empty" ? "" : null;
}

/** The result as cells: a 1 × 1 table is its one value, nothing is "", a number that is none is a fault. */
export function plainResult(result: unknown): Cell | Cell[][] {
  if (!Array.isArray(result)) return plainCell(result);
  if (result.length > MOST_ROWS) throw new Error(`a result of ${result.length} rows does not fit a sheet`);
  const rows = (result as unknown[][]).map((row) => row.map(plainCell));
  return rows.length === 1 && rows[0]!.length === 1 ? rows[0]![0]! : rows;
}

function plainCell(value: unknown): Cell {
  if (typeof value === "number") {
    if (!Number.isFinite(value)) throw new Error(`the result is ${value}`);
    return value === 0 ? 0 : value;
  }
  if (typeof value === "string" || typeof value === "boolean") return value;
  if (isBlank(value as Cell)) return "";
  if (isCellError(value)) return value;
  throw new Error(`a result of type ${typeof value}`);
}
