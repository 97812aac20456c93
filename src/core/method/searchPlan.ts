import { DomainError, requireCount, requireFraction } from "../domain";
import type { MarkMethod } from "./markFactor";

/** A search to be played out: learn on so many scores, set the mark by this method, look until the first pass. */
export interface SearchPlan {
  /** The share of the true curve that counts as truly top, and that the mark aims at. */
  readonly fraction: number;
  readonly learnCount: number;
  readonly method: MarkMethod;
  readonly runs: number;
  readonly seed: number;
  /** Searching looks after which a run gives up. */
  readonly mostLooks: number;
}

/** Runs whose outcomes are kept side by side: 16 bytes each. */
export const MOST_RUNS = 10_000_000;

/**
 * Fails unless the plan can be played.
 *
 * @throws {DomainError} naming the argument as the cell function does.
 */
export function requireSearchPlan(plan: SearchPlan): void {
  requireFraction("fraction", plan.fraction);
  requireCount("learn_count", plan.learnCount, 2);
  requireCount("runs", plan.runs, 1, MOST_RUNS);
  requireCount("seed", plan.seed);
  requireCount("most_looks", plan.mostLooks, 1);
}

/** Looks of a run that are played one by one; of a longer search the rest is drawn in one go. At most three times the looks that the fraction leads one to expect. */
export function looksPlayedOut({ fraction, mostLooks }: SearchPlan): number {
  return Math.min(mostLooks, Math.ceil(3 / fraction));
}

/** Draws that a cell may ask for; longer simulations run in the background. */
export const MOST_CELL_DRAWS = 20_000_000;

/**
 * Fails where a cell would have to wait: runs × (learn_count + the smaller of most_looks and 3/fraction) above 20 million.
 *
 * @throws {DomainError} naming runs, or learn_count where a single run is too long already.
 */
export function requireCellWork({ fraction, learnCount, mostLooks, runs }: SearchPlan): void {
  const draws = learnCount + Math.min(mostLooks, 3 / fraction);
  if (runs * draws <= MOST_CELL_DRAWS) return;
  const fitting = Math.floor(MOST_CELL_DRAWS / draws);
  if (fitting < 1) throw new DomainError("learn_count", learnCount, "such that one run takes at most 20 million draws");
  const advice = `at most ${fitting} with these arguments (longer simulations run in the pane)`;
  throw new DomainError("runs", runs, advice);
}
