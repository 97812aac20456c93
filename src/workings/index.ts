import * as audit from "./audit";
import * as plan from "./plan";
import type { Workings } from "./workingsCall";

/** The workings of each cell function, by its name. */
export const workings: Readonly<Record<string, Workings>> = { ...plan, ...audit };
