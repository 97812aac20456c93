import { NUMBER_FORMATS } from "../../sheet/cellLook";
import type { PlanLine, PlanQuestion } from "../planModel";
import { result } from "./result";

const { percent, decimals, whole, date } = NUMBER_FORMATS;
const NO_COST = '"none"';

/** When to settle; how often the mark errs; the mark that is held. */
export function settle({ day }: PlanQuestion, fixedMark: number | undefined, count: number): PlanLine[] {
  const errors = (name: string, label: string, item: string, meaning: string): PlanLine => {
    const by = (method: string) =>
      `WEIR.CUTOFF_ERROR_RATES(weir_count,weir_fraction,"${method}",weir_confidence,"${item}")`;
    return result(name, label, by("plain"), percent, meaning, by("safe"));
  };
  const fixed = (
    name: string,
    label: string,
    value: number | string | null,
    format: string | undefined,
    meaning: string,
  ): PlanLine => ({ kind: "input", name: `weir_${name}`, label, cell: { value, format }, meaning });
  // One IF around two sums: inside a sum a host would take one cell of the range for it.
  const passing = (sign: string) => `SUMPRODUCT(ISNUMBER(weir_scores)*(weir_scores${sign}weir_fixed_mark))`;
  return [
    { kind: "section", text: "When to settle" },
    result(
      "reserve",
      "Reserve",
      `IF(weir_look_cost="",${NO_COST},WEIR.RESERVE_SCORE(weir_mean,weir_sd,weir_look_cost,,weir_better))`,
      decimals,
      "The score at which going on looking costs more than it brings, with looks without end. “none” while no cost of a look is given above.",
    ),
    result(
      "reserve_first",
      "Mark for the first of your last looks",
      'IF(weir_look_cost="",' +
        NO_COST +
        ",INDEX(WEIR.RESERVE_SCHEDULE(weir_mean,weir_sd,weir_looks,weir_look_cost,,weir_better),2,2))",
      decimals,
      "With only the looks you can afford left; it falls with each of them. Both take the curve as normal and known.",
    ),
    { kind: "section", text: "How often the mark errs" },
    {
      kind: "heading",
      texts: [
        "Averages over all samples of this size",
        "plain",
        "safe",
        "For a normal curve, before a single further entry is looked at.",
      ],
    },
    errors("error_passing", "Fraction that passes", "average passing fraction", "Of all entries."),
    errors(
      "error_wrong",
      "Wrong ones among the passed",
      "passed but not truly top",
      "Share of those passed that don't belong to the top fraction.",
    ),
    errors(
      "error_missed",
      "Right ones that are missed",
      "truly top but missed",
      "Share of the true top fraction that doesn't pass.",
    ),
    { kind: "section", text: "The mark that is held" },
    fixed(
      "fixed_mark",
      "Fixed mark",
      fixedMark ?? null,
      undefined,
      "A constant, so that it doesn't move while scores arrive: the plain cutoff of the day, at the next score that clears it. Put in the mark you decide on.",
    ),
    fixed("fixed_day", "Written on", daySerial(day), date, "The day on which it was set."),
    fixed("fixed_count", "On so many scores", count, whole, "Scores that were at hand that day."),
    fixed("fixed_reason", "Reason", null, undefined, "Why this mark, and who decided on it."),
    result(
      "fixed_moved",
      "Plain cutoff now, less the fixed mark",
      'IF(ISNUMBER(weir_fixed_mark),weir_plain_cutoff-weir_fixed_mark,"no mark is held")',
      decimals,
      "How far newer scores would move it, in score points.",
    ),
    result(
      "fixed_passing",
      "Entries at or beyond the fixed mark",
      `IF(ISNUMBER(weir_fixed_mark),IF(weir_better="low",${passing("<=")},${passing(">=")}),"no mark is held")`,
      whole,
      "Of the scores at hand.",
    ),
  ];
}

/** A day as a sheet counts it: days since 1899-12-30. */
export function daySerial(day: string): number {
  return Date.parse(`${day}T00:00:00Z`) / 86_400_000 + 25_569;
}
