import type { Area } from "../../sheet/address";
import type { RoleLook } from "../../sheet/cellLook";

/** How a cell is shown, as far as it is read. */
export interface CellStyle {
  /** A number format, such as "0.0%"; left out for the general one. */
  readonly format?: string;
  readonly look: RoleLook;
}

/** In points, as the format allows at most. */
const HIGHEST_ROW = 409.5;

/** How a sheet looks, beside its cells and not in them: what computes has no use for it. */
export class SheetLook {
  /** In characters, by column. */
  readonly columnWidths = new Map<number, number>();
  /** In points, by row, where the file names them. */
  readonly rowHeights = new Map<number, number>();
  readonly hiddenColumns = new Set<number>();
  readonly merged: Area[] = [];
  frozenRows = 0;
  frozenColumns = 0;
  readonly #styles: (number[] | undefined)[] = [];

  /** `style` is the number of a style in the list of the workbook; 0 is the plain one. */
  setStyle(row: number, column: number, style: number): void {
    if (style > 0) (this.#styles[row] ??= [])[column] = style;
  }

  /** A height that no row can have is passed over. */
  setHeight(row: number, points: number): void {
    if (points > 0 && points <= HIGHEST_ROW) this.rowHeights.set(row, points);
  }

  style(row: number, column: number): number {
    return this.#styles[row]?.[column] ?? 0;
  }
}
