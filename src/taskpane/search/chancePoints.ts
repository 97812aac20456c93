import type { Point } from "../../plot/drawnLine";
import type { Call } from "../context";

const STEPS = 48;

/** The looks at which the chance is worked out: whole numbers from 0 to `most`, evenly. */
export function lookSteps(most: number): number[] {
  const step = Math.max(1, most / STEPS);
  const looks: number[] = [];
  for (let at = 0; at < most; at += step) looks.push(Math.round(at));
  return [...new Set(looks), most];
}

/** The chance of so many hits by look, the mark taken as exact. */
export function knownChance(call: Call, fraction: number, hits: number, most: number): Point[] {
  return lookSteps(most).map((looks) => [
    looks,
    looks === 0 ? 0 : numberOf(call("HIT_CHANCE", [fraction, looks, hits])),
  ]);
}

/**
 * The chance of a first hit by look, the mark being estimated from `count` scores. What counts is how many deviations the mark stands from
 * the mean, so it is asked on a standard curve: the same for every shape and direction.
 */
export function estimatedChance(call: Call, count: number, fraction: number, most: number): Point[] {
  const mark = numberOf(call("CURVE_CUTOFF", [0, 1, fraction]));
  return lookSteps(most).map((looks) => [
    looks,
    looks === 0 ? 0 : numberOf(call("CURVE_HIT_CHANCE", [count, 0, 1, mark, looks])),
  ]);
}

const MOST_LOOKS = 1_000_000;

/**
 * The smallest number of looks that gives a first hit with this chance, the mark being estimated from `count` scores; undefined where even
 * a million are not enough (of a mark from two or three scores some come out so high that nothing ever clears them).
 */
export function estimatedLooks(call: Call, count: number, fraction: number, chance: number): number | undefined {
  const mark = numberOf(call("CURVE_CUTOFF", [0, 1, fraction]));
  const enough = (looks: number) => numberOf(call("CURVE_HIT_CHANCE", [count, 0, 1, mark, looks])) >= chance;
  let high = 1;
  while (!enough(high)) if ((high *= 2) > MOST_LOOKS) return undefined;
  let low = Math.floor(high / 2);
  // Not enough at `low`, enough at `high`.
  while (high - low > 1) {
    const middle = Math.floor((low + high) / 2);
    if (enough(middle)) high = middle;
    else low = middle;
  }
  return high;
}

function numberOf(outcome: ReturnType<Call>): number {
  return outcome && "value" in outcome && typeof outcome.value === "number" ? outcome.value : NaN;
}
