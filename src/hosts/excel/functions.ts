/*
 * The functions bundle: what Excel loads before the first of our formulas can calculate, so nothing is in it but the functions of the main job.
 * This entry and the page (src/taskpane/excel.ts) are the only places that know the host's globals.
 */
import { immediate } from "../../functions/immediate";
import { associateAll } from "./associate";
import { onDemand } from "./onDemand";

/** Put in by the build from the table of functions: names of those that may spill, and of those that load when first asked for. */
declare const SPILLING_FUNCTIONS: readonly string[];
declare const LATER_FUNCTIONS: readonly string[];

const implementations = {
  ...immediate,
  ...onDemand(LATER_FUNCTIONS, async () => (await import("../../functions/later")).later),
  ...onDemand(["WORKINGS"], async () => {
    const { WORKINGS } = await import("../../functions/audit.workings");
    return { WORKINGS };
  }),
};

associateAll(CustomFunctions, implementations, SPILLING_FUNCTIONS);
