import type { Port } from "../../hosts/port";
import { formatAddress, parseAddress, type Area } from "../../sheet/address";
import { isBlank } from "../../sheet/cell";

const FARTHEST = 40;

export interface FreeColumn {
  /** Where the first result goes. */
  readonly first: string;
  /** The cell above it, where a heading fits; undefined in the first row. */
  readonly heading: string | undefined;
  /** All cells that the results take, without the sheet. */
  readonly shown: string;
}

/** The nearest column right of the scores in which every row of theirs is empty, and the row above too. Undefined where none is near. */
export async function freeColumn(port: Port, scores: string): Promise<FreeColumn | undefined> {
  const area = parseAddress(scores);
  if (!area) return undefined;
  const top = Math.max(area.top - 1, 0);
  const around: Area = { ...area, top, left: area.right + 1, right: Math.min(area.right + FARTHEST, 16_383) };
  if (around.left > around.right) return undefined;
  const { values } = await port.read(formatAddress(around));
  for (let offset = 0; offset <= around.right - around.left; offset++) {
    if (!values.every((row) => isBlank(row[offset]))) continue;
    const column = around.left + offset;
    const cell = (row: number): Area => ({ ...area, top: row, bottom: row, left: column, right: column });
    return {
      first: formatAddress(cell(area.top)),
      heading: area.top > 0 ? formatAddress(cell(area.top - 1)) : undefined,
      shown: formatAddress({ top: area.top, bottom: area.bottom, left: column, right: column }),
    };
  }
  return undefined;
}
