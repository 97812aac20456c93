import { formatAddress } from "../../sheet/address";
import type { PaneContext } from "../context";
import { listed } from "../column/listed";
import { loadProof } from "./loadProof";
import { workingsCells } from "./workingsCells";
import type { WorkedCall, WorkedCell } from "./workingsOf";
import { workingsPlace } from "./workingsPlace";

/** The same words as in the workings that a cell shows. */
const HEADINGS = ["step", "meaning", "value", "formula without the add-in, live", "source"] as const;

/** Writes the workings into free cells, from `typed` on or right of theirs, and reads what the formulas come to there. Returns what to say. */
export async function writeWorkings(
  context: PaneContext,
  cell: WorkedCell,
  call: WorkedCall,
  typed = "",
): Promise<string> {
  const { texts, numbers, port } = context;
  const cells = workingsCells(`Workings of ${call.text}, ${cell.address}`, HEADINGS, call.steps);
  const found = await workingsPlace(context, cell, { rows: cells.length, columns: HEADINGS.length }, typed);
  if ("refusal" in found) return found.refusal;
  const { place } = found;
  await port.write(formatAddress(place), cells);
  const column = { ...place, top: place.top + 2, left: place.left + 3, right: place.left + 3 };
  const [{ values }, { liveAnswers }] = await Promise.all([port.read(formatAddress(column)), loadProof()]);
  const { formulas, off, lacking } = liveAnswers(
    call.steps,
    values.map(([answer]) => answer),
    column,
  );
  return [
    texts.workingsDone(formatAddress({ ...place, sheet: undefined })),
    off.length > 0 && texts.workingsOff(listed(off, texts, numbers)),
    lacking.length > 0 && texts.workingsLacking(listed(lacking, texts, numbers)),
    off.length + lacking.length > 0 && port.kind === "trial" && texts.workingsTrial,
    off.length + lacking.length === 0 &&
      formulas > 0 &&
      (formulas === 1 ? texts.workingsOneLive : texts.workingsLive(numbers.count(formulas))),
  ]
    .filter((sentence) => sentence !== false)
    .join(" ");
}
