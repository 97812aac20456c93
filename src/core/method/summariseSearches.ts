import { nthSmallest } from "../numeric/nthSmallest";

/** What the runs of a simulation came to, side by side. */
export interface SearchOutcomes {
  /** Searching looks of each run; a run that found nothing counts most_looks. */
  readonly looks: Float64Array;
  /** The fraction of the true curve that each run's mark lets through. */
  readonly passing: Float64Array;
  found: number;
  notTop: number;
  looksPlayed: number;
}

export interface SearchSummary {
  /** The k of the mark x̄ + k·s. */
  readonly factor: number;
  readonly runs: number;
  readonly looksPlayed: number;
  readonly averageLooks: number;
  readonly medianLooks: number;
  readonly ninetiethLooks: number;
  /** Among the runs that found one; undefined where none did. */
  readonly firstHitNotTop: number | undefined;
  readonly foundNothing: number;
  readonly lowestPassing: number;
  readonly highestPassing: number;
}

/**
 * The outcomes in a few numbers. Median and 90th percentile of the looks are the smallest whole number of looks by which at least half, at
 * least nine tenths of the runs had ended; the 5th and 95th percentiles of the passing fraction are interpolated at (n − 1)p.
 * Reorders the outcomes.
 *
 * Reference  Hyndman & Fan (1996), Sample quantiles in statistical packages, Amer. Statist. 50: types 1 and 7.
 */
export function summariseSearches(
  factor: number,
  { looks, passing, found, notTop, looksPlayed }: SearchOutcomes,
): SearchSummary {
  const runs = looks.length;
  let totalLooks = 0;
  for (const one of looks) totalLooks += one;
  return {
    factor,
    runs,
    looksPlayed,
    averageLooks: totalLooks / runs,
    medianLooks: nthSmallest(looks, Math.ceil(runs / 2) - 1),
    ninetiethLooks: nthSmallest(looks, Math.ceil((9 * runs) / 10) - 1),
    firstHitNotTop: found > 0 ? notTop / found : undefined,
    foundNothing: (runs - found) / runs,
    lowestPassing: interpolatedQuantile(passing, 0.05),
    highestPassing: interpolatedQuantile(passing, 0.95),
  };
}

function interpolatedQuantile(values: Float64Array, p: number): number {
  const place = (values.length - 1) * p;
  const below = Math.floor(place);
  const low = nthSmallest(values, below);
  return below === place ? low : low + (place - below) * (nthSmallest(values, below + 1) - low);
}
