import { requireFraction } from "../domain";
import { chiSquareQuantile } from "../distribution/chiSquareQuantile";
import { normalUpperTailQuantile } from "../distribution/normalUpperTailQuantile";
import { findRoot } from "../numeric/findRoot";
import { gatedCurve } from "../sample/gatedCurve";
import { gatedInUnits, gatedLogLikelihood, gatedProfile, type GatedEntries } from "../sample/gatedLikelihood";
import type { Sample } from "../sample/sample";
import { representable } from "./representable";

export interface GatedCutoffLimits {
  readonly entries: GatedEntries;
  /** The gate in deviations from the mean. */
  readonly gateScore: number;
  readonly mean: number;
  readonly sd: number;
  readonly z: number;
  readonly logLikelihood: number;
  /** What twice the log-likelihood may fall by at a limit: the chi-square quantile with one degree of freedom. */
  readonly allowed: number;
  readonly lowerLimit: number;
  readonly cutoff: number;
  readonly upperLimit: number;
  /** The deviation of the likeliest curve whose mark stands at the limit. */
  readonly lowerSd: number;
  readonly upperSd: number;
}

/** Up to this fall of the likelihood it is a parabola: limits are then standard errors away, to a billionth of one. */
const LEAST_FALL = 1e-9;

/**
 * The mark that the top fraction of all entries reaches where those below a gate were only counted, with limits by profile likelihood: the
 * marks at which twice the log-likelihood, made as large as it can be, lies a chi-square quantile below its maximum.
 *
 * Domain     as gatedCurve; fraction and confidence in (0, 1). The fraction is of all entries, those below the gate included.
 * Method     One root on either side of the estimate, bracketed outwards in standard errors, all in deviations of the likeliest curve, so
 *            that no square leaves the range of numbers. Limits from the standard errors are symmetric, where the likelihood falls more
 *            slowly towards the side on which nothing was seen.
 * Accuracy   1e-10 relative; the limits themselves are large-sample ones. test/core/method/gatedCutoffLimits.test.ts.
 * Reference  Meeker & Escobar (1998), Statistical Methods for Reliability Data, ch. 8.
 *
 * @throws {DomainError} naming gate where a limit passes the largest number.
 */
export function gatedCutoffLimits(
  sample: Sample,
  gate: number,
  below: number,
  fraction: number,
  confidence: number,
): GatedCutoffLimits {
  requireFraction("fraction", fraction);
  requireFraction("confidence", confidence);
  const { entries, gateScore, pull, mean, sd, information } = gatedCurve(sample, gate, below);
  const z = normalUpperTailQuantile(fraction);
  const { inMean, mixed, inSd } = information;
  const error = Math.sqrt((inSd - 2 * z * mixed + z * z * inMean) / (inMean * inSd - mixed * mixed));
  const units = gatedInUnits(entries, gateScore, pull, sd);
  const best = gatedLogLikelihood(units, 0, 1);
  const allowed =
    confidence < 0.5 ? chiSquareQuantile(confidence, 1) : normalUpperTailQuantile((1 - confidence) / 2) ** 2;
  const excess = (point: number) => 2 * (best - gatedProfile(units, point, z).logLikelihood) - allowed;
  const limit = (side: 1 | -1) => {
    let reach = side * Math.sqrt(allowed) * error;
    // So near the top the likelihood falls by less than its last digits.
    if (allowed < LEAST_FALL) return z + reach;
    while (excess(z + reach) < 0) reach *= 2;
    return findRoot(excess, z, z + reach);
  };
  const [lower, upper] = [limit(-1), limit(1)];
  return {
    entries,
    gateScore,
    mean,
    sd,
    z,
    logLikelihood: best - entries.scored * Math.log(sd),
    allowed,
    lowerLimit: representable("gate", gate, mean + lower * sd),
    cutoff: representable("gate", gate, mean + z * sd),
    upperLimit: representable("gate", gate, mean + upper * sd),
    lowerSd: sd * gatedProfile(units, lower, z).sd,
    upperSd: sd * gatedProfile(units, upper, z).sd,
  };
}
