import type { CellFunction } from "../sheet/invoke";
import * as combine from "./combine";
import * as combinePanel from "./combine.panel";
import * as risk from "./risk";
import * as riskGroups from "./risk.groups";
import * as riskMeasurement from "./risk.measurement";
import * as riskReliability from "./risk.reliability";
import * as searchPool from "./search.pool";
import * as searchStages from "./search.stages";
import * as simulate from "./simulate";
import * as stopping from "./stopping";
import * as stoppingBest from "./stopping.best";
import * as watch from "./watch";

/** The functions of pools, stages, stopping, risk, combine, watch and simulate: in Excel a chunk of its own, loaded when a cell first asks for one. */
export const later: Readonly<Record<string, CellFunction>> = {
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
};
