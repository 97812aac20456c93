/*
 * The functions bundle: what Excel loads before the first of our formulas can calculate, so nothing but the functions is in it.
 * This entry and the page (src/taskpane/excel.ts) are the only places that know the host's globals.
 */
import { implementations } from "../../functions/index";
import type { CellFunction } from "../../sheet/invoke";
import { associateAll } from "./associate";

/** Names of the functions that may spill, put in by the build from the table of functions. */
declare const SPILLING_FUNCTIONS: readonly string[];

/** The workings come in when the first cell asks for them. */
async function WORKINGS(...cells: unknown[]): Promise<unknown> {
  const loaded = await import("../../functions/audit.workings");
  return (loaded.WORKINGS as CellFunction)(...cells);
}

associateAll(CustomFunctions, { ...implementations, WORKINGS }, SPILLING_FUNCTIONS);
