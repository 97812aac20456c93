import type { PlanCell, PlanModel } from "../../plan/planModel";
import type { Area } from "../../sheet/address";
import type { Cell } from "../../sheet/cell";

/** The rows that are left free for the picture. */
export function pictureArea({ picture, widths }: PlanModel): Area {
  return { top: picture?.top ?? 0, left: 0, bottom: picture?.bottom ?? 0, right: widths.length - 1 };
}

/** Rows of one width, formulas with their "=". */
export function cellsOf(rows: PlanModel["rows"], columns: number): Cell[][] {
  return rows.map((row) => Array.from({ length: columns }, (_, column) => cellOf(row[column])));
}

export function cellOf(cell: PlanCell | undefined): Cell {
  return cell?.formula === undefined ? (cell?.value ?? null) : `=${cell.formula}`;
}
