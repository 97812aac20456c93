import { auditWorkbook, type Audit } from "../../src/audit/auditWorkbook";
import { readXlsx } from "../../src/hosts/file/readXlsx";
import { callFunction } from "../../src/functions/call";
import type { Cell } from "../../src/sheet/cell";
import type { Argument, BlankPolicy } from "../../src/sheet/invoke";
import { xlsxFile, type BookXml } from "./xlsxFile";

/** Invented: a housing office scores flats; rows 2 to 13, one of them blank. */
export const SCORES: readonly (number | null)[] = [62.5, 71, 58, 80.5, 66, null, 74, 69.5, 77, 63, 70, 84.5];
export const column = (values: readonly Cell[]): Cell[][] => values.map((value) => [value]);

/** What a call gives directly: the stored value of a file that is in order. */
export function direct(name: string, args: readonly Argument[], blanks: BlankPolicy = "null"): Cell | Cell[][] {
  const outcome = callFunction(name, args, blanks)!;
  if ("error" in outcome) throw new Error(outcome.message);
  return outcome.value;
}

export const CUTOFF = direct("TOP_FRACTION_CUTOFF", [column(SCORES), 0.1]) as number;

export interface CellXml {
  readonly f?: string;
  readonly v?: Cell;
  /** What stands in the `<c>` besides: ` cm="1"`. */
  readonly attributes?: string;
  /** What stands in the `<f>`: ` t="array" ref="D2:E4"`. */
  readonly formulaAttributes?: string;
}

const escape = (text: string) => text.replace(/&/g, "&amp;").replace(/</g, "&lt;");

/** Cells by address as the rows of a sheet's XML, in the order of a file. */
export function sheetRows(cells: Readonly<Record<string, Cell | CellXml>>): string {
  const rows = new Map<number, { column: string; xml: string }[]>();
  for (const [address, given] of Object.entries(cells)) {
    const [, letters, row] = /^([A-Z]+)(\d+)$/.exec(address)!;
    const cell: CellXml = typeof given === "object" && given !== null && !("code" in given) ? given : { v: given };
    const line = rows.get(Number(row)) ?? [];
    rows.set(Number(row), line);
    line.push({ column: letters!.padStart(3), xml: cellXml(address, cell) });
  }
  return [...rows]
    .sort(([a], [b]) => a - b)
    .map(
      ([row, line]) =>
        `<row r="${row}">${line
          .sort((a, b) => (a.column < b.column ? -1 : 1))
          .map(({ xml }) => xml)
          .join("")}</row>`,
    )
    .join("");
}

function cellXml(address: string, { f, v, attributes = "", formulaAttributes = "" }: CellXml): string {
  // Without a formula as Excel writes a text in place, so that a reader keeps its spaces.
  if (f === undefined && typeof v === "string")
    return `<c r="${address}" t="inlineStr"${attributes}><is><t xml:space="preserve">${escape(v)}</t></is></c>`;
  const formula = f === undefined ? "" : `<f${formulaAttributes}>${escape(f)}</f>`;
  const [kind, value] =
    v === undefined || v === null
      ? ["", undefined]
      : typeof v === "number"
        ? ["", String(v)]
        : typeof v === "boolean"
          ? [' t="b"', v ? "1" : "0"]
          : typeof v === "string"
            ? [' t="str"', escape(v)]
            : [' t="e"', v.code];
  return `<c r="${address}"${kind}${attributes}>${formula}${value === undefined ? "" : `<v>${value}</v>`}</c>`;
}

/** The score column: heading in B1, SCORES from B2 on. */
export function scoreCells(): Record<string, Cell> {
  return Object.fromEntries([["B1", "score"], ...SCORES.map((score, i) => [`B${i + 2}`, score] as const)]);
}

export async function auditOf(
  cells: Readonly<Record<string, Cell | CellXml>>,
  rest: Partial<BookXml> = {},
): Promise<Audit> {
  const book = { ...rest, sheets: [{ name: "Flats", rows: sheetRows(cells) }, ...(rest.sheets ?? [])] };
  return auditWorkbook(readXlsx(xlsxFile(book)), { tolerance: 1e-9 });
}
