import { columnLetters, formatSheetName } from "../../../sheet/address";
import type { PrintLine, PrintSetup, SheetToWrite } from "./book";
import { escapeXml } from "./xmlText";

const PAPER = { Letter: 1, A4: 9 } as const;

/** Margins, paper, and the lines at the head and foot of a page, in the order of the format. */
export function printXml({ paper, orientation, pagesWide, header, footer, breaksBefore = [] }: PrintSetup): string {
  const fit = pagesWide ? ` fitToWidth="${pagesWide}" fitToHeight="0"` : "";
  const lines = [
    header && `<oddHeader>${lineXml(header)}</oddHeader>`,
    footer && `<oddFooter>${lineXml(footer)}</oddFooter>`,
  ];
  const around = lines.some(Boolean) ? `<headerFooter>${lines.filter(Boolean).join("")}</headerFooter>` : "";
  return `<pageMargins left="0.6" right="0.6" top="0.75" bottom="0.75" header="0.3" footer="0.3"/><pageSetup paperSize="${PAPER[paper]}" orientation="${orientation}"${fit}/>${around}${breaksXml(breaksBefore)}`;
}

function breaksXml(rows: readonly number[]): string {
  if (rows.length === 0) return "";
  const breaks = rows.map((row) => `<brk id="${row}" max="16383" man="1"/>`).join("");
  return `<rowBreaks count="${rows.length}" manualBreakCount="${rows.length}">${breaks}</rowBreaks>`;
}

function lineXml({ left, centre, right }: PrintLine): string {
  const part = (letter: string, text: string | undefined) => (text ? `&${letter}${text}` : "");
  return escapeXml(part("L", left) + part("C", centre) + part("R", right));
}

/** What a workbook keeps of the print setup as names of its own: the area that is printed and the rows on every page. */
export function printNames({ name, print }: SheetToWrite): readonly (readonly [name: string, formula: string])[] {
  if (!print) return [];
  const sheet = `${formatSheetName(name)}!`;
  const { area, titleRows } = print;
  const names: (readonly [string, string])[] = [];
  if (area)
    names.push([
      "_xlnm.Print_Area",
      `${sheet}$${columnLetters(area.left)}$${area.top + 1}:$${columnLetters(area.right)}$${area.bottom + 1}`,
    ]);
  if (titleRows) names.push(["_xlnm.Print_Titles", `${sheet}$${titleRows[0] + 1}:$${titleRows[1] + 1}`]);
  return names;
}
