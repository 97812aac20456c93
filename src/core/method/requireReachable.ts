import { NoAnswerError } from "../domain";

/** The most scores that a sample size may ask for: the largest degrees of freedom that the distributions know. */
export const MOST_SCORES = 1e15;

/** A sample size that a search found, or a message that no size which can be worked out is large enough. */
export function requireReachable(argument: string, value: number, count: number): number {
  if (count <= MOST_SCORES) return count;
  throw new NoAnswerError(
    argument,
    `${argument} of ${value} would take more than ${MOST_SCORES} scores: ask for less precision.`,
  );
}
