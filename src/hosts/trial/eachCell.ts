import type { Nullable } from "@univerjs/core";

export type ByCell<What> = Readonly<Record<number, Readonly<Record<number, What>>>>;

/** Visits what the engine keeps by row and column. */
export function eachCell<What>(
  cells: ByCell<Nullable<What>> | undefined,
  visit: (row: number, column: number, what: What) => void,
): void {
  for (const [row, line] of Object.entries(cells ?? {}))
    for (const [column, what] of Object.entries(line ?? {})) if (what) visit(Number(row), Number(column), what);
}
