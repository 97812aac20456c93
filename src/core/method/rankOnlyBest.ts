import { requireCount } from "../domain";
import { MOST_LOOKS } from "./mostLooks";

/** A chance that meets another on paper may miss it by rounding. */
const SLACK = 1e-12;

export interface RankOnlyBest {
  readonly passOver: number;
  readonly chance: number;
}

/**
 * How many looks to pass over before taking the first that is better than all before, for the best chance of the very best: the
 * smallest s with Σ_{i=s+1..n−1} 1/i ≤ 1; the chance is (s/n)·Σ_{i=s..n−1} 1/i, or 1/n with s = 0.
 *
 * Domain     looks 1 … 10,000.
 * Edges      1 look: pass over none, chance 1. 2 looks: 0 and 1 come to the same, the smaller is given.
 * Method     The harmonic sum is built from its small end.
 * Accuracy   relative error ≤ 1e-14 (test/core/method/rankOnly.test.ts).
 * Reference  Gilbert & Mosteller (1966), J. Amer. Statist. Assoc. 61, sec. 2.
 *
 * @throws {DomainError} if looks is outside its domain.
 */
export function rankOnlyBest(looks: number): RankOnlyBest {
  requireCount("looks", looks, 1, MOST_LOOKS);
  let passOver = looks - 1;
  let after = 0;
  while (passOver > 0 && after + 1 / passOver <= 1 + SLACK) after += 1 / passOver--;
  return { passOver, chance: passOver === 0 ? 1 / looks : (passOver / looks) * (after + 1 / passOver) };
}
