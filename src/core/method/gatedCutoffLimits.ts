import { requireFraction } from "../domain";
import { normalUpperTailQuantile } from "../distribution/normalUpperTailQuantile";
import { findRoot } from "../numeric/findRoot";
import { gatedCurve } from "../sample/gatedCurve";
import { gatedLogLikelihood, gatedProfile, type GatedEntries } from "../sample/gatedLikelihood";
import type { Sample } from "../sample/sample";
import { requireOnScale } from "./markCurve";

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

/**
 * The mark that the top fraction of all entries reaches where those below a gate were only counted, with limits by profile likelihood: the
 * marks at which twice the log-likelihood, made as large as it can be, lies a chi-square quantile below its maximum.
 *
 * Domain     as gatedCurve; fraction and confidence in (0, 1). The fraction is of all entries, those below the gate included.
 * Method     One root on either side of the estimate, bracketed outwards in standard errors. Limits from the standard errors are
 *            symmetric, where the likelihood falls more slowly towards the side on which nothing was seen.
 * Accuracy   1e-10 relative; the limits themselves are large-sample ones. test/core/method/gatedCutoffLimits.test.ts.
 * Reference  Meeker & Escobar (1998), Statistical Methods for Reliability Data, ch. 8.
 *
 * @throws {DomainError} @throws {NoAnswerError} where a limit passes the largest number.
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
  const { entries, gateScore, mean, sd, meanError, sdError } = gatedCurve(sample, gate, below);
  const z = normalUpperTailQuantile(fraction);
  const cutoff = mean + z * sd;
  const logLikelihood = gatedLogLikelihood(entries, mean, sd);
  const allowed = normalUpperTailQuantile((1 - confidence) / 2) ** 2;
  const excess = (mark: number) => 2 * (logLikelihood - gatedProfile(entries, mark, z).logLikelihood) - allowed;
  const limit = (side: 1 | -1, what: string) => {
    let reach = side * Math.sqrt(allowed) * Math.hypot(meanError, z * sdError);
    while (excess(cutoff + reach) < 0) reach *= 2;
    return requireOnScale(what, findRoot(excess, cutoff, cutoff + reach));
  };
  const lowerLimit = limit(-1, "lower limit");
  const upperLimit = limit(1, "upper limit");
  return {
    entries,
    gateScore,
    mean,
    sd,
    z,
    logLikelihood,
    allowed,
    lowerLimit,
    cutoff,
    upperLimit,
    lowerSd: gatedProfile(entries, lowerLimit, z).sd,
    upperSd: gatedProfile(entries, upperLimit, z).sd,
  };
}
