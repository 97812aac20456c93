/** What a chance may fall short of the one asked for and still count as met: 1e-12 of it, or a thousandth of the chance of missing. */
export function chanceSlack(asked: number): number {
  return Math.min(1e-12 * asked, 1e-3 * (1 - asked));
}

/**
 * Whether a chance comes up to the one asked for, a chance that does so on paper included: 50 % and 87.5 % are met by 3 trials.
 *
 * Domain     asked in (0, 1); hit and miss the two tails of one distribution, each computed as itself.
 * Method     The smaller side is compared, so that an asked 0.999999999999 is not decided by the rounding of 1 − miss.
 */
export function reachesChance(asked: number, hit: () => number, miss: () => number): boolean {
  const slack = chanceSlack(asked);
  return asked < 0.5 ? hit() >= asked - slack : miss() <= 1 - asked + slack;
}
