import { NUMBER_FORMATS } from "../../sheet/cellLook";
import type { PlanLine, PlanQuestion } from "../planModel";
import { STAGE_COSTS, STAGE_REACH } from "../names";
import { result } from "./result";
import { usualStages } from "./usualStages";

const { percent, decimals, whole } = NUMBER_FORMATS;
const NORMAL_ONLY = '"not this shape"';
const LOAD = `WEIR.STAGE_LOAD(${STAGE_REACH},${STAGE_COSTS},weir_fraction,weir_count,weir_hits)`;

/** How many more looks it takes, how long, through which stages and at what cost. */
export function search({ fraction, search: asked }: PlanQuestion): PlanLine[] {
  const stages = asked?.stages ?? usualStages(fraction);
  return [
    { kind: "section", text: "What the search takes", newPage: true },
    result(
      "looks_average",
      "Looks on average",
      "WEIR.EXPECTED_TRIALS_TO_HIT(weir_fraction,weir_hits)",
      decimals,
      "Until the hits are found. A single search often takes much longer.",
    ),
    result(
      "looks_needed",
      "Looks for the chance wanted",
      "WEIR.TRIALS_FOR_HIT_CHANCE(weir_fraction,weir_chance,weir_hits)",
      whole,
      "With so many looks the hits have come by with the chance wanted.",
    ),
    result(
      "hit_chance",
      "Chance within the looks you can afford",
      "WEIR.HIT_CHANCE(weir_fraction,weir_looks,weir_hits)",
      percent,
      "Of the hits, the mark taken as right.",
    ),
    result(
      "estimated_hit_chance",
      "The same, the mark only estimated",
      `IF(weir_shape="normal",WEIR.CURVE_HIT_CHANCE(weir_count,weir_mean,weir_sd,weir_plain_cutoff,weir_looks,weir_better),${NORMAL_ONLY})`,
      percent,
      "Of at least one entry beyond the plain cutoff; counts in how little is known of the curve. For the normal shape.",
    ),
    result(
      "weeks",
      "Weeks for the chance wanted",
      "WEIR.SEARCH_DURATION(weir_fraction,weir_arrivals,weir_chance,weir_hits)",
      decimals,
      "At the arrivals above, in their unit of time.",
    ),
    {
      kind: "heading",
      texts: ["Work by stage", "looks", "cost", "Learning on the scores at hand and searching, on average."],
    },
    ...stages.map(({ label }, index) => stageLoad(label ?? `Stage ${index + 1}`, index + 1)),
    result(
      "cost_average",
      "Cost on average",
      `INDEX(${LOAD},ROWS(${LOAD}),5)`,
      decimals,
      "All stages, learning and searching, in the unit of the stages' costs.",
    ),
    result(
      "cost_budget",
      "Budget for the chance wanted",
      `WEIR.SEARCH_BUDGET(weir_fraction,${STAGE_REACH},${STAGE_COSTS},weir_chance,weir_hits)`,
      decimals,
      "Covers the search itself with the chance wanted; what was spent on learning comes on top.",
    ),
  ];
}

function stageLoad(label: string, stage: number): PlanLine {
  const at = (column: number) => `IF(COUNT(${STAGE_REACH})<${stage},"",INDEX(${LOAD},${stage + 1},${column}))`;
  return result(
    `stage_${stage}`,
    label,
    at(4),
    decimals,
    stage === 1 ? "Entries that are looked at in this stage, and what that costs." : "",
    at(5),
  );
}
