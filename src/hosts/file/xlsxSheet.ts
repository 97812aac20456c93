import type { Area } from "../../sheet/address";
import type { Cell } from "../../sheet/cell";
import type { Sheet } from "../../sheet/workbook";
import { areaReference, cellReference } from "./cellReference";
import { lookListener } from "./lookListener";
import type { Extras } from "./notShown";
import { readXml, type Attributes } from "./readXml";
import type { SheetLook } from "./sheetLook";
import { UnusableFile } from "./unusableFile";
import { storedValue } from "./xlsxValue";
import type { ZipArchive } from "./zipArchive";

const MOST_CELLS = 10_000_000;
/** All cells that the array formulas of a file fill; each of them is in the file, if it is in order. */
const MOST_ARRAY_CELLS = 5_000_000;

export interface SheetContext {
  readonly archive: ZipArchive;
  readonly strings: readonly string[];
  readonly date1904: boolean;
  readonly dynamicMarks: ReadonlySet<number>;
  /** Cells read so far, in all sheets, and those that array formulas claim to fill. */
  cells: number;
  arrayCells: number;
  /** Counts what is not read; left out where nobody wants to know. */
  readonly extras?: Extras;
}

function cellCount({ top, left, bottom, right }: Area): number {
  return (bottom - top + 1) * (right - left + 1);
}

interface SharedFormula {
  readonly formula: string;
  readonly row: number;
  readonly column: number;
}

/** Reads the cells of one sheet part into `sheet`, and how they look into `look`. */
export function readSheet(context: SheetContext, part: string, sheet: Sheet, look?: SheetLook): void {
  const seen = look && lookListener(look, context.extras);
  const shared = new Map<string, SharedFormula>();
  let row = -1;
  let column = -1;
  let cell: Attributes = {};
  let formula: Attributes | undefined;
  let formulaText = "";
  let value: string | undefined;
  let collecting: "formula" | "value" | undefined;
  let inPhonetic = false;

  const place = () => {
    if (value === undefined && !formula) return;
    if (++context.cells > MOST_CELLS) throw new UnusableFile(`The file holds more than ${MOST_CELLS} cells.`);
    const stored = value === undefined ? null : storedValue(value, cell["t"], context);
    if (stored !== null) sheet.set(row, column, stored);
    if (look && cell["s"] !== undefined) look.setStyle(row, column, Number(cell["s"]));
    if (formula) placeFormula(formula, stored);
  };

  const placeFormula = (attributes: Attributes, stored: Cell) => {
    const kind = attributes["t"];
    let text = formulaText;
    let shift: { rows: number; columns: number } | undefined;
    if (kind === "shared") {
      const group = attributes["si"] ?? "";
      const origin = shared.get(group);
      if (text !== "") shared.set(group, { formula: text, row, column });
      else if (!origin)
        throw new UnusableFile("The file is damaged: a shared formula stands before its text, or without one.");
      else {
        text = origin.formula;
        shift = { rows: row - origin.row, columns: column - origin.column };
      }
    }
    if (text === "") return;
    const array: Area | undefined = kind === "array" ? areaReference(attributes["ref"] ?? "") : undefined;
    if (array && (context.arrayCells += cellCount(array)) > MOST_ARRAY_CELLS)
      throw new UnusableFile(
        `The file is refused: its array formulas claim to fill more than ${MOST_ARRAY_CELLS} cells.`,
      );
    const dynamic = array !== undefined && context.dynamicMarks.has(Number(cell["cm"]));
    sheet.addFormula({ row, column, formula: text, shift, array, dynamic, calculated: stored !== null });
  };

  const found = readXml(context.archive, part, {
    open(name, attributes) {
      switch (name) {
        case "row":
          row = attributes["r"] === undefined ? row + 1 : Number(attributes["r"]) - 1;
          column = -1;
          if (!(row >= 0 && row < 1_048_576))
            throw new UnusableFile(`The file is damaged: it has a row ${attributes["r"]}.`);
          if (attributes["hidden"] === "1" || attributes["hidden"] === "true") sheet.hiddenRows.add(row);
          if (look && attributes["ht"] !== undefined) look.setHeight(row, Number(attributes["ht"]));
          break;
        case "c":
          cell = attributes;
          if (attributes["r"] === undefined) column++;
          else ({ row, column } = cellReference(attributes["r"]));
          formula = value = undefined;
          formulaText = "";
          break;
        case "f":
          formula = attributes;
          collecting = "formula";
          break;
        case "rPh":
          inPhonetic = true;
          break;
        case "v":
        case "t":
          // How a text is read aloud is no part of it.
          if (inPhonetic) break;
          value ??= "";
          collecting = "value";
          break;
        case "autoFilter":
          if (attributes["ref"] !== undefined) sheet.filter = areaReference(attributes["ref"]);
          break;
        default:
          seen?.(name, attributes);
      }
    },
    text(text) {
      if (collecting === "formula") formulaText += text;
      else if (collecting === "value") value += text;
    },
    close(name) {
      collecting = undefined;
      if (name === "rPh") inPhonetic = false;
      if (name === "c") place();
    },
  });
  if (!found) throw new UnusableFile(`The file is damaged: the sheet “${sheet.name}” is missing.`);
}
