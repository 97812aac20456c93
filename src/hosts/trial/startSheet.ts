import { LocaleType, LogLevel, ThemeService, Univer, type IWorkbookData } from "@univerjs/core";
import { FUniver } from "@univerjs/core/facade";
import {
  CalculationMode,
  SetFormulaCalculationResultMutation,
  UniverSheetsCorePreset,
  type ISetFormulaCalculationResultMutation,
} from "@univerjs/preset-sheets-core";
import english from "@univerjs/preset-sheets-core/locales/en-US";
import "@univerjs/preset-sheets-core/lib/index.css";
import { cellFunctions } from "./cellFunctions";
import { descriptions } from "./descriptions";
import { followNames } from "./followNames";
import type { FunctionSet } from "./functionSet";
import type { MessageBook } from "./messageBook";

// The engine's own accent, replaced by the water blue of our pages.
const WATER = {
  50: "#eef6f9",
  100: "#dcecf2",
  200: "#bcd9e5",
  300: "#8fc0d3",
  400: "#4f97b3",
  500: "#1f7496",
  600: "#0f5f80",
  700: "#0b4a6b",
  800: "#083c53",
  900: "#062e40",
} as const;

export interface TrialSheet {
  readonly api: FUniver;
  readonly univer: Univer;
}

/** Opens a workbook in `container`: grid, formula line and sheet tabs, nothing else, with our functions in any cell. */
export function startSheet(
  container: HTMLElement,
  snapshot: IWorkbookData,
  functions: FunctionSet,
  messages: MessageBook,
  dark: boolean,
): TrialSheet {
  const univer = new Univer({
    locale: LocaleType.EN_US,
    locales: { [LocaleType.EN_US]: english },
    logLevel: LogLevel.ERROR,
    darkMode: dark,
  });
  const { plugins } = UniverSheetsCorePreset({
    container,
    header: true,
    toolbar: false,
    formulaBar: true,
    footer: { statisticBar: false, menus: false, zoomSlider: false },
    contextMenu: true,
    disableAutoFocus: true,
    formula: {
      function: cellFunctions(functions, messages),
      description: descriptions(functions.table),
      initialFormulaComputing: CalculationMode.FORCED,
    },
  });
  for (const plugin of plugins) {
    if (Array.isArray(plugin)) univer.registerPlugin(plugin[0], plugin[1]);
    else univer.registerPlugin(plugin);
  }
  const themes = univer.__getInjector().get(ThemeService);
  themes.setTheme({ ...themes.getCurrentTheme(), primary: WATER });
  const api = FUniver.newAPI(univer);
  api.createWorkbook(snapshot);
  followCalculations(api, messages);
  followNames(api, univer);
  return { api, univer };
}

/** Else a cell that fails for another reason than before would go on showing the old one. */
function followCalculations(api: FUniver, messages: MessageBook): void {
  api.getFormula().calculationStart(() => messages.startRound());
  // Not the engine's calculationResultApplied, which comes when others already read the cells.
  api.onCommandExecuted(({ id, params }) => {
    if (id !== SetFormulaCalculationResultMutation.id) return;
    for (const sheets of Object.values((params as ISetFormulaCalculationResultMutation).unitData))
      for (const [sheetId, rows] of Object.entries(sheets ?? {}))
        for (const [row, cells] of Object.entries(rows ?? {}))
          for (const column of Object.keys(cells ?? {})) messages.settle(sheetId, Number(row), Number(column));
  });
}
