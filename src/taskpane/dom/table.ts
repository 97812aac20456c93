import { element } from "./element";

export interface TableCell {
  readonly text: string;
  readonly number?: boolean;
}

export type TableRow = readonly (string | TableCell)[];

/** A table with a caption, headings above and the first cell of each row as its heading; numbers stand right. */
export function table(caption: string, headings: readonly string[], rows: readonly TableRow[]): HTMLElement {
  const numbers = (column: number) => rows.length > 0 && rows.every((row) => isNumber(row[column]));
  const head = headings.map((words, column) =>
    element("th", { scope: "col", class: numbers(column) ? "number" : undefined }, words),
  );
  const body = rows.map((row) =>
    element(
      "tr",
      {},
      ...row.map((cell, column) => {
        const text = typeof cell === "string" ? cell : cell.text;
        if (column === 0) return element("th", { scope: "row", class: isNumber(cell) ? "number" : undefined }, text);
        return element("td", { class: isNumber(cell) ? "number" : undefined }, text);
      }),
    ),
  );
  return element(
    "div",
    { class: "table", tabindex: "0", role: "region", "aria-label": caption },
    element(
      "table",
      {},
      element("caption", {}, caption),
      headings.length > 0 && element("thead", {}, element("tr", {}, ...head)),
      element("tbody", {}, ...body),
    ),
  );
}

function isNumber(cell: string | TableCell | undefined): boolean {
  return typeof cell === "object" && cell.number === true;
}

export function figure(text: string): TableCell {
  return { text, number: true };
}
