import { typedFormula } from "../../audit/formulaText";
import { parseAddress } from "../../sheet/address";
import type { Workbook } from "../../sheet/workbook";

/** The name under which the engine keeps names in a workbook, and its word for a name that every sheet knows. */
const NAMES = "SHEET_DEFINED_NAME_PLUGIN";
const EVERYWHERE = "AllDefaultWorkbook";

/** The names of a workbook as the engine keeps them: cells by their address, anything else as a formula. */
export function namesResource({ names, sheets }: Workbook): { name: string; data: string } {
  const kept = names.map(({ name, formula, sheet }, index) => {
    const home = sheets.findIndex((one) => one.name === sheet);
    const typed = typedFormula(`=${formula}`);
    return [
      `name-${index + 1}`,
      {
        id: `name-${index + 1}`,
        name,
        formulaOrRefString: parseAddress(formula) ? formula : typed,
        comment: "",
        localSheetId: home < 0 ? EVERYWHERE : `sheet-${home + 1}`,
        hidden: false,
      },
    ] as const;
  });
  return { name: NAMES, data: JSON.stringify(Object.fromEntries(kept)) };
}
