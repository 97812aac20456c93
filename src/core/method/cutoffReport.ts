import { andersonDarling, type AndersonDarling } from "../sample/andersonDarling";
import type { Curve } from "../sample/curve";
import type { Sample } from "../sample/sample";
import type { Better } from "./better";
import { cutoffLimits, type CutoffLimits } from "./cutoffLimits";
import { looksForHitChance } from "./looksForHitChance";
import { passingFractionLimits, type PassingFractionLimits } from "./passingFractionLimits";
import { safeCutoff, type SafeCutoff } from "./safeCutoff";

export interface CutoffReport {
  readonly limits: CutoffLimits;
  readonly safe: SafeCutoff;
  readonly normality: AndersonDarling;
  /** Its p-value; undefined below 8 scores and where a power was fitted. */
  readonly normalityP: number | undefined;
  /** Scores of the sample at or beyond the cutoff; NaN where that falls off the scale. */
  readonly passing: number;
  readonly passingFractions: PassingFractionLimits;
  /** Looks for a chance of 50 % and 90 % that one of them clears the cutoff; Infinity past all counting. */
  readonly looksForHalf: number;
  readonly looksForMost: number;
}

/**
 * All that is said of one cutoff: the plain mark with its limits, the safe mark, how the curve fits, who passes now, what share of all
 * entries may really pass, and how many looks the next hit may take.
 *
 * Domain     as cutoffLimits; `curve` fitted to `sample`.
 *
 * @throws {DomainError}
 */
export function cutoffReport(
  sample: Sample,
  curve: Curve,
  fraction: number,
  confidence: number,
  better: Better,
): CutoffReport {
  const limits = cutoffLimits(curve, fraction, confidence, better);
  const normality = andersonDarling(curve.scaled);
  return {
    limits,
    safe: safeCutoff(curve, fraction, confidence, better),
    normality,
    normalityP: curve.powerFitted ? undefined : normality.pValue,
    passing: passingNow(sample, limits.cutoff, better),
    passingFractions: passingFractionLimits(curve.count, fraction, confidence),
    looksForHalf: looksForHitChance(curve.count, fraction, 0.5),
    looksForMost: looksForHitChance(curve.count, fraction, 0.9),
  };
}

function passingNow({ values }: Sample, cutoff: number, better: Better): number {
  if (Number.isNaN(cutoff)) return NaN;
  let passing = 0;
  for (const score of values) if (better === "low" ? score <= cutoff : score >= cutoff) passing++;
  return passing;
}
