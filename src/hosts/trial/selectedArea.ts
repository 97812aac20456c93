import type { FUniver } from "@univerjs/core/facade";
import type { Area } from "../../sheet/address";

/** The one area that is selected on the sheet in front, with the sheet's name; undefined where there is none or more than one. */
export function selectedArea(api: FUniver): (Area & { readonly sheet: string }) | undefined {
  const sheet = api.getActiveWorkbook()!.getActiveSheet();
  const ranges = sheet.getSelection()?.getActiveRangeList() ?? [];
  if (ranges.length !== 1) return undefined;
  const range = ranges[0]!;
  return {
    sheet: sheet.getSheetName(),
    top: range.getRow(),
    left: range.getColumn(),
    bottom: range.getLastRow(),
    right: range.getLastColumn(),
  };
}
