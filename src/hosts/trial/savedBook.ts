import type { ICellData, IWorkbookData, Nullable } from "@univerjs/core";
import { FormulaDataModel } from "@univerjs/preset-sheets-core";
import type { ByCell } from "./eachCell";
import type { TrialSheet } from "./startSheet";

type BySheet<What> = Readonly<Record<string, What>>;

/** Everything that a saved workbook needs, as plain data that can be handed to a background. */
export interface SavedBook {
  readonly snapshot: IWorkbookData;
  /** The cells that formulas fill beside their own, and the ranges that they fill, at the formula's cell. */
  readonly spilled: BySheet<ByCell<Nullable<ICellData>>>;
  readonly ranges: BySheet<ByCell<{ startRow: number; startColumn: number; endRow: number; endColumn: number }>>;
  /** Formulas that the engine keeps only as a copy of another cell's. */
  readonly copied: BySheet<readonly (readonly [row: number, column: number, formula: string])[]>;
  readonly names: readonly { readonly name: string; readonly formula: string; readonly sheetId?: string }[];
  readonly activeSheetId: string;
}

const EVERYWHERE = "AllDefaultWorkbook";

export function savedBook({ api, univer }: TrialSheet): SavedBook {
  const book = api.getActiveWorkbook()!;
  const formulas = univer.__getInjector().get(FormulaDataModel);
  const unit = book.getId();
  const snapshot = book.getWorkbook().getSnapshot();
  const copied: Record<string, (readonly [number, number, string])[]> = {};
  for (const sheet of book.getSheets()) {
    const id = sheet.getSheetId();
    const list: (readonly [number, number, string])[] = (copied[id] = []);
    sheet
      .getSheet()
      .getCellMatrix()
      .forValue((row, column, data) => {
        if (!data?.si || data.f) return;
        const formula = formulas.getFormulaStringByCell(row, column, id, unit);
        if (formula) list.push([row, column, formula]);
      });
  }
  return {
    snapshot,
    spilled: (formulas.getArrayFormulaCellData()[unit] ?? {}) as SavedBook["spilled"],
    ranges: (formulas.getArrayFormulaRange()[unit] ?? {}) as SavedBook["ranges"],
    copied,
    names: book.getDefinedNames().map((one) => {
      const home = one.getLocalSheetId();
      return {
        name: one.getName(),
        formula: one.getFormulaOrRefString(),
        ...(home !== undefined && home !== EVERYWHERE && { sheetId: home }),
      };
    }),
    activeSheetId: book.getActiveSheet().getSheetId(),
  };
}
