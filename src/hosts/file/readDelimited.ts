import { Sheet, type Workbook } from "../../sheet/workbook";
import { decodeText } from "./decodeText";
import { fieldCell } from "./fieldCell";
import { findNumberStyle } from "./numberStyle";
import { findSeparator, type Separator } from "./separator";
import { splitRecords } from "./splitRecords";
import { UnusableFile } from "./unusableFile";

const MOST_ROWS = 1_048_576;
const MOST_COLUMNS = 16_384;

/** Reads the bytes of a .csv or .tsv file into a workbook of one sheet. Separator and decimal sign are found by themselves. */
export function readDelimited(bytes: Uint8Array, sheetName: string, given?: Separator): Workbook {
  const text = decodeText(bytes);
  const body = text.replace(/^sep=[\t;,]\r?\n?/i, "");
  let separator = given ?? findSeparator(text);
  let records = splitRecords(body, separator);
  if (separator === "," && isColumnOfDecimalCommas(records)) records = splitRecords(body, (separator = ";"));
  if (records.length > MOST_ROWS)
    throw new UnusableFile(`The file has ${records.length} rows; a sheet holds ${MOST_ROWS}.`);
  const style = findNumberStyle(records, separator);
  const sheet = new Sheet(sheetName);
  records.forEach((record, row) => {
    if (record.length > MOST_COLUMNS)
      throw new UnusableFile(`Row ${row + 1} has ${record.length} fields; a sheet holds ${MOST_COLUMNS} columns.`);
    record.forEach((field, column) => {
      const cell = fieldCell(field, style);
      if (cell !== null) sheet.set(row, column, cell);
    });
  });
  return { sheets: [sheet], names: [], tables: [], date1904: false };
}

/** One heading over rows of two whole numbers: no program writes fewer headings than fields, so the commas are decimal ones. */
function isColumnOfDecimalCommas(records: readonly (readonly string[])[]): boolean {
  const [heading, ...rows] = records.filter((record) => record.length > 1 || record[0] !== "");
  if (heading?.length !== 1 || !rows.some(({ length }) => length === 2)) return false;
  const whole = ([first = "", second = "0"]: readonly string[]) =>
    /^[+-]?\d*$/.test(first.trim()) && /^\d+( ?%)?$/.test(second.trim());
  return rows.every((record) => record.length <= 2 && whole(record));
}
