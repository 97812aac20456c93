import { DomainError, requireFinite } from "../domain";
import { normalUpperTail } from "../distribution/normalUpperTail";
import { representable } from "../method/representable";
import { compensatedSum } from "../numeric/compensatedSum";
import { findRoot } from "../numeric/findRoot";
import { erfcx } from "../special/erfcx";
import { fitCurve } from "./fitCurve";
import type { Sample } from "./sample";
import { NORMAL } from "./shape";

/** What the likelihood needs to know of scores that had to pass a gate. */
export interface GatedEntries {
  readonly scored: number;
  readonly below: number;
  readonly gate: number;
  /** Mean of the scores, its distance from the gate, and their standard deviation with divisor n. */
  readonly average: number;
  readonly distance: number;
  readonly spread: number;
}

/**
 * The summary of scores that passed a gate, and of the entries below it that were only counted.
 *
 * @throws {DomainError} naming gate where a score lies below it.
 */
export function gatedEntries(sample: Sample, gate: number, below: number): GatedEntries {
  requireFinite("gate", gate);
  if (!(sample.minimum >= gate)) {
    const came = `${gate} was given, and the lowest score is ${sample.minimum}`;
    throw new DomainError("gate", gate, "at or below every score", came);
  }
  const { count, mean } = fitCurve("scores", sample, NORMAL);
  const spread = Math.sqrt(sample.sumOfSquares / count);
  // Of scores that differ in their last digits alone, the mean less the gate would keep none.
  const sum = compensatedSum(sample.sorted, (score) => score - gate);
  const distance = representable("gate", gate, sum < Infinity ? sum / count : mean - gate);
  return { scored: count, below, gate, average: mean, distance, spread };
}

/** φ(z)/Φ(z), the density over the lower tail; −z + 1/|z| … far below, 0 far above. */
export function millsRatio(z: number): number {
  return Math.sqrt(2 / Math.PI) / erfcx(-z * Math.SQRT1_2);
}

/** ln Φ(z), finite as far down as its size can be told. */
function logNormalCdf(z: number): number {
  return z < 0 ? Math.log(erfcx(-z * Math.SQRT1_2) / 2) - (z * z) / 2 : Math.log1p(-normalUpperTail(z));
}

/**
 * The log-likelihood of gated entries under a normal curve, without the constant −n/2 ln 2π:
 * below · ln Φ((gate − mean)/sd) − scored · ln sd − Σ(x − mean)²/(2 sd²).
 */
export function gatedLogLikelihood(entries: GatedEntries, mean: number, sd: number): number {
  const { scored, below, gate, average, spread } = entries;
  const squares = spread * spread + (average - mean) ** 2;
  // 0 · (−∞) would be NaN.
  const counted = below === 0 ? 0 : below * logNormalCdf((gate - mean) / sd);
  return counted - scored * (Math.log(sd) + squares / (2 * sd * sd));
}

/**
 * The profile log-likelihood of a mark: the largest log-likelihood among the curves with mean + z·sd = mark.
 *
 * Method     In t = 1/sd the log-likelihood along that line is concave, below · ln Φ((gate − mark)t + z) + scored · ln t
 *            − Σ((x − mark)t + z)²/2; the root of its derivative is bracketed outwards from the spread of the scores about the mark.
 * Reference  Olsen (1978), A note on the uniqueness of the maximum likelihood estimator for the tobit model, Econometrica 46.
 */
export function gatedProfile(entries: GatedEntries, mark: number, z: number): { logLikelihood: number; sd: number } {
  const { scored, below, gate, average, spread } = entries;
  const far = gate - mark;
  const offset = average - mark;
  const squares = spread * spread + offset * offset;
  // A gate that nothing lies below has no effect, however far it stands: 0 · ∞ would be NaN.
  const counted = (t: number) => (below === 0 ? 0 : below * millsRatio(far * t + z) * far * t);
  // The derivative times t falls from `scored` at 0 to −∞.
  const slope = (t: number) => counted(t) + scored * (1 - squares * t * t - offset * z * t);
  let high = 1 / Math.sqrt(squares);
  while (slope(high) > 0) high *= 2;
  let low = high / 2;
  while (slope(low) < 0) low /= 2;
  const sd = 1 / findRoot(slope, low, high);
  return { logLikelihood: gatedLogLikelihood(entries, mark - z * sd, sd), sd };
}

/** The same entries in deviations from the mean of a curve, where no square leaves the range of numbers. */
export function gatedInUnits({ scored, below, spread }: GatedEntries, gateScore: number, pull: number, sd: number) {
  return { scored, below, gate: gateScore, average: pull, distance: pull - gateScore, spread: spread / sd };
}
