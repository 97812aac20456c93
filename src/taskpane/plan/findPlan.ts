import type { Port } from "../../hosts/port";
import { isPlanName } from "../../plan/layPlan";
import type { PlanModel } from "../../plan/planModel";
import { parseAddress } from "../../sheet/address";
import { isBlank, type Cell } from "../../sheet/cell";

/** What the sheet of a plan is called, unless another is called so. */
export const PLAN_SHEET = "Plan";
const SETTING = "plan";
/** Cells that every plan has: where these lead to cells of one sheet, there is one. */
const MARKS = ["weir_written", "weir_fraction", "weir_safe_cutoff"] as const;

export interface PlanThere {
  readonly kind: "plan";
  readonly sheet: string;
  /** Where its cells stand now, by their names. */
  readonly places: ReadonlyMap<string, string>;
  /** The inputs as they were last written, by their names. */
  readonly written: Readonly<Record<string, Cell>>;
}

export type Found =
  PlanThere | { readonly kind: "none" } | { readonly kind: "taken"; readonly names: readonly string[] };

/** The plan in the workbook, by its names, not by its sheet: sheets are renamed and moved. */
export async function findPlan(port: Port, model: PlanModel): Promise<Found> {
  const sheets = new Set((await port.sheetNames()).map((name) => name.toLowerCase()));
  const ours = new Set(model.names.map(({ name }) => name));
  const named = (await port.readNames()).filter(({ name, address }) => {
    const sheet = parseAddress(address)?.sheet?.toLowerCase();
    return isPlanName(name) && sheet !== undefined && sheets.has(sheet);
  });
  const places = new Map(named.map(({ name, address }) => [name.toLowerCase(), address]));
  const homes = new Set(MARKS.map((name) => parseAddress(places.get(name) ?? "")?.sheet));
  const [home] = homes;
  if (homes.size === 1 && home !== undefined)
    return { kind: "plan", sheet: home, places, written: await writtenInputs(port) };
  // Leftovers of a plan whose sheet was deleted lead nowhere and are gone by now: what leads somewhere is somebody else's.
  const taken = named.filter(({ name }) => ours.has(name.toLowerCase())).map(({ name }) => name);
  const others = taken.filter((name) => name.toLowerCase() !== "weir_scores");
  return others.length > 0 ? { kind: "taken", names: others } : { kind: "none" };
}

async function writtenInputs(port: Port): Promise<Readonly<Record<string, Cell>>> {
  const kept = await port.readSetting(SETTING);
  const inputs = typeof kept === "object" && kept !== null ? (kept as { inputs?: unknown }).inputs : undefined;
  return typeof inputs === "object" && inputs !== null ? (inputs as Record<string, Cell>) : {};
}

/** Remembers what was written into the inputs, to tell later what the user changed. */
export async function keepPlan(port: Port, model: PlanModel, sheet: string): Promise<void> {
  await keepInputs(port, sheet, inputsOf(model));
}

export async function keepInputs(port: Port, sheet: string, inputs: Readonly<Record<string, Cell>>): Promise<void> {
  await port.keepSetting(SETTING, { sheet, inputs });
}

/** The single-cell inputs of a plan with their values. */
export function inputsOf({ names, rows }: PlanModel): Record<string, Cell> {
  const single = names.filter(({ input, area }) => input && area.top === area.bottom && area.left === area.right);
  return Object.fromEntries(single.map(({ name, area }) => [name, rows[area.top]![area.left]!.value ?? null]));
}

/** The same content: a blank is a blank whatever a host calls it. */
export function sameCell(one: Cell, other: Cell): boolean {
  return one === other || (isBlank(one) && isBlank(other));
}
