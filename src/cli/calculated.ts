import type { Answer } from "../audit/evaluate";
import { isCellError, type Cell } from "../sheet/cell";

/** What is printed of one formula. */
export interface Calculated {
  readonly formula: string;
  readonly value?: Cell | Cell[][];
  readonly error?: string;
  readonly message?: string;
  /** The text is no formula: the only outcome that counts as input that can't be used. */
  readonly unreadable?: boolean;
}

const MEANINGS: Readonly<Record<string, string>> = {
  "#DIV/0!": "It divides by zero, or takes the mean of nothing.",
  "#N/A": "No value is available.",
  "#NAME?": "A name in it is not known.",
  "#NULL!": "The ranges have no cell in common.",
  "#NUM!": "A number in it is outside of what is allowed, or the result is too large.",
  "#REF!": "It refers to cells that are not there.",
  "#VALUE!": "A value in it is of the wrong kind.",
  "#CALC!": "The result is an array without cells.",
};

/** An answer as it is printed. An error in a table is its text. */
export function describeAnswer(formula: string, answer: Answer): Calculated {
  if ("unreadable" in answer)
    return { formula, error: "#VALUE!", message: `The formula can't be read: ${answer.unreadable}.`, unreadable: true };
  if ("notKnown" in answer) {
    const { unknownFunction } = answer;
    if (!unknownFunction)
      return { formula, error: "#N/A", message: `This can't be worked out here: ${answer.notKnown}.` };
    const { functionName, nearest } = unknownFunction;
    const hint = nearest ? `; the nearest is ${nearest}` : "";
    return { formula, error: "#NAME?", message: `There is no function ${functionName} here${hint}.` };
  }
  const { value } = answer;
  if (isCellError(value)) {
    const message = value.message ?? MEANINGS[value.code] ?? "The cell it leads to holds this error.";
    return { formula, error: value.code, message };
  }
  if (!Array.isArray(value)) return { formula, value };
  return { formula, value: value.map((row) => row.map((cell) => (isCellError(cell) ? cell.code : cell))) };
}
