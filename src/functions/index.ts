import type { CellFunction } from "../sheet/invoke";
import * as audit from "./audit";
import * as combine from "./combine";
import * as combinePanel from "./combine.panel";
import * as describe from "./describe";
import * as describeChecks from "./describe.checks";
import * as describeCurves from "./describe.curves";
import * as plan from "./plan";
import * as simulate from "./simulate";
import * as watch from "./watch";

/**
 * The cell functions by name, all but WORKINGS: what the host loads before the first formula calculates. `call.ts` adds WORKINGS, whose
 * derivations and texts would make that bundle twice as large.
 */
export const implementations: Readonly<Record<string, CellFunction>> = {
  ...plan,
  ...describe,
  ...describeChecks,
  ...describeCurves,
  ...combine,
  ...combinePanel,
  ...watch,
  ...simulate,
  ...audit,
};
