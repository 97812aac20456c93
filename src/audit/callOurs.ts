import type { AstExpression, CallExpression } from "@borgar/fx/xlsx";
import { callFunction } from "../functions/call";
import { formatAddress } from "../sheet/address";
import { isCellError, type Cell } from "../sheet/cell";
import type { FunctionEntry, ParameterEntry } from "../sheet/functionTable";
import type { Argument, Invocation } from "../sheet/invoke";
import type { Evaluation } from "./evaluation";
import { errorCell, isArray, Reference, type Value } from "./value";

/** Calls one of our functions with the arguments of a formula, by the one way in. */
export function callOurs(entry: FunctionEntry, node: CallExpression, at: Evaluation): Value {
  const inside = at.withArrays;
  const given: Argument[] = [];
  const values: (Value | undefined)[] = [];
  for (const [index, argument] of node.arguments.entries()) {
    const value = argument === null ? undefined : inside.value(argument);
    // A misspelt name is a fault of the formula, not a value to hand on.
    if (isCellError(value) && value.code === "#NAME?" && value.message !== undefined) return value;
    values.push(value);
    given.push(value === undefined ? undefined : asArgument(entry.parameters[index], value, inside));
  }
  // Empty places at the end are arguments left out.
  while (given.length > 0 && given[given.length - 1] === undefined) given.pop();
  const invocation = entry.takesAddresses ? invocationOf(node, values, at) : undefined;
  const outcome = callFunction(entry.name, given, at.setting.blanks, invocation)!;
  at.setting.budget.calls?.push({ entry, values, given, outcome, source: at.setting.source, node });
  return "error" in outcome ? errorCell(outcome.error, outcome.message) : (outcome.value as Cell | Cell[][]);
}

function asArgument(parameter: ParameterEntry | undefined, value: Value, at: Evaluation): Argument {
  // In the host a union reaches no function of an add-in.
  if (value instanceof Reference && value.places.length > 1)
    return errorCell("#VALUE!", `${parameter?.name ?? "The argument"} wants one range.`);
  return isArray(value) && value.length === 0 ? null : at.cells(value);
}

function invocationOf(node: CallExpression, values: readonly (Value | undefined)[], at: Evaluation): Invocation {
  const { sheet, row, column, source } = at.setting;
  const text = (argument: AstExpression | null) =>
    argument?.loc ? source.slice(argument.loc[0], argument.loc[1]) : undefined;
  return {
    address: formatAddress({ sheet: sheet.name, top: row, left: column, bottom: row, right: column }),
    parameterAddresses: values.map((value) => {
      const place = value instanceof Reference && value.places.length === 1 ? value.places[0] : undefined;
      return place && formatAddress({ sheet: place.sheet.name, ...place.area });
    }),
    parameterTexts: node.arguments.map(text),
  };
}
