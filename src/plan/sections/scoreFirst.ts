import { NUMBER_FORMATS } from "../../sheet/cellLook";
import type { PlanLine } from "../planModel";
import { result } from "./result";

const { percent, whole } = NUMBER_FORMATS;

/** How many to score before the mark can be trusted. */
export function scoreFirst(): PlanLine[] {
  return [
    { kind: "section", text: "How many to score first" },
    result(
      "samples_spread",
      "For the spread",
      "WEIR.SAMPLES_FOR_SD_PRECISION(weir_precision,weir_confidence)",
      whole,
      "Scores until the standard deviation is as precise as asked for.",
    ),
    result(
      "samples_mark",
      "For the mark",
      "WEIR.SAMPLES_FOR_CUTOFF_PRECISION(weir_fraction,weir_fraction_low,weir_fraction_high,weir_confidence)",
      whole,
      "Scores until the plain mark lets through a fraction between the two bounds.",
    ),
    result(
      "still_to_score",
      "Still to score",
      "MAX(0,MAX(weir_samples_spread,weir_samples_mark)-weir_count)",
      whole,
      "More scores until both are reached; 0 when they are.",
    ),
    result(
      "spread_precision",
      "Precision of the spread now",
      "WEIR.SD_PRECISION(weir_count,weir_confidence)",
      percent,
      "How far the standard deviation may lie from the true one.",
    ),
    result(
      "passing_low",
      "Fraction let through now: lowest",
      'WEIR.CUTOFF_PRECISION(weir_count,weir_fraction,weir_confidence,"lowest passing fraction")',
      percent,
      "What the plain mark may really let through, at the least …",
    ),
    result(
      "passing_high",
      "Fraction let through now: highest",
      'WEIR.CUTOFF_PRECISION(weir_count,weir_fraction,weir_confidence,"highest passing fraction")',
      percent,
      "… and at the most, with the confidence.",
    ),
  ];
}
