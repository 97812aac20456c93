import type { FormulaCell, Sheet, Workbook } from "../sheet/workbook";
import { mayCallOurs, readFunctionName } from "./functionName";
import { MOST_CHARACTERS, readFormula } from "./readFormula";
import type { AstExpression } from "@borgar/fx/xlsx";

export interface CallCell {
  readonly sheet: Sheet;
  readonly cell: FormulaCell;
  /** Names in our namespace that the table doesn't have. */
  readonly unknown: readonly string[];
}

/** Every cell whose formula calls a function of ours, alone or inside, sheet by sheet, down and across. */
export function callCells(workbook: Workbook): CallCell[] {
  return workbook.sheets.flatMap((sheet) => {
    const found: CallCell[] = [];
    for (const cell of sheet.formulas.values()) {
      if (!mayCallOurs(cell.formula)) continue;
      const names = calledNames(cell.formula);
      if (names) found.push({ sheet, cell, unknown: names.filter((name) => name !== "") });
    }
    return found.sort((a, b) => a.cell.row - b.cell.row || a.cell.column - b.cell.column);
  });
}

/** "" for each call of ours, its name for each unknown one; undefined where there is neither. A text in quotes is no call. */
function calledNames(formula: string): string[] | undefined {
  let ast: AstExpression;
  try {
    ast = readFormula(`=${formula}`);
  } catch {
    // It can't be read, so it can't be judged; but it does name a function of ours. No cell takes a longer one: the rest is not looked at.
    return /weir[._][a-z_.]+\s*\(/i.test(formula.slice(0, 2 * MOST_CHARACTERS).replace(/"[^"]*"/g, ""))
      ? [""]
      : undefined;
  }
  const names: string[] = [];
  visit(ast, (name) => {
    const callee = readFunctionName(name);
    if (callee.kind === "ours") names.push("");
    if (callee.kind === "unknown") names.push(callee.shown);
  });
  return names.length > 0 ? names : undefined;
}

/** Tells the name of every function called. Walked with a list of what is to do, so that no nesting exhausts the stack. */
function visit(root: AstExpression, tell: (name: string) => void): void {
  const waiting: unknown[] = [root];
  while (waiting.length > 0) {
    const node = waiting.pop() as Record<string, unknown> | null | undefined;
    if (!node || typeof node !== "object") continue;
    const callee = node["callee"] as { name?: string } | undefined;
    if (node["type"] === "CallExpression" && typeof callee?.name === "string") tell(callee.name);
    for (const key of ["arguments", "declarations"])
      if (Array.isArray(node[key])) waiting.push(...(node[key] as unknown[]));
    waiting.push(node["init"], node["body"], callee?.name === undefined ? callee : undefined);
  }
}
