import { NoAnswerError, requireCount } from "../domain";

/** Above this a single hypergeometric tail takes too long. */
export const LARGEST_POOL = 1_000_000_000;

/** Fails unless good ones fit into the pool; all counts whole. */
export function requirePool(pool: number, good: number, hits: number): void {
  requireCount("pool", pool, 1, LARGEST_POOL);
  requireCount("good", good, 0, pool);
  requireCount("hits", hits, 1);
}

/** Fails where the pool can never give that many hits. */
export function requireHitsInPool(good: number, hits: number): void {
  if (hits > good)
    throw new NoAnswerError("hits", `hits is ${hits}, but good is only ${good}: this pool never gives that many hits.`);
}
