import { NUMBER_FORMATS } from "../../sheet/cellLook";
import { SCORES } from "../names";
import type { PlanLine, PlanQuestion } from "../planModel";
import { stageLines, usualStages } from "./usualStages";

const { percent, whole } = NUMBER_FORMATS;

/** What the user may put in. What isn't asked for has a usual value, and says so. */
export function inputs({
  scores,
  heading,
  fraction,
  confidence,
  better,
  shape,
  search = {},
}: PlanQuestion): PlanLine[] {
  const given = (
    name: string,
    label: string,
    value: number | string,
    format: string | undefined,
    meaning: string,
    words?: readonly string[],
  ): PlanLine => ({ kind: "input", name: `weir_${name}`, label, cell: { value, format }, meaning, words });
  return [
    { kind: "section", text: "What goes in" },
    {
      kind: "result",
      name: "weir_count",
      label: "Scores at hand",
      cell: { formula: `COUNT(${SCORES})`, format: whole },
      meaning: `Numbers in ${scores}, heading “${heading}”. The name ${SCORES} leads there; point it elsewhere and all below follows.`,
    },
    given("fraction", "Top fraction that is to pass", fraction, percent, "Share of all entries, between 0 and 1."),
    given("confidence", "Confidence", confidence, percent, "Of the limits, the safe mark and the precision asked for."),
    given("better", "Better scores are", better, undefined, "high or low.", ["high", "low"]),
    given(
      "shape",
      "Shape of the curve",
      shape,
      undefined,
      "normal, lognormal, logit(low,high), boxcox or boxcox(power): fix it before you look at the scores.",
    ),
    given(
      "precision",
      "Precision wanted of the spread",
      0.1,
      percent,
      "Assumed: the standard deviation known to within so much of itself.",
    ),
    given(
      "fraction_low",
      "Fraction let through: at least",
      fraction / 2,
      percent,
      "Assumed: the least that is still good enough.",
    ),
    given(
      "fraction_high",
      "Fraction let through: at most",
      Math.min(2 * fraction, (1 + fraction) / 2),
      percent,
      "Assumed: the most that is still good enough.",
    ),
    given("hits", "Hits wanted", search.hits ?? 1, whole, "How many entries are to be found that clear the mark."),
    given(
      "chance",
      "Chance wanted",
      search.chance ?? 0.9,
      percent,
      assumed(search.chance, "with this chance looks, time and money are to be enough."),
    ),
    given(
      "looks",
      "Looks you can afford",
      search.looks ?? Math.ceil(3 / fraction),
      whole,
      search.looks === undefined ? "Assumed: three times what a hit takes on average." : "How many are left at most.",
    ),
    given(
      "arrivals",
      "Entries a week",
      search.arrivals ?? 5,
      undefined,
      assumed(search.arrivals, "how many entries come by on average. For another unit of time, count in that."),
    ),
    {
      kind: "input",
      name: "weir_look_cost",
      label: "Cost of one look, in score points",
      cell: { value: search.lookCost ?? null },
      meaning: "How many points of score one more look is worth to you. Left empty there is no reserve.",
    },
    {
      kind: "heading",
      texts: ["Stages of a look", "reach", "cost", assumed(search.stages, "in any unit of cost, such as hours.")],
    },
    ...stageLines(search.stages ?? usualStages(fraction)),
  ];
}

/** A value that nobody gave is marked as such, so that it is looked at. */
function assumed(given: unknown, meaning: string): string {
  return given === undefined ? `Assumed: ${meaning}` : meaning.charAt(0).toUpperCase() + meaning.slice(1);
}
