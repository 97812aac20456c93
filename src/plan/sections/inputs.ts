import { NUMBER_FORMATS } from "../../sheet/cellLook";
import { SCORES } from "../names";
import type { PlanLine, PlanQuestion } from "../planModel";
import { usualStages } from "./usualStages";

const { percent, whole } = NUMBER_FORMATS;

/** What the user may put in. What isn't asked for has a usual value, and says so. */
export function inputs({ scores, heading, fraction, confidence, better, shape }: PlanQuestion): PlanLine[] {
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
    given("hits", "Hits wanted", 1, whole, "How many entries are to be found that clear the mark."),
    given("chance", "Chance wanted", 0.9, percent, "Assumed: with this chance looks, time and money are to be enough."),
    given(
      "looks",
      "Looks you can afford",
      Math.ceil(3 / fraction),
      whole,
      "Assumed: three times what a hit takes on average.",
    ),
    given(
      "arrivals",
      "Entries a week",
      5,
      undefined,
      "Assumed: how many entries come by on average. For another unit of time, count in that.",
    ),
    {
      kind: "input",
      name: "weir_look_cost",
      label: "Cost of one look, in score points",
      cell: { value: null },
      meaning: "Left empty: there is no reserve then. How many points of score one more look is worth to you.",
    },
    {
      kind: "heading",
      texts: ["Stages of a look", "reach", "cost", "In any unit of cost, such as hours. Assumed: put in your own."],
    },
    ...usualStages(fraction),
  ];
}
