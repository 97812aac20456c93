import type { OwnCall } from "../evaluation";
import { opinions } from "./opinions";

export interface Heard {
  readonly agrees: boolean;
  readonly sentence: string;
}

export interface SecondOpinion {
  /** What the other library says of a call; undefined where it has no opinion that can be trusted. */
  of(call: OwnCall): Heard | undefined;
}

/** So much of an audit's time a second opinion may take. */
const MOST_CALLS = 500;

/** Loads jStat, a library that shares no code with ours. It is asked only inside the ranges where its error was measured. */
export async function loadSecondOpinion(): Promise<SecondOpinion> {
  const { jStat } = (await import("jstat")).default;
  let asked = 0;
  return {
    of({ entry, given, outcome }) {
      const opinion = opinions[entry.name];
      if (!opinion || !("value" in outcome) || typeof outcome.value !== "number" || asked >= MOST_CALLS)
        return undefined;
      const check = opinion({ jStat, given, result: outcome.value });
      if (!check) return undefined;
      asked++;
      const { theirs, ours, tolerance, what } = check;
      if (!Number.isFinite(theirs)) return undefined;
      const agrees = Math.abs(theirs - ours) <= tolerance;
      const heard = `Second opinion, by jStat: ${what} ${Number(theirs.toPrecision(8))}`;
      const within = `within ${Number(tolerance.toPrecision(1))}`;
      if (agrees) return { agrees, sentence: `${heard}, the same as worked out here (${within}).` };
      return {
        agrees,
        sentence: `${heard}, and ${Number(ours.toPrecision(8))} was worked out here: they should be the same ${within}. Rest nothing on this call, and report it.`,
      };
    },
  };
}
