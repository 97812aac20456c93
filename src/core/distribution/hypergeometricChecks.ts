import { requireCount, requireInteger } from "../domain";

/** Both groups of the largest table that can be compared, 1e12 each. Its tail is summed in some 3 million steps. */
const LARGEST_POOL = 2e12;

/** The checks that the three hypergeometric functions share. */
export function requireHypergeometric(k: number, pool: number, good: number, drawn: number): void {
  requireInteger("k", k);
  requireCount("pool", pool, 0, LARGEST_POOL);
  requireCount("good", good, 0, pool);
  requireCount("drawn", drawn, 0, pool);
}
