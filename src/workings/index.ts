import * as audit from "./audit";
import type { Workings } from "./workingsCall";

/** The workings of each cell function, by its name. */
export const workings: Readonly<Record<string, Workings>> = { ...audit };
