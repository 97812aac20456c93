import { NoAnswerError } from "../domain";

/** A sample size that a search found, or a message that no size which a number can hold is large enough. */
export function requireReachable(argument: string, value: number, count: number): number {
  if (count <= Number.MAX_SAFE_INTEGER) return count;
  throw new NoAnswerError(
    argument,
    `${argument} of ${value} would take more than ${Number.MAX_SAFE_INTEGER} scores: ask for less precision.`,
  );
}
