import { isCellError, type Cell } from "../sheet/cell";

/** A cell as a line of plain text shows it: numbers to 10 digits, no line breaks or signals to the terminal out of a file. */
export function plainCell(cell: Cell): string {
  if (typeof cell === "number") return readableNumber(cell);
  if (typeof cell === "boolean") return cell ? "TRUE" : "FALSE";
  if (cell === null || cell === undefined) return "";
  return printable(isCellError(cell) ? cell.code : cell);
}

export function readableNumber(value: number): string {
  if (Number.isInteger(value) && Math.abs(value) < 1e15) return String(value === 0 ? 0 : value);
  const size = Math.abs(value);
  if (size !== 0 && (size < 1e-4 || size >= 1e15)) return value.toExponential(6).replace(/\.?0+e/, "e");
  return String(Number(value.toPrecision(10)));
}

export function printable(text: string): string {
  // Control characters and marks that turn the direction of writing could make a line say something else.
  return text.replace(/[\p{Cc}\u202a-\u202e\u2066-\u2069]/gu, " ");
}

/** Rows with their columns under one another, numbers to the right. */
export function alignedRows(rows: readonly (readonly Cell[])[], indent = ""): string[] {
  const texts = rows.map((row) => row.map(plainCell));
  const columns = Math.max(0, ...texts.map((row) => row.length));
  const widths = Array.from({ length: columns }, (_, column) =>
    texts.reduce((most, row) => Math.max(most, row[column]?.length ?? 0), 0),
  );
  return texts.map((row, at) => {
    const padded = row.map((text, column) => {
      const width = widths[column]!;
      return typeof rows[at]![column] === "number" ? text.padStart(width) : text.padEnd(width);
    });
    return (indent + padded.join("  ")).trimEnd();
  });
}
