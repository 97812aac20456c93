import { formatAddress, parseAddress, type Area } from "../../sheet/address";
import type { PaneContext } from "../context";
import { freeBlock } from "../target/freeBlock";
import { overlap } from "../target/overlap";
import { cellShown, checkTarget } from "../target/targetCells";
import type { WorkedCell } from "./workingsOf";

export type WorkingsPlace = { readonly place: Area } | { readonly refusal: string };

/** The free cells for a table of workings: from the cell that was typed on, or where none was, the nearest right of the call. */
export async function workingsPlace(
  { texts, port }: Pick<PaneContext, "texts" | "port">,
  { address, touches }: WorkedCell,
  size: { readonly rows: number; readonly columns: number },
  typed: string,
): Promise<WorkingsPlace> {
  const call = parseAddress(address)!;
  if (typed.trim() === "") {
    const place = await freeBlock(port, call, size.rows, size.columns, touches);
    return place ? { place } : { refusal: texts.workingsNoRoom(address) };
  }
  const check = await checkTarget(port, typed, size, address);
  switch (check.kind) {
    case "missing":
      return { refusal: texts.targetMissing };
    case "bad":
      return { refusal: texts.targetBad(typed.trim()) };
    case "no-sheet":
      return { refusal: texts.targetNoSheet(check.sheet) };
    case "edge":
      return { refusal: texts.targetEdge };
    case "inside":
      return { refusal: texts.workingsInside };
    case "taken":
      return { refusal: texts.workingsTaken(check.address, cellShown(check.holds, texts.quoted)) };
    case "no-room":
      return { refusal: texts.workingsTaken(check.first, cellShown(check.holds, texts.quoted)) };
  }
  const first = parseAddress(check.address)!;
  const place = { ...first, bottom: first.top + size.rows - 1, right: first.left + size.columns - 1 };
  // The formulas name their cells as the call does, without its sheet: elsewhere they would read other cells.
  if (place.sheet?.toLowerCase() !== call.sheet?.toLowerCase())
    return { refusal: texts.workingsOtherSheet(formatAddress({ ...call, sheet: undefined }), call.sheet ?? "") };
  return touches.some((area) => overlap(area, place)) ? { refusal: texts.workingsInside } : { place };
}
