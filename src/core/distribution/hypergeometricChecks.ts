import { requireCount, requireInteger } from "../domain";

/** The checks that the three hypergeometric functions share. */
export function requireHypergeometric(k: number, pool: number, good: number, drawn: number): void {
  requireInteger("k", k);
  requireCount("pool", pool);
  requireCount("good", good, 0, pool);
  requireCount("drawn", drawn, 0, pool);
}
