import { requireProbability } from "../domain";
import { normalScore } from "../special/normalScore";

/**
 * The z with P(Z ≤ z) = p for a standard normal Z.
 *
 * Domain     p in [0, 1].
 * Edges      0 gives −∞, 1 gives ∞.
 * Method     normalScore.ts. Where p is next to 1, use normalUpperTailQuantile: 1 − p has few digits.
 * Accuracy   1e-15 relative; test/core/distribution/normal.test.ts.
 * Reference  Wichura (1988), Algorithm AS 241, Appl. Statist. 37.
 *
 * @throws {DomainError} if an argument is outside its domain.
 */
export function normalQuantile(p: number): number {
  requireProbability("p", p);
  return p === 0.5 ? 0 : -normalScore(p);
}
