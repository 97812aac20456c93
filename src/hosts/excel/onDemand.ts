import type { CellFunction } from "../../sheet/invoke";

/** Functions that come in when a cell first asks for one: until then only their names are here. */
export function onDemand(
  names: readonly string[],
  load: () => Promise<Readonly<Record<string, CellFunction>>>,
): Record<string, CellFunction> {
  return Object.fromEntries(
    names.map((name) => [name, async (...cells: unknown[]) => (await load())[name]!(...cells)]),
  );
}
