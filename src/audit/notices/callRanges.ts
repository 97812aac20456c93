import { formatAddress, type Area } from "../../sheet/address";
import type { Sheet } from "../../sheet/workbook";
import type { Judgement } from "../judgement";
import { LAST_COLUMN, LAST_ROW } from "../reference";
import { Reference } from "../value";

/** A range that calls of ours take in, once for all of them. */
export interface CallRange {
  readonly sheet: Sheet;
  readonly area: Area;
  /** The first cell that takes it, and how many more do. */
  readonly judgement: Judgement;
  others: number;
}

/** A range of fewer rows is no column of scores. */
const FEWEST_ROWS = 3;

/** The columns of cells that calls of ours take in, each once, in the order of their first call. */
export function callRanges(judgements: readonly Judgement[]): CallRange[] {
  const ranges = new Map<string, CallRange>();
  for (const judgement of judgements) {
    for (const { entry, values } of judgement.calls) {
      values.forEach((value, index) => {
        const place = value instanceof Reference && value.places.length === 1 ? value.places[0] : undefined;
        if (!place || entry.parameters[index]?.dimensionality !== "matrix") return;
        const { sheet, area } = place;
        if (area.bottom - area.top + 1 < FEWEST_ROWS || area.right === LAST_COLUMN) return;
        const key = rangeAddress({ sheet, area });
        const known = ranges.get(key);
        if (!known) ranges.set(key, { sheet, area, judgement, others: 0 });
        else if (known.judgement !== judgement) known.others++;
      });
    }
  }
  return [...ranges.values()];
}

export function rangeAddress({ sheet, area }: { readonly sheet: Sheet; readonly area: Area }): string {
  return formatAddress({ sheet: sheet.name, ...area });
}

export function isWholeColumn({ area }: CallRange): boolean {
  return area.top === 0 && area.bottom === LAST_ROW;
}
