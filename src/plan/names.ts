/** The defined names of a plan. A file that was written once keeps them: never renamed. */
export const SCORES = "weir_scores";
export const STAGE_REACH = "weir_stage_reach";
export const STAGE_COSTS = "weir_stage_costs";

/** Every name of a plan begins so, and so does none that another program gives. */
export const PREFIX = "weir_";
