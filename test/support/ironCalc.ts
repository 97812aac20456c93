import { readFileSync } from "node:fs";
import { join } from "node:path";
import { initSync, Model } from "@ironcalc/wasm";
import type { Cell } from "../../src/sheet/cell";

const wasm = join(__dirname, "../../node_modules/@ironcalc/wasm/wasm_bg.wasm");
let loaded = false;

/**
 * Formulas of the host's own functions worked out by IronCalc 0.8.4 on the cells given, row by row from A1: an engine that shares no
 * code with ours. Numbers come back with 12 digits or more, by way of a power of ten near `near`; errors and texts as they are shown.
 */
export function ironCalc(
  rows: readonly (readonly Cell[])[],
  formulas: readonly { formula: string; near: Cell }[],
): string[] {
  if (!loaded) initSync({ module: readFileSync(wasm) });
  loaded = true;
  const model = new Model("check", "en", "UTC", "en");
  model.pauseEvaluation();
  rows.forEach((row, r) =>
    row.forEach((cell, c) => {
      if (cell !== null && cell !== "")
        model.setUserInput(0, r + 1, c + 1, typeof cell === "boolean" ? String(cell).toUpperCase() : String(cell));
    }),
  );
  formulas.forEach(({ formula, near }, index) => {
    const inside = formula.replace(/^=/, "");
    const number = typeof near === "number";
    model.setUserInput(0, index + 1, 60, number ? `=TEXT((${inside})*${scaleOf(near)},"0.0000")` : `=${inside}`);
  });
  model.resumeEvaluation();
  model.evaluate();
  const shown = formulas.map(({ near }, index) => {
    const text = model.getFormattedCellValue(0, index + 1, 60);
    return typeof near === "number" && text !== "" && Number.isFinite(Number(text))
      ? String(Number(text) / scaleOf(near))
      : text;
  });
  model.free();
  return shown;
}

/** The power of ten that brings a number to some twelve digits before the point. */
function scaleOf(value: number): number {
  if (value === 0) return 1e9;
  return 10 ** Math.min(280, 9 - Math.floor(Math.log10(Math.abs(value))));
}
