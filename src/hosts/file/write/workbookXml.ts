import type { BookToWrite } from "./book";
import { printNames } from "./printXml";
import { storedSpelling } from "./storedSpelling";
import { cellText, escapeXml, HEAD, MAIN, OFFICE } from "./xmlText";

/** Which engine calculated the file last: an older number, or none, makes the host calculate all anew as it opens, also where the add-in is missing. */
const ENGINE = 191_029;

/** The part of the workbook: its sheets, numbered in order like their relations, and its names, in the order of the alphabet as hosts write them. */
export function workbookXml({ sheets, names = [], active = 0 }: BookToWrite): string {
  const listed = sheets.map(
    ({ name, hidden }, index) =>
      `<sheet name="${escapeXml(name)}" sheetId="${index + 1}"${hidden ? ' state="hidden"' : ""} r:id="rId${index + 1}"/>`,
  );
  const own = names.map(({ name, formula, sheet }) => {
    const home = sheets.findIndex((one) => one.name === sheet);
    return { name, local: home < 0 ? "" : ` localSheetId="${home}"`, formula: storedSpelling(formula) };
  });
  const printed = sheets.flatMap((sheet, index) =>
    printNames(sheet).map(([name, formula]) => ({ name, local: ` localSheetId="${index}"`, formula })),
  );
  const all = [...own, ...printed].sort((a, b) => (a.name.toLowerCase() < b.name.toLowerCase() ? -1 : 1));
  const defined = all.map(
    ({ name, local, formula }) => `<definedName name="${escapeXml(name)}"${local}>${cellText(formula)}</definedName>`,
  );
  return `${HEAD}<workbook xmlns="${MAIN}" xmlns:r="${OFFICE}"><bookViews><workbookView activeTab="${active}"/></bookViews><sheets>${listed.join("")}</sheets>${defined.length === 0 ? "" : `<definedNames>${defined.join("")}</definedNames>`}<calcPr calcId="${ENGINE}"/></workbook>`;
}
