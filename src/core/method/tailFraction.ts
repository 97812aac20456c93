import { normalCdf } from "../distribution/normalCdf";
import { normalUpperTail } from "../distribution/normalUpperTail";
import { requireFinite, requirePositive } from "../domain";
import type { Better } from "./better";

export interface TailFraction {
  /** The mark in deviations from the mean; ±∞ where it is farther out than numbers reach. */
  readonly z: number;
  readonly fraction: number;
}

/**
 * The fraction of a normal curve at or beyond a mark: 1 − Φ((mark − mean)/sd), with "low" Φ((mark − mean)/sd).
 *
 * Domain     mark and mean finite; sd > 0, all taken as the true ones.
 * Accuracy   that of the normal tail; test/core/method/tailFraction.test.ts.
 *
 * @throws {DomainError} naming cutoff, mean or sd.
 */
export function tailFraction(mark: number, mean: number, sd: number, better: Better): TailFraction {
  requireFinite("cutoff", mark);
  requireFinite("mean", mean);
  requirePositive("sd", sd);
  const z = (mark - mean) / sd;
  return { z, fraction: better === "low" ? normalCdf(z) : normalUpperTail(z) };
}
