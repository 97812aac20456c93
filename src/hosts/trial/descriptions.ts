import type { IFunctionInfo } from "@univerjs/preset-sheets-core";
import type { FunctionEntry } from "../../sheet/functionTable";

// The engine's word for functions that are not its own.
const USER_FUNCTION = 15;

/** What autocomplete and the argument help show: the words of the table of functions. */
export function descriptions(table: readonly FunctionEntry[]): IFunctionInfo[] {
  return table.map(({ name, description, parameters }) => ({
    functionName: `WEIR.${name}`,
    functionType: USER_FUNCTION,
    description,
    abstract: firstSentence(description),
    functionParameter: parameters.map((parameter) => ({
      name: parameter.name,
      detail: parameter.description,
      example: "",
      require: parameter.optional ? 0 : 1,
      repeat: 0,
    })),
  }));
}

/** The list of suggestions shows this under each name: with more than a sentence it would hold three names at most. */
function firstSentence(text: string): string {
  return /^.*?[.](?= [A-Z]|$)/.exec(text)?.[0] ?? text;
}
