import type { Port } from "../../hosts/port";
import { SCORES } from "../../plan/names";
import type { PlanModel, PlanName } from "../../plan/planModel";
import { formatAddress, parseAddress, type Area } from "../../sheet/address";
import type { Cell } from "../../sheet/cell";
import { inputsOf, keepInputs, sameCell, type PlanThere } from "./findPlan";
import { cellOf, pictureArea } from "./planCells";
import type { PlanOutcome } from "./planOutcome";

/** The day is ours to change; a mark that is held, and all that was said about it, is not. */
const DAY = "weir_written";
const HELD = /^weir_fixed_/;

/** Brings a plan up to date where it stands: scores, formulas, day, and the inputs that the user didn't change. */
export async function updatePlan(port: Port, model: PlanModel, there: PlanThere): Promise<PlanOutcome> {
  const { sheet, places, written } = there;
  const scores = model.names.find(({ name }) => name === SCORES)!;
  await port.defineNames([{ name: SCORES, address: formatAddress(scores.area) }]);
  const inputs = inputsOf(model);
  const left: string[] = [];
  const writes: { at: Area; row: Cell[] }[] = [];
  for (const one of model.names) {
    // A line whose cells the user deleted stays deleted.
    const at = parseAddress(places.get(one.name) ?? "");
    const line = model.rows[one.area.top];
    if (one.name === SCORES || !at || !line) continue;
    if (!one.input) {
      writes.push({ at, row: lineCells(one, line) });
      continue;
    }
    if (!(one.name in inputs)) continue;
    const [[now = null] = []] = (await port.read(formatAddress(at))).values;
    const before = written[one.name];
    const untouched = one.name === DAY || (!HELD.test(one.name) && one.name in written && sameCell(now, before));
    if (untouched && !sameCell(now, inputs[one.name])) writes.push({ at, row: [inputs[one.name]!] });
    if (!untouched) {
      if (!sameCell(now, inputs[one.name]) && !HELD.test(one.name)) left.push(String(line[0]?.value ?? one.name));
      // What the user put in is remembered as not ours.
      if (before === undefined) delete inputs[one.name];
      else inputs[one.name] = before;
    }
  }
  for (const { address, cells } of inBlocks(writes)) await port.write(address, cells);
  await keepInputs(port, sheet, inputs);
  return { sheet, updated: true, left, picture: port.insertChart ? undefined : picturePlace(model, there) };
}

/** The rows for the picture stand behind the line above them, wherever that is now. */
function picturePlace(model: PlanModel, { places }: PlanThere): string | undefined {
  const area = pictureArea(model);
  const above = model.names.find((one) => one.area.sheet === undefined && one.area.top === area.top - 1);
  const at = above && parseAddress(places.get(above.name) ?? "");
  if (!at) return undefined;
  return formatAddress({ ...area, sheet: at.sheet, top: at.top + 1, bottom: at.top + 1 + area.bottom - area.top });
}

function lineCells({ area }: PlanName, line: PlanModel["rows"][number]): Cell[] {
  return Array.from({ length: area.right - area.left + 1 }, (_, i) => cellOf(line[area.left + i]));
}

/** Lines right below one another are written at one go. */
function inBlocks(writes: readonly { at: Area; row: Cell[] }[]): { address: string; cells: Cell[][] }[] {
  const blocks: { first: Area; cells: Cell[][] }[] = [];
  for (const { at, row } of [...writes].sort((a, b) => a.at.top - b.at.top)) {
    const last = blocks[blocks.length - 1];
    const follows = last && last.first.sheet === at.sheet && last.first.left === at.left;
    if (follows && last.first.top + last.cells.length === at.top && last.cells[0]!.length === row.length)
      last.cells.push(row);
    else blocks.push({ first: at, cells: [row] });
  }
  return blocks.map(({ first, cells }) => ({
    address: formatAddress({ ...first, bottom: first.top, right: first.left }),
    cells,
  }));
}
