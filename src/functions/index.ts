import type { CellFunction } from "../sheet/invoke";
import * as audit from "./audit";

/** Every cell function by name. The names are the table's: a test compares the two. */
export const implementations: Readonly<Record<string, CellFunction>> = { ...audit };
