import type { Area } from "../../sheet/address";
import type { RoleLook } from "../../sheet/cellLook";

/** How a cell is shown, as far as it is read. */
export interface CellStyle {
  /** A number format, such as "0.0%"; left out for the general one. */
  readonly format?: string;
  readonly look: RoleLook;
}

/** How a sheet looks, beside its cells and not in them: what computes has no use for it. */
export class SheetLook {
  /** In characters, by column. */
  readonly columnWidths = new Map<number, number>();
  readonly hiddenColumns = new Set<number>();
  readonly merged: Area[] = [];
  frozenRows = 0;
  frozenColumns = 0;
  readonly #styles: (number[] | undefined)[] = [];

  /** `style` is the number of a style in the list of the workbook; 0 is the plain one. */
  setStyle(row: number, column: number, style: number): void {
    if (style > 0) (this.#styles[row] ??= [])[column] = style;
  }

  style(row: number, column: number): number {
    return this.#styles[row]?.[column] ?? 0;
  }
}
