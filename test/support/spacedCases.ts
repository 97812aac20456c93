import { isBlank, type Cell } from "../../src/sheet/cell";
import { callParts, parseArgument, type CaseFile } from "./cases";

/** A cell that looks blank and holds two spaces: our functions skip it, and so must the formulas that stand for them. */
const SPACES = "  ";

/** The cases that meet a blank cell and give a value, with two spaces in each such cell. */
export function withSpaces({ columns, cases }: CaseFile): CaseFile {
  const spaced = columns.map(({ heading, cells }) => ({
    heading,
    cells: cells.map((cell): Cell => (isBlank(cell) ? SPACES : cell)),
  }));
  const meetsSpaces = (formula: string) =>
    callParts(formula).args.some((text) => {
      const value = parseArgument(text, spaced);
      return Array.isArray(value) && value.flat().includes(SPACES);
    });
  return { columns: spaced, cases: cases.filter(({ formula, error }) => error === undefined && meetsSpaces(formula)) };
}
