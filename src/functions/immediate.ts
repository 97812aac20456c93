import type { CellFunction } from "../sheet/invoke";
import * as audit from "./audit";
import * as cutoff from "./cutoff";
import * as cutoffLimits from "./cutoff.limits";
import * as cutoffReport from "./cutoff.report";
import * as describe from "./describe";
import * as describeChecks from "./describe.checks";
import * as describeCurves from "./describe.curves";
import * as plan from "./plan";
import * as search from "./search";

/**
 * The functions of the main job (plan, describe, cutoff, most of search) and RELEASE and BLANK_CHECK: what the host loads before the first formula
 * can calculate. The others come in when a cell first asks for one (later.ts, audit.workings.ts).
 */
export const immediate: Readonly<Record<string, CellFunction>> = {
  ...plan,
  ...describe,
  ...describeChecks,
  ...describeCurves,
  ...cutoff,
  ...cutoffLimits,
  ...cutoffReport,
  ...search,
  ...audit,
};
