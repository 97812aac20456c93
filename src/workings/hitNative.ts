/** Beyond these many trials the host's binomial, and a power of 1 − fraction, have lost the digits that a comparison needs. */
const MOST_TRIALS = 100_000;
const MOST_TRIALS_TO_ONE_HIT = 1_000_000;
/** Below this, 1 − P(fewer) would keep no digits. */
const SMALL = 1e-6;

/**
 * P(Bin(trials, fraction) ≥ hits) as native text; "" where the host can't compute it. A small chance is taken from the incomplete beta function.
 * The numbers choose the form.
 */
export function hitChanceNative(
  [fraction, trials, hits]: readonly [string, string, string],
  at: { readonly trials: number; readonly hits: number; readonly chance: number },
): string {
  if (at.trials < at.hits || at.trials > (at.hits === 1 ? MOST_TRIALS_TO_ONE_HIT : MOST_TRIALS)) return "";
  if (at.chance < SMALL) return `BETA.DIST(${fraction},${hits},${trials}-${hits}+1,TRUE)`;
  return at.hits === 1 ? `1-(1-${fraction})^${trials}` : `1-BINOM.DIST(${hits}-1,${trials},${fraction},TRUE)`;
}

/** What hitChanceNative stands on. */
export function hitChanceSource(chance: number): string {
  return chance < SMALL
    ? "binomial distribution, as an incomplete beta function: Abramowitz & Stegun 1964, 26.5.24"
    : "binomial distribution";
}
