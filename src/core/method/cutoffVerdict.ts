import { DomainError } from "../domain";
import type { Better } from "./better";

export type Verdict = "clears" | "falls short" | "too close to call";

/**
 * How a score stands to a mark that is known only within two limits: it clears at or beyond the far limit, falls short before the near one,
 * and is too close to call in between.
 *
 * Domain     lowerLimit ≤ upperLimit; −∞ and ∞ stand for no limit on that side, which no score is beyond.
 *
 * @throws {DomainError} naming lower_limit where it is above the upper one.
 */
export function cutoffVerdict(lowerLimit: number, upperLimit: number, better: Better): (score: number) => Verdict {
  if (!(lowerLimit <= upperLimit))
    throw new DomainError("lower_limit", lowerLimit, `at most upper_limit, which is ${upperLimit}`);
  return better === "low"
    ? (score) => (score <= lowerLimit ? "clears" : score > upperLimit ? "falls short" : "too close to call")
    : (score) => (score >= upperLimit ? "clears" : score < lowerLimit ? "falls short" : "too close to call");
}
