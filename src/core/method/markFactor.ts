import { requireCount, requireFraction } from "../domain";
import { noncentralTQuantile } from "../distribution/noncentralTQuantile";
import { normalUpperTailQuantile } from "../distribution/normalUpperTailQuantile";
import { studentTUpperTailQuantile } from "../distribution/studentTUpperTailQuantile";

/** How a mark is set from learning scores: the plain point estimate, the safe mark, or the one that the next score clears with the chance asked for. */
export const MARK_METHODS = ["plain", "safe", "next"] as const;
export type MarkMethod = (typeof MARK_METHODS)[number];

/**
 * The k of the mark x̄ + k·s that `method` sets from `learn_count` scores so that `fraction` of a normal curve passes.
 *
 * Domain     learn_count a whole number from 2; 0 < fraction < 1; 0 < confidence < 1 (used by "safe" alone).
 * Method     plain: z(1 − fraction). safe: the noncentral t quantile at confidence, n − 1 degrees of freedom and noncentrality z√n, over √n.
 *            next: t(n − 1; 1 − fraction)·√(1 + 1/n).
 * Reference  Owen (1968), A survey of properties and applications of the noncentral t-distribution, Technometrics 10(3); Geisser (1993),
 *            Predictive Inference.
 * @throws {DomainError} if an argument is outside its domain.
 */
export function markFactor(learnCount: number, fraction: number, method: MarkMethod, confidence = 0.95): number {
  requireCount("learn_count", learnCount, 2);
  requireFraction("fraction", fraction);
  requireFraction("confidence", confidence);
  const z = normalUpperTailQuantile(fraction);
  if (method === "plain") return z;
  if (method === "next") return studentTUpperTailQuantile(fraction, learnCount - 1) * Math.sqrt(1 + 1 / learnCount);
  const root = Math.sqrt(learnCount);
  return noncentralTQuantile(confidence, learnCount - 1, z * root) / root;
}
