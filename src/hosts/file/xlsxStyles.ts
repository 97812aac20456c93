import { readXml, type Attributes } from "./readXml";
import type { CellStyle } from "./sheetLook";
import type { ZipArchive } from "./zipArchive";

/** The number formats that a file names by number alone (ECMA-376 part 1, 18.8.30, those of all languages). */
const BUILT_IN: Readonly<Record<number, string>> = {
  1: "0",
  2: "0.00",
  3: "#,##0",
  4: "#,##0.00",
  9: "0%",
  10: "0.00%",
  11: "0.00E+00",
  12: "# ?/?",
  13: "# ??/??",
  // The standard gives month-first dates, which a program shows in the order of its user: the order that nobody misreads is used here.
  14: "yyyy-mm-dd",
  15: "d-mmm-yy",
  16: "d-mmm",
  17: "mmm-yy",
  18: "h:mm AM/PM",
  19: "h:mm:ss AM/PM",
  20: "h:mm",
  21: "h:mm:ss",
  22: "yyyy-mm-dd h:mm",
  37: "#,##0;(#,##0)",
  38: "#,##0;[Red](#,##0)",
  39: "#,##0.00;(#,##0.00)",
  40: "#,##0.00;[Red](#,##0.00)",
  45: "mm:ss",
  46: "[h]:mm:ss",
  47: "mm:ss.0",
  48: "##0.0E+0",
  49: "@",
};
const LONGEST_FORMAT = 255;

export interface BookStyles {
  /** By the number that a cell gives; the first is the plain one. */
  readonly cells: readonly CellStyle[];
  /** True where cells have colours, borders or fonts, which are not read. */
  readonly decorated: boolean;
}

/** What the styles of a workbook say of number formats, bold letters and wrapped texts. */
export function readStyles(archive: ZipArchive, part: string | undefined): BookStyles {
  const formats = new Map<number, string>();
  const bold: boolean[] = [];
  const cells: CellStyle[] = [];
  let decorated = false;
  let list = "";
  if (part === undefined) return { cells, decorated };
  readXml(archive, part, {
    open(name, attributes) {
      if (/^(fonts|cellXfs|cellStyleXfs|dxfs|numFmts)$/.test(name)) list = name;
      else if (name === "numFmt" && list === "numFmts") {
        const code = attributes["formatCode"] ?? "";
        if (code.length <= LONGEST_FORMAT && code.toLowerCase() !== "general")
          formats.set(Number(attributes["numFmtId"]), code);
      } else if (list === "fonts") {
        if (name === "font") bold.push(false);
        else if (name === "b" && isOn(attributes["val"])) bold[bold.length - 1] = true;
      } else if (list === "cellXfs" && name === "xf") {
        cells.push(styleOf(attributes, formats, bold));
        // The first two fills are the format's own "none" and a grey that no cell has.
        decorated ||= Number(attributes["fillId"] ?? 0) > 1 || Number(attributes["borderId"] ?? 0) > 0;
      } else if (list === "cellXfs" && name === "alignment" && isOn(attributes["wrapText"] ?? "0"))
        cells[cells.length - 1] = { ...cells[cells.length - 1], wrapped: true };
    },
    close(name) {
      if (name === list) list = "";
    },
  });
  return { cells, decorated };
}

function styleOf(xf: Attributes, formats: ReadonlyMap<number, string>, bold: readonly boolean[]): CellStyle {
  const id = Number(xf["numFmtId"] ?? 0);
  const format = formats.get(id) ?? BUILT_IN[id];
  return { ...(format !== undefined && { format }), ...(bold[Number(xf["fontId"] ?? 0)] && { bold: true }) };
}

function isOn(value: string | undefined): boolean {
  return value === undefined || value === "1" || value === "true";
}
