import type { CellFunction } from "../sheet/invoke";
import * as audit from "./audit";
import * as combine from "./combine";
import * as combinePanel from "./combine.panel";
import * as cutoff from "./cutoff";
import * as cutoffLimits from "./cutoff.limits";
import * as cutoffReport from "./cutoff.report";
import * as describe from "./describe";
import * as describeChecks from "./describe.checks";
import * as describeCurves from "./describe.curves";
import * as plan from "./plan";
import * as risk from "./risk";
import * as riskGroups from "./risk.groups";
import * as riskMeasurement from "./risk.measurement";
import * as riskReliability from "./risk.reliability";
import * as search from "./search";
import * as searchPool from "./search.pool";
import * as searchStages from "./search.stages";
import * as simulate from "./simulate";
import * as stopping from "./stopping";
import * as stoppingBest from "./stopping.best";
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
  ...cutoff,
  ...cutoffLimits,
  ...cutoffReport,
  ...search,
  ...searchPool,
  ...searchStages,
  ...stopping,
  ...stoppingBest,
  ...risk,
  ...riskGroups,
  ...riskMeasurement,
  ...riskReliability,
  ...combine,
  ...combinePanel,
  ...watch,
  ...simulate,
  ...audit,
};
