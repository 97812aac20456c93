import { functionTable } from "../functions/call";
import type { FunctionEntry } from "../sheet/functionTable";
import { nearestName } from "../functions/nearestName";

/** Who is called by a name in a formula. */
export type Callee =
  | { readonly kind: "ours"; readonly entry: FunctionEntry }
  /** In our namespace, but not in the table: mistyped, or of a newer release. */
  | { readonly kind: "unknown"; readonly shown: string; readonly nearest?: string }
  | { readonly kind: "native"; readonly name: string };

/** Plain, stored, of another host: `WEIR.X_Y`, `_xldudf_WEIR_X_Y`, `weir_x_y`, in any case. */
const OURS = /^(?:_xldudf_|_xll\.)?weir[._](.*)$/i;
const key = (name: string) => name.toUpperCase().replace(/\./g, "_");
const byKey = new Map(functionTable.map((entry) => [key(entry.name), entry]));

/** Decodes a function's name as typed or as a file stores it. Ours are looked up in the table, never taken apart by rule. */
export function readFunctionName(name: string): Callee {
  const ours = OURS.exec(name)?.[1];
  if (ours === undefined) return { kind: "native", name: name.replace(/^(_xlfn\.|_xlws\.)+/i, "").toUpperCase() };
  const entry = byKey.get(key(ours));
  if (entry) return { kind: "ours", entry };
  const nearest = nearestName(key(ours), [...byKey.keys()]);
  return {
    kind: "unknown",
    shown: `WEIR.${key(ours)}`,
    ...(nearest && { nearest: `WEIR.${byKey.get(nearest)!.name}` }),
  };
}

/** True where a text can hold a call of ours: a quick look before a formula is read. */
export function mayCallOurs(formula: string): boolean {
  return /weir[._]/i.test(formula);
}
