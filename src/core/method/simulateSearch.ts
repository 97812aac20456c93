import { normalDeviate } from "../numeric/normalDeviate";
import { SeededRandom } from "../numeric/seededRandom";
import { normalTail } from "../special/normalTail";
import { markFactor } from "./markFactor";
import { missesBeforeHit } from "./missesBeforeHit";
import { looksPlayedOut, requireSearchPlan, type SearchPlan } from "./searchPlan";
import { summariseSearches, type SearchOutcomes, type SearchSummary } from "./summariseSearches";

/** How far a simulation has come. */
export interface SearchProgress {
  readonly runsPlayed: number;
  /** Searching looks that were played one by one. */
  readonly looksPlayed: number;
}

const TWO_TO_32 = 0x100000000;

/**
 * Plays a search plan out, run by run, in steps: a generator that hands back after about `drawsPerStep` draws how far it has come, and
 * returns the summary at the end. The steps have no influence on the numbers.
 *
 * Method     A run draws its learning scores one by one from a standard normal (mean and sd of the true curve cancel out), sets the mark
 *            x̄ + k·s, and looks. A look is played by comparing a uniform number with the fraction q = P(Z > mark) that the mark really lets
 *            through: it passes when U < q, and the score that passed is truly top when U < fraction, for U is that score's upper tail.
 *            Comparing scores with the mark would say the same at three times the price. The first 3/fraction looks of a run are played so,
 *            one by one; if none passed, what is left of the run is drawn in one go from its exact law, the geometric, since looks forget
 *            what came before. So no mark, however badly it came out, can make a run long.
 * Accuracy   against the exact error rates and the exact mean number of looks, within the standard error of the simulation;
 *            test/core/method/simulateSearch.test.ts. Same plan, same bits, but for the last bit of Math.exp inside P(Z > mark): two engines
 *            could part ways only where a uniform number falls within 1e-16 of it.
 * @throws {DomainError} if the plan is outside its domain.
 */
export function* simulateSearch(plan: SearchPlan, drawsPerStep = 1_000_000): Generator<SearchProgress, SearchSummary> {
  requireSearchPlan(plan);
  const factor = markFactor(plan.learnCount, plan.fraction, plan.method);
  const outcomes = playedRuns(plan.runs);
  const random = new SeededRandom(plan.seed);
  const playedOut = looksPlayedOut(plan);
  const drawsAtMost = plan.learnCount + playedOut;
  const runsPerStep = Math.max(1, Math.floor(drawsPerStep / drawsAtMost));
  for (let first = 0; first < plan.runs; first += runsPerStep) {
    const end = Math.min(plan.runs, first + runsPerStep);
    for (let run = first; run < end; run++) playRun(run, plan, factor, playedOut, random, outcomes);
    yield { runsPlayed: end, looksPlayed: outcomes.looksPlayed };
  }
  return summariseSearches(factor, outcomes);
}

/** The same without a stop. */
export function playSearches(plan: SearchPlan): SearchSummary {
  const steps = simulateSearch(plan);
  for (let step = steps.next(); ; step = steps.next()) if (step.done) return step.value;
}

function playedRuns(runs: number): SearchOutcomes {
  return {
    looks: new Float64Array(runs),
    passing: new Float64Array(runs),
    found: 0,
    notTop: 0,
    looksPlayed: 0,
  };
}

function playRun(
  run: number,
  { fraction, learnCount, mostLooks }: SearchPlan,
  factor: number,
  playedOut: number,
  random: SeededRandom,
  outcomes: SearchOutcomes,
): void {
  const passing = normalTail(learntMark(learnCount, factor, random));
  outcomes.passing[run] = passing;
  const look = lookForHit(passing, fraction, playedOut, random);
  let looks = Math.abs(look);
  outcomes.looksPlayed += looks === 0 ? playedOut : looks;
  if (look !== 0) {
    outcomes.found++;
    if (look < 0) outcomes.notTop++;
  } else if (playedOut < mostLooks) {
    const misses = playedOut + missesBeforeHit(passing, mostLooks - playedOut, random.fraction());
    looks = Math.min(misses + 1, mostLooks);
    if (misses < mostLooks) {
      outcomes.found++;
      if (random.fraction() * passing >= fraction) outcomes.notTop++;
    }
  }
  outcomes.looks[run] = looks === 0 ? mostLooks : looks;
}

/** The mark, in units of the true curve, that a fresh sample of learning scores sets. */
function learntMark(count: number, factor: number, random: SeededRandom): number {
  let sum = 0;
  let squares = 0;
  for (let i = 0; i < count; i++) {
    const score = normalDeviate(random);
    sum += score;
    squares += score * score;
  }
  const mean = sum / count;
  // Two equal scores could leave a difference just below 0, and its root would be no number.
  return mean + factor * Math.sqrt(Math.max(0, squares - sum * mean) / (count - 1));
}

/**
 * Looks one by one, `most` at most: the number of the look that passed, negative where that score was not truly top, 0 where none passed.
 * A uniform number is a word of 32 bits; only where it coincides with the threshold are 32 more drawn to decide.
 */
function lookForHit(passing: number, fraction: number, most: number, random: SeededRandom): number {
  const threshold = passing * TWO_TO_32;
  const word32 = Math.floor(threshold);
  for (let look = 1; look <= most; look++) {
    const word = random.word();
    if (word > word32) continue;
    const rest = word === word32 || word === Math.floor(fraction * TWO_TO_32) ? (random.word() + 0.5) / TWO_TO_32 : 0;
    if (word + rest < threshold) return word + rest < fraction * TWO_TO_32 ? look : -look;
  }
  return 0;
}
