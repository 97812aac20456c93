import { callFunction, functionTable } from "../functions/call";
import { bookSnapshot } from "../hosts/trial/bookSnapshot";
import { keepChanges } from "../hosts/trial/keepChanges";
import { letBookBeforeGo, readKeptBook } from "../hosts/trial/keptBook";
import { messageBook } from "../hosts/trial/messageBook";
import type { Port } from "../hosts/port";
import { pictureLayer } from "../hosts/trial/pictureLayer";
import { selectedArea } from "../hosts/trial/selectedArea";
import { startSheet } from "../hosts/trial/startSheet";
import { trialPort } from "../hosts/trial/trialPort";
import type { FunctionSet } from "../hosts/trial/functionSet";
import { showSelectedCell } from "./cellLine";
import { exampleBook, firstColumn } from "./exampleBook";
import { setUpFiles } from "./files";
import { frameTexts, showFrameTexts, showOwnFile } from "./language";

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
  const file: unknown = snapshot.custom?.["file"];
  if (typeof file === "string") showOwnFile(file);
  const sheet = startSheet(grid, snapshot, functions, messages, scheme.matches);
  const { api, univer } = sheet;
  scheme.addEventListener("change", () => api.toggleDarkMode(scheme.matches));

  await api.getFormula().onCalculationResultApplied();
  performance.mark("computed");
  const keep = keepChanges(sheet, (worked) => {
    const place = document.getElementById("kept")!;
    place.dataset["text"] = worked ? "kept" : "notKept";
    place.textContent = worked ? frameTexts().kept : frameTexts().notKept;
  });
  void letBookBeforeGo();
  const pictures = pictureLayer(api, grid, keep);
  const port = followingLanguage(trialPort({ api, univer, messages, pictures, dark: () => scheme.matches }));
  // On the first visit the pane has something to answer at once.
  if (!kept) await port.select(firstColumn);
  showSelectedCell(port, () => selectedArea(api), document.getElementById("cell")!);
  // For the browser tests, and for whoever wants to look at the engine from the console.
  Object.assign(globalThis, { weirmarkTrial: { port, api, call: callFunction } });
  setUpFiles(sheet);
  document.body.dataset["state"] = "computed";
  const { mountPane } = await import("../taskpane/pane");
  mountPane(document.getElementById("pane")!, port);
  performance.mark("pane");
}

/** The frame speaks the language that is chosen in the pane. */
function followingLanguage(port: Port): Port {
  return {
    ...port,
    async keepSetting(key, value) {
      await port.keepSetting(key, value);
      if (key === "language") showFrameTexts();
    },
  };
}
