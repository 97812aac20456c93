import { NUMBER_FORMATS } from "../../sheet/cellLook";
import type { PlanLine } from "../planModel";
import { result } from "./result";

const { decimals, whole } = NUMBER_FORMATS;
const ASKED = "weir_scores,weir_fraction,weir_confidence,weir_shape,weir_better";
/** Rows that the picture takes. */
const PICTURE = 20;

/** Where the mark stands, and how sure that is. */
export function mark(): PlanLine[] {
  return [
    { kind: "section", text: "Where the mark stands" },
    result(
      "plain_cutoff",
      "Plain cutoff",
      "WEIR.TOP_FRACTION_CUTOFF(weir_scores,weir_fraction,weir_shape,weir_better)",
      decimals,
      "The best single guess; lets through more than the fraction about every second time.",
    ),
    result(
      "lower_limit",
      "Lower limit of the true mark",
      `WEIR.CUTOFF_LIMITS(${ASKED},"lower limit")`,
      decimals,
      "With the confidence the true mark lies from here …",
    ),
    result(
      "upper_limit",
      "Upper limit of the true mark",
      `WEIR.CUTOFF_LIMITS(${ASKED},"upper limit")`,
      decimals,
      "… to here; a score in between is too close to call.",
    ),
    result(
      "safe_cutoff",
      "Safe cutoff",
      `WEIR.SAFE_CUTOFF(${ASKED})`,
      decimals,
      "With the confidence no more than the fraction passes it.",
    ),
    result(
      "next_cutoff",
      "Next-score cutoff",
      "WEIR.NEXT_SCORE_CUTOFF(weir_scores,weir_fraction,weir_shape,weir_better)",
      decimals,
      "The next entry passes it with exactly that chance.",
    ),
    result(
      "rank_cutoff",
      "Without a curve",
      'WEIR.RANK_CUTOFF(weir_scores,weir_fraction,weir_confidence,weir_better,"cutoff")',
      decimals,
      "From the order of the scores alone, if no shape can be believed.",
    ),
    result(
      "passing_now",
      "Entries that pass now",
      `WEIR.CUTOFF_REPORT(${ASKED},"passing now")`,
      whole,
      "At or beyond the plain cutoff, of the scores at hand.",
    ),
    { kind: "picture", rows: PICTURE },
  ];
}
