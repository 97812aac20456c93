import type { Cell } from "../../sheet/cell";

/** Values as Office.js reads them, with their types: "" is a blank, "#N/A" of type Error an error cell. */
export function cellsFromHost(values: readonly (readonly any[])[], types: readonly (readonly string[])[]): Cell[][] {
  return values.map((row, r) =>
    row.map((value, c) => {
      const type = types[r]?.[c];
      if (type === "Empty" || value === "" || value === null) return null;
      return type === "Error" ? { code: String(value) } : (value as Cell);
    }),
  );
}

/**
 * Cells as Office.js takes them in `formulas`: a text that the host would turn into a number or a date is marked as text, a blank is
 * "" (null would leave what stands there).
 */
export function cellsForHost(cells: readonly (readonly Cell[])[]): (string | number | boolean)[][] {
  return cells.map((row) =>
    row.map((cell) => {
      if (cell === null || cell === undefined) return "";
      if (typeof cell === "object") return `=${cell.code}`;
      if (typeof cell === "string" && /^[\d+\-@'(.,$€£%]/.test(cell)) return `'${cell}`;
      return cell;
    }),
  );
}
