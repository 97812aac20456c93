/*
 * The functions bundle: what Excel loads before the first of our formulas can calculate, so nothing but the functions is in it.
 * This entry and the page (src/taskpane/excel.ts) are the only places that know the host's globals.
 */
import { implementations } from "../../functions/index";
import { associateAll } from "./associate";

/** Names of the functions that may spill, put in by the build from the table of functions. */
declare const SPILLING_FUNCTIONS: readonly string[];

associateAll(CustomFunctions, implementations, SPILLING_FUNCTIONS);
