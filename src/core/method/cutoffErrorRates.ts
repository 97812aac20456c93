import { DomainError, requireFraction } from "../domain";
import { noncentralTCdf } from "../distribution/noncentralTCdf";
import { noncentralTUpperTail } from "../distribution/noncentralTUpperTail";
import { normalPdf } from "../distribution/normalPdf";
import { normalUpperTailQuantile } from "../distribution/normalUpperTailQuantile";
import { studentTUpperTail } from "../distribution/studentTUpperTail";
import { gaussLegendre } from "../numeric/gaussLegendre";
import { markFactor, type MarkMethod } from "./markFactor";
import { requireScored } from "./requireScored";

export interface CutoffErrorRates {
  /** The true mark, z(1 − fraction), and the factor k of the estimated mark x̄ + k·s. */
  readonly trueMark: number;
  readonly factor: number;
  readonly passingFraction: number;
  /** Share of all entries that pass without being truly top, and that are truly top without passing. */
  readonly wronglyPassed: number;
  readonly wronglyMissed: number;
  readonly passedNotTop: number;
  readonly topMissed: number;
}

/** Below it the distribution of the mark leaves the range of numbers. */
const LEAST = 1e-100;

/**
 * How often a mark x̄ + k·s, set from `count` scores of a normal curve, passes the wrong entries and misses the right ones, on average
 * over samples. With T the estimated mark in standard units, z the true one and X an entry's score: P(X > T), P(T < X < z) / P(X > T)
 * and P(z < X < T) / fraction.
 *
 * Domain     count a whole number from 2; 1e-100 ≤ fraction < 1; 1e-100 ≤ confidence < 1 (used by "safe" alone).
 * Edges      the error rates fall to 0 like 1/√count for "plain" and "next".
 * Method     P(X > T) is a t tail. E[(Φ̄(T) − p)⁺] = ∫ φ(x)·P(T < x) dx over x < z, and likewise beyond z, with P(T < x) a noncentral t
 *            tail: all terms positive, where Φ̄(T) − p would cancel. Gauss-Legendre panels from z outwards.
 * Accuracy   relative error ≤ 1e-12 for count 2 … 1e6, fraction 1e-6 … 0.99 (test/core/method/cutoffErrorRates.test.ts).
 * Reference  the distribution of T: Owen (1968), Technometrics 10(3).
 *
 * @throws {DomainError} if an argument is outside its domain.
 */
export function cutoffErrorRates(
  count: number,
  fraction: number,
  method: MarkMethod = "plain",
  confidence = 0.95,
): CutoffErrorRates {
  requireScored(count);
  requireFraction("fraction", fraction);
  requireFraction("confidence", confidence);
  if (!(fraction >= LEAST)) throw new DomainError("fraction", fraction, `at least ${LEAST}`);
  if (!(confidence >= LEAST)) throw new DomainError("confidence", confidence, `at least ${LEAST}`);
  const trueMark = normalUpperTailQuantile(fraction);
  const factor = markFactor(count, fraction, method, confidence);
  const degrees = count - 1;
  const root = Math.sqrt(count);
  const markAt = factor * root;
  const passingFraction = studentTUpperTail(factor / Math.sqrt(1 + 1 / count), degrees);
  const standardError = Math.sqrt(1 / count + factor ** 2 / (2 * degrees));
  const wronglyPassed = outwards(trueMark, -standardError, (x) => noncentralTUpperTail(markAt, degrees, x * root));
  const wronglyMissed = outwards(trueMark, standardError, (x) => noncentralTCdf(markAt, degrees, x * root));
  return {
    trueMark,
    factor,
    passingFraction,
    wronglyPassed,
    wronglyMissed,
    passedNotTop: Math.min(1, wronglyPassed / passingFraction),
    topMissed: Math.min(1, wronglyMissed / fraction),
  };
}

/**
 * ∫ φ(x)·chance(x) dx from `start` outwards, in the direction of the sign of `scale`; the integrand has one peak. A panel spans no more
 * than 2.5 of the scale on which the chance turns, and no more than e^12 of the fall of φ.
 */
function outwards(start: number, scale: number, chance: (x: number) => number): number {
  const { nodes, weights } = gaussLegendre(20);
  let total = 0;
  let before = 0;
  let width = 0;
  for (let from = start; Math.abs(from) < 40; from += width) {
    width = Math.sign(scale) * Math.min(1.25, 2.5 * Math.abs(scale), 12 / (1 + Math.abs(from)));
    let sum = 0;
    for (let i = 0; i < nodes.length; i++) {
      const x = from + (width / 2) * (1 + nodes[i]);
      sum += (Math.abs(width) / 2) * weights[i] * normalPdf(x) * chance(x);
    }
    total += sum;
    // Only past the peak: on the way up to it a panel is small beside those that come.
    if (total > 0 && sum <= before && sum <= 1e-17 * total) break;
    before = sum;
  }
  return total;
}
