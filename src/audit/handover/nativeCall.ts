import { tokenize } from "@borgar/fx/xlsx";
import { isBlank, type Cell, type Range } from "../../sheet/cell";
import type { Argument } from "../../sheet/invoke";
import { workings } from "../../workings/index";
import { WorkingsCall } from "../../workings/workingsCall";
import type { OwnCall } from "../evaluation";

/** The last step of the workings of a call, as a formula of the host alone; undefined where the host has none that computes it. */
export function nativeCall(call: OwnCall): string | undefined {
  const { entry, outcome, source, node, given } = call;
  const lay = workings[entry.name];
  if (!lay || !("value" in outcome) || Array.isArray(outcome.value)) return undefined;
  const args = given.map(asTyped);
  const texts = node.arguments.map((argument) =>
    argument?.loc ? source.slice(argument.loc[0], argument.loc[1]) : undefined,
  );
  const names = entry.parameters.map(({ name }) => name);
  let formula: string | undefined;
  try {
    const steps = lay(new WorkingsCall(names, args, texts));
    formula = steps[steps.length - 1]?.formula.replace(/^=/, "");
  } catch {
    // What the function refuses has no workings.
    return undefined;
  }
  return formula && !restsOnAnswer(formula, outcome.value, texts) ? formula : undefined;
}

/** A check of the answer holds the answer: as a formula it would give the old one for ever. */
function restsOnAnswer(formula: string, answer: Cell, texts: readonly (string | undefined)[]): boolean {
  if (typeof answer !== "number") return false;
  const typed = texts.filter((text) => text !== undefined).join(" ");
  return tokenize(`=${formula}`).some(
    ({ type, value }) => type === "number" && Number(value) === Math.abs(answer) && !typed.includes(value),
  );
}

function asTyped(argument: Argument): Argument {
  if (!Array.isArray(argument)) return argument;
  const range = argument as Range;
  if (range.length !== 1 || range[0]!.length !== 1) return argument;
  const cell = range[0]![0];
  return isBlank(cell) ? null : cell;
}
