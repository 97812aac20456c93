import { requireCount } from "../domain";

/** The most scores whose mean and deviation are judged: the largest degrees of freedom of the distributions. */
const MOST_SCORED = 1e15;

/** Fails unless `count` is a number of scores that has a standard deviation, and for which the distributions are accurate. */
export function requireScored(count: number): void {
  requireCount("count", count, 2, MOST_SCORED);
}
