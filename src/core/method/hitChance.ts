import { requireCount, requireFraction } from "../domain";
import { binomialUpperTail } from "../distribution/binomialUpperTail";

/**
 * The chance of at least `hits` hits in `trials` trials, each a hit with chance `fraction`: P(Bin(trials, fraction) ≥ hits).
 *
 * Domain     fraction in (0, 1); trials ≥ 0 and hits ≥ 1 whole.
 * Edges      fewer trials than hits give 0.
 * Accuracy   as binomialUpperTail.
 *
 * @throws {DomainError}
 */
export function hitChance(fraction: number, trials: number, hits: number): number {
  requireFraction("fraction", fraction);
  requireCount("trials", trials);
  requireCount("hits", hits, 1);
  return binomialUpperTail(hits, trials, fraction);
}
