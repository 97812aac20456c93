import * as audit from "./audit";
import * as combine from "./combine";
import * as combinePanel from "./combine.panel";
import * as cutoff from "./cutoff";
import * as cutoffGated from "./cutoff.gated";
import * as cutoffLimits from "./cutoff.limits";
import * as cutoffReport from "./cutoff.report";
import * as describe from "./describe";
import * as describeChecks from "./describe.checks";
import * as describeCurves from "./describe.curves";
import * as describeOutliers from "./describe.outliers";
import * as plan from "./plan";
import * as risk from "./risk";
import * as riskGroups from "./risk.groups";
import * as riskReliability from "./risk.reliability";
import * as search from "./search";
import * as searchPool from "./search.pool";
import * as searchStages from "./search.stages";
import * as simulate from "./simulate";
import * as stopping from "./stopping";
import * as stoppingBest from "./stopping.best";
import * as watch from "./watch";
import * as watchComparison from "./watch.comparison";
import type { Workings } from "./workingsCall";

/** The workings of each cell function, by its name. */
export const workings: Readonly<Record<string, Workings>> = {
  ...plan,
  ...simulate,
  ...watchComparison,
  ...watch,
  ...combinePanel,
  ...combine,
  ...describeOutliers,
  ...describeCurves,
  ...describeChecks,
  ...describe,
  ...cutoff,
  ...cutoffGated,
  ...cutoffLimits,
  ...cutoffReport,
  ...search,
  ...searchPool,
  ...searchStages,
  ...stopping,
  ...stoppingBest,
  ...risk,
  ...riskGroups,
  ...riskReliability,
  ...audit,
};
