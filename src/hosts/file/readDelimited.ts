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
  const separator = given ?? findSeparator(text);
  const records = splitRecords(text.replace(/^sep=[\t;,]\r?\n?/i, ""), separator);
  if (records.length > MOST_ROWS)
    throw new UnusableFile(`The file has ${records.length} rows; a sheet holds ${MOST_ROWS}.`);
  refuseCommaMixUp(records, separator);
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

/** One heading over rows of two whole numbers is a column with decimal commas that was saved with commas between the fields. */
function refuseCommaMixUp(records: readonly (readonly string[])[], separator: Separator): void {
  const [heading, ...rows] = records.filter((record) => record.length > 1 || record[0] !== "");
  if (separator !== "," || heading?.length !== 1 || !rows.some(({ length }) => length === 2)) return;
  const whole = (field: string, sign: boolean) => (sign ? /^[+-]?\d+$/ : /^\d+$/).test(field.trim());
  const split = (record: readonly string[]) =>
    whole(record[0]!, true) && (record.length === 1 || whole(record[1]!, false));
  if (rows.every((record) => record.length <= 2 && split(record)))
    throw new UnusableFile(
      "Commas stand between the fields and, it seems, inside the numbers (one heading, two numbers in a row): save the file with semicolons between the fields or with decimal points.",
    );
}
