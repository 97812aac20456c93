import { areaReference } from "./cellReference";
import { countTag, type Extras } from "./notShown";
import type { Attributes } from "./readXml";
import type { SheetLook } from "./sheetLook";

const COLUMNS = 16_384;
const WIDEST = 255;
const MOST_FROZEN = 1000;
const MOST_MERGED = 100_000;

/** Hears the tags of a sheet part that say how it looks; what is not sensible there is passed over, since no value hangs on it. */
export function lookListener(look: SheetLook, extras?: Extras): (tag: string, attributes: Attributes) => void {
  return (tag, attributes) => {
    if (tag === "col") readColumn(look, attributes);
    else if (tag === "pane" && /^frozen/.test(attributes["state"] ?? "")) {
      look.frozenRows = frozen(attributes["ySplit"]);
      look.frozenColumns = frozen(attributes["xSplit"]);
    } else if (tag === "mergeCell" && look.merged.length < MOST_MERGED) {
      look.merged.push(areaReference(attributes["ref"] ?? ""));
    } else if (extras) countTag(extras, tag);
  };
}

function readColumn(look: SheetLook, { min, max, width, hidden }: Attributes): void {
  const first = Number(min);
  const last = Number(max);
  if (!(first >= 1 && last <= COLUMNS && Number.isInteger(first))) return;
  const wide = Number(width);
  for (let column = first - 1; column < last; column++) {
    if (wide > 0 && wide <= WIDEST) look.columnWidths.set(column, wide);
    if (hidden === "1" || hidden === "true") look.hiddenColumns.add(column);
  }
}

function frozen(split: string | undefined): number {
  const count = Number(split ?? 0);
  return Number.isInteger(count) && count > 0 && count <= MOST_FROZEN ? count : 0;
}
