import { callFunction, functionTable } from "../functions/call";
import { bookSnapshot } from "../hosts/trial/bookSnapshot";
import { keepChanges } from "../hosts/trial/keepChanges";
import { readKeptBook } from "../hosts/trial/keptBook";
import { messageBook } from "../hosts/trial/messageBook";
import { pictureLayer } from "../hosts/trial/pictureLayer";
import { startSheet } from "../hosts/trial/startSheet";
import { trialPort } from "../hosts/trial/trialPort";
import type { FunctionSet } from "../hosts/trial/functionSet";
import { showSelectedCell } from "./cellLine";
import { exampleBook, firstColumn } from "./exampleBook";

const functions: FunctionSet = {
  table: functionTable,
  call: (name, given, invocation) => callFunction(name, given, "null", invocation),
};

/** Opens the kept workbook, or the invented one, and puts the pane beside it. */
export async function openTrial(): Promise<void> {
  const grid = document.getElementById("grid")!;
  const scheme = matchMedia("(prefers-color-scheme: dark)");
  const messages = messageBook();
  const kept = await readKeptBook();
  const snapshot = kept ?? bookSnapshot(exampleBook);
  const { api, univer } = startSheet(grid, snapshot, functions, messages, scheme.matches);
  scheme.addEventListener("change", () => api.toggleDarkMode(scheme.matches));

  await api.getFormula().onCalculationResultApplied();
  performance.mark("computed");
  const keep = keepChanges(api, (worked) => {
    if (!worked) document.getElementById("kept")!.textContent = "This browser keeps no changes.";
  });
  const pictures = pictureLayer(api, grid, keep);
  const port = trialPort({ api, univer, messages, pictures, dark: () => scheme.matches });
  // On the first visit the pane has something to answer at once.
  if (!kept) await port.select(firstColumn);
  showSelectedCell(port, document.getElementById("cell")!);
  // For the browser tests, and for whoever wants to look at the engine from the console.
  Object.assign(globalThis, { weirmarkTrial: { port, api, call: callFunction } });
  document.body.dataset["state"] = "computed";
  const { mountPane } = await import("../taskpane/pane");
  mountPane(document.getElementById("pane")!, port);
  performance.mark("pane");
}
