import type { Stage } from "./stages";

/** A kind of miss: what it pays, in units of cost, and the share of all looks that end so. */
export interface MissCost {
  readonly units: number;
  readonly share: number;
  /** The stages at which these looks stop, counted from 0. */
  readonly stages: readonly number[];
}

/**
 * What a look that is no hit pays: it stops at stage j with chance reach(j) − reach(j + 1), at the last with reach − fraction, and has
 * paid for the stages up to there. Kinds that pay the same are taken as one.
 */
export function missCosts(stages: readonly Stage[], multiples: readonly number[], fraction: number): MissCost[] {
  const kinds = new Map<number, MissCost>();
  let paid = 0;
  stages.forEach(({ reach }, index) => {
    paid += multiples[index];
    const next = stages[index + 1]?.reach ?? fraction;
    if (!(reach > next)) return;
    const { share, stages: before } = kinds.get(paid) ?? { share: 0, stages: [] };
    kinds.set(paid, { units: paid, share: share + reach - next, stages: [...before, index] });
  });
  return [...kinds.values()];
}
