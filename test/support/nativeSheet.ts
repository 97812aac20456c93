import { readFileSync } from "node:fs";
import { createRequire } from "node:module";
import { join } from "node:path";
import * as ironcalc from "@ironcalc/wasm";
import { isCellError, type Cell } from "../../src/sheet/cell";

const resolve = createRequire(__filename).resolve;
let started = false;

/**
 * A sheet in an engine of its own (IronCalc), which knows none of our functions: what evaluates here, the host computes without us.
 * Formulas stand in a second sheet, so that addresses without a sheet must name it: they are put on the sheet of the data, far to the right.
 */
export class NativeSheet {
  private readonly model: ironcalc.Model;
  private row = 1;

  constructor(columns: readonly (readonly Cell[])[]) {
    if (!started) ironcalc.initSync({ module: readFileSync(join(resolve("@ironcalc/wasm"), "../wasm_bg.wasm")) });
    started = true;
    this.model = new ironcalc.Model("book", "en", "UTC", "en");
    this.model.pauseEvaluation();
    columns.forEach((cells, c) =>
      cells.forEach((cell, r) => {
        if (!isEmpty(cell)) this.model.setUserInput(0, r + 1, c + 1, inputText(cell));
      }),
    );
    this.model.resumeEvaluation();
  }

  /** The value of a formula with all its digits: a number, text or boolean; an error as its code. */
  evaluate(formula: string): Cell {
    const row = this.row++;
    this.model.pauseEvaluation();
    this.model.setUserInput(0, row, 100, formula);
    this.model.setUserInput(0, row, 101, `=IF(ISNUMBER(${CELL(row)}),${CELL(row)}&"",${CELL(row)})`);
    this.model.resumeEvaluation();
    this.model.evaluate();
    const text = this.model.getFormattedCellValue(0, row, 101);
    // The next formula must not recompute this one.
    this.model.setUserInput(0, row, 100, "");
    this.model.setUserInput(0, row, 101, "");
    if (/^(TRUE|FALSE)$/.test(text)) return text === "TRUE";
    if (/^#/.test(text)) return { code: text };
    return text !== "" && Number.isFinite(Number(text)) ? Number(text) : text;
  }
}

const CELL = (row: number) => `$CV$${row}`;

/** A cell of spaces is put in as it is: a text to the engine, a blank to our functions. */
function isEmpty(cell: Cell): boolean {
  return cell === null || cell === undefined || cell === "";
}

function inputText(cell: Cell): string {
  if (isCellError(cell)) return cell.code;
  return typeof cell === "string" ? `'${cell}` : String(cell).toUpperCase();
}
