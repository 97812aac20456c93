import type { CellFunction } from "../sheet/invoke";
import * as audit from "./audit";
import * as plan from "./plan";

/**
 * The cell functions by name, all but WORKINGS: what the host loads before the first formula calculates. `call.ts` adds WORKINGS, whose
 * derivations and texts would make that bundle twice as large.
 */
export const implementations: Readonly<Record<string, CellFunction>> = { ...plan, ...audit };
