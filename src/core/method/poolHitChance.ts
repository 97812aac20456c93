import { requireCount } from "../domain";
import { hypergeometricUpperTail } from "../distribution/hypergeometricUpperTail";
import { requirePool } from "./pool";

/**
 * The chance of at least `hits` hits in `trials` entries drawn without return from a pool that holds `good` good ones.
 *
 * Domain     pool whole, 1 … 1e9; good and trials whole, 0 … pool; hits ≥ 1 whole.
 * Edges      hits above good or above trials give 0.
 * Accuracy   as hypergeometricUpperTail.
 *
 * @throws {DomainError}
 */
export function poolHitChance(pool: number, good: number, trials: number, hits: number): number {
  requirePool(pool, good, hits);
  requireCount("trials", trials, 0, pool);
  return hypergeometricUpperTail(hits, pool, good, trials);
}
