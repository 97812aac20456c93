import * as audit from "./audit";
import * as combine from "./combine";
import * as combinePanel from "./combine.panel";
import * as describe from "./describe";
import * as describeChecks from "./describe.checks";
import * as describeCurves from "./describe.curves";
import * as describeOutliers from "./describe.outliers";
import * as plan from "./plan";
import * as simulate from "./simulate";
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
  ...audit,
};
