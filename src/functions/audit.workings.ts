import { DomainError } from "../core/domain";
import { isBlank, type Cell } from "../sheet/cell";
import { run, type Argument, type Invocation } from "../sheet/invoke";
import { headedTable } from "../sheet/tables";
import { workings } from "../workings/index";
import { WorkingsCall } from "../workings/workingsCall";
import { functionEntry, functionTable, implementations } from "./call";
import { nearestName } from "./nearestName";

/**
 * Shows how a result comes about: every intermediate with its meaning, its value, the formula that computes it without the add-in, and where the method is published.
 *
 * Hand it the name of a function and the very arguments of the cell to be proved. The last row is the function's value. Where a function answers for each cell of a range,
 * the first cell is worked; of a table every label gets a row, or just the one named by item. A formula can be pasted into an empty cell and computes on your own cells; where the host has no
 * function for a step, a check evaluates the defining equation at the answer.
 *
 * @customfunction WORKINGS
 * @requiresParameterAddresses
 * @param {any} name Name of one of these functions, such as "SAFE_CUTOFF", with or without WEIR in front.
 * @param {any[][]} [argument_1] First argument of that function.
 * @param {any[][]} [argument_2] Second argument.
 * @param {any[][]} [argument_3] Third argument.
 * @param {any[][]} [argument_4] Fourth argument.
 * @param {any[][]} [argument_5] Fifth argument.
 * @param {any[][]} [argument_6] Sixth argument.
 * @param {any[][]} [argument_7] Seventh argument.
 * @param {any[][]} [argument_8] Eighth argument.
 * @param {any[][]} [argument_9] Ninth argument.
 * @returns {any[][]} One heading row, then a row a step: step, meaning, value, formula without the add-in, source. What the named function refuses is refused here with the same message.
 * @question How was this number computed, step by step?
 * @question How can I check it without the add-in?
 * @example =WEIR.WORKINGS("RELEASE","revision") => [["step","meaning","value","formula without the add-in","source"],[1,"revision",1,"","the build itself"]]
 */
export function WORKINGS(
  name: any,
  argument_1?: any[][],
  argument_2?: any[][],
  argument_3?: any[][],
  argument_4?: any[][],
  argument_5?: any[][],
  argument_6?: any[][],
  argument_7?: any[][],
  argument_8?: any[][],
  argument_9?: any[][],
  invocation?: any,
): any {
  const entry = typeof name === "string" ? functionEntry(name.trim()) : undefined;
  const steps = entry && workings[entry.name];
  if (!entry || !steps) {
    const known = functionTable.map((one) => one.name).filter((one) => one in workings);
    const near = typeof name === "string" ? nearestName(name.trim().replace(/^WEIR\./i, ""), known) : undefined;
    throw new DomainError("name", name, `the name of one of these functions${near ? `, such as "${near}"` : ""}`);
  }
  const given = [
    argument_1,
    argument_2,
    argument_3,
    argument_4,
    argument_5,
    argument_6,
    argument_7,
    argument_8,
    argument_9,
  ].map(asTyped);
  while (given.length > 0 && given[given.length - 1] === undefined) given.pop();
  // Refuses what the function refuses, with its own message, before any step is laid out.
  run(entry, implementations[entry.name]!, given);
  const { parameterAddresses = [], parameterTexts = [] } = (invocation ?? {}) as Invocation;
  const texts = given.map((_, i) => parameterTexts[i + 1] || parameterAddresses[i + 1] || undefined);
  const names = entry.parameters.map((parameter) => parameter.name);
  const rows = steps(new WorkingsCall(names, given, texts));
  return headedTable(
    ["step", "meaning", "value", "formula without the add-in", "source"],
    rows.map((row, i) => [i + 1, row.meaning, row.value, row.formula, row.source]),
  );
}

/** An argument as the named function wants it: a left-out one as undefined, a single cell as its value. */
function asTyped(argument: Cell[][] | null | undefined): Argument {
  if (!argument) return undefined;
  if (argument.length !== 1 || argument[0]!.length !== 1) return argument;
  const cell = argument[0]![0];
  return isBlank(cell) ? null : cell;
}
