import * as audit from "./audit";
import * as combine from "./combine";
import * as combinePanel from "./combine.panel";
import * as describe from "./describe";
import * as describeChecks from "./describe.checks";
import * as describeCurves from "./describe.curves";
import * as describeOutliers from "./describe.outliers";
import * as plan from "./plan";
import type { Workings } from "./workingsCall";

/** The workings of each cell function, by its name. */
export const workings: Readonly<Record<string, Workings>> = {
  ...plan,
  ...combinePanel,
  ...combine,
  ...describeOutliers,
  ...describeCurves,
  ...describeChecks,
  ...describe,
  ...audit,
};
