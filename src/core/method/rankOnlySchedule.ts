import { requireCount } from "../domain";
import { MOST_LOOKS } from "./mostLooks";

/** Taking and passing over may come to the same on paper and differ by rounding: then take. */
const SLACK = 1e-12;

export interface RankOnlySchedule {
  /** acceptRank[i − 1]: the largest rank among the first i looks at which look i is accepted; 0 is none. */
  readonly acceptRank: readonly number[];
  readonly expectedRank: number;
}

/**
 * Which relative rank to accept at each look for the smallest expected rank among all: at look i accept rank s while
 * s·(n + 1)/(i + 1), the rank it will have in the end on average, is at most C(i), what going on brings.
 *
 * Domain     looks 1 … 10,000.
 * Edges      the last look is taken, whatever its rank.
 * Method     Backwards: C(i − 1) = [(n + 1)/(i + 1)·S(S + 1)/2 + (i − S)·C(i)]/i, S = ⌊C(i)(i + 1)/(n + 1)⌋, since a rank is 1 … i with
 *            equal chances: one step a look, where summing over the ranks would take n²/2.
 * Accuracy   relative error ≤ 1e-13 (test/core/method/rankOnly.test.ts).
 * Reference  Chow, Moriguti, Robbins & Samuels (1964), Israel J. Math. 2.
 *
 * @throws {DomainError} if looks is outside its domain.
 */
export function rankOnlySchedule(looks: number): RankOnlySchedule {
  requireCount("looks", looks, 1, MOST_LOOKS);
  const acceptRank = new Array<number>(looks);
  acceptRank[looks - 1] = looks;
  let goingOn = (looks + 1) / 2;
  for (let look = looks - 1; look >= 1; look--) {
    const rankStep = (looks + 1) / (look + 1);
    const accept = Math.min(look, Math.floor((goingOn / rankStep) * (1 + SLACK)));
    goingOn = ((rankStep * accept * (accept + 1)) / 2 + (look - accept) * goingOn) / look;
    acceptRank[look - 1] = accept;
  }
  return { acceptRank, expectedRank: goingOn };
}
